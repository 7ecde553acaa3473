using PartPick.Catalog;
using PartPick.Screens;
using Terminal.Gui.Input;

namespace PartPick.Tests.Screens;

public sealed class PartsScreenTests : IDisposable
{
    private readonly string _directory = Directory.CreateTempSubdirectory("partpick-parts-").FullName;

    private string CatalogFile => Path.Combine(_directory, "catalog.db");

    public void Dispose() => Directory.Delete(_directory, recursive: true);

    [Theory]
    [InlineData(80, 24)]
    [InlineData(120, 40)]
    [InlineData(40, 12)]
    [InlineData(62, 17)]
    public void One_key_opens_the_catalogue_and_Esc_leads_back(int width, int height)
    {
        using Bench bench = Open(width, height);
        Assert.Contains("Listed: crystals", bench.Text, StringComparison.Ordinal);
        Assert.Contains(PartsCatalog.BuiltIn().Crystals[0].Id[..8], bench.Text, StringComparison.Ordinal);
        Assert.Contains("? keys", bench.Rows[^1], StringComparison.Ordinal);
        Assert.All(bench.Rows, row => Assert.True(row.Length <= width));
        bench.Press(Key.Esc);
        Assert.Contains("Wanted:", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void Filtering_while_typing_then_ordering_then_opening_shows_the_part_with_its_origins()
    {
        using Bench bench = Open();
        bench.Press(new Key('f'));
        bench.Type("h49 load>=30p");
        bench.Settle();
        CrystalPart[] expected =
        [
            .. PartsCatalog.BuiltIn().Crystals
                .Where(part => part.Id.Contains("H49", StringComparison.Ordinal) && part.LoadFarads > 29.9e-12)
                .OrderByDescending(part => part.ResistanceOhms ?? double.NegativeInfinity).ThenBy(part => part.Id, StringComparer.Ordinal),
        ];
        Assert.NotEmpty(expected);
        Assert.Contains($"{expected.Length} of {PartsCatalog.BuiltIn().Crystals.Length} crystals", bench.Text, StringComparison.Ordinal);

        bench.Press(Key.Enter, Key.CursorRight, Key.CursorRight, Key.CursorRight, new Key('o'), new Key('o'));
        bench.Settle();
        Assert.Contains("by resistance, highest first", bench.Text, StringComparison.Ordinal);
        Assert.StartsWith("►  " + expected[0].Id, bench.Rows[4], StringComparison.Ordinal);
        Assert.StartsWith("   " + expected[1].Id, bench.Rows[5], StringComparison.Ordinal);

        bench.Press(Key.CursorDown, Key.Enter);
        bench.Settle();
        Assert.Contains(expected[1].Id, bench.Rows[0], StringComparison.Ordinal);
        Assert.Contains(bench.Rows, row => row.Contains("load ", StringComparison.Ordinal)
            && row.Contains("pF", StringComparison.Ordinal) && row.Contains("built-in", StringComparison.Ordinal));

        bench.Press(Key.Esc);
        Assert.Equal(1, bench.Model.Parts!.List.At);
        bench.Press(Key.Esc);
        bench.Settle();
        Assert.Contains($"─ {PartsCatalog.BuiltIn().Crystals.Length} crystals", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void Esc_while_typing_a_filter_leaves_the_one_before()
    {
        using Bench bench = Open();
        bench.Press(new Key('f'));
        bench.Type("32.768");
        bench.Press(Key.Enter, new Key('f'));
        bench.Type(" no such");
        bench.Settle();
        Assert.Contains(" 0 of ", bench.Text, StringComparison.Ordinal);
        bench.Press(Key.Esc);
        bench.Settle();
        Assert.Contains("with 32.768,", bench.Text, StringComparison.Ordinal);
        Assert.DoesNotContain(" 0 of ", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_wrong_condition_is_said_and_the_list_stays()
    {
        using Bench bench = Open();
        bench.Press(new Key('f'));
        bench.Type("load<18Ohm");
        bench.Settle();
        Assert.Contains("! filter load: '18Ohm'", bench.Text, StringComparison.Ordinal);
        bench.Press(Key.Enter);
        Assert.NotNull(bench.Model.Parts!.List.Typed);
        Assert.NotEqual(0, bench.Model.Parts.List.View.Count);
    }

    [Fact]
    public void A_figure_set_in_place_is_kept_with_its_origin_and_goes_back()
    {
        using Bench bench = Open();
        string id = bench.Model.Parts!.List.Chosen!.Id;
        CrystalPart before = (CrystalPart)PartsCatalog.BuiltIn().Find(id)!;
        bench.Press(Key.Enter);
        bench.Settle();
        GoTo(bench, "resistance");
        bench.Type("45");
        bench.Press(Key.Enter);
        bench.Settle();

        Assert.Equal("set by hand, 2026-03-01", bench.Model.Parts.Page.Chosen!.Origin);
        Assert.Contains("45 Ω", bench.Text, StringComparison.Ordinal);
        CatalogEntry entry = CatalogReading.Find(CatalogFile, id).Value!;
        Assert.Equal(45, ((CrystalPart)entry.Part).ResistanceOhms);
        Assert.Equal("set by hand, 2026-03-01", entry.Origin["resistance"]);

        bench.Press(Key.Esc);
        bench.Settle();
        Assert.StartsWith("►* " + id, bench.Rows[4], StringComparison.Ordinal);
        Assert.Matches(@"\s45\s", bench.Rows[4]);

        bench.Press(Key.Enter);
        bench.Settle();
        GoTo(bench, "resistance");
        bench.Press(new Key('b'));
        bench.Settle();
        Assert.Equal(PartFigures.Of(before), PartFigures.Of(CatalogReading.Find(CatalogFile, id).Value!.Part));
    }

    [Fact]
    public void A_value_that_does_not_fit_is_said_and_can_be_mended()
    {
        using Bench bench = Open();
        bench.Press(Key.Enter);
        bench.Settle();
        GoTo(bench, "load");
        bench.Press(Key.Enter);
        bench.Type(" Ohm");
        bench.Press(Key.Enter);
        bench.Settle();
        Assert.Contains("! load:", bench.Text, StringComparison.Ordinal);
        Assert.NotNull(bench.Model.Parts!.Page.Typed);
        bench.Press(Key.Esc);
        Assert.DoesNotContain("! load:", bench.Text, StringComparison.Ordinal);
        Assert.False(bench.Model.Parts.HasChanged);
    }

    [Fact]
    public void A_note_and_an_exclusion_are_kept_and_change_the_ranked_parts_on_the_way_back()
    {
        using Bench bench = Open();
        int told = 0;
        bench.Model.PartsChanged += () => told++;
        string id = bench.Model.Parts!.List.Chosen!.Id;
        bench.Press(Key.Enter);
        bench.Settle();
        bench.Press(new Key('n'));
        bench.Type("hums at 4 V");
        bench.Press(Key.Enter);
        bench.Settle();
        bench.Press(new Key('x'));
        bench.Settle();
        Part part = CatalogReading.Find(CatalogFile, id).Value!.Part;
        Assert.Equal((true, "hums at 4 V"), (part.Excluded, part.Note));

        bench.Press(Key.Esc);
        bench.Settle();
        Assert.Contains("note: hums at 4 V", bench.Text, StringComparison.Ordinal);
        Assert.StartsWith("►x", bench.Rows[4], StringComparison.Ordinal);
        Assert.Equal(0, told);
        bench.Press(Key.Esc);
        Assert.Equal(1, told);

        bench.Press(new Key('c'), Key.Enter);
        bench.Settle();
        bench.Press(new Key('x'));
        bench.Settle();
        Assert.False(CatalogReading.Find(CatalogFile, id).Value!.Part.Excluded);
    }

    [Fact]
    public void A_ranking_waits_while_the_catalogue_is_open()
    {
        using var bench = new Bench(ranking: new FakeRanking { Holds = true }, catalogue: CatalogFile);
        bench.Press(new Key('c'));
        Assert.True(bench.Ranking.IsCancelled(0));
        bench.Settle();
        bench.Press(Key.Esc);
        Assert.Equal(2, bench.Ranking.Asked.Count);
        Assert.False(bench.Ranking.IsCancelled(1));
    }

    [Fact]
    public void Every_kind_can_be_listed_opened_and_drawn_in_ascii()
    {
        using var bench = new Bench(catalogue: CatalogFile, glyphs: Glyphs.Ascii);
        bench.Press(new Key('c'));
        bench.Settle();
        foreach (PartKind kind in PartKinds.All)
        {
            Assert.Contains($"Listed: {kind.Word()}", bench.Text, StringComparison.Ordinal);
            bench.Press(Key.Enter);
            bench.Settle();
            Assert.Contains("description", bench.Text, StringComparison.Ordinal);
            Assert.DoesNotContain(bench.Text, sign => sign > '~');
            bench.Press(Key.Esc);
            Assert.DoesNotContain(bench.Text, sign => sign > '~');
            bench.Press(new Key('k'));
            bench.Settle();
        }

        Assert.Equal(PartKind.Crystal, bench.Model.Parts!.List.Kind);
    }

    [Fact]
    public void The_page_of_keys_lists_those_of_the_catalogue_and_leads_back_to_it()
    {
        using Bench bench = Open();
        bench.Press(new Key('?'));
        Assert.Contains("In the catalogue", bench.Text, StringComparison.Ordinal);
        Assert.DoesNotContain("In an import", bench.Text, StringComparison.Ordinal);
        bench.Press(Key.PageDown);
        Assert.Contains("In an import", bench.Text, StringComparison.Ordinal);
        bench.Press(Key.Esc);
        Assert.Contains("Listed: crystals", bench.Text, StringComparison.Ordinal);
    }

    private static void GoTo(Bench bench, string key)
    {
        bench.Press(Key.Home);
        for (int i = 0; bench.Model.Parts!.Page.Chosen!.Key != key; i++)
        {
            Assert.True(i < 100, key + " is not on the page.");
            bench.Press(Key.CursorDown);
        }
    }

    private Bench Open(int width = 80, int height = 24)
    {
        var bench = new Bench(width, height, catalogue: CatalogFile);
        bench.Press(new Key('c'));
        bench.Settle();
        return bench;
    }
}
