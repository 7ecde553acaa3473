namespace PartPick.Selection.Tests;

public sealed class DependencyTests
{
    [Fact]
    public void The_selection_knows_parts_and_physics_and_neither_store_nor_screen()
    {
        string[] allowed = ["PartPick.Values", "PartPick.Catalog", "PartPick.Physics"];

        Assert.All(
            typeof(Ranker).Assembly.GetReferencedAssemblies().Select(assembly => assembly.Name!),
            name => Assert.True(name.StartsWith("System.", StringComparison.Ordinal) || allowed.Contains(name), name));
    }
}
