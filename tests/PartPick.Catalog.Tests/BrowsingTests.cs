using System.Collections.Immutable;
using PartPick.Catalog.Browsing;
using PartPick.Catalog.Import;
using PartPick.Values;

namespace PartPick.Catalog.Tests;

public sealed class BrowsingTests : IDisposable
{
    private readonly string _directory = Directory.CreateTempSubdirectory("partpick-browsing-").FullName;

    private string CatalogFile => Path.Combine(_directory, "catalog.db");

    public void Dispose() => Directory.Delete(_directory, recursive: true);

    [Fact]
    public void Every_part_is_listed_once_in_the_order_of_the_catalogue()
    {
        var pieces = new List<ImmutableDictionary<PartKind, PartRows>>();
        ImmutableDictionary<PartKind, PartRows> all =
            PartListing.Read(CatalogFile, pieces.Add, TestContext.Current.CancellationToken).Value;

        Assert.NotEmpty(pieces);
        foreach (PartKind kind in PartKinds.All)
        {
            string[] expected = [.. PartsCatalog.BuiltIn().OfKind(kind).Select(part => part.Id)];
            Assert.Equal(expected, Enumerable.Range(0, all[kind].Count).Select(row => all[kind][row].Id));
            Assert.All(expected, (id, row) => Assert.Equal(row, all[kind].Find(id)));
            Assert.Equal(-1, all[kind].Find("no such part"));
        }
    }

    [Fact]
    public void Reading_in_pieces_gives_the_same_catalogue_and_begins_anew_when_an_import_comes_between()
    {
        CancellationToken stop = TestContext.Current.CancellationToken;
        Assert.Equal(
            CatalogStore.Load(CatalogFile).Value.All.Select(part => (part.Id, part.Kind)),
            CatalogReading.All(CatalogFile, stop).Value.All.Select(part => (part.Id, part.Kind)));

        var request = new ImportRequest { Kind = PartKind.Crystal, Name = "list.csv", Date = new DateOnly(2026, 3, 1) };
        bool imported = false;
        PartRows crystals = PartListing.Read(
            CatalogFile,
            _ =>
            {
                if (!imported)
                {
                    imported = true;
                    using var list = new StringReader("Part No,Freq\nA-0,4 MHz\nZ-9,8 MHz\n");
                    Assert.Equal(2, CatalogImport.Run(CatalogFile, list, request, stop).Value.Added);
                }
            },
            stop).Value[PartKind.Crystal];

        Assert.True(imported);
        Assert.True(crystals.Find("A-0") >= 0);
        Assert.True(crystals.Find("Z-9") >= 0);
        Assert.Equal(PartsCatalog.BuiltIn().Crystals.Length + 2, crystals.Count);
    }

    [Fact]
    public void An_import_that_comes_between_ends_a_reading_part_by_part()
    {
        CancellationToken stop = TestContext.Current.CancellationToken;
        var request = new ImportRequest { Kind = PartKind.Crystal, Name = "list.csv", Date = new DateOnly(2026, 3, 1) };
        string rows = string.Concat(Enumerable.Range(0, 9000).Select(i => $"L-{i:D5},4 MHz\n"));
        using (var list = new StringReader("Part No,Freq\n" + rows))
        {
            Assert.Equal(9000, CatalogImport.Run(CatalogFile, list, request, stop).Value.Added);
        }

        bool undone = false;
        Result<int> read = CatalogReading.Each(CatalogFile, PartKind.Crystal, _ =>
        {
            if (!undone)
            {
                undone = true;
                Assert.NotNull(CatalogImport.Undo(CatalogFile).Value);
            }
        });

        Assert.Contains("was changed by an import or an undo", read.Problem?.What, StringComparison.Ordinal);
    }

