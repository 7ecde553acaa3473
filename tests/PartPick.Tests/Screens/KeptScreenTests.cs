using PartPick.Requirements;
using PartPick.Screens;
using PartPick.Selection;
using Terminal.Gui.Input;

namespace PartPick.Tests.Screens;

/// <summary>Keeping, naming, copying, taking and comparing requirements, by the keys that a person presses.</summary>
public sealed class KeptScreenTests
{
    private readonly string _db = Path.Combine(Path.GetDirectoryName(Run.File(""))!, "kept.db");

    private KeptRequirementStore Store => new(_db);

    [Theory]
    [InlineData(80, 24)]
    [InlineData(120, 40)]
    [InlineData(160, 50)]
    public void A_requirement_is_kept_changed_kept_again_and_taken_back(int width, int height)
    {
        using Bench bench = Open(width, height);
        bench.Do(new Key('w'));
        Assert.Contains("Wanted: nothing is kept yet", bench.Text, StringComparison.Ordinal);
        Assert.Contains("It is not kept; n keeps it under a name.", bench.Text, StringComparison.Ordinal);
        bench.Do(new Key('n'));
        bench.Type("river");
        bench.Do(Key.Enter);
        Assert.Contains("Kept as river.", bench.Rows[^1], StringComparison.Ordinal);
        Assert.Contains("river: 1 kHz square", bench.Rows[0], StringComparison.Ordinal);
        bench.Do(Key.Esc, new Key('e'));
        bench.Type("2k");
        bench.Do(Key.Enter, Key.Esc, new Key('w'));
        Assert.Contains("river is kept with other values", bench.Text, StringComparison.Ordinal);
        bench.Do(new Key('n'));
        bench.Type("tide");
        bench.Do(Key.Enter);
        Assert.Equal(["river", "tide"], Store.Read().Value.Items.Select(item => item.Name));
        Assert.Equal([1000, 2000], Store.Read().Value.Items.Select(item => item.Requirement.OutputHz));
        Assert.All(bench.Rows, row => Assert.True(row.Length <= width));
        bench.Do(Key.Home, Key.CursorDown, Key.Enter);
        Assert.Equal(1000, bench.Model.Wanted.Accepted.OutputHz);
        Assert.Equal(1000, bench.Ranking.Asked[^1].OutputHz);
        Assert.Contains("river: 1 kHz square", bench.Rows[0], StringComparison.Ordinal);
        Assert.Contains("river is what is wanted now.", bench.Rows[^1], StringComparison.Ordinal);
        Assert.Equal(Place.List, bench.Model.Place);
    }

    [Fact]
    public void A_sentence_that_is_not_kept_goes_only_when_Enter_is_pressed_twice()
    {
        Keep("river", 1000);
        using Bench bench = Open(requirement: new Requirement { OutputHz = 5000 });
        bench.Do(new Key('w'), Key.CursorDown, Key.Enter);
        Assert.Contains("is not kept: Enter once more lets it go", bench.Rows[^1], StringComparison.Ordinal);
        Assert.Equal(5000, bench.Model.Wanted.Accepted.OutputHz);
        bench.Do(Key.CursorUp, Key.CursorDown, Key.Enter);
        Assert.Equal(5000, bench.Model.Wanted.Accepted.OutputHz);
        bench.Do(Key.Enter);
        Assert.Equal(1000, bench.Model.Wanted.Accepted.OutputHz);
    }

    [Fact]
    public void A_name_that_is_taken_is_put_over_only_when_Enter_is_pressed_twice()
    {
        Keep("river", 1000);
        using Bench bench = Open(requirement: new Requirement { OutputHz = 5000 });
        bench.Do(new Key('w'), new Key('n'));
        bench.Type("river");
        bench.Do(Key.Enter);
        Assert.Contains("river is kept with other values: Enter once more", bench.Rows[^1], StringComparison.Ordinal);
        Assert.Equal(1000, Store.Read().Value.Items.Single().Requirement.OutputHz);
        bench.Do(Key.Enter);
        Assert.Equal(5000, Store.Read().Value.Items.Single().Requirement.OutputHz);
    }

    [Fact]
    public void N_calls_a_kept_one_otherwise_and_c_keeps_a_copy()
    {
        Keep("river", 1000);
        using Bench bench = Open();
        bench.Do(new Key('w'), Key.CursorDown, new Key('c'));
        Assert.Contains("name river 2", bench.Text, StringComparison.Ordinal);
        bench.Do(Key.Enter);
        Assert.Equal(["river", "river 2"], Store.Read().Value.Items.Select(item => item.Name));
        Assert.Equal("river 2", bench.Model.Kept.Chosen.Name);
        bench.Do(new Key('n'));
        bench.Type("tide");
        bench.Do(Key.Enter);
        Assert.Contains("It is called tide now.", bench.Rows[^1], StringComparison.Ordinal);
        Assert.Equal(["river", "tide"], Store.Read().Value.Items.Select(item => item.Name));
        bench.Do(new Key('n'));
        bench.Type("river");
        bench.Do(Key.Enter);
        Assert.Contains("! name: 'river' is kept already", bench.Rows[^1], StringComparison.Ordinal);
        bench.Do(Key.Esc);
        Assert.Equal(["river", "tide"], Store.Read().Value.Items.Select(item => item.Name));
    }

