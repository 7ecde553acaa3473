namespace PartPick.Screens;

/// <summary>
/// A field of dots that is shown in cells of text: eight dots a cell in Braille signs, two in half blocks, one in ASCII. Letters
/// stand over dots.
/// </summary>
internal sealed class PlotDots
{
    // Bits of the eight dots of a cell of Unicode's Braille patterns, by row and column.
    private static readonly int[,] Bits = { { 0x01, 0x08 }, { 0x02, 0x10 }, { 0x04, 0x20 }, { 0x40, 0x80 } };
    private static readonly char[] Halves = [' ', '▀', '▄', '█'];

    private readonly char[,] _cells;
    private readonly bool[,] _isLetter;
    private readonly bool[,] _dots;
    private readonly Glyphs _glyphs;

    /// <summary>An empty field.</summary>
    /// <param name="width">Width in cells.</param>
    /// <param name="height">Height in cells.</param>
    /// <param name="glyphs">The signs.</param>
    public PlotDots(int width, int height, Glyphs glyphs)
    {
        (Width, Height, _glyphs) = (width, height, glyphs);
        (Across, Down) = glyphs.IsAscii ? (1, 1) : glyphs.HasBraille ? (2, 4) : (1, 2);
        _cells = new char[width, height];
        _isLetter = new bool[width, height];
        _dots = new bool[width * Across, height * Down];
    }

    /// <summary>Width in cells.</summary>
    public int Width { get; }

    /// <summary>Height in cells.</summary>
    public int Height { get; }

    /// <summary>Dots in a cell's width.</summary>
    public int Across { get; }

    /// <summary>Dots in a cell's height.</summary>
    public int Down { get; }

    /// <summary>Number of dots across.</summary>
    public int DotsAcross => Width * Across;

    /// <summary>Number of dots down.</summary>
    public int DotsDown => Height * Down;

    /// <summary>The column of dots of a place from 0 to 1.</summary>
    public int Column(double place) => (int)Math.Round(Math.Clamp(place, -1, 2) * (DotsAcross - 1));

    /// <summary>The row of dots of a place from 0, below, to 1, above.</summary>
    public int Row(double place) => (int)Math.Round((1 - Math.Clamp(place, -1, 2)) * (DotsDown - 1));

    /// <summary>Sets a dot; beyond the edges nothing is set. In ASCII the sign stands for it.</summary>
    public void Dot(int x, int y, char sign)
    {
        if (x < 0 || y < 0 || x >= DotsAcross || y >= DotsDown)
        {
            return;
        }

        _dots[x, y] = true;
        if (_glyphs.IsAscii)
        {
            _cells[x, y] = sign;
        }
    }

    /// <summary>Sets dots from one to another.</summary>
    public void Stroke(int x1, int y1, int x2, int y2, char sign)
    {
        int steps = Math.Max(1, Math.Max(Math.Abs(x2 - x1), Math.Abs(y2 - y1)));
        for (int k = 0; k <= steps; k++)
        {
            Dot((int)Math.Round(x1 + (double)(x2 - x1) * k / steps), (int)Math.Round(y1 + (double)(y2 - y1) * k / steps), sign);
        }
    }

    /// <summary>Puts a letter into the cell of a dot, over what is there.</summary>
    public void Letter(int x, int y, char letter)
    {
        (int column, int row) = (x / Across, y / Down);
        if (x >= 0 && y >= 0 && column < Width && row < Height)
        {
            _cells[column, row] = letter;
            _isLetter[column, row] = true;
        }
    }

    /// <summary>Writes words, over what is there; what is beyond the edges is left out.</summary>
    public void Words(int column, int row, string text)
    {
        string shown = _glyphs.Show(text);
        for (int i = 0; i < shown.Length; i++)
        {
            Letter((column + i) * Across, row * Down, shown[i]);
        }
    }

    /// <summary>Whether nothing is in a stretch of a row.</summary>
    public bool IsEmpty(int column, int row, int length) => Holds(column, row, length, ' ');

    /// <summary>Whether nothing is in a stretch of a row but a sign.</summary>
    public bool Holds(int column, int row, int length, char sign) =>
        row >= 0 && row < Height && column >= 0 && column + length <= Width
        && Enumerable.Range(column, length).All(at => Sign(at, row) == ' ' || Sign(at, row) == sign);

    /// <summary>Adds a row of cells to a line.</summary>
    public void AddTo(LineBuilder line, int row)
    {
        int from = 0;
        while (from < Width)
        {
            int to = from + 1;
            while (to < Width && _isLetter[to, row] == _isLetter[from, row])
            {
                to++;
            }

            string text = string.Concat(Enumerable.Range(from, to - from).Select(column => Sign(column, row)));
            line.Add(text, _isLetter[from, row] ? Tone.Strong : Tone.Normal);
            from = to;
        }
    }

    private char Sign(int column, int row)
    {
        if (_isLetter[column, row] || _glyphs.IsAscii)
        {
            return _cells[column, row] == 0 ? ' ' : _cells[column, row];
        }

        int bits = 0;
        for (int y = 0; y < Down; y++)
        {
            for (int x = 0; x < Across; x++)
            {
                bits |= !_dots[column * Across + x, row * Down + y] ? 0 : _glyphs.HasBraille ? Bits[y, x] : 1 << y;
            }
        }

        return bits == 0 ? ' ' : _glyphs.HasBraille ? (char)(0x2800 + bits) : Halves[bits];
    }
}
