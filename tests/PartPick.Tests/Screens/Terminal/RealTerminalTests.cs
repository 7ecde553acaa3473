using System.Text.RegularExpressions;

namespace PartPick.Tests.Screens;

/// <summary>The built program in real terminals, driven by keys and signals.</summary>
public partial class RealTerminalTests
{
    // How the sentence of a fresh catalogue begins.
    private const string Named = "river logger time base: ";

    private static readonly (int Width, int Height)[] Sizes = [(80, 24), (100, 30), (120, 40), (160, 48)];

    [Theory]
    [InlineData("xterm-256color", "C.UTF-8", 0)]
    [InlineData("linux", "C.UTF-8", 1)]
    [InlineData("screen", "C.UTF-8", 2)]
    [InlineData("vt100", "C.UTF-8", 3)]
    [InlineData("xterm-256color", "C", 3)]
    [InlineData("linux", "C", 2)]
    [InlineData("tmux-256color", "C", 1)]
    [InlineData("vt100", "C", 0)]
    public void The_screens_work_at_every_size_and_give_the_terminal_back(string term, string locale, int first)
    {
        bool isAscii = locale == "C" || term == "vt100";
        using var terminal = new TmuxTerminal(term, locale, Sizes[first].Width, Sizes[first].Height);
        string before = terminal.Ask("stty -g");
        terminal.Start();
        terminal.WaitFor("? for all keys.");
        terminal.WaitFor("best first");
        terminal.Type("Down");
        for (int i = 0; i < Sizes.Length; i++)
        {
            (int width, int height) = Sizes[(first + i) % Sizes.Length];
            terminal.Resize(width, height);
            terminal.WaitUntil(() => Fills(terminal.Rows, width, height, isAscii), $"a screen of {width} x {height}");
        }

        // A value of the sentence, then a circuit, then out.
        terminal.Type("e");
        terminal.WaitFor("output frequency");
        terminal.Type("2");
        terminal.WaitFor("as it was");
        terminal.Type("kHz", "Enter");
        terminal.WaitFor(Named + "2 kHz");
        terminal.Type("Escape");
        terminal.WaitFor("q quit");
        WaitForAnswer(terminal);
        terminal.Type("Enter");
        terminal.WaitFor("Esc list");

        // Together, as a slow line hands them on: back to the list, the catalogue, its next kind.
        terminal.Type("Escape", "c", "k");
        terminal.WaitFor("Listed: capacitors");
        terminal.WaitFor(" C-");
        terminal.Type("q");
        terminal.WaitUntilGone("Listed:");
        AssertGivenBack(terminal, before);
        string written = terminal.Written;
        AssertUnderstood(written, term);
        Assert.Equal(isAscii, written.All(sign => sign < 0x80));

        if (first == 0)
        {
            terminal.Start();
            terminal.WaitFor(Named + "2 kHz");
        }
    }

    [Theory]
    [InlineData("INT")]
    [InlineData("TERM")]
    [InlineData("C-c")]
    public void An_interrupt_gives_the_terminal_back_and_keeps_the_requirement(string how)
    {
        using var terminal = new TmuxTerminal("screen-256color", "C.UTF-8", 80, 24);
        string before = terminal.Ask("stty -g");
        terminal.Start();
        Edit(terminal);
        if (how == "C-c")
        {
            terminal.Type(how);
        }
        else
        {
            terminal.Signal(how);
        }

        terminal.WaitUntilGone(Named);
        AssertGivenBack(terminal, before);
        terminal.Start();
        terminal.WaitFor(Named + "5 kHz");
    }

    [Fact]
    public void A_hang_up_ends_the_program_and_keeps_the_requirement()
    {
        using var terminal = new TmuxTerminal("screen-256color", "C.UTF-8", 80, 24);
        terminal.Start();
        Edit(terminal);
        terminal.Signal("HUP");
        terminal.WaitUntilGone(Named);
        terminal.Start();
        terminal.WaitFor(Named + "5 kHz");
        terminal.HangUp();
        long start = TimeProvider.System.GetTimestamp();
        while (terminal.Runs)
        {
            Assert.True(TimeProvider.System.GetElapsedTime(start) < TimeSpan.FromSeconds(30), "It runs on without a terminal.");
            Thread.Sleep(50);
        }
    }

