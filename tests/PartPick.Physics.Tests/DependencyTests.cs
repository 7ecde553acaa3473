namespace PartPick.Physics.Tests;

public sealed class DependencyTests
{
    [Fact]
    public void Physics_refers_to_the_platform_and_to_MathNet_alone()
    {
        string[] others =
        [
            .. typeof(OscillatorAnalysis).Assembly.GetReferencedAssemblies()
                .Select(assembly => assembly.Name!)
                .Where(name => name != "MathNet.Numerics" && !name.StartsWith("System.", StringComparison.Ordinal)),
        ];

        Assert.Empty(others);
    }
}
