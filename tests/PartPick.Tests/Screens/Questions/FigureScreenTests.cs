using PartPick.Catalog;
using PartPick.Selection;
using Terminal.Gui.Input;

namespace PartPick.Tests.Screens.Questions;

public sealed class FigureScreenTests : IDisposable
{
    private readonly string _directory = Directory.CreateTempSubdirectory("partpick-figures-").FullName;

    public void Dispose() => Directory.Delete(_directory, recursive: true);

    [Theory]
    [InlineData(80, 24)]
    [InlineData(120, 40)]
    [InlineData(52, 16)]
    public void One_key_shows_how_each_figure_comes_about_and_Up_and_Down_go_through_them(int width, int height)
    {
        using Bench bench = Open(width, height);
        Candidate first = bench.Model.List.Chosen!;

        bench.Press(new Key('h'));
        bench.Settle();
        Assert.Contains("How it comes about: counter", bench.Text, StringComparison.Ordinal);
        while (bench.Text.Contains("more below", StringComparison.Ordinal)
            && !bench.Text.Contains("|e0| + sum of", StringComparison.Ordinal))
        {
            bench.Press(Key.PageDown);
        }

        Assert.Contains("|e0| + sum of", bench.Text, StringComparison.Ordinal);
        var seen = new HashSet<string>();
        foreach (FigureWorking figure in FigureWorkings.Of(first, SampleRanking.Wanted, null))
        {
            Assert.Contains(bench.Rows, row => row.StartsWith($"► {figure.Name}", StringComparison.Ordinal));
            seen.Add(figure.Name);
            Assert.All(bench.Rows, row => Assert.True(row.Length <= width));
            bench.Press(Key.CursorDown);
        }

        Assert.Superset(
            new HashSet<string>(
            [
                "frequency error, worst case", "crystal tolerance", "strays", "start-up margin, least", "critical transconductance",
                "gain margin", "running margin", "drive level, highest", "start-up time, longest", "load capacitance", "output swing",
                    "cost",
            ]),
            seen);
        bench.Press(Key.CursorUp, Key.CursorUp, Key.Esc);
        Assert.DoesNotContain("How it comes about", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void In_a_circuit_it_leads_back_to_the_circuit_and_the_next_time_to_the_same_figure()
    {
        using Bench bench = Open(120, 40);
        bench.Press(Key.Enter, new Key('h'));
        bench.Settle();
        bench.Press(Key.CursorDown, Key.CursorDown);
        Assert.Contains("► centre error e0", bench.Text, StringComparison.Ordinal);
        bench.Press(Key.Esc);
        Assert.Contains("Esc list", bench.Rows[^1], StringComparison.Ordinal);

        bench.Press(Key.CursorRight, new Key('h'));
        bench.Settle();

        Assert.Contains("► centre error e0", bench.Text, StringComparison.Ordinal);
        Assert.Contains("f / (2^k target) - 1", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_ranked_candidate_shows_its_score_with_its_numbers()
    {
        Requirement wanted = SampleRanking.Wanted with { Circuits = [CircuitKind.Counter], CapacitorSeries = "E3", ResistorSeries = "E3" };
        RankingResult ranked = Ranker.Rank(
            wanted, PartsCatalog.BuiltIn(), new RankingOptions { Top = 1 }, cancellation: TestContext.Current.CancellationToken);
        Candidate best = Assert.Single(ranked.Candidates);
        using Bench bench = Open(120, 40, new FakeRanking { Answer = _ => ranked });

        bench.Press(new Key('h'));
        bench.Settle();
        bench.Press(Key.End);

        Assert.Contains($"score: {best.Score.ToString("0.000", System.Globalization.CultureInfo.InvariantCulture)}", bench.Text,
            StringComparison.Ordinal);
        Assert.Contains("we error/budget + wm wanted margin/margin", bench.Text, StringComparison.Ordinal);
    }

    private Bench Open(int width, int height, FakeRanking? ranking = null)
    {
        var bench = new Bench(width, height, ranking);
        bench.AnswerQuestions(Path.Combine(_directory, "catalog.db"));
        return bench;
    }
}
