namespace PartPick.Values.Tests;

public sealed class DependencyTests
{
    [Fact]
    public void Values_refer_to_the_platform_alone()
    {
        string[] allowed = [];

        Assert.All(
            typeof(ValueText).Assembly.GetReferencedAssemblies().Select(assembly => assembly.Name!),
            name => Assert.True(name.StartsWith("System.", StringComparison.Ordinal) || allowed.Contains(name), name));
    }
}
