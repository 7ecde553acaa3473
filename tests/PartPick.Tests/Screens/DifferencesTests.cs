using System.Collections.Immutable;
using PartPick.Screens;
using PartPick.Selection;
using Terminal.Gui.Input;

namespace PartPick.Tests.Screens;

/// <summary>Two circuits side by side, by the keys that a person presses.</summary>
public class DifferencesTests
{
    [Fact]
    public void D_marks_a_circuit_and_d_on_another_shows_both_with_what_differs()
    {
        using Bench bench = SwapWorld.Open(height: 60);
        bench.Press(new Key('d'));
        Assert.Contains(bench.Rows, row => row.StartsWith("►=counter", StringComparison.Ordinal));
        Assert.Contains("Marked with =", bench.Rows[^1], StringComparison.Ordinal);
        bench.Press(Key.CursorDown);
        Assert.Contains(bench.Rows, row => row.StartsWith(" =counter", StringComparison.Ordinal));
        bench.Press(new Key('d'));
        ImmutableArray<Candidate> ranked = SwapWorld.Ranking.Candidates;
        Assert.Contains(
            "A marked: counter " + ranked[0].Choice.Amplifier.Id + ", " + ranked[0].Choice.Crystal.Id, bench.Text, StringComparison.Ordinal);
        Assert.Contains(
            "B chosen: counter " + ranked[1].Choice.Amplifier.Id + ", " + ranked[1].Choice.Crystal.Id, bench.Text, StringComparison.Ordinal);
        foreach ((string one, string other) in new[]
        {
            (ranked[0].Choice.Crystal.Id, ranked[1].Choice.Crystal.Id), (ranked[0].Choice.C1.Id, ranked[1].Choice.C1.Id),
            (ranked[0].Choice.C2.Id, ranked[1].Choice.C2.Id), (ranked[0].Choice.Series!.Id, ranked[1].Choice.Series!.Id),
        }.Where(pair => pair.Item1 != pair.Item2))
        {
            Assert.Contains(bench.Rows, row => row.Contains(one, StringComparison.Ordinal)
                && row[row.IndexOf(one, StringComparison.Ordinal)..].Contains(other, StringComparison.Ordinal));
        }

        Assert.Contains("The same in both:", bench.Text, StringComparison.Ordinal);
        bench.Press(Key.Esc);
        Assert.Equal((Place.List, 1), (bench.Model.Place, bench.Model.List.At));
    }

    [Fact]
    public void Each_figure_stands_under_the_other_and_the_better_one_is_named_in_its_line()
    {
        using Bench bench = SwapWorld.Open();
        bench.Press(new Key('d'), Key.CursorDown, new Key('d'));
        (Candidate a, Candidate b) = (SwapWorld.Ranking.Candidates[0], SwapWorld.Ranking.Candidates[1]);
        Assert.Single(bench.Rows, row => row.EndsWith("better", StringComparison.Ordinal));
        AssertLine(
            "error, worst case", Figures.Ppm(a.Budget!.WorstRatio), Figures.Ppm(b.Budget!.WorstRatio), a.Budget.WorstRatio < b.Budget.WorstRatio);
        AssertLine(
            "margin, worst corner", Figures.Three(a.Margin.Value), Figures.Three(b.Margin.Value), a.Margin.Value > b.Margin.Value);
        (double one, double other) = (a.Drive!.Value / a.RatedDriveWatts!.Value, b.Drive!.Value / b.RatedDriveWatts!.Value);
        AssertLine("  of the rated", Figures.Three(one * 100), Figures.Three(other * 100), one < other);
        int[] points = [.. bench.Rows.Where(row => row.StartsWith(" error, w", StringComparison.Ordinal)
            || row.StartsWith(" cost", StringComparison.Ordinal)).Select(row => row.IndexOf('.', StringComparison.Ordinal))];
        Assert.Equal(2, points.Length);
        Assert.Equal(points[0], points[1]);

        void AssertLine(string name, string textA, string textB, bool first)
        {
            string row = bench.Rows.Single(text => text.StartsWith(" " + name, StringComparison.Ordinal));
            string[] words = row[name.Length..].Split(' ', StringSplitOptions.RemoveEmptyEntries);
            Assert.Contains(textA, words);
            Assert.Contains(textB, words);
            Assert.Equal(textA == textB ? "same" : first ? "A" : "B", words[^1]);
        }
    }

