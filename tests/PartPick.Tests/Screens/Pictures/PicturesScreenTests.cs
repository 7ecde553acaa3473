using System.Xml.Linq;
using PartPick.Screens;
using PartPick.Selection;
using Terminal.Gui.Input;

namespace PartPick.Tests.Screens.Pictures;

/// <summary>The pictures by the keys that a person presses.</summary>
public sealed class PicturesScreenTests
{
    private static readonly Key P = new('p');

    [Fact]
    public void P_opens_the_pictures_of_the_chosen_circuit_and_Right_goes_through_them_all_and_round()
    {
        using var bench = new Bench();
        Assert.Contains("p pictures", bench.Rows[^1], StringComparison.Ordinal);
        bench.Press(P);
        bench.Settle();
        string[] titles =
        [
            "Frequency error over temperature: counter CNT-14-HC", "Start-up margin over supply: counter CNT-14-HC",
            "Error budget: counter CNT-14-HC", "Growth of the amplitude after switch-on: counter CNT-14-HC",
            "Error against cost: counter CNT-14-HC", "Schematic: counter CNT-14-HC",
        ];
        for (int i = 0; i <= titles.Length; i++)
        {
            Assert.Contains(titles[i % titles.Length], bench.Text, StringComparison.Ordinal);
            Assert.Contains(FormattableString.Invariant($"picture {i % titles.Length + 1} of 6"), bench.Text, StringComparison.Ordinal);
            Assert.Contains("Wanted: 1 kHz square", bench.Text, StringComparison.Ordinal);
            Assert.All(bench.Rows, row => Assert.True(row.Length <= 80));
            bench.Press(Key.CursorRight);
        }

        bench.Press(Key.CursorLeft, Key.Tab, Key.Tab.WithShift);
        Assert.Contains(titles[0], bench.Text, StringComparison.Ordinal);
        bench.Press(Key.Esc);
        Assert.Equal(Place.List, bench.Model.Place);
        Assert.Contains("5 circuits fit", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void Esc_leads_back_to_the_circuit_that_they_were_opened_from()
    {
        using var bench = new Bench();
        bench.Press(Key.CursorDown, Key.CursorDown, Key.Enter, P);
        Assert.Contains("gate INV-HC-U-1", bench.Text, StringComparison.Ordinal);
        Assert.Contains("x to an SVG file", bench.Rows[^1], StringComparison.Ordinal);
        bench.Press(Key.Esc);
        Assert.Equal(Place.Circuit, bench.Model.Place);
        Assert.Contains("pictures", bench.Rows[^1], StringComparison.Ordinal);
    }

    [Fact]
    public void The_page_of_keys_lies_over_the_pictures_and_names_theirs()
    {
        using var bench = new Bench(80, 60);
        bench.Press(P, new Key('?'));
        Assert.Contains("pictures of the circuit", bench.Text, StringComparison.Ordinal);
        bench.Press(Key.Esc);
        Assert.Contains("Frequency error over temperature", bench.Text, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(120, 24, 2)]
    [InlineData(80, 44, 2)]
    [InlineData(120, 44, 4)]
    [InlineData(80, 24, 1)]
    public void A_larger_screen_shows_two_or_four_at_once(int width, int height, int count)
    {
        using var bench = new Bench(width, height);
        bench.Press(P);
        bench.Settle();
        string[] titles =
            ["Frequency error over temperature", "Start-up margin over supply", "Error budget", "Growth of the amplitude after switch-on"];
        Assert.Equal(count, titles.Count(title => bench.Text.Contains(title, StringComparison.Ordinal)));
        Assert.All(bench.Rows, row => Assert.True(row.Length <= width));

        // The last ones are shown with those before them, so that no place is left empty.
        bench.Press(Key.CursorLeft);
        Assert.Contains("Schematic", bench.Text, StringComparison.Ordinal);
        Assert.Contains("picture 6 of 6", bench.Text, StringComparison.Ordinal);
        Assert.Equal(count > 1, bench.Text.Contains("Error against cost", StringComparison.Ordinal));
    }

    [Fact]
    public void What_takes_long_is_marked_until_it_is_there_and_keys_go_on_working()
    {
        using var bench = new Bench(80, 24);
        bench.Press(P, Key.CursorRight, Key.CursorRight, Key.CursorRight);
        Assert.Contains("computing …", bench.Text, StringComparison.Ordinal);
        bench.Press(new Key('x'));
        Assert.Contains("still being computed", bench.Rows[^1], StringComparison.Ordinal);
        bench.Press(Key.CursorRight);
        Assert.Contains("Error against cost", bench.Text, StringComparison.Ordinal);
        bench.Press(Key.CursorLeft);
        bench.Settle();
        Assert.DoesNotContain("computing …", bench.Text, StringComparison.Ordinal);
        Assert.Contains("start-up time", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void What_comes_after_leaving_is_dropped()
    {
        using var bench = new Bench();
        bench.Press(P, Key.Esc);
        bench.Settle();
        Assert.Contains("5 circuits fit", bench.Text, StringComparison.Ordinal);
        Assert.Null(bench.Model.Pictures.ChartOf(PictureKind.Growth));
    }

    [Fact]
    public void In_ascii_all_pictures_are_ascii()
    {
        using var bench = new Bench(120, 44, glyphs: Glyphs.Ascii);
        bench.Press(P);
        bench.Settle();
        Assert.True(bench.Text.All(char.IsAscii), bench.Text);
        bench.Press(Key.CursorLeft);
        Assert.True(bench.Text.All(char.IsAscii), bench.Text);
        Assert.Contains("X the chosen one", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void X_writes_the_picture_to_a_file_that_is_not_there_yet()
    {
        string path = Path.Combine(Path.GetDirectoryName(Run.File(""))!, "my picture.svg");
        using var bench = new Bench();
        bench.Press(P, Key.CursorRight, Key.CursorRight, new Key('x'));
        Assert.Contains("file budget.svg", bench.Text, StringComparison.Ordinal);
        bench.Type(path);
        bench.Press(Key.Enter);
        bench.Settle();
        Assert.Contains("Written to", bench.Rows[^1], StringComparison.Ordinal);
        Assert.Contains("Error budget", XDocument.Load(path).Root!.Value, StringComparison.Ordinal);
        string before = File.ReadAllText(path);

        bench.Press(Key.CursorRight);
        bench.SettleUntil(() => bench.Model.Pictures.ChartOf(PictureKind.Growth) is not null);
        bench.Press(new Key('x'));
        bench.Type(path);
        bench.Press(Key.Enter);
        bench.Settle();
        Assert.Contains("is there already", bench.Text, StringComparison.Ordinal);
        Assert.Equal(before, File.ReadAllText(path));
        bench.Press(Key.Esc, Key.Esc);
        Assert.Contains("5 circuits fit", bench.Text, StringComparison.Ordinal);
        Assert.Single(Directory.GetFiles(Path.GetDirectoryName(path)!, "*.svg*"));
    }

    [Fact]
    public void A_better_answer_moves_what_the_candidate_stands_among_but_not_the_candidate()
    {
        var ranking = new FakeRanking { Holds = true };
        using var bench = new Bench(ranking: ranking);
        ranking.Report(0, SampleRanking.Answer(ranking.Asked[0], SampleRanking.Counter) with { IsComplete = false });
        bench.Press(P, Key.CursorLeft, Key.CursorLeft);
        Assert.Contains("best so far", bench.Text, StringComparison.Ordinal);
        Assert.DoesNotContain("o another", bench.Text, StringComparison.Ordinal);
        ranking.Finish(0);
        Assert.DoesNotContain("best so far", bench.Model.Draw(80, 24).Aggregate("", (text, line) => text + line.Text), StringComparison.Ordinal);
        Assert.Contains("o another", bench.Model.Draw(80, 24).Aggregate("", (text, line) => text + line.Text), StringComparison.Ordinal);
        Assert.Equal(SampleRanking.Counter.Id, bench.Model.Pictures.Candidate!.Id);
    }

    [Fact]
    public void A_resize_lays_them_out_anew()
    {
        using var bench = new Bench();
        bench.Press(P);
        bench.Settle();
        bench.Resize(120, 44);
        Assert.Contains("Error budget", bench.Text, StringComparison.Ordinal);
        bench.Resize(80, 24);
        Assert.DoesNotContain("Error budget", bench.Text, StringComparison.Ordinal);
        bench.Resize(40, 12);
        Assert.Contains("Frequency error", bench.Text, StringComparison.Ordinal);
    }
}
