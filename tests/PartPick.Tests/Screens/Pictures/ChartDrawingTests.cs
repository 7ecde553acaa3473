using System.Collections.Immutable;
using PartPick.Screens;

namespace PartPick.Tests.Screens.Pictures;

public class ChartDrawingTests
{
    public static TheoryData<int, int, string> Sizes => new()
    {
        { 80, 20, "braille" }, { 80, 20, "blocks" }, { 80, 20, "ascii" }, { 118, 36, "braille" }, { 118, 36, "ascii" }, { 58, 16, "ascii" },
        { 40, 12, "braille" }, { 20, 5, "ascii" },
    };

    [Theory]
    [MemberData(nameof(Sizes))]
    public void A_picture_has_exactly_its_size_and_only_signs_that_the_terminal_has(int width, int height, string signs)
    {
        ImmutableArray<Line> lines = ChartDrawing.Draw(SampleChart.Of(), width, height, Signs(signs));

        Assert.Equal(height, lines.Length);
        Assert.All(lines, line => Assert.True(line.Width <= Math.Max(width, 14), line.Text));
        string text = Text(lines);
        Assert.Equal(signs == "braille", text.Any(sign => sign is >= '\u2800' and <= '\u28ff'));
        Assert.Equal(signs == "blocks", text.Contains('▀', StringComparison.Ordinal) || text.Contains('▄', StringComparison.Ordinal));
        Assert.True(signs != "ascii" || text.All(char.IsAscii), text);
    }

    [Theory]
    [InlineData("braille")]
    [InlineData("blocks")]
    [InlineData("ascii")]
    public void Axes_carry_round_numbers_and_their_units_and_all_signs_are_explained(string signs)
    {
        string text = Text(ChartDrawing.Draw(SampleChart.Of(), 80, 22, Signs(signs)));

        Assert.All(
            new[] { " margin\n", "supply (V)", "4.0", "5.0", "6.0", "f falling", "l level", "spread", "A least 6 at 6 V", "wanted 8", "at 5.5" },
            words => Assert.Contains(words, text, StringComparison.Ordinal));
        Assert.Contains("o another", text, StringComparison.Ordinal);
        Assert.Contains(signs == "ascii" ? "# on the front" : "■ on the front", text, StringComparison.Ordinal);
        Assert.Contains(signs == "ascii" ? "A note with +/-5 % in it." : "A note with ±5 % in it.", text, StringComparison.Ordinal);
    }

    [Fact]
    public void Each_point_stands_at_the_row_and_column_of_its_value()
    {
        string[] rows = Text(ChartDrawing.Draw(SampleChart.Of(), 80, 40, Glyphs.Ascii)).Split('\n');
        int six = Array.FindIndex(rows, row => row.TrimStart().StartsWith("6 +", StringComparison.Ordinal));
        int two = Array.FindIndex(rows, row => row.TrimStart().StartsWith("2 +", StringComparison.Ordinal));
        int numbers = Array.FindIndex(rows, row => row.Contains("4.0", StringComparison.Ordinal));

        Assert.True(six > 0 && two > six && numbers > two);
        Assert.Contains("lllll", rows[six], StringComparison.Ordinal);
        Assert.EndsWith("A", rows[six], StringComparison.Ordinal);
        int fiveVolts = rows[numbers].IndexOf("5.0", StringComparison.Ordinal) + 1;
        Assert.Equal('#', rows[two][fiveVolts]);
        Assert.Equal('+', rows[numbers - 1][fiveVolts]);
    }

    [Fact]
    public void The_whole_picture_in_ascii()
    {
        const string expected = """
             margin
             10 +                         | at 5.5
                |ffff
                |    ffffff               |
                |-- -- -- -fffffff -- --  wanted 8
                |        o        fffffff |
                |                        ffffff
                |lllllllllllllllllllllllllllllllffA
              5 +                            ::::::
                |                 :::::::::::. . .
                |      ::::::::::: . . . . . . . .
                |::::::            . . . .|. . . .
                |. . . . . . . . # . . . . . . . .
                |. . . . . . . . . . . . .|. . . .
                |::::::::::::::::::::::::::::::::::
              0 +                         |
                ++---------------+----------------+
                 4               5                6
                                         supply (V)
             f falling   l level   . . spread
             # on the front   o another
             A least 6 at 6 V
             A note with +/-5 % in it.
            """;
        Assert.Equal(expected.ReplaceLineEndings("\n"), Text(ChartDrawing.Draw(SampleChart.Of(), 40, 23, Glyphs.Ascii)));
    }

    [Fact]
    public void The_whole_picture_in_braille()
    {
        const string expected = """
             margin
             10 ┤                         │ at 5.5
                │⠤⣀f
                │   ⠉⠉⠒⠒⠤⢄⣀⡀              │
                │── ── ──o─⠈⠉⠑f⠤⠤⣀⣀── ──  wanted 8
                │                  ⠉⠉⠒⠢⠤⢄⣀f
                │                         ⠈⠉⠒⠒⠤⠤⣀⣀
                │⠉⠉⠉⠉⠉⠉⠉⠉l⠉⠉⠉⠉⠉⠉⠉⠉⠉⠉l⠉⠉⠉⠉⠉⠉⠉⠉⠉⠉l⠉⠉A
              5 ┤                             ⣀⣀⣀⠤⠤
                │                 ⣀⣀⣀⠤⠤⠤⠒⠒⠒⠉⠉⠉ · ·
                │     ⣀⣀⣀⠤⠤⠤⠒⠒⠒⠉⠉⠉ · · · · · · · ·
                │⠒⠒⠉⠉⠉             · · · ·│· · · ·
                │· · · · · · · · ·■· · · · · · · ·
                │· · · · · · · · · · · · ·│· · · ·
                │⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒⠒
              0 ┤                         │
                └┬────────────────┬───────────────┬
                 4                5               6
                                         supply (V)
             f falling   l level   · · spread
             ■ on the front   o another
             A least 6 at 6 V
             A note with ±5 % in it.
            """;
        Assert.Equal(expected.ReplaceLineEndings("\n"), Text(ChartDrawing.Draw(SampleChart.Of(), 40, 23, Glyphs.Drawn)));
    }

    [Fact]
    public void Dots_lie_in_the_cells_of_braille_signs_in_Unicodes_order()
    {
        // Unicode, Braille Patterns: dots 1 to 8 are bits 0 to 7; 1-2-3-7 run down at the left, 4-5-6-8 at the right.
        var dots = new PlotDots(1, 1, Glyphs.Drawn);
        string Shown()
        {
            var line = new LineBuilder(Glyphs.Drawn);
            dots.AddTo(line, 0);
            return line.Build().Text;
        }

        dots.Dot(0, 0, '*');
        Assert.Equal("⠁", Shown());
        dots.Dot(1, 3, '*');
        Assert.Equal("⢁", Shown());
        dots.Dot(0, 3, '*');
        dots.Dot(1, 0, '*');
        Assert.Equal("⣉", Shown());
    }

    private static Glyphs Signs(string name) => name switch
    {
        "braille" => Glyphs.Drawn,
        "blocks" => Glyphs.DrawnInBlocks,
        _ => Glyphs.Ascii,
    };

    private static string Text(ImmutableArray<Line> lines) => string.Join('\n', lines.Select(line => line.Text.TrimEnd()));
}