    [Fact]
    public void Del_twice_takes_one_away_and_another_key_between_keeps_it()
    {
        Keep("river", 1000);
        Keep("tide", 2000);
        using Bench bench = Open();
        bench.Do(new Key('w'), Key.Delete);
        Assert.Contains("cannot be taken away", bench.Rows[^1], StringComparison.Ordinal);
        bench.Do(Key.CursorDown, Key.Delete);
        Assert.Contains("Del once more takes river away for good.", bench.Rows[^1], StringComparison.Ordinal);
        bench.Do(Key.CursorDown, Key.Delete);
        Assert.Equal(2, Store.Read().Value.Items.Length);
        bench.Do(Key.Delete);
        Assert.Equal("river", Store.Read().Value.Items.Single().Name);
        Assert.Contains("tide was taken away.", bench.Rows[^1], StringComparison.Ordinal);
    }

    [Fact]
    public void What_is_kept_is_known_again_whatever_zeros_its_cost_was_written_with()
    {
        using Bench bench = Open(requirement: FirstRequirement.RiverLogger);
        bench.Do(new Key('w'), new Key('n'), Key.Enter, Key.Home);
        Assert.Contains("It is kept as river logger time base.", bench.Text, StringComparison.Ordinal);
        bench.Do(Key.CursorDown);
        Assert.Contains("The sentence as it stands wants the same.", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void The_page_has_the_best_circuits_figures_where_it_was_ranked()
    {
        Keep("river", SampleRanking.Wanted);
        Keep("tide", 2000);
        using Bench bench = Open();
        bench.Do(new Key('w'));
        string river = bench.Rows.First(row => row.Contains(" river ", StringComparison.Ordinal));
        string tide = bench.Rows.First(row => row.Contains(" tide ", StringComparison.Ordinal));
        Candidate best = SampleRanking.Counter;
        Assert.Contains(Figures.Ppm(best.Budget!.WorstRatio), river, StringComparison.Ordinal);
        Assert.Contains(Figures.Three(best.Margin.Value), river, StringComparison.Ordinal);
        Assert.EndsWith(Figures.Money(best.Cost), river, StringComparison.Ordinal);
        Assert.DoesNotContain(Figures.Money(best.Cost), tide, StringComparison.Ordinal);
        Assert.Contains("It is kept as river.", bench.Text, StringComparison.Ordinal);
        bench.Do(Key.CursorDown, Key.CursorDown);
        Assert.Contains("Not ranked since the program was started.", bench.Text, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(80, 24)]
    [InlineData(120, 40)]
    [InlineData(160, 50)]
    public void Marked_ones_stand_side_by_side_with_what_differs_and_the_best_circuit_of_each(int width, int height)
    {
        Keep("river", SampleRanking.Wanted);
        Keep("tide", SampleRanking.Wanted with { OutputHz = 32768, BudgetRatio = 20e-6 });
        using Bench bench = Open(width, height);
        bench.Ranking.Answer = requirement => requirement.OutputHz == 1000
            ? SampleRanking.Answer(requirement, SampleRanking.Counter)
            : SampleRanking.Answer(requirement, SampleRanking.Port, SampleRanking.Undamped);
        bench.Do(new Key('w'), Key.CursorDown, Key.Space, Key.Space, new Key('d'));
        string[] rows = bench.Rows;
        Cells("output frequency", "1 kHz", "32.768 kHz");
        Cells("frequency error", "80 ppm", "20 ppm");
        Cells("circuits that fit", "5", "2");
        Cells("circuit ", "counter CNT-14-HC", "port MCU-KHZ-C");
        Assert.Contains("The same in all: waveform square", bench.Text, StringComparison.Ordinal);
        Assert.DoesNotContain(rows, row => row.TrimStart().StartsWith("waveform ", StringComparison.Ordinal));
        Assert.All(rows, row => Assert.True(row.Length <= width));
        Assert.Equal(32768, bench.Ranking.Asked[^1].OutputHz);
        bench.Do(Key.Esc);
        Assert.Contains("2 kept", bench.Text, StringComparison.Ordinal);
        Assert.Contains("2 ", bench.Rows.First(row => row.Contains(" tide ", StringComparison.Ordinal)), StringComparison.Ordinal);

        void Cells(string label, string left, string right)
        {
            string row = rows.First(
                each => each.Contains(label, StringComparison.Ordinal) && each.Contains(right, StringComparison.Ordinal));
            row = row[row.IndexOf(label, StringComparison.Ordinal)..];
            int at = row.IndexOf(left, StringComparison.Ordinal);
            Assert.True(at >= 0 && at < row.IndexOf(right, StringComparison.Ordinal), row);
        }
    }

    [Fact]
    public void Leaving_the_comparison_ends_its_ranking_and_the_one_put_off_goes_on()
    {
        Keep("tide", 2000);
        using Bench bench = Open(ranking: new FakeRanking { Holds = true });
        bench.Do(new Key('w'));
        bench.Press(Key.CursorDown, new Key('d'));
        bench.SettleUntil(() => bench.Ranking.Asked.Count == 2);
        Assert.True(bench.Ranking.IsCancelled(0));
        Assert.Contains("ranking Wanted, 0 %", bench.Text, StringComparison.Ordinal);
        Assert.Contains("computing", bench.Text, StringComparison.Ordinal);
        bench.Ranking.Report(
            1, SampleRanking.Answer(SampleRanking.Wanted, SampleRanking.Counter) with { IsComplete = false, Covered = 2_061_500 });
        bench.SettleUntil(() => bench.Model.Kept.Comparison!.Share > 0);
        Assert.Contains("50 %", bench.Text, StringComparison.Ordinal);
        bench.Press(Key.Esc);
        Assert.True(bench.Ranking.IsCancelled(1));
        Assert.Equal(1000, bench.Ranking.Asked[^1].OutputHz);
        Assert.Equal(3, bench.Ranking.Asked.Count);
        Assert.Contains("1 kept", bench.Text, StringComparison.Ordinal);
        bench.Ranking.Finish(1);
    }

    [Fact]
    public void What_the_comparison_ranked_for_the_sentence_is_not_ranked_again_for_the_list()
    {
        Keep("tide", 2000);
        using Bench bench = Open(ranking: new FakeRanking { Holds = true });
        bench.Do(new Key('w'));
        bench.Press(Key.CursorDown);
        bench.Ranking.Holds = false;
        bench.Do(new Key('d'), Key.Esc, Key.Esc);
        Assert.Equal([1000, 1000, 2000], bench.Ranking.Asked.Select(requirement => requirement.OutputHz));
        Assert.True(bench.Ranking.IsCancelled(0));
        Assert.False(bench.Model.IsRanking);
        Assert.Contains("5 circuits fit", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void With_no_mark_on_the_sentence_d_says_what_to_mark()
    {
        using Bench bench = Open();
        bench.Do(new Key('w'), new Key('d'));
        Assert.Contains("Space marks those", bench.Rows[^1], StringComparison.Ordinal);
    }

    [Fact]
    public void A_damaged_file_is_said_on_the_page_and_left_as_it_is()
    {
        Directory.CreateDirectory(Store.Folder);
        string path = Path.Combine(Store.Folder, "river.json");
        File.WriteAllText(path, "{ half");
        using Bench bench = Open();
        bench.Do(new Key('w'));
        Assert.Contains("! ", bench.Text, StringComparison.Ordinal);
        Assert.Contains("It is left as it is.", string.Join(" ", bench.Rows.Select(row => row.Trim())), StringComparison.Ordinal);
        bench.Do(new Key('n'));
        bench.Type("river");
        bench.Do(Key.Enter);
        Assert.Equal("{ half", File.ReadAllText(path));
        Assert.Equal("river", Store.Read().Value.Items.Single().Name);
    }

    [Theory]
    [InlineData(40, 12)]
    [InlineData(60, 16)]
    public void The_page_and_the_comparison_fit_a_small_screen(int width, int height)
    {
        Keep("river logger in the north", SampleRanking.Wanted);
        Keep("tide", 2000);
        using Bench bench = Open(width, height);
        bench.Do(new Key('w'), Key.End);
        Assert.Contains("tide", bench.Text, StringComparison.Ordinal);
        Assert.All(bench.Rows, row => Assert.True(row.Length <= width));
        bench.Do(new Key('d'));
        Assert.Contains("1 kHz", bench.Text, StringComparison.Ordinal);
        Assert.Contains("2 kHz", bench.Text, StringComparison.Ordinal);
        Assert.All(bench.Rows, row => Assert.True(row.Length <= width));
    }

    [Fact]
    public void In_ascii_nothing_else_is_drawn()
    {
        Keep("Fluß ±", SampleRanking.Wanted with { BudgetRatio = 20e-6 });
        using Bench bench = Open(120, 40, glyphs: Glyphs.Ascii);
        bench.Do(new Key('w'), Key.CursorDown);
        Assert.DoesNotContain(bench.Text, sign => !char.IsAscii(sign));
        bench.Do(new Key('d'));
        Assert.DoesNotContain(bench.Text, sign => !char.IsAscii(sign));
    }

    private Bench Open(
        int width = 80, int height = 24, FakeRanking? ranking = null, Requirement? requirement = null, Glyphs? glyphs = null)
    {
        var bench = new Bench(width, height, ranking, requirement, glyphs);
        bench.KeepWanted(_db);
        return bench;
    }

    private void Keep(string name, double hertz) => Keep(name, new Requirement { OutputHz = hertz });

    private void Keep(string name, Requirement requirement) => Assert.True(Store.Keep(requirement with { Name = name }).IsOk);
}
