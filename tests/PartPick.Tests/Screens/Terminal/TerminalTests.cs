using PartPick.Catalog;
using PartPick.Screens;
using PartPick.Selection;

namespace PartPick.Tests.Screens;

public class TerminalTests
{
    [Theory]
    [InlineData("xterm-256color", null, true)]
    [InlineData("linux", null, true)]
    [InlineData("linux", "", true)]
    [InlineData("xterm-256color", "1", false)]
    [InlineData("vt100", null, false)]
    [InlineData("dumb", null, false)]
    [InlineData("xterm-mono", null, false)]
    public void Colours_follow_the_terminal_and_NO_COLOR(string term, string? noColor, bool expected) =>
        Assert.Equal(expected, TerminalTraits.Of(name => name switch { "TERM" => term, "NO_COLOR" => noColor, _ => null }).HasColour);

    [Theory]
    [InlineData("de_AT.UTF-8", null, null, true)]
    [InlineData("C", "en_US.utf8", null, true)]
    [InlineData("de_AT.UTF-8", null, "C", false)]
    [InlineData("C", null, null, false)]
    [InlineData(null, null, null, false)]
    public void Signs_follow_the_first_locale_that_is_set(string? lang, string? type, string? all, bool expected)
    {
        TerminalTraits traits =
            TerminalTraits.Of(name => name switch { "LANG" => lang, "LC_CTYPE" => type, "LC_ALL" => all, _ => null });

        Assert.Equal(expected, traits.IsUtf8);
    }

    [Theory]
    [InlineData("xterm-256color", true, true, true)]
    [InlineData("screen.xterm-256color", true, true, true)]
    [InlineData("tmux", true, true, true)]
    [InlineData("linux", false, true, true)]
    [InlineData("vt220", false, true, false)]
    [InlineData("vt100", false, false, false)]
    [InlineData("vt102", false, false, false)]
    [InlineData("ansi", false, false, false)]
    [InlineData("something-new", false, false, false)]
    public void Only_what_the_terminal_has_is_asked_of_it(string term, bool alternateScreen, bool hidesCursor, bool faint)
    {
        TerminalTraits traits = TerminalTraits.Of(name => name == "TERM" ? term : null);

        Assert.True(traits.CanPlace);
        Assert.Equal((alternateScreen, hidesCursor, faint), (traits.HasAlternateScreen, traits.HidesCursor, traits.HasFaint));
    }

    [Theory]
    [InlineData("dumb")]
    [InlineData("")]
    [InlineData(null)]
    [InlineData("vt52")]
    public void A_terminal_that_cannot_place_the_cursor_is_known(string? term) =>
        Assert.False(TerminalTraits.Of(name => name == "TERM" ? term : null).CanPlace);

    [Fact]
    public void A_VT100_is_never_sent_Unicode() =>
        Assert.False(TerminalTraits.Of(name => name switch { "TERM" => "vt100", "LANG" => "C.UTF-8", _ => null }).IsUtf8);

    [Theory]
    [InlineData("xterm-256color", true, false)]
    [InlineData("tmux-256color", true, false)]
    [InlineData("linux", false, false)]
    [InlineData("ansi", false, false)]
    [InlineData("xterm-256color", false, true)]
    public void Dots_are_drawn_with_what_the_font_of_the_terminal_has(string term, bool braille, bool ascii)
    {
        TerminalTraits traits = TerminalTraits.Of(name => name switch { "TERM" => term, "LANG" => ascii ? "C" : "C.UTF-8", _ => null });

        Assert.Equal((braille, ascii), (traits.Glyphs.HasBraille, traits.Glyphs.IsAscii));
    }

    [Fact]
    public void The_requirement_is_kept_and_recalled()
    {
        string directory = Directory.CreateTempSubdirectory("partpick-screens").FullName;
        try
        {
            string path = Path.Combine(directory, "catalog.db");
            Assert.Null(new RequirementKeeper(path).Recall().Value);
            var keeper = new RequirementKeeper(path);
            Requirement wanted = SampleRanking.Wanted with { Name = "logger", OutputHz = 4242, CostLimit = null, AllowDisturbance = true };
            Assert.Null(keeper.Keep(wanted));
            Requirement recalled = new RequirementKeeper(path).Recall().Value!;
            Assert.Equal(wanted with { Circuits = recalled.Circuits }, recalled);
            Assert.Equal(wanted.Circuits, recalled.Circuits);
            Assert.True(CatalogStore.Load(path).IsOk);
        }
        finally
        {
            Directory.Delete(directory, true);
        }
    }

    [Fact]
    public void Without_a_terminal_it_ends_with_status_2()
    {
        // The runner of the tests takes standard output away, as a pipe does.
        Assert.True(Console.IsOutputRedirected || Console.IsInputRedirected);
        Assert.Equal(2, ScreenHost.Run("/nowhere/catalog.db", null));
    }

    [Fact]
    public void Ascii_spells_what_it_cannot_show() =>
        Assert.Equal("+/-4.7 kohm at 25 degC, 3 uW ?", Glyphs.Ascii.Show("±4.7 kΩ at 25 °C, 3 µW 水"));

    [Fact]
    public void A_number_and_its_unit_stay_on_one_line()
    {
        string[] lines = [.. Paragraph.Of("The margin is least at 4.5 V, 50 °C and so on.", 26, Glyphs.Drawn).Select(line => line.Text)];
        Assert.Equal(["The margin is least at", "4.5 V, 50 °C and so on."], lines);
    }
}
