using PartPick.Screens;
using PartPick.Selection;
using Terminal.Gui.Input;

namespace PartPick.Tests.Screens;

public class MainScreenTests
{
    [Fact]
    public void At_80_by_24_sentence_list_and_limits_are_all_in_sight()
    {
        using var bench = new Bench();
        string text = bench.Text;
        Assert.Contains("Wanted: 1 kHz square, within ±80 ppm for 5 years", text, StringComparison.Ordinal);
        Assert.Contains("5 circuits fit, of 4.1 million combinations", text, StringComparison.Ordinal);
        Assert.Contains("most: crystal over temperature", text, StringComparison.Ordinal);
        Assert.Contains("least: 4.5 V, 50 °C", text, StringComparison.Ordinal);
        Assert.Contains("of 2.50 EUR", text, StringComparison.Ordinal);
        Assert.Contains("Enter open", text, StringComparison.Ordinal);
        Assert.All(bench.Rows, row => Assert.True(row.Length <= 80));
    }

    [Fact]
    public void Down_chooses_the_next_circuit_and_its_limits()
    {
        using var bench = new Bench();
        Assert.Contains("counter CNT-14-HC", bench.Text, StringComparison.Ordinal);
        bench.Press(Key.CursorDown, Key.CursorDown);
        Assert.Equal(2, bench.Model.List.At);
        Assert.Contains("gate INV-HC-U-1", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void Typing_a_value_ranks_again_and_keeps_it()
    {
        using var bench = new Bench();
        bench.Press(new Key('e'));
        bench.Type("2k");
        Assert.Equal(2000, bench.Ranking.Asked[^1].OutputHz);
        Assert.Equal(1000, bench.Model.Wanted.Accepted.OutputHz);
        bench.Press(Key.Enter);
        Assert.Equal(2000, bench.Model.Wanted.Accepted.OutputHz);
        Assert.Contains("Wanted: 2 kHz square", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void Wrong_text_says_what_is_wrong_and_what_fits_and_keeps_the_old_value()
    {
        using var bench = new Bench();
        bench.Press(new Key('e'));
        bench.Type("5 Ohm");
        bench.Press(Key.Enter);
        string foot = bench.Rows[^2] + " " + bench.Rows[^1].Trim();
        Assert.Contains("! output frequency: '5 Ohm'", foot, StringComparison.Ordinal);
        Assert.Contains("fits a frequency", foot, StringComparison.Ordinal);
        Assert.Equal(1000, bench.Model.Wanted.Accepted.OutputHz);
        bench.Press(Key.Esc);
        Assert.Contains("Wanted: 1 kHz square", bench.Text, StringComparison.Ordinal);
        Assert.Equal(Place.Sentence, bench.Model.Place);
        bench.Press(Key.Esc);
        Assert.Equal(Place.List, bench.Model.Place);
    }

    [Fact]
    public void Escape_while_typing_goes_back_to_the_old_value_and_its_ranking()
    {
        using var bench = new Bench();
        bench.Press(new Key('e'));
        bench.Type("7");
        Assert.Equal(7, bench.Ranking.Asked[^1].OutputHz);
        bench.Press(Key.Esc);
        Assert.Equal(1000, bench.Ranking.Asked[^1].OutputHz);
    }

    [Fact]
    public void Tab_and_letters_pick_a_board()
    {
        using var bench = new Bench();
        bench.Press(new Key('e'));
        while (bench.Model.Wanted.Field.Name != "board")
        {
            bench.Press(Key.Tab);
        }

        bench.Press(new Key('f'));
        Assert.Equal(Board.FourLayer, bench.Model.Wanted.Accepted.Board);
        bench.Press(Key.Space);
        Assert.Equal(Board.Breadboard, bench.Model.Wanted.Accepted.Board);
        Assert.Equal(Board.Breadboard, bench.Ranking.Asked[^1].Board);
    }

    [Fact]
    public void The_old_list_stays_until_the_new_answer_comes()
    {
        using var bench = new Bench();
        bench.Ranking.Holds = true;
        bench.Press(new Key('e'));
        bench.Type("3");
        Assert.Contains("computing; the list is still the one before", bench.Text, StringComparison.Ordinal);
        Assert.Contains("CNT-14-HC", bench.Text, StringComparison.Ordinal);
        bench.Type("2");
        Assert.True(bench.Ranking.IsCancelled(1));
        bench.Ranking.Answer = requirement => SampleRanking.Answer(requirement, SampleRanking.Port);
        bench.Ranking.Finish(2);
        bench.Press(Key.Enter);
        Assert.Contains("1 circuit fits", bench.Text, StringComparison.Ordinal);
        Assert.Contains("MCU-KHZ-C", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_best_so_far_is_shown_with_the_computing_mark()
    {
        using var bench = new Bench(ranking: new FakeRanking { Holds = true });
        Assert.Contains("computing", bench.Text, StringComparison.Ordinal);
        bench.Ranking.Report(
            0, SampleRanking.Answer(SampleRanking.Wanted, SampleRanking.Counter) with { IsComplete = false, Covered = 1_400_000 });
        bench.Press(Key.CursorDown);
        Assert.Contains("computing 33 %, best so far", bench.Text, StringComparison.Ordinal);
        Assert.Contains("CNT-14-HC", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void When_nothing_fits_the_nearest_misses_and_the_limit_are_named()
    {
        using var bench = new Bench(ranking: new FakeRanking { Answer = SampleRanking.Nothing });
        Assert.Contains("nothing fits; the frequency error removed 82 %", bench.Text, StringComparison.Ordinal);
        Assert.Contains("1 of 2, nearest first", bench.Text, StringComparison.Ordinal);
        Assert.Contains(" ■■■■■■■■■■■■■■■■···· 3 400 000", bench.Text, StringComparison.Ordinal);
        Assert.Contains("The frequency error is 74.9 ppm, the budget 20 ppm.", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void Enter_opens_the_whole_circuit_and_escape_comes_back_to_the_same_row()
    {
        using var bench = new Bench(height: 200);
        bench.Press(Key.CursorDown, Key.Enter);
        string text = bench.Text;
        Assert.Contains("Wanted: 1 kHz square", text, StringComparison.Ordinal);
        Assert.Contains("÷16384", text, StringComparison.Ordinal);
        Assert.Contains("decoupling", text, StringComparison.Ordinal);
        Assert.Contains("centre: nominal values at 25 °C", text, StringComparison.Ordinal);
        Assert.Contains("negative resistance", text, StringComparison.Ordinal);
        Assert.Contains("Why this circuit", text, StringComparison.Ordinal);
        bench.Press(Key.Esc);
        Assert.Equal(1, bench.Model.List.At);
        Assert.Contains("Enter open", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void The_circuit_page_scrolls_and_n_goes_to_the_same_place_of_the_next_circuit()
    {
        using var bench = new Bench();
        bench.Press(Key.Enter);
        Assert.Contains("1 of 5, more below", bench.Text, StringComparison.Ordinal);
        bench.Press(Key.End);
        Assert.Contains("Score 1.900", bench.Text, StringComparison.Ordinal);
        bench.Press(new Key('n'));
        Assert.Contains("2 of 5", bench.Text, StringComparison.Ordinal);
        Assert.Contains("Score 1.900", bench.Text, StringComparison.Ordinal);
        bench.Press(new Key('b'));
        Assert.Contains("1 of 5", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_question_mark_shows_keys_and_cautions_and_escape_leaves_them()
    {
        using var bench = new Bench(height: 120);
        bench.Press(new Key('?'));
        Assert.Contains("licence", bench.Text, StringComparison.Ordinal);
        Assert.Contains("qualified", bench.Text, StringComparison.Ordinal);
        Assert.Contains("Local codes", bench.Text, StringComparison.Ordinal);
        bench.Press(Key.Esc);
        Assert.DoesNotContain("licence", bench.Text, StringComparison.Ordinal);
        Assert.Equal(Place.List, bench.Model.Place);
    }

    [Fact]
    public void At_120_columns_the_drawing_stands_beside_the_list()
    {
        using var bench = new Bench(120, 40);
        Assert.Contains(
            bench.Rows,
            row => row.Contains("CNT-14-HC", StringComparison.Ordinal) && row.Contains('┤', StringComparison.Ordinal));
        Assert.Contains("÷4096", bench.Text, StringComparison.Ordinal);
        bench.Resize(80, 24);
        Assert.DoesNotContain("÷4096 ", bench.Text, StringComparison.Ordinal);
        Assert.Contains("Wanted:", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void In_ascii_nothing_else_is_drawn()
    {
        using var bench = new Bench(120, 40, glyphs: Glyphs.Ascii);
        for (int i = 0; i < 5; i++)
        {
            Assert.Empty(NotAscii(bench.Text));
            bench.Press(Key.CursorDown);
        }

        bench.Press(Key.Enter);
        Assert.Empty(NotAscii(bench.Text));
        bench.Press(Key.Esc, new Key('?'));
        Assert.Empty(NotAscii(bench.Text));

        static string NotAscii(string text) => new([.. text.Where(sign => !char.IsAscii(sign))]);
    }

    [Fact]
    public void A_tiny_screen_says_what_it_needs_and_recovers()
    {
        using var bench = new Bench(30, 8);
        Assert.Contains("40 x 12", bench.Text, StringComparison.Ordinal);
        bench.Resize(80, 24);
        Assert.Contains("5 circuits fit", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void Q_ends_it_and_escape_in_the_list_does_not()
    {
        using var bench = new Bench();
        bench.Press(Key.Esc);
        Assert.False(bench.Model.IsDone);
        Assert.Contains("q quits", bench.Rows[^1], StringComparison.Ordinal);
        bench.Press(new Key('q'));
        Assert.True(bench.Model.IsDone);
    }

    [Fact]
    public void Escape_and_a_letter_that_arrive_together_are_both_taken()
    {
        using var bench = new Bench();
        bench.Press(Key.Enter);
        Assert.Equal(Place.Circuit, bench.Model.Place);
        bench.Press(new Key('q').WithAlt);
        Assert.Equal(Place.List, bench.Model.Place);
        Assert.True(bench.Model.IsDone);
    }

    [Fact]
    public void Escape_leads_from_the_sentence_back_to_the_circuit_it_was_entered_from()
    {
        using var bench = new Bench();
        bench.Press(Key.CursorDown, Key.Enter, new Key('e'));
        Assert.Contains("Esc circuit", bench.Rows[^1], StringComparison.Ordinal);
        bench.Press(Key.Esc);
        Assert.Equal(Place.Circuit, bench.Model.Place);
        Assert.Equal(1, bench.Model.List.At);
        bench.Press(Key.Esc, new Key('e'), Key.Esc);
        Assert.Equal(Place.List, bench.Model.Place);
    }

    [Fact]
    public void A_circuit_that_no_longer_fits_leads_to_the_list_and_is_said()
    {
        using var bench = new Bench();
        bench.Press(Key.Enter, new Key('e'));
        bench.Ranking.Answer = requirement => SampleRanking.Answer(requirement, SampleRanking.Port);
        bench.Type("32768");
        bench.Press(Key.Enter, Key.Esc);
        Assert.Equal(Place.List, bench.Model.Place);
        Assert.Contains("counter CNT-14-HC, stage 12 (÷4096) is not in the list any more", bench.Rows[^1], StringComparison.Ordinal);
    }

    [Fact]
    public void The_circuit_that_is_read_stays_when_a_better_one_is_found()
    {
        using var bench = new Bench(ranking: new FakeRanking { Holds = true });
        bench.Ranking.Report(0, SampleRanking.Answer(SampleRanking.Wanted, SampleRanking.Counter) with { IsComplete = false });
        bench.Press(Key.Enter);
        bench.Ranking.Report(
            0, SampleRanking.Answer(SampleRanking.Wanted, SampleRanking.Follower, SampleRanking.Counter) with { IsComplete = false });
        bench.Press(Key.Home);
        Assert.Contains("counter CNT-14-HC", bench.Text, StringComparison.Ordinal);
        Assert.Contains("2 of 2", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void When_nothing_fits_every_limit_says_how_many_it_removed()
    {
        using var bench = new Bench(ranking: new FakeRanking { Answer = r => SampleRanking.Nothing(r) with { NearestMisses = [] } });
        Assert.Contains(bench.Rows, row => row.Contains("the frequency error", StringComparison.Ordinal)
            && row.Contains("3 400 000", StringComparison.Ordinal) && row.Contains('■', StringComparison.Ordinal));
        Assert.Contains(bench.Rows, row => row.Contains("the cost", StringComparison.Ordinal)
            && row.Contains("1 200", StringComparison.Ordinal));
        Assert.DoesNotContain("Enter open", bench.Rows[^1], StringComparison.Ordinal);
        bench.Press(Key.Enter);
        Assert.Equal(Place.List, bench.Model.Place);
    }

    [Fact]
    public void A_frequency_that_no_crystal_gives_is_said_in_words()
    {
        using var bench = new Bench(ranking: new FakeRanking
        {
            Answer = r => SampleRanking.Answer(r) with { Combinations = 0, Covered = 0 },
        });
        Assert.Contains("No crystal of the catalogue gives 1 kHz", bench.Text, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(60, 20)]
    [InlineData(50, 16)]
    [InlineData(40, 12)]
    public void On_a_small_screen_the_list_keeps_some_rows_with_their_costs(int width, int height)
    {
        using var bench = new Bench(width, height);
        Assert.True(bench.Rows.Count(row => row.EndsWith("0.83", StringComparison.Ordinal)) >= 4, bench.Text);
        Assert.Contains("q quit", bench.Rows[^1], StringComparison.Ordinal);
        Assert.Contains("Wanted:", bench.Rows[0], StringComparison.Ordinal);
    }

    [Fact]
    public void In_ascii_labels_keep_their_spaces()
    {
        using var bench = new Bench(glyphs: Glyphs.Ascii);
        Assert.DoesNotContain("?", string.Concat(bench.Rows[..^1]), StringComparison.Ordinal);
        Assert.Contains("C1 15 pF  C2 18 pF", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_text_that_is_no_value_yet_says_so_and_changes_no_ranking()
    {
        using var bench = new Bench();
        bench.Press(new Key('e'));
        int asked = bench.Ranking.Asked.Count;
        bench.Type("-");
        Assert.StartsWith(" output frequency, not yet: such as", bench.Rows[^1], StringComparison.Ordinal);
        Assert.Equal(asked, bench.Ranking.Asked.Count);
        bench.Press(Key.Backspace);
        bench.Type("4k");
        Assert.StartsWith(" output frequency: such as", bench.Rows[^1], StringComparison.Ordinal);
    }

    [Fact]
    public void A_value_is_changed_with_the_arrows_and_digits_alone_while_a_ranking_runs()
    {
        using var bench = new Bench(ranking: new FakeRanking { Holds = true });
        bench.Press(new Key('e'), Key.CursorRight, Key.CursorRight);
        bench.Type("50");
        bench.Press(Key.Enter, Key.CursorRight);
        bench.Type("10");
        bench.Press(Key.Enter);
        Assert.Equal((50e-6, 10), (bench.Model.Wanted.Accepted.BudgetRatio, bench.Model.Wanted.Accepted.Years));
        int last = bench.Ranking.Asked.Count - 1;
        Assert.All(Enumerable.Range(0, last), number => Assert.True(bench.Ranking.IsCancelled(number)));
        Assert.False(bench.Ranking.IsCancelled(last));
        bench.Ranking.Finish(last);
        Assert.Contains("5 circuits fit", bench.Model.Draw(80, 24).Select(line => line.Text).First(
            text => text.Contains("fit", StringComparison.Ordinal)), StringComparison.Ordinal);
    }

    [Fact]
    public void The_title_of_a_circuit_is_whole_at_120_columns()
    {
        using var bench = new Bench(120, 40);
        Assert.Contains("counter CNT-14-HC, stage 12 (÷4096) ─", bench.Text, StringComparison.Ordinal);
        Assert.Equal(" abc ", Rules.Draw("abc", "", 6, Glyphs.Drawn).Text[1..]);
    }
}
