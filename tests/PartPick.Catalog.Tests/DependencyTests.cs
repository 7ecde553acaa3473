namespace PartPick.Catalog.Tests;

public sealed class DependencyTests
{
    [Fact]
    public void The_catalogue_refers_to_its_store_and_its_files_and_to_nothing_above_it()
    {
        string[] allowed = ["PartPick.Values", "LiteDB", "CsvHelper"];

        Assert.All(
            typeof(PartsCatalog).Assembly.GetReferencedAssemblies().Select(assembly => assembly.Name!),
            name => Assert.True(name.StartsWith("System.", StringComparison.Ordinal) || allowed.Contains(name), name));
    }
}
