using System.Text.Json;
using PartPick.Catalog;
using PartPick.Screens;
using PartPick.Selection;
using Terminal.Gui.Input;

namespace PartPick.Tests.Screens;

/// <summary>Changing the parts of an open circuit, by the keys that a person presses.</summary>
public class SwapScreenTests
{
    [Fact]
    public void One_key_steps_a_capacitor_and_every_figure_is_that_of_the_ranking()
    {
        using Bench bench = Opened();
        string before = Value(bench);
        bench.Press(Key.CursorRight);
        bench.Settle();
        Candidate shown = bench.Model.Swaps.Shown!;
        Assert.True(shown.Choice.C1.ValueFarads > SwapWorld.Ranking.Candidates[0].Choice.C1.ValueFarads);
        Assert.Equal(SwapWorld.Figures(SwapWorld.All.Candidates.Single(one => one.Id == shown.Id)), SwapWorld.Figures(shown));
        string text = bench.Text;
        Assert.Contains($"* was {before}", text, StringComparison.Ordinal);
        Assert.Contains(", changed", text, StringComparison.Ordinal);
        Assert.Contains($"{Figures.Ppm(shown.Budget!.WorstRatio)} ", text, StringComparison.Ordinal);
        double error = (shown.Budget.WorstRatio - SwapWorld.Ranking.Candidates[0].Budget!.WorstRatio) * 1e6;
        Assert.Contains($"{Signed.Of(error)} {(error > 0 ? "worse" : "better")}", text, StringComparison.Ordinal);
        Assert.Contains("against the ranked", text, StringComparison.Ordinal);
    }

    [Fact]
    public void The_figures_are_those_that_check_gives_for_the_changed_circuit()
    {
        using Bench bench = Opened();
        bench.Press(Key.CursorRight, Key.CursorDown, Key.CursorLeft, Key.CursorDown, Key.CursorLeft);
        bench.Settle();
        Candidate shown = bench.Model.Swaps.Shown!;
        string file = Run.File(CircuitFile.Write(shown.Describe(1000)).ToJsonString());
        JsonElement check = Run.Of("check", file, "--format", "json").Json;
        Assert.Equal(shown.OutputHz, check.GetProperty("outputFrequency").GetDouble());
        Assert.Equal(shown.Result.StartUp.Margin, check.GetProperty("startUpMargin").GetDouble());
        Assert.Equal(shown.Result.Steady!.DriveWatts, check.GetProperty("driveLevel").GetDouble());
        Assert.Equal(shown.Result.StartUpTimeSeconds, check.GetProperty("startUpTime").GetDouble());
    }

    [Fact]
    public void Stepping_back_shows_the_ranked_circuit_exactly_as_it_was()
    {
        using Bench bench = Opened();
        string before = bench.Text;
        bench.Press(Key.CursorRight);
        bench.Settle();
        Assert.NotEqual(before, bench.Text);
        bench.Press(Key.CursorLeft);
        Assert.Equal(before, bench.Text);
        Assert.Same(SwapWorld.Ranking.Candidates[0], bench.Model.Swaps.Shown);
        Assert.False(bench.Model.Swaps.IsChanged);
    }

