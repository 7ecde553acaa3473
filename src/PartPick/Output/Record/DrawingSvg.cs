using System.Collections.Immutable;
using System.Globalization;
using System.Text;
using PartPick.Screens;

namespace PartPick.Output;

/// <summary>Turns a drawing of line signs into lines: the same drawing as on the screen, at any size.</summary>
internal static class DrawingSvg
{
    private const int CellWidth = 9;
    private const int CellHeight = 18;

    /// <summary>The drawing as an SVG element.</summary>
    /// <param name="drawing">Its lines, drawn with <see cref="Glyphs.Drawn"/>.</param>
    /// <param name="title">What it shows.</param>
    public static string Of(ImmutableArray<Line> drawing, string title)
    {
        int width = drawing.Max(line => line.Text.TrimEnd().Length) * CellWidth + CellWidth;
        int height = drawing.Length * CellHeight;
        var path = new StringBuilder();
        var texts = new StringBuilder();
        for (int row = 0; row < drawing.Length; row++)
        {
            string line = drawing[row].Text.TrimEnd();
            for (int column = 0; column < line.Length; column++)
            {
                if (Strokes(line[column]) is { } strokes)
                {
                    Stroke(path, strokes, column, row);
                }
                else if (line[column] != ' ')
                {
                    int end = column + 1;
                    while (end < line.Length && Strokes(line[end]) is null && (line[end] != ' ' || (end + 1 < line.Length
                        && line[end + 1] != ' ' && Strokes(line[end + 1]) is null)))
                    {
                        end++;
                    }

                    Text(texts, line[column..end], column, row);
                    column = end - 1;
                }
            }
        }

        return string.Create(
            CultureInfo.InvariantCulture,
            $"""
            <svg class="schematic" xmlns="http://www.w3.org/2000/svg" role="img"
             width="{width}" height="{height}" viewBox="0 0 {width} {height}">
            <title>{Html.Encode(title)}</title>
            <path d="{path}" fill="none" stroke="currentColor" stroke-width="1.4" stroke-linecap="square"/>
            {texts}</svg>
            """);
    }

    // Which way the strokes of a sign go from its middle; = stands for a double horizontal.
    private static string? Strokes(char sign) => sign switch
    {
        '─' => "LR",
        '│' => "UD",
        '┌' => "RD",
        '┐' => "LD",
        '└' => "RU",
        '┘' => "LU",
        '├' => "UDR",
        '┤' => "UDL",
        '┬' => "LRD",
        '┴' => "LRU",
        '┼' => "LRUD",
        '═' => "=",
        '╧' => "=U",
        _ => null,
    };

    private static void Stroke(StringBuilder path, string strokes, int column, int row)
    {
        double x = (column + 0.5) * CellWidth, y = (row + 0.5) * CellHeight;
        foreach (char way in strokes)
        {
            path.Append(way switch
            {
                'L' => Segment(x, y, x - CellWidth / 2.0, y),
                'R' => Segment(x, y, x + CellWidth / 2.0, y),
                'U' => Segment(x, y, x, y - CellHeight / 2.0),
                'D' => Segment(x, y, x, y + CellHeight / 2.0),
                _ => Across(x, y) + Across(x, y + 3),
            });
        }
    }

    private static string Across(double x, double y) => Segment(x - CellWidth / 2.0, y, x + CellWidth / 2.0, y);

    private static string Segment(double x1, double y1, double x2, double y2) =>
        string.Create(CultureInfo.InvariantCulture, $"M{x1:0.#} {y1:0.#}L{x2:0.#} {y2:0.#}");

    private static void Text(StringBuilder texts, string text, int column, int row) => texts
        .Append(CultureInfo.InvariantCulture, $"<text x=\"{column * CellWidth}\" y=\"{row * CellHeight + 13}\"")
        .Append(CultureInfo.InvariantCulture, $" textLength=\"{text.Length * CellWidth}\">{Html.Encode(text)}</text>\n");
}
