using System.Globalization;
using System.Text;
using Terminal.Gui.Drawing;
using Terminal.Gui.Text;

namespace PartPick.Screens;

/// <summary>
/// Finds what has to be sent so that the terminal shows the cells: those that differ from what it shows already, and nothing else. The
/// toolkit itself sends every cell that was touched, each change of style with both colours, and asks the terminal questions.
/// </summary>
/// <param name="pen">Spells how a cell looks.</param>
internal sealed class CellWriter(Pen pen)
{
    // Going over cells that are right already costs a byte each, a move to the right four or five.
    private const int Stride = 4;

    private readonly StringBuilder _out = new();
    private Shown[,] _shown = new Shown[0, 0];
    private string _style = "";
    private int _row = -1;
    private int _column = -1;

    /// <summary>Takes it that the terminal has just been cleared, in plain style.</summary>
    /// <param name="rows">Rows of the terminal.</param>
    /// <param name="columns">Columns of the terminal.</param>
    public void Cleared(int rows, int columns)
    {
        _shown = new Shown[rows, columns];
        for (int row = 0; row < rows; row++)
        {
            for (int column = 0; column < columns; column++)
            {
                _shown[row, column] = Shown.Blank;
            }
        }

        _style = "";
        _row = -1;
    }

    /// <summary>What has to be sent; empty where the terminal shows the cells already.</summary>
    /// <param name="cells">The cells, by row and column.</param>
    public string Changes(Cell[,] cells)
    {
        _out.Clear();
        int rows = Math.Min(cells.GetLength(0), _shown.GetLength(0));
        int columns = Math.Min(cells.GetLength(1), _shown.GetLength(1));
        var wanted = new Shown[columns];
        for (int row = 0; row < rows; row++)
        {
            for (int column = 0; column < columns; column++)
            {
                wanted[column] = Look(cells[row, column]);
            }

            Write(row, wanted);
        }

        return _out.ToString();
    }

    private Shown Look(Cell cell)
    {
        string text = cell.Grapheme is { Length: > 0 } grapheme && grapheme != "\0" ? grapheme : " ";
        string style = cell.Attribute is { } look ? pen.Spell(look) : "";
        return text != " " || style.Length == 0 || Pen.ShowsOnSpaces(style) ? new Shown(text, style) : Shown.Blank;
    }

    private void Write(int row, Shown[] wanted)
    {
        int end = wanted.Length;
        while (end > 0 && wanted[end - 1] == Shown.Blank)
        {
            end--;
        }

        for (int column = 0; column < end; column++)
        {
            if (wanted[column] != _shown[row, column])
            {
                column += Put(row, column, wanted) - 1;
            }
        }

        Erase(row, end, wanted.Length);
    }

    // A sign that takes two cells stands in the first of them.
    private int Put(int row, int column, Shown[] wanted)
    {
        Shown cell = wanted[column];
        Go(row, column, wanted);
        Style(cell);
        _out.Append(cell.Text);
        int width = Math.Clamp(cell.Text.Length == 1 && char.IsAscii(cell.Text[0]) ? 1 : cell.Text.GetColumns(), 1, wanted.Length - column);
        for (int i = 0; i < width; i++)
        {
            _shown[row, column + i] = wanted[column + i];
        }

        // Behind the last column terminals differ in where the cursor is.
        _column = column + width < wanted.Length ? column + width : -1;
        return width;
    }

    private void Erase(int row, int from, int end)
    {
        int first = from;
        while (first < end && _shown[row, first] == Shown.Blank)
        {
            first++;
        }

        if (first == end)
        {
            return;
        }

        Go(row, first, null);
        Style(Shown.Blank);
        _out.Append("\x1b[K");
        for (int column = first; column < end; column++)
        {
            _shown[row, column] = Shown.Blank;
        }
    }

    private void Go(int row, int column, Shown[]? wanted)
    {
        if (row != _row || column < _column || _column < 0)
        {
            _out.Append("\x1b[");
            if (row > 0 || column > 0)
            {
                _out.Append(CultureInfo.InvariantCulture, $"{row + 1}");
            }

            if (column > 0)
            {
                _out.Append(CultureInfo.InvariantCulture, $";{column + 1}");
            }

            _out.Append('H');
        }
        else if (column - _column <= Stride && wanted is not null && IsInStyle(wanted, column))
        {
            for (; _column < column; _column++)
            {
                _out.Append(wanted[_column].Text);
            }
        }
        else if (column - _column == 1)
        {
            _out.Append("\x1b[C");
        }
        else if (column > _column)
        {
            _out.Append(CultureInfo.InvariantCulture, $"\x1b[{column - _column}C");
        }

        _row = row;
        _column = column;
    }

    private bool IsInStyle(Shown[] wanted, int end)
    {
        for (int column = _column; column < end; column++)
        {
            if (!IsInStyle(wanted[column]) || wanted[column].Text.Length != 1)
            {
                return false;
            }
        }

        return true;
    }

    // A space looks the same in most styles.
    private bool IsInStyle(Shown cell) => cell.Style == _style || (cell == Shown.Blank && !Pen.ShowsOnSpaces(_style));

    private void Style(Shown cell)
    {
        if (!IsInStyle(cell))
        {
            _out.Append("\x1b[").Append(cell.Style.Length > 0 && _style.Length > 0 ? "0;" : "").Append(cell.Style).Append('m');
            _style = cell.Style;
        }
    }

    private readonly record struct Shown(string Text, string Style)
    {
        public static Shown Blank { get; } = new(" ", "");
    }
}
