using System.Collections.Immutable;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Says what the signs of a picture are.</summary>
internal static class ChartKey
{
    /// <summary>The lines.</summary>
    /// <param name="chart">The picture.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Draw(Chart chart, int width, Glyphs glyphs)
    {
        (string Sign, string Name)[] signs =
        [
            .. chart.Curves.Select(curve => (curve.Letter.ToString(), curve.Name)),
            .. chart.Bands.Select(band => ($"{glyphs.Free} {glyphs.Free}", band.Name)),
            .. chart.Spots.Select(spot => spot.Kind).Distinct().OrderDescending()
                .Select(kind => (Sign(kind, glyphs).ToString(), Word(kind))),
            .. chart.Marks.Select(mark => (mark.Letter.ToString(), mark.Words)),
        ];
        var lines = ImmutableArray.CreateBuilder<Line>();
        LineBuilder line = new LineBuilder(glyphs).Add(" ");
        foreach ((string sign, string name) in signs)
        {
            int length = sign.Length + 1 + glyphs.Show(name).Length;
            if (line.Width > 1 && line.Width + length > width)
            {
                lines.Add(line.Build());
                line = new LineBuilder(glyphs).Add(" ");
            }

            line.Add(sign, Tone.Strong).Add(" ").Words(name, width - line.Width);
            line.Add("   ");
        }

        return line.Width > 1 ? [.. lines, line.Build()] : lines.ToImmutable();
    }

    /// <summary>The sign of a single point.</summary>
    public static char Sign(SpotKind kind, Glyphs glyphs) => kind switch
    {
        SpotKind.Chosen => 'X',
        SpotKind.Front => glyphs.Full,
        _ => 'o',
    };

    /// <summary>The words for a single point.</summary>
    public static string Word(SpotKind kind) => kind switch
    {
        SpotKind.Chosen => "the chosen one",
        SpotKind.Front => "on the front",
        _ => "another",
    };
}
