namespace PartPick.Tests;

public sealed class DependencyTests
{
    [Fact]
    public void The_program_reaches_the_store_through_the_catalogue_alone() =>
        Assert.DoesNotContain("LiteDB", typeof(ExitStatus).Assembly.GetReferencedAssemblies().Select(assembly => assembly.Name));
}
