using PartPick.Screens;
using Terminal.Gui.Drawing;
using Attribute = Terminal.Gui.Drawing.Attribute;

namespace PartPick.Tests.Screens;

/// <summary>What is sent for a change of cells, shown by a terminal that knows what a VT100 knows.</summary>
public class CellWriterTests
{
    private static readonly TerminalTraits Tube = TerminalTraits.Of(name => name == "TERM" ? "vt100" : null);
    private static readonly TerminalTraits Window = TerminalTraits.Of(name => name == "TERM" ? "xterm" : null);

    private static readonly Attribute Plain = new(Color.None, Color.None);

    private static readonly Attribute[] Looks =
    [
        Plain,
        new(Color.None, Color.None, TextStyle.Bold),
        new(Color.None, Color.None, TextStyle.Faint),
        new(Color.None, Color.None, TextStyle.Reverse),
        new(new Color(ColorName16.Magenta), Color.None, TextStyle.Reverse | TextStyle.Underline),
    ];

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Whatever_changes_the_terminal_shows_the_cells(bool isTube)
    {
        TerminalTraits traits = isTube ? Tube : Window;
        var random = new Random(5);
        const int rows = 6, columns = 30;
        var writer = new CellWriter(new Pen(traits));
        writer.Cleared(rows, columns);
        var screen = new TubeScreen(rows, columns);
        Cell[,] cells = Filled(rows, columns);
        for (int round = 0; round < 400; round++)
        {
            // A few stretches of a few cells each, often blank, often to the end of the row.
            for (int i = random.Next(5); i >= 0; i--)
            {
                int row = random.Next(rows), from = random.Next(columns);
                int end = random.Next(3) == 0 ? columns : Math.Min(columns, from + random.Next(9));
                Attribute look = Looks[random.Next(Looks.Length)];
                string text = random.Next(2) == 0 ? " " : ((char)('a' + random.Next(26))).ToString();
                for (int column = from; column < end; column++)
                {
                    cells[row, column] = new Cell(look, true, text);
                }
            }

            screen.Take(writer.Changes(cells));
            screen.AssertShows(cells, new Pen(traits));
            Assert.Equal("", writer.Changes(cells));
        }
    }

    [Fact]
    public void A_changed_figure_is_a_few_bytes()
    {
        var writer = new CellWriter(new Pen(Window));
        writer.Cleared(24, 80);
        Cell[,] cells = Filled(24, 80);
        Put(cells, 10, "margin 9.72");
        writer.Changes(cells);
        Put(cells, 10, "margin 9.81");
        Assert.Equal("\x1b[11;10H81", writer.Changes(cells));
    }

    [Fact]
    public void A_row_that_goes_is_erased()
    {
        var writer = new CellWriter(new Pen(Window));
        writer.Cleared(24, 80);
        Cell[,] cells = Filled(24, 80);
        Put(cells, 3, "a row of words");
        writer.Changes(cells);
        Put(cells, 3, "              ");
        Assert.Equal("\x1b[4H\x1b[K", writer.Changes(cells));
    }

    [Fact]
    public void A_terminal_without_colours_or_faint_text_is_sent_neither()
    {
        var pen = new Pen(Tube);
        Assert.Equal("", pen.Spell(Looks[2]));
        Assert.Equal("4;7", pen.Spell(Looks[4]));
        Assert.Equal("4;7;35", new Pen(Window).Spell(Looks[4]));
    }

    private static void Put(Cell[,] cells, int row, string text)
    {
        for (int i = 0; i < text.Length; i++)
        {
            cells[row, i] = new Cell(Plain, true, text[i].ToString());
        }
    }

    private static Cell[,] Filled(int rows, int columns)
    {
        var cells = new Cell[rows, columns];
        for (int row = 0; row < rows; row++)
        {
            Put(cells, row, new string(' ', columns));
        }

        return cells;
    }
}
