using PartPick.Catalog.Import;
using PartPick.Catalog.Tests.Import;

namespace PartPick.Catalog.Tests.OnDemand;

public sealed class StoredPartsTests : IDisposable
{
    private const string List = "Part Number,Frequency,Overtone,Load Cap.,Package,Price (EUR)\n"
        + "A1,4.000MHz,1,18pF,SMD 3225,0.42\n"
        + "A2,8 MHz,1,,HC49,0.55\n"
        + "A3,25 MHz,3,18pF,HC49,0.55\n"
        + "A4,8 MHz,1,12pF,HC49,\n";

    private readonly ImportBench _bench = new();

    private static CancellationToken Stop => TestContext.Current.CancellationToken;

    private string Beside => _bench.Db + ".directory";

    public void Dispose() => _bench.Dispose();

    [Fact]
    public void The_directory_holds_every_crystal_that_is_for_sale_with_what_decides_its_frequency()
    {
        _bench.Run(List);
        CatalogEdit.Set(_bench.Db, "A2", [("shunt", "5 pF"), ("motional", "12 fF")], new DateOnly(2026, 3, 2));
        (StoredParts parts, PartsDirectory directory) = Open();
        PartsCatalog all = CatalogStore.Load(_bench.Db).Value;
        CrystalPart[] expected =
        [
            .. all.Crystals.Where(part =>
                part.Overtone == 1 && !part.Excluded && part.Offer.HasPrices && part.Offer.Currency == all.Currency),
        ];
        Assert.Contains(expected, part => part.Id == "A2");
        Assert.DoesNotContain(expected, part => part.Id is "A3" or "A4");
        Assert.Equal(expected.Select(CrystalOutline.Of), Enumerable.Range(0, directory.Crystals).Select(place => directory[place]));
        Assert.Equal(expected.Select(part => part.Id), Enumerable.Range(0, directory.Crystals).Select(directory.IdOf));
        PartsCatalog some = parts.Read(directory, [0, directory.Crystals - 1], Stop).Value!;
        Assert.Equal([expected[0].Id, expected[^1].Id], some.Crystals.Select(part => part.Id));
        Assert.Equal(
            Samples.Text(new PartsCatalog(all.All.Where(part => part is not CrystalPart))),
            Samples.Text(new PartsCatalog(some.All.Where(part => part is not CrystalPart))));
        Assert.Equal(all.Currency, some.Currency);
    }

    [Fact]
    public void It_is_kept_and_used_again_until_a_part_changes()
    {
        _bench.Run(List);
        string first = Open().Directory.Mark;
        byte[] kept = File.ReadAllBytes(Beside);
        CatalogStore.WriteSetting(_bench.Db, "wanted", "something");
        Assert.Equal(first, Open().Directory.Mark);
        Assert.Equal(kept, File.ReadAllBytes(Beside));
        CatalogEdit.Set(_bench.Db, "A1", [("excluded", "yes")], new DateOnly(2026, 3, 2));
        Assert.DoesNotContain("A1", Ids());
        _bench.Run("Part Number,Frequency,Price (EUR)\nA5,8 MHz,0.1\n");
        Assert.Contains("A5", Ids());
        Assert.True(CatalogImport.Undo(_bench.Db).IsOk);
        Assert.DoesNotContain("A5", Ids());
    }

    [Fact]
    public void A_damaged_directory_and_one_of_another_catalogue_are_made_anew()
    {
        _bench.Run(List);
        string[] ids = Ids();
        byte[] bytes = File.ReadAllBytes(Beside);
        foreach (byte[] damaged in new[] { [], bytes[..^9], [.. bytes[..200], (byte)(bytes[200] ^ 1), .. bytes[201..]] })
        {
            File.WriteAllBytes(Beside, damaged);
            Assert.Equal(ids, Ids());
            Assert.Equal(bytes, File.ReadAllBytes(Beside));
        }

        using var other = new ImportBench();
        other.Run(List.Replace("A1", "B1", StringComparison.Ordinal));
        File.Copy(Beside, other.Db + ".directory");
        var parts = new StoredParts(other.Db, 0);
        Assert.True(parts.Open(Stop).IsOk);
        Assert.Contains("B1", Enumerable.Range(0, parts.Directory!.Crystals).Select(parts.Directory.IdOf));
    }

    [Fact]
    public void After_a_change_by_another_an_old_directory_reads_nothing()
    {
        _bench.Run(List);
        (StoredParts parts, PartsDirectory directory) = Open();
        Assert.NotNull(parts.Read(directory, [0], Stop).Value);
        CatalogEdit.Set(_bench.Db, "A1", [("note", "seen")], new DateOnly(2026, 3, 2));
        Assert.Null(parts.Read(directory, [0], Stop).Value);
    }

    [Fact]
    public void Being_stopped_is_no_damage()
    {
        _bench.Run(List);
        (StoredParts parts, PartsDirectory directory) = Open();
        using var stop = new CancellationTokenSource();
        stop.Cancel();
        Assert.Throws<OperationCanceledException>(() => parts.Read(directory, [0], stop.Token));
        File.Delete(Beside);
        Assert.Throws<OperationCanceledException>(() => parts.Open(stop.Token));
        Assert.Contains("A1", Ids());
    }

    [Fact]
    public void A_small_catalogue_is_read_whole_and_leaves_no_directory()
    {
        _bench.Run(List);
        var parts = new StoredParts(_bench.Db);
        Assert.True(parts.Open(Stop).IsOk);
        Assert.Equal(Samples.Text(CatalogStore.Load(_bench.Db).Value), Samples.Text(parts.Whole!));
        Assert.False(File.Exists(Beside));
    }

    private (StoredParts Parts, PartsDirectory Directory) Open()
    {
        var parts = new StoredParts(_bench.Db, 0);
        var opened = parts.Open(Stop);
        Assert.True(opened.IsOk, opened.Problem?.ToString());
        return (parts, parts.Directory!);
    }

    private string[] Ids()
    {
        PartsDirectory directory = Open().Directory;
        return [.. Enumerable.Range(0, directory.Crystals).Select(directory.IdOf)];
    }
}
