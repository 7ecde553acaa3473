using PartPick.Screens;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>Says below an SVG picture what its strokes and signs are, and what is to be known besides.</summary>
internal static class ChartSvgKey
{
    private const double RowHeight = 18;
    private const double LetterWidth = 7;
    private static readonly string[] Dashes = ["", "7 3", "2 3", "10 3 2 3"];

    /// <summary>The strokes of a curve.</summary>
    /// <param name="number">Its number, from zero.</param>
    public static string Strokes(int number) => Dashes[number % Dashes.Length];

    /// <summary>Draws the key and the notes.</summary>
    /// <param name="svg">The picture so far.</param>
    /// <param name="chart">The numbers.</param>
    /// <param name="left">Where it begins, in pixels across.</param>
    /// <param name="y">The base line of its first row, in pixels.</param>
    /// <param name="width">Width of the sheet in pixels.</param>
    /// <returns>Where the sheet may end, in pixels.</returns>
    public static double Draw(SvgText svg, Chart chart, double left, double y, double width)
    {
        for (int i = 0; i < chart.Curves.Length; i++)
        {
            svg.Points([(left, y - 4), (left + 44, y - 4)], "curve", Strokes(i));
            Row($"{chart.Curves[i].Letter}  {chart.Curves[i].Name}");
        }

        foreach (ChartBand band in chart.Bands)
        {
            svg.Box(left, y - 11, 44, 14, "band");
            Row(band.Name);
        }

        foreach (SpotKind kind in chart.Spots.Select(spot => spot.Kind).Distinct().OrderDescending())
        {
            Spot(svg, kind, left + 22, y - 4);
            Row(ChartKey.Word(kind));
        }

        foreach (ChartMark mark in chart.Marks)
        {
            svg.Circle(left + 22, y - 4, 4, "full");
            Row($"{mark.Letter}  {mark.Words}");
        }

        foreach (string line in chart.Notes.SelectMany(note => Wrapped(note, (int)((width - 32) / LetterWidth))))
        {
            svg.Text(16, y, line);
            y += RowHeight;
        }

        return y;

        void Row(string words)
        {
            svg.Text(left + 56, y, words);
            y += RowHeight;
        }
    }

    /// <summary>Draws a single point.</summary>
    public static void Spot(SvgText svg, SpotKind kind, double x, double y)
    {
        switch (kind)
        {
            case SpotKind.Front:
                svg.Box(x - 4.5, y - 4.5, 9, 9, "full");
                break;
            case SpotKind.Chosen:
                svg.Line(x - 7, y - 7, x + 7, y + 7, "curve").Line(x - 7, y + 7, x + 7, y - 7, "curve").Circle(x, y, 9, "open");
                break;
            default:
                svg.Circle(x, y, 4, "open");
                break;
        }
    }

    private static IEnumerable<string> Wrapped(string text, int longest)
    {
        string line = "";
        foreach (string word in text.Split(' '))
        {
            if (line.Length > 0 && line.Length + 1 + word.Length > longest)
            {
                yield return line;
                line = "";
            }

            line += line.Length == 0 ? word : " " + word;
        }

        yield return line;
    }
}