    [Fact]
    public void A_changed_circuit_stands_beside_the_ranked_one_and_esc_leads_back_to_it()
    {
        using Bench bench = SwapWorld.Open();
        bench.Press(Key.Enter, Key.CursorRight);
        bench.Settle();
        string before = bench.Text;
        bench.Press(new Key('d'));
        Candidate ranked = SwapWorld.Ranking.Candidates[0];
        Assert.Contains("A ranked: ", bench.Text, StringComparison.Ordinal);
        Assert.Contains("B changed: ", bench.Text, StringComparison.Ordinal);
        Assert.Contains(bench.Rows, row => row.StartsWith(" C1 ", StringComparison.Ordinal)
            && row.Contains(ranked.Choice.C1.Id, StringComparison.Ordinal)
            && row.Contains(bench.Model.Swaps.Shown!.Choice.C1.Id, StringComparison.Ordinal));
        bench.Press(Key.Esc);
        Assert.Equal(before, bench.Text);
    }

    [Fact]
    public void A_marked_circuit_stands_beside_a_changed_one_of_another_row()
    {
        using Bench bench = SwapWorld.Open();
        bench.Press(new Key('d'), Key.CursorDown, Key.Enter, Key.CursorRight);
        bench.Settle();
        bench.Press(new Key('d'));
        Assert.Same(SwapWorld.Ranking.Candidates[0], bench.Model.Differences.Pair!.A);
        Assert.Same(bench.Model.Swaps.Shown, bench.Model.Differences.Pair.B);
    }

    [Fact]
    public void D_on_the_marked_circuit_takes_the_mark_off()
    {
        using Bench bench = SwapWorld.Open();
        bench.Press(new Key('d'), new Key('d'));
        Assert.Contains("It is marked no more.", bench.Rows[^1], StringComparison.Ordinal);
        Assert.DoesNotContain(bench.Rows, row => row.Contains("=counter", StringComparison.Ordinal));
    }

    [Fact]
    public void A_mark_follows_its_circuit_into_a_new_answer_and_its_end_is_said()
    {
        using var bench = new Bench();
        bench.Press(new Key('d'), new Key('e'));
        bench.Ranking.Answer = requirement => SampleRanking.Answer(requirement, SampleRanking.Port, SampleRanking.Counter);
        bench.Type("2k");
        bench.Press(Key.Enter);
        Assert.Same(SampleRanking.Counter, bench.Model.List.Marked);
        bench.Ranking.Answer = requirement => SampleRanking.Answer(requirement, SampleRanking.Port);
        bench.Type("3");
        Assert.Null(bench.Model.List.Marked);
        Assert.Contains("The marked circuit is not in the list any more.", bench.Model.Notice, StringComparison.Ordinal);
    }

    [Fact]
    public void Of_a_follower_and_a_gate_the_places_of_both_are_shown()
    {
        var pair = new CircuitPair(SampleRanking.Undamped, "marked", SampleRanking.Follower, "chosen", SampleRanking.Wanted);
        string text = string.Join('\n', PairParts.Different(pair, 80, Glyphs.Drawn).Select(line => line.Text));
        Assert.Matches("circuit +gate +follower", text);
        Assert.Matches("Rs +direct +-", text);
        Assert.Matches("RE +- +2.2 kΩ", text);
    }

    [Fact]
    public void A_figure_that_only_one_has_makes_that_one_better()
    {
        Assert.Equal("A", new FigurePair("drive", "µW", 3, null, -1).Better);
        Assert.Equal("B", new FigurePair("margin", "", 3, 4, 1).Better);
        Assert.Equal("", new FigurePair("margin", "", 3.0001, 3.0002, 1).Better);
        Assert.Equal(("same", "-1.00"), (new FigurePair("x", "", 2.001, 2.002, 1).Difference, new FigurePair("x", "", 3, 2, 1).Difference));
    }

    [Theory]
    [InlineData(40, 12)]
    [InlineData(80, 24)]
    [InlineData(120, 40)]
    public void The_two_fit_every_size_in_ascii_too(int width, int height)
    {
        foreach (Glyphs glyphs in new[] { Glyphs.Drawn, Glyphs.Ascii })
        {
            using Bench bench = SwapWorld.Open(width, height, glyphs);
            bench.Press(new Key('d'), Key.CursorDown, new Key('d'));
            for (int i = 0; i < 5; i++)
            {
                Assert.All(bench.Rows, row => Assert.True(row.Length <= width));
                Assert.True(glyphs == Glyphs.Drawn || bench.Text.All(sign => char.IsAscii(sign)));
                bench.Press(Key.PageDown);
            }
        }
    }
}