    [Fact]
    public void A_row_says_what_the_part_says()
    {
        CrystalPart part = PartsCatalog.BuiltIn().Crystals.First(each => each.Offer.HasPrices && each.LoadFarads is not null);
        PartRows rows = Rows([part]);
        PartRow row = rows[0];

        Assert.Equal(part.Id, row.Id);
        Assert.Equal(part.FrequencyHz, Number(row, "frequency"));
        Assert.Equal(part.LoadFarads, Number(row, "load"));
        Assert.Equal((double)part.Offer.Prices[0].UnitPrice, Number(row, "price"));
        Assert.Contains(part.Description, row.Cells);
        Assert.Equal(RowMarks.None, row.Marks);
        Assert.True(double.IsNaN(Number(PartRow.Of(part with { ResistanceOhms = null }), "resistance")));
        Assert.Equal(RowMarks.Excluded, PartRow.Of(part with { Excluded = true }).Marks);
    }

    [Theory]
    [InlineData("h49")]
    [InlineData("4.096 H49 10")]
    [InlineData("load=18p")]
    [InlineData("load<18p")]
    [InlineData("frequency>=4.096M frequency<=8M 30")]
    [InlineData("resistance>1k x-")]
    [InlineData("no such word")]
    public void A_filter_finds_the_parts_that_looking_at_each_finds(string text)
    {
        PartRows rows = Rows([.. PartsCatalog.BuiltIn().Crystals]);
        PartFilter filter = PartFilter.Read(PartKind.Crystal, text, "filter").Value;

        string[] found = [.. filter.Find(rows, TestContext.Current.CancellationToken).Select(row => rows[row].Id)];

        Assert.Equal(PartsCatalog.BuiltIn().Crystals.Where(part => HoldsPlainly(part, text)).Select(part => part.Id), found);
    }

    [Fact]
    public void Typing_on_narrows_what_was_found_to_the_same_as_starting_over()
    {
        CancellationToken stop = TestContext.Current.CancellationToken;
        PartRows rows = Rows([.. PartsCatalog.BuiltIn().Crystals]);
        ListColumn column = ListColumns.Of(PartKind.Crystal)[2];
        PartView? view = null;
        foreach (string text in new[] { "", "4", "4.", "4.0", "4.096", "4.096 load>10p", "4.0", "8" })
        {
            PartFilter filter = PartFilter.Read(PartKind.Crystal, text, "filter").Value;
            view = PartView.Of(rows, filter, column, true, view, stop);
            PartView anew = PartView.Of(rows, filter, column, true, null, stop);
            Assert.Equal(Ids(anew), Ids(view));
        }
    }

    [Theory]
    [InlineData("frequency", false)]
    [InlineData("frequency", true)]
    [InlineData("load", false)]
    [InlineData("load", true)]
    [InlineData("description", false)]
    [InlineData("package", true)]
    [InlineData("id", true)]
    public void Rows_are_in_the_order_of_the_column_equal_ones_by_id_and_absent_ones_last(string key, bool descending)
    {
        PartRows rows = Rows([.. PartsCatalog.BuiltIn().Crystals]);
        ListColumn column = ListColumns.Of(PartKind.Crystal).First(each => each.Key == key);

        PartRow[] ordered =
        [
            .. RowOrder.Of(rows, column, descending, TestContext.Current.CancellationToken).Select(row => rows[row]),
        ];

        Assert.Equal(rows.Count, ordered.Select(row => row.Id).Distinct().Count());
        for (int i = 1; i < ordered.Length; i++)
        {
            int order = Compare(ordered[i - 1], ordered[i], column, descending);
            Assert.True(order < 0 || (order == 0 && string.CompareOrdinal(ordered[i - 1].Id, ordered[i].Id) < 0));
        }
    }