    [Theory]
    [InlineData("C-z")]
    [InlineData("TSTP")]
    public void A_stopped_program_leaves_the_terminal_and_paints_it_again(string how)
    {
        using var terminal = new TmuxTerminal("xterm", "C.UTF-8", 80, 24);
        string before = terminal.Ask("stty -g");
        terminal.Start();
        Edit(terminal);
        if (how == "C-z")
        {
            terminal.Type(how);
        }
        else
        {
            terminal.Signal(how);
        }

        terminal.WaitFor("Stopped");
        AssertGivenBack(terminal, before);
        terminal.Type("fg", "Enter");
        terminal.WaitFor(Named + "5 kHz");
        terminal.WaitFor("q quit");
        terminal.Type("?");
        terminal.WaitFor("In the list");
    }

    [Fact]
    public void The_option_draws_in_ASCII_whatever_the_locale()
    {
        using var terminal = new TmuxTerminal("xterm", "C.UTF-8", 120, 40);
        terminal.Start("--ascii");
        WaitForAnswer(terminal);
        terminal.Type("Enter");
        terminal.WaitFor("Esc list");
        terminal.Type("q");
        terminal.WaitUntilGone(Named);
        Assert.DoesNotContain(terminal.Written, sign => sign >= 0x80);
    }

    [Theory]
    [InlineData("dumb")]
    [InlineData("vt52")]
    public void A_terminal_that_cannot_place_the_cursor_gets_one_line(string term)
    {
        using var terminal = new TmuxTerminal(term, "C", 80, 24);
        terminal.Start();
        terminal.WaitFor("partpick: the screens need a terminal that can place the cursor");
        Assert.Equal("2\n", terminal.Ask("echo $?"));
    }

    private static void Edit(TmuxTerminal terminal)
    {
        terminal.WaitFor("? for all keys.");
        terminal.Type("e");
        terminal.WaitFor("output frequency");
        terminal.Type("5kHz", "Enter");
        terminal.WaitFor(Named + "5 kHz");
        terminal.Type("Escape");
        terminal.WaitFor("q quit");
    }

    // The last one: what is computed on the way may be taken back.
    private static void WaitForAnswer(TmuxTerminal terminal) => terminal.WaitUntil(
        () => terminal.Rows is var rows
            && rows.Any(row => row.Contains(" circuits fit", StringComparison.Ordinal))
            && !rows.Any(row => row.Contains("computing", StringComparison.Ordinal)),
        "the last answer");

    private static bool Fills(string[] rows, int width, int height, bool isAscii) =>
        rows.Length == height
        && rows[0].Contains(Named + "1 kHz", StringComparison.Ordinal)
        && rows[^1].Contains("q quit", StringComparison.Ordinal)
        && rows.Any(row => row.Contains("best first", StringComparison.Ordinal))
        && rows.Any(row => row.StartsWith(isAscii ? "> " : "► ", StringComparison.Ordinal))
        && rows.Max(row => row.Length) is int widest && widest <= width && widest > width - 20;

    private static void AssertGivenBack(TmuxTerminal terminal, string before)
    {
        terminal.WaitFor("ready>");
        Assert.Equal(before, terminal.Ask("stty -g"));
        Assert.Equal("0", terminal.Flag("alternate_on"));
        Assert.Equal("1", terminal.Flag("cursor_flag"));
        Assert.Equal("0", terminal.Flag("keypad_cursor_flag"));
        Assert.Equal("0", terminal.Flag("keypad_flag"));
        Assert.Equal("0", terminal.Flag("mouse_any_flag"));
    }

    // What a terminal of that name understands, and no question that it would answer into the keys.
    private static void AssertUnderstood(string written, string term)
    {
        string[] modes = term switch
        {
            "vt100" => ["?1h", "?1l"],
            "linux" => ["?1h", "?1l", "?25l", "?25h"],
            _ => ["?1h", "?1l", "?25l", "?25h", "?1049l", "?1049h"],
        };
        string[] styles = term == "vt100" ? ["", "0", "1", "4", "7"] : ["", "0", "1", "2", "4", "7", "35"];
        foreach (Match match in Sequence().Matches(written))
        {
            string what = match.Groups["csi"].Value;
            bool known = match.Value is "\x1b=" or "\x1b>"
                || (what.Length > 0 && (modes.Contains(what)
                    || (what[0] != '?' && what[^1] is 'H' or 'C' or 'K' or 'J')
                    || (what[^1] == 'm' && what[..^1].Split(';').All(styles.Contains))));
            Assert.True(known, $"{term} is sent {match.Value.Replace('\x1b', '^')}");
        }
    }

    [GeneratedRegex(@"\x1b(\[(?<csi>[0-?]*[ -/]*[@-~])|.)", RegexOptions.Singleline)]
    private static partial Regex Sequence();
}
