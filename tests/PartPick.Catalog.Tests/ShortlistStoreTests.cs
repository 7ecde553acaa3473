using PartPick.Values;

namespace PartPick.Catalog.Tests;

public sealed class ShortlistStoreTests : IDisposable
{
    private readonly string _directory = Directory.CreateTempSubdirectory("partpick-lists").FullName;

    private string Db => Path.Combine(_directory, "catalog.db");

    private static ShortlistEntry Entry => new()
    {
        Added = "2026-03-01", Builds = 200, Note = "a note", Choice = "{}", Circuit = "{\"c\": 1}",
        Requirement = "{\"r\": 2}", Figures = "{}",
        Parts = [.. PartKinds.All.Select(kind => PartsCatalog.BuiltIn().OfKind(kind).First())],
    };

    [Fact]
    public void An_entry_comes_back_with_every_part_as_it_was()
    {
        ShortlistEntry kept = ShortlistStore.Add(Db, "logger", Entry).Value;
        ShortlistEntry found = Assert.Single(Assert.Single(ShortlistStore.ReadAll(Db).Value).Entries);
        Assert.Equal(1, kept.Number);
        Assert.Equal(Entry with { Number = 1, Parts = default }, found with { Parts = default });
        Assert.Equal(
            Entry.Parts.Select(part => string.Join('|', PartFigures.Of(part))),
            found.Parts.Select(part => string.Join('|', PartFigures.Of(part))));
    }

    [Fact]
    public void Lists_are_apart_and_numbers_go_on_behind_the_last()
    {
        foreach (string list in new[] { "b", "a", "b", "b" })
        {
            Assert.True(ShortlistStore.Add(Db, list, Entry).IsOk);
        }

        Assert.Equal(1, ShortlistStore.Remove(Db, "b", 2).Value);
        Assert.Equal(4, ShortlistStore.Add(Db, "b", Entry).Value.Number);
        Assert.Equal(["a", "b"], ShortlistStore.ReadAll(Db).Value.Select(list => list.Name));
        Assert.Equal([1, 3, 4], ShortlistStore.Read(Db, "b").Value.Entries.Select(entry => entry.Number));
        Assert.Equal(3, ShortlistStore.Remove(Db, "b", null).Value);
        Assert.Equal("NAME", ShortlistStore.Read(Db, "b").Problem!.Where);
        Assert.Equal("NUMBER", ShortlistStore.Remove(Db, "a", 7).Problem!.Where);
    }

    [Fact]
    public void Entries_put_there_at_once_are_all_there()
    {
        Assert.True(ShortlistStore.Add(Db, "a", Entry).IsOk);
        Result<ShortlistEntry>[] added = [.. Enumerable.Range(0, 8).AsParallel().Select(_ => ShortlistStore.Add(Db, "a", Entry))];
        ShortlistEntry[] kept = [.. ShortlistStore.Read(Db, "a").Value.Entries];
        Assert.Equal(kept.Length, kept.Select(entry => entry.Number).Distinct().Count());
        Assert.Equal(1 + added.Count(each => each.IsOk), kept.Length);
        Assert.All(
            added,
            each => Assert.True(each.IsOk || each.Problem.What.Contains("in use", StringComparison.Ordinal), each.ToString()));
    }

    [Fact]
    public void Verify_backup_and_restore_take_the_lists_along()
    {
        Assert.True(ShortlistStore.Add(Db, "a", Entry).IsOk);
        Assert.Empty(CatalogSafety.Verify(Db).Value.Faults);
        string copy = Path.Combine(_directory, "copy.db");
        Assert.True(CatalogSafety.Backup(Db, copy).IsOk);
        Assert.Equal(1, ShortlistStore.Remove(Db, "a", null).Value);
        Assert.True(CatalogSafety.Restore(Db, copy).IsOk);
        Assert.Single(ShortlistStore.Read(Db, "a").Value.Entries);
    }

    [Theory]
    [InlineData("logger", true)]
    [InlineData("Logger 2, river", true)]
    [InlineData("Fluß", true)]
    [InlineData("", false)]
    [InlineData("  ", false)]
    [InlineData("a/b", false)]
    [InlineData("a\\b", false)]
    [InlineData("-x", false)]
    [InlineData("a\tb", false)]
    public void A_name_is_one_line_without_separators_of_paths(string name, bool fits) => Assert.Equal(fits, ShortlistName.Read(name).IsOk);

    public void Dispose() => Directory.Delete(_directory, true);
}
