using System.Globalization;
using System.Text;

namespace PartPick.Output;

/// <summary>
/// Draws a cost per unit over the number of boards, both logarithmic, so that a fixed sum shared by more boards falls straight.
/// </summary>
internal static class CostPicture
{
    private const int DotsAcross = 2;
    private const int DotsDown = 4;
    private const int LabelWidth = 8;

    // Bits of the eight dots of a cell of Unicode's braille patterns, by row and column.
    private static readonly int[,] Bits = { { 0x01, 0x08 }, { 0x02, 0x10 }, { 0x04, 0x20 }, { 0x40, 0x80 } };

    /// <summary>The picture.</summary>
    /// <param name="most">Largest number of boards, two or more.</param>
    /// <param name="cost">The cost per unit of a number of boards, above zero.</param>
    /// <param name="width">Width of the curve in letters.</param>
    /// <param name="height">Height of the curve in lines.</param>
    /// <param name="ascii">Whether only ASCII may be used.</param>
    /// <returns>The lines: the curve with the highest and lowest cost beside it, and the numbers of boards below.</returns>
    public static IReadOnlyList<string> Draw(int most, Func<int, decimal> cost, int width, int height, bool ascii)
    {
        (int across, int down) = ascii ? (1, 1) : (DotsAcross, DotsDown);
        bool[,] dots = new bool[width * across, height * down];
        (double Least, double Most)[] columns = [.. Enumerable.Range(0, width * across).Select(column => Range(column, width * across))];
        double low = Math.Log(columns.Min(column => column.Least));
        double high = Math.Max(Math.Log(columns.Max(column => column.Most)), low + 1e-9);
        for (int x = 0; x < columns.Length; x++)
        {
            for (int y = Row(columns[x].Most); y <= Row(columns[x].Least); y++)
            {
                dots[x, y] = true;
            }
        }

        var lines = new List<string>();
        for (int line = 0; line < height; line++)
        {
            string label = line == 0 ? Label(Math.Exp(high)) : line == height - 1 ? Label(Math.Exp(low)) : "";
            lines.Add($"{label,LabelWidth} {(ascii ? '|' : '│')}{Cells(dots, line, width, ascii)}".TrimEnd());
        }

        lines.Add($"{new string(' ', LabelWidth)} {(ascii ? '+' : '└')}{new string(ascii ? '-' : '─', width)}");
        lines.Add(new string(' ', LabelWidth + 2) + Marks(most, width).TrimEnd());
        return lines;

        (double Least, double Most) Range(int column, int count)
        {
            int from = BuildsAt(column, count, most);
            int to = Math.Max(from, BuildsAt(column + 1, count, most) - 1);
            decimal[] costs = [.. Enumerable.Range(from, to - from + 1).Select(cost)];
            return ((double)costs.Min(), (double)costs.Max());
        }

        int Row(double value) =>
            Math.Clamp((int)Math.Round((high - Math.Log(value)) / (high - low) * (height * down - 1)), 0, height * down - 1);
    }

    /// <summary>The number of boards at which a column begins.</summary>
    /// <param name="column">The column, from zero.</param>
    /// <param name="count">Number of columns.</param>
    /// <param name="most">Largest number of boards.</param>
    public static int BuildsAt(int column, int count, int most) =>
        Math.Min(most, (int)Math.Ceiling(Math.Pow(most, (double)column / count) - 1e-9));

    private static string Cells(bool[,] dots, int line, int width, bool ascii)
    {
        var text = new StringBuilder();
        for (int cell = 0; cell < width; cell++)
        {
            if (ascii)
            {
                text.Append(dots[cell, line] ? '*' : ' ');
                continue;
            }

            int bits = 0;
            for (int y = 0; y < DotsDown; y++)
            {
                for (int x = 0; x < DotsAcross; x++)
                {
                    bits |= dots[cell * DotsAcross + x, line * DotsDown + y] ? Bits[y, x] : 0;
                }
            }

            text.Append(bits == 0 ? ' ' : (char)(0x2800 + bits));
        }

        return text.ToString();
    }

    // Each decade stands below its column; the last one ends with the picture.
    private static string Marks(int most, int width)
    {
        char[] marks = [.. new string(' ', width + 8)];
        for (long builds = 1; builds <= most; builds *= 10)
        {
            string text = Figures.Whole(builds);
            int place = most == 1 ? 0 : (int)Math.Round(Math.Log(builds) / Math.Log(most) * width);
            int start = Math.Clamp(place, 0, marks.Length - text.Length);
            text.CopyTo(0, marks, start, text.Length);
        }

        return new string(marks);
    }

    private static string Label(double cost) => cost.ToString(cost < 100 ? "0.000" : "0", CultureInfo.InvariantCulture);
}
