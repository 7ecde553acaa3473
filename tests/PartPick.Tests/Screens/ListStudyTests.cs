using PartPick.Catalog;
using PartPick.Screens;
using PartPick.Selection;
using Terminal.Gui.Input;

namespace PartPick.Tests.Screens;

/// <summary>Replacements of a list's candidate and its cost over the number of boards, by the keys that a person presses.</summary>
public sealed class ListStudyTests
{
    private readonly string _db = Path.Combine(Path.GetDirectoryName(Run.File(""))!, "study.db");

    [Theory]
    [InlineData(80, 24)]
    [InlineData(120, 40)]
    public void R_lists_what_may_replace_a_part_as_the_engine_finds_it(int width, int height)
    {
        using Bench bench = Open(width, height);
        bench.Press(new Key('r'));
        Assert.Contains("reading", bench.Text, StringComparison.Ordinal);
        bench.Settle();
        LineAlternates found = Expected(0);
        Assert.False(found.Replacements.IsEmpty);
        Assert.Contains(
            FormattableString.Invariant($"{found.Replacements.Length} of {found.Considered} others fit"), bench.Text, StringComparison.Ordinal);
        Assert.Contains("part 1 of 7", bench.Text, StringComparison.Ordinal);
        string[] shown = [.. bench.Rows.SkipWhile(row => !row.Contains(" most in", StringComparison.Ordinal)).Skip(1).Take(3)];
        Assert.All(shown.Zip(found.Replacements), pair => Assert.Contains(pair.Second.Part.Id, pair.First, StringComparison.Ordinal));
        Assert.StartsWith("►", shown[0], StringComparison.Ordinal);
        Assert.Contains("With " + found.Replacements[0].Part.Id, bench.Text, StringComparison.Ordinal);
        Assert.Contains("in stock", bench.Text, StringComparison.Ordinal);
        Assert.All(bench.Rows, row => Assert.True(row.Length <= width));
        Assert.Contains("other parts", bench.Rows[^1], StringComparison.Ordinal);
    }

