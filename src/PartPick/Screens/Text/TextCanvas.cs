using System.Collections.Immutable;

namespace PartPick.Screens;

/// <summary>A small drawing of characters.</summary>
public sealed class TextCanvas
{
    private readonly char[][] _cells;
    private readonly Glyphs _glyphs;

    /// <summary>Makes an empty drawing.</summary>
    /// <param name="width">Its width in cells.</param>
    /// <param name="height">Its height in cells.</param>
    /// <param name="glyphs">The signs.</param>
    public TextCanvas(int width, int height, Glyphs glyphs)
    {
        _glyphs = glyphs;
        _cells = new char[height][];
        for (int row = 0; row < height; row++)
        {
            _cells[row] = new string(' ', width).ToCharArray();
        }
    }

    /// <summary>Writes text; what is beyond the edges is left out.</summary>
    /// <param name="x">Column, from zero.</param>
    /// <param name="y">Row, from zero.</param>
    /// <param name="text">The text.</param>
    public void Put(int x, int y, string text)
    {
        string shown = _glyphs.Show(text);
        for (int i = 0; i < shown.Length; i++)
        {
            if (y >= 0 && y < _cells.Length && x + i >= 0 && x + i < _cells[y].Length)
            {
                _cells[y][x + i] = shown[i];
            }
        }
    }

    /// <summary>Writes a sign of the drawing as it is.</summary>
    /// <param name="x">Column, from zero.</param>
    /// <param name="y">Row, from zero.</param>
    /// <param name="sign">The sign.</param>
    public void Put(int x, int y, char sign) => _cells[y][x] = sign;

    /// <summary>Writes text that ends before a column.</summary>
    /// <param name="end">The column after it.</param>
    /// <param name="y">Row, from zero.</param>
    /// <param name="text">The text.</param>
    public void PutBefore(int end, int y, string text) => Put(end - _glyphs.Show(text).Length, y, text);

    /// <summary>Writes text about the middle of a stretch.</summary>
    /// <param name="left">First column of the stretch.</param>
    /// <param name="right">Last column of the stretch.</param>
    /// <param name="y">Row, from zero.</param>
    /// <param name="text">The text.</param>
    public void PutCentred(int left, int right, int y, string text)
    {
        int width = _glyphs.Show(text).Length;
        Put(left + Math.Max(0, (right - left + 1 - width) / 2), y, text);
    }

    /// <summary>Draws a horizontal line.</summary>
    /// <param name="from">First column.</param>
    /// <param name="to">Last column.</param>
    /// <param name="y">Row.</param>
    public void Across(int from, int to, int y)
    {
        for (int x = from; x <= to; x++)
        {
            _cells[y][x] = _glyphs.Horizontal;
        }
    }

    /// <summary>Draws a vertical line.</summary>
    /// <param name="x">Column.</param>
    /// <param name="from">First row.</param>
    /// <param name="to">Last row.</param>
    public void DownFrom(int x, int from, int to)
    {
        for (int y = from; y <= to; y++)
        {
            _cells[y][x] = _glyphs.Vertical;
        }
    }

    /// <summary>The drawing as lines.</summary>
    public ImmutableArray<Line> Lines() => [.. _cells.Select(row => new Line([new Span(new string(row), Tone.Normal)]))];
}
