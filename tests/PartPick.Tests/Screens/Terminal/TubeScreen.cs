using System.Globalization;
using PartPick.Screens;
using Terminal.Gui.Drawing;

namespace PartPick.Tests.Screens;

/// <summary>
/// A terminal that knows text and, of ECMA-48, CUP, CUF, EL to the end of the row and SGR, and refuses all else. Behind the last column
/// its cursor is nowhere: terminals differ in that.
/// </summary>
internal sealed class TubeScreen
{
    private readonly (char Sign, string Style)[,] _cells;
    private int _row = -1;
    private int _column;
    private string _style = "";

    public TubeScreen(int rows, int columns)
    {
        _cells = new (char, string)[rows, columns];
        for (int row = 0; row < rows; row++)
        {
            for (int column = 0; column < columns; column++)
            {
                _cells[row, column] = (' ', "");
            }
        }
    }

    public void Take(string sent)
    {
        for (int i = 0; i < sent.Length; i++)
        {
            if (sent[i] != '\x1b')
            {
                Assert.True(_row >= 0 && _column < _cells.GetLength(1), "The cursor is nowhere.");
                Assert.InRange(sent[i], ' ', '~');
                _cells[_row, _column++] = (sent[i], _style);
                continue;
            }

            Assert.Equal('[', sent[i + 1]);
            int end = sent.AsSpan(i).IndexOfAnyInRange('a', 'z') is int low and >= 0 ? i + low : int.MaxValue;
            end = Math.Min(end, sent.AsSpan(i).IndexOfAnyInRange('A', 'Z') is int high and >= 0 ? i + high : int.MaxValue);
            Do(sent[end], sent[(i + 2)..end]);
            i = end;
        }
    }

    public void AssertShows(Cell[,] cells, Pen pen)
    {
        for (int row = 0; row < cells.GetLength(0); row++)
        {
            for (int column = 0; column < cells.GetLength(1); column++)
            {
                Cell cell = cells[row, column];
                (char sign, string style) = _cells[row, column];
                string wanted = pen.Spell(cell.Attribute!.Value);
                Assert.Equal(cell.Grapheme, sign.ToString());
                Assert.Equal(sign == ' ' ? OnSpaces(wanted) : wanted, sign == ' ' ? OnSpaces(style) : style);
            }
        }
    }

    // A space shows underline and reverse, and the colour with them.
    private static string OnSpaces(string style) => style.Contains('4') || style.Contains('7') ? style : "";

    private void Do(char what, string parameters)
    {
        int[] numbers = [.. parameters.Split(';').Select(one => one.Length == 0 ? 0 : int.Parse(one, CultureInfo.InvariantCulture))];
        switch (what)
        {
            case 'H':
                (_row, _column) = (Math.Max(1, numbers[0]) - 1, numbers.Length > 1 ? Math.Max(1, numbers[1]) - 1 : 0);
                break;
            case 'C':
                Assert.True(_row >= 0 && _column < _cells.GetLength(1), "The cursor is nowhere.");
                _column += Math.Max(1, numbers[0]);
                break;
            case 'K':
                Assert.Equal("", parameters);
                Assert.Equal("", OnSpaces(_style));
                for (int column = _column; column < _cells.GetLength(1); column++)
                {
                    _cells[_row, column] = (' ', "");
                }

                break;
            case 'm':
                string kept = numbers[0] == 0 ? "" : _style;
                string added = string.Join(';', numbers.Where(number => number != 0));
                _style = kept.Length > 0 && added.Length > 0 ? kept + ";" + added : kept + added;
                break;
            default:
                Assert.Fail($"A VT100 does not know {parameters}{what}.");
                break;
        }
    }
}