    [Fact]
    public void Down_chooses_another_replacement_and_right_goes_to_the_next_part()
    {
        using Bench bench = Open();
        bench.Press(new Key('r'));
        bench.Settle();
        bench.Press(Key.CursorDown);
        Assert.Contains("With " + Expected(0).Replacements[1].Part.Id, bench.Text, StringComparison.Ordinal);
        bench.Press(Key.CursorRight);
        Assert.Contains("computing", bench.Text, StringComparison.Ordinal);
        Assert.Contains("part 2 of 7", bench.Text, StringComparison.Ordinal);
        bench.Settle();
        Assert.Contains("With " + Expected(1).Replacements[0].Part.Id, bench.Text, StringComparison.Ordinal);
        bench.Press(Key.CursorLeft);
        Assert.DoesNotContain("computing", bench.Text, StringComparison.Ordinal);
        Assert.Contains("With " + Expected(0).Replacements[0].Part.Id, bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void Esc_ends_the_search_and_leads_back_to_the_list()
    {
        using Bench bench = Open();
        bench.Press(new Key('r'), Key.Esc);
        bench.Settle();
        Assert.Contains("List default", bench.Text, StringComparison.Ordinal);
        Assert.Contains("r replacements", bench.Rows[^1], StringComparison.Ordinal);
        bench.Press(new Key('b'), Key.Esc);
        bench.Settle();
        Assert.Contains("List default", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_part_without_any_replacement_says_why()
    {
        using Bench bench = Open();
        int crystal = Lines().FindIndex(line => line.Part is CrystalPart);
        CatalogEdit.Set(_db, "X-04M096-18-H49-10", [("excluded", "yes")], new DateOnly(2026, 1, 2));
        Assert.Empty(Expected(crystal).Replacements);
        bench.Press(new Key('r'));
        bench.Settle();
        bench.Press([.. Enumerable.Repeat(Key.CursorRight, crystal)]);
        bench.Settle();
        Assert.Contains("another frequency", bench.Text, StringComparison.Ordinal);
        Assert.Contains("None keeps the circuit fit", bench.Text, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(80, 24)]
    [InlineData(120, 40)]
    public void B_shows_the_cost_over_boards_at_once_and_the_best_candidates_when_they_are_found(int width, int height)
    {
        using Bench bench = Open(width, height);
        CostCurve curve = CostCurve.Of(Circuit().Chosen.Board, 10_000)!;
        bench.Press(new Key('b'));
        bench.SettleUntil(() => bench.Model.Shortlists.Page.Quantity!.View is not null);
        Assert.Contains("both logarithmic", bench.Text, StringComparison.Ordinal);
        Assert.Contains("computing the best", bench.Text, StringComparison.Ordinal);
        Assert.Contains("└──", bench.Text, StringComparison.Ordinal);
        bench.Press(Key.PageDown);
        string[] rows = bench.Rows;
        string hundred = curve.UnitCost(100).ToString("F4", System.Globalization.CultureInfo.InvariantCulture);
        Assert.Contains(rows, row => row.TrimStart().StartsWith("100 ", StringComparison.Ordinal)
            && row.Contains(hundred, StringComparison.Ordinal));
        Assert.All(rows, row => Assert.True(row.Length <= width));
        bench.Press(new Key('b'));
        bench.Settle();
        Assert.Contains("List default", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_candidate_that_was_taken_off_elsewhere_is_one_line()
    {
        using Bench bench = Open();
        Assert.Null(ShortlistStore.Remove(_db, "default", 1).Problem);
        bench.Press(new Key('r'));
        bench.Settle();
        Assert.Contains("! ", bench.Text, StringComparison.Ordinal);
        bench.Press(Key.Esc, new Key('b'));
        bench.Settle();
        Assert.Contains("! ", bench.Text, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(40, 12)]
    [InlineData(60, 16)]
    [InlineData(160, 50)]
    public void Both_pages_fit_every_size(int width, int height)
    {
        using Bench bench = Open(width, height);
        bench.Press(new Key('r'));
        bench.Settle();
        Assert.Contains("others fit", bench.Text, StringComparison.Ordinal);
        Assert.Contains("► C-", bench.Text, StringComparison.Ordinal);
        Assert.All(bench.Rows, row => Assert.True(row.Length <= width));
        bench.Press(Key.Esc, new Key('b'));
        bench.SettleUntil(() => bench.Model.Shortlists.Page.Quantity!.View is not null);
        Assert.Contains("One board", bench.Text, StringComparison.Ordinal);
        Assert.All(bench.Rows, row => Assert.True(row.Length <= width));
    }

    private Bench Open(int width = 80, int height = 24)
    {
        var bench = new Bench(width, height);
        bench.KeepLists(_db);
        var desk = new CatalogDesk(_db);
        Assert.True(desk.Put("default", Fit(), SampleRanking.Wanted, null, null, TestContext.Current.CancellationToken).IsOk);
        bench.Press(new Key('l'));
        bench.Settle();
        return bench;
    }

    internal static CandidateParts Fit()
    {
        var parts = PartsCatalog.BuiltIn();
        return new CandidateParts
        {
            Circuit = CircuitKind.Counter,
            Crystal = (CrystalPart)parts.Find("X-04M096-20-H49-10")!,
            Amplifier = parts.Find("CNT-14-HC")!,
            Tap = 12,
            C1 = (CapacitorPart)parts.Find("C-015p-C0G-2-0603")!,
            C2 = (CapacitorPart)parts.Find("C-047p-C0G-2-0603")!,
            Series = (ResistorPart)parts.Find("R-680R-5-0603")!,
        };
    }

    private ListCircuit Circuit() => new CatalogDesk(_db).Circuit("default", 1, TestContext.Current.CancellationToken).Value;

    private List<BoardLine> Lines() => [.. BoardLine.Of(Circuit().Chosen.Board)];

    private LineAlternates Expected(int line)
    {
        ListCircuit circuit = Circuit();
        return new Alternates(circuit.Chosen, circuit.Review.Requirement, circuit.Catalog).Find(Lines()[line]);
    }
}