    [Fact]
    public void Lists_longer_than_a_block_are_whole_and_a_changed_row_is_found_in_its_place()
    {
        CrystalPart one = PartsCatalog.BuiltIn().Crystals[0];
        PartRows rows = Rows([.. Enumerable.Range(0, 20_000).Select(i => one with { Id = $"P-{i:D6}", Description = $"number {i}" })]);
        Assert.Equal(20_000, rows.Count);
        Assert.Equal("P-019999", rows[19_999].Id);
        PartFilter filter = PartFilter.Read(PartKind.Crystal, "number 1777", "filter").Value;
        Assert.Equal(
            Enumerable.Range(0, 20_000).Where(i => $"{i}".Contains("1777", StringComparison.Ordinal)),
            filter.Find(rows, TestContext.Current.CancellationToken));

        PartRows changed = rows.With(PartRow.Of(one with { Id = "P-010000", Description = "another" }));

        Assert.Contains("another", changed[10_000].Cells);
        Assert.Equal("P-010001", changed[10_001].Id);
        Assert.Contains("number 10000", rows[10_000].Cells);
    }

    [Theory]
    [InlineData("loud<18p", "'loud'")]
    [InlineData("load<", "filter load")]
    [InlineData("load<18 Ohm", "")]
    [InlineData("load<18Ohm", "filter load")]
    public void A_wrong_condition_says_what_fits(string text, string expected)
    {
        Result<PartFilter> read = PartFilter.Read(PartKind.Crystal, text, "filter");
        Assert.Equal(expected.Length == 0, read.IsOk);
        Assert.Contains(expected, read.Problem?.ToString() ?? "", StringComparison.Ordinal);
    }

    [Fact]
    public void Reading_is_stopped_between_pieces()
    {
        using var stop = new CancellationTokenSource();
        Assert.Throws<OperationCanceledException>(() => { PartListing.Read(CatalogFile, _ => stop.Cancel(), stop.Token); });
    }

    private static bool HoldsPlainly(CrystalPart part, string text) => text.Split(' ').All(word => word switch
    {
        "load=18p" => part.LoadFarads is { } load && Math.Abs(load - 18e-12) < 1e-18,
        "load<18p" => part.LoadFarads < 17.999e-12,
        "frequency>=4.096M" => part.FrequencyHz > 4.0959e6,
        "frequency<=8M" => part.FrequencyHz < 8.0001e6,
        "resistance>1k" => part.ResistanceOhms > 1000.1,
        _ => new[] { part.Id, part.Description, part.Package, part.Supplier, part.SupplierPart, part.Note }
            .Any(each => each?.Contains(word, StringComparison.OrdinalIgnoreCase) == true),
    });

    private static int Compare(PartRow one, PartRow other, ListColumn column, bool descending)
    {
        if (column.IsNumber)
        {
            (double left, double right) = (Number(one, column.Key), Number(other, column.Key));
            return double.IsNaN(left) || double.IsNaN(right)
                ? double.IsNaN(left).CompareTo(double.IsNaN(right))
                : descending ? right.CompareTo(left) : left.CompareTo(right);
        }

        int place = ListColumns.Of(one.Kind).Where(each => !each.IsNumber).ToList().FindIndex(each => each.Key == column.Key);
        (string first, string second) = (one.Cells[place], other.Cells[place]);
        return first.Length == 0 || second.Length == 0
            ? (first.Length == 0).CompareTo(second.Length == 0)
            : StringComparer.OrdinalIgnoreCase.Compare(first, second) * (descending ? -1 : 1);
    }

    private static double Number(PartRow row, string key) =>
        row.Numbers[ListColumns.Of(row.Kind).Where(each => each.IsNumber).ToList().FindIndex(each => each.Key == key)];

    private static string[] Ids(PartView view) => [.. Enumerable.Range(0, view.Count).Select(place => view[place].Id)];

    private static PartRows Rows(Part[] parts) => new(
        PartKind.Crystal,
        [.. parts.Chunk(PartBlock.Size).Select(chunk => PartBlock.Of(PartKind.Crystal, [.. chunk.Select(PartRow.Of)]))]);
}