    [Fact]
    public void Backspace_takes_the_chosen_part_back_and_Del_all_of_them()
    {
        using Bench bench = Opened();
        bench.Press(Key.CursorRight, Key.CursorDown, Key.CursorRight, Key.CursorDown, Key.CursorLeft);
        bench.Settle();
        Assert.Equal(3, bench.Text.Split("* was ").Length - 1);
        bench.Press(Key.CursorUp, Key.Backspace);
        bench.Settle();
        Assert.Equal(2, bench.Text.Split("* was ").Length - 1);
        Assert.Equal(SwapWorld.Ranking.Candidates[0].Choice.C2.ValueFarads, bench.Model.Swaps.Shown!.Choice.C2.ValueFarads);
        bench.Press(Key.Backspace);
        Assert.Contains("That part is as it was ranked.", bench.Rows[^1], StringComparison.Ordinal);
        Assert.Equal(Place.Circuit, bench.Model.Place);
        bench.Press(Key.Delete);
        Assert.Same(SwapWorld.Ranking.Candidates[0], bench.Model.Swaps.Shown);
        Assert.DoesNotContain("* was ", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void Esc_keeps_the_changed_circuit_marks_its_row_and_Enter_shows_it_again()
    {
        using Bench bench = Opened();
        bench.Press(Key.CursorRight);
        bench.Settle();
        string changed = bench.Text;
        bench.Press(Key.Esc);
        Assert.Contains("The changed circuit is kept", bench.Rows[^1], StringComparison.Ordinal);
        Assert.Contains(bench.Rows, row => row.StartsWith("►*counter", StringComparison.Ordinal));
        bench.Press(Key.CursorDown, Key.Enter);
        bench.Settle();
        Assert.DoesNotContain("* was ", bench.Text, StringComparison.Ordinal);
        bench.Press(new Key('b'));
        bench.Settle();
        Assert.Equal(changed, bench.Text);
    }

    [Fact]
    public void A_circuit_that_no_longer_starts_says_so()
    {
        using Bench bench = Opened(height: 40);
        bench.Press(Key.CursorDown, Key.CursorDown);
        bench.Press([.. Enumerable.Repeat(Key.CursorRight, 20)]);
        bench.Settle();
        Assert.Contains("It does not start by itself any more.", bench.Text, StringComparison.Ordinal);
        Assert.Contains("Newly broken: the start-up margin, the frequency error", bench.Text, StringComparison.Ordinal);
        Assert.Contains("does not build up from noise at ", bench.Text, StringComparison.Ordinal);
        Assert.Contains("none now", bench.Text, StringComparison.Ordinal);
        Assert.Contains("No frequency: it does not run", bench.Text, StringComparison.Ordinal);
        bench.Press(Key.CursorRight);
        Assert.Contains("4.7 MΩ is the last one that may stand there.", bench.Rows[^1], StringComparison.Ordinal);
    }

    [Fact]
    public void Zero_is_a_direct_connection_in_the_place_of_Rs_and_no_capacitor_at_all()
    {
        using Bench bench = Opened();
        bench.Press(new Key('0'));
        Assert.Contains("The circuit needs a part there.", bench.Rows[^1], StringComparison.Ordinal);
        bench.Press(Key.CursorDown, Key.CursorDown, new Key('0'));
        bench.Settle();
        Assert.Null(bench.Model.Swaps.Shown!.Choice.Series);
        Assert.Matches("Rs +direct +\\* was ", bench.Text);
        bench.Press(Key.CursorLeft);
        Assert.Contains("direct is the first", bench.Rows[^1], StringComparison.Ordinal);
        bench.Press(Key.CursorRight);
        bench.Settle();
        Assert.Equal(330, bench.Model.Swaps.Shown!.Choice.Series!.ValueOhms);
    }

    [Fact]
    public void The_last_figures_stay_until_the_new_ones_are_there_and_no_key_is_lost()
    {
        using Bench bench = SwapWorld.Open();
        bench.Press(Key.Enter, Key.CursorRight, Key.CursorRight);
        Assert.True(bench.Model.Swaps.IsComputing);
        Assert.Contains("computing, ", bench.Text, StringComparison.Ordinal);
        Assert.Same(SwapWorld.Ranking.Candidates[0], bench.Model.Swaps.Shown);
        bench.Press(new Key('s'));
        Assert.Contains("still being computed", bench.Rows[^1], StringComparison.Ordinal);
        bench.Settle();
        bench.Press(Key.CursorRight, Key.CursorLeft, Key.CursorRight);
        bench.Settle();
        Assert.DoesNotContain("computing, ", bench.Text, StringComparison.Ordinal);
        double[] values = [.. SwapWorld.Parts.Capacitors.Select(part => part.ValueFarads).Where(IsE12).Distinct().Order()];
        int before = Array.IndexOf(values, SwapWorld.Ranking.Candidates[0].Choice.C1.ValueFarads);
        Assert.Equal(values[before + 3], bench.Model.Swaps.Shown!.Choice.C1.ValueFarads);
    }

    [Fact]
    public void Crystal_and_stage_are_stepped_through_what_gives_the_wanted_frequency()
    {
        using Bench bench = Opened();
        bench.Press([.. Enumerable.Repeat(Key.CursorDown, 6)]);
        bench.Press(Key.CursorRight);
        bench.Settle();
        Candidate shown = bench.Model.Swaps.Shown!;
        Assert.Equal((13, 8.192e6), (shown.Choice.Tap, shown.Choice.Crystal.FrequencyHz));
        Assert.Matches("stage +13 \\(÷8192\\) \\* was 12", bench.Text);
        bench.Press(Key.CursorUp, Key.CursorUp, Key.Backspace);
        Assert.Same(SwapWorld.Ranking.Candidates[0], bench.Model.Swaps.Shown);
        bench.Press(Key.CursorRight, Key.CursorLeft, Key.CursorLeft, Key.CursorLeft, Key.CursorLeft);
        bench.Settle();
        Assert.Equal(4.096e6, bench.Model.Swaps.Shown!.Choice.Crystal.FrequencyHz);
        Assert.NotEqual(SwapWorld.Ranking.Candidates[0].Choice.Crystal.Id, bench.Model.Swaps.Shown.Choice.Crystal.Id);
    }

    [Fact]
    public void S_puts_the_changed_circuit_on_a_list_as_it_stands_with_its_feedback_resistor()
    {
        string catalogue = Path.Combine(Path.GetDirectoryName(Run.File(""))!, "swaps.db");
        using Bench bench = Opened();
        bench.KeepLists(catalogue);
        bench.Press(Key.CursorRight, Key.CursorDown, Key.CursorDown, Key.CursorDown, Key.CursorRight);
        bench.Settle();
        Candidate shown = bench.Model.Swaps.Shown!;
        bench.Press(new Key('s'), Key.Enter);
        bench.Settle();
        Assert.Contains("Candidate 1 of the list default", bench.Rows[^1], StringComparison.Ordinal);
        ShortlistEntry entry = ShortlistStore.Read(catalogue, "default").Value.Entries.Single();
        Assert.Equal(BoardParts.Of(shown).Support.Feedback!.Id, ChosenParts.Read(entry.Choice)!.Ids["rf"]);
        Assert.Equal(2.2e6, BoardParts.Of(shown).Support.Feedback!.ValueOhms);
        Assert.Equal(shown.Budget!.WorstRatio * 1e6, ShortlistFigures.Read(entry.Figures)!.ErrorWorst);
        Assert.True(bench.Model.Swaps.IsChanged);
    }

    [Fact]
    public void A_new_requirement_is_held_against_the_changed_circuit()
    {
        using Bench bench = Opened(height: 40);
        bench.Press(Key.CursorRight);
        bench.Settle();
        double changed = bench.Model.Swaps.Shown!.Choice.C1.ValueFarads;
        bench.Ranking.Answer = requirement => Ranker.Rank(requirement, SwapWorld.Parts);
        bench.Press(new Key('e'), Key.CursorRight, Key.CursorRight);
        bench.Type("90");
        bench.Press(Key.Enter, Key.Esc);
        bench.Settle();
        Assert.Equal(Place.Circuit, bench.Model.Place);
        Assert.Contains("of 90 ppm", bench.Text, StringComparison.Ordinal);
        Assert.Equal(changed, bench.Model.Swaps.Shown!.Choice.C1.ValueFarads);
        Assert.Equal(90e-6, bench.Model.List.Result!.Requirement.BudgetRatio);
    }

    [Fact]
    public void A_follower_has_its_bias_resistors_to_choose_from_and_without_a_catalogue_they_stay()
    {
        using var bench = new Bench(height: 40);
        bench.Press(Key.End, Key.Enter);
        Assert.Matches("► C1 +100 pF", bench.Text);
        Assert.Matches("R1 RB top +100 kΩ", bench.Text);
        Assert.Matches("R2 RB low +100 kΩ", bench.Text);
        Assert.Matches("R3 RE +2.2 kΩ", bench.Text);
        bench.Press(Key.CursorDown, Key.CursorDown, Key.CursorRight);
        Assert.Matches("► R1 RB top", bench.Text);
        Assert.Contains("There are no parts to put in.", bench.Rows[^1], StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(40, 12)]
    [InlineData(60, 20)]
    [InlineData(80, 24)]
    [InlineData(120, 40)]
    [InlineData(160, 50)]
    public void The_changed_circuit_fits_every_size_in_ascii_too(int width, int height)
    {
        foreach (Glyphs glyphs in new[] { Glyphs.Drawn, Glyphs.Ascii })
        {
            using Bench bench = SwapWorld.Open(width, height, glyphs);
            bench.Press(Key.Enter, Key.CursorRight, Key.CursorDown, Key.CursorDown, Key.CursorRight);
            bench.Settle();
            Assert.All(bench.Rows, row => Assert.True(row.Length <= width));
            Assert.True(glyphs == Glyphs.Drawn || bench.Text.All(sign => char.IsAscii(sign)));
            Assert.Matches("worse|better|as ranked|none now", bench.Text);
        }
    }

    private static bool IsE12(double farads) =>
        farads < 50e-12 && Math.Abs(Values.PreferredSeries.Named("E12").Value.Nearest(farads) / farads - 1) < 1e-6;

    private static string Value(Bench bench) => bench.Model.Swaps.Board!.Words(bench.Model.Swaps.Places[bench.Model.Swaps.At]);

    private static Bench Opened(int width = 80, int height = 24)
    {
        Bench bench = SwapWorld.Open(width, height);
        bench.Press(Key.Enter);
        bench.Settle();
        return bench;
    }
}
