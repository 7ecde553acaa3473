using System.Collections.Immutable;
using System.Globalization;
using System.Xml.Linq;
using PartPick.Screens;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Output;

/// <summary>The pictures of a candidate as SVG files.</summary>
internal static class PictureSvg
{
    private const double Edge = 16;
    private const int LetterWidth = 8;

    /// <summary>Whether a picture is drawn of numbers; the budget and the schematic are not.</summary>
    /// <param name="kind">The picture.</param>
    public static bool IsChart(PictureKind kind) => kind is not (PictureKind.Budget or PictureKind.Schematic);

    /// <summary>The SVG file.</summary>
    /// <param name="kind">The picture.</param>
    /// <param name="candidate">The candidate.</param>
    /// <param name="requirement">What was needed.</param>
    /// <param name="chart">Its numbers; null for those that are not drawn of numbers.</param>
    public static string Of(PictureKind kind, Candidate candidate, Requirement requirement, Result<Chart>? chart) => kind switch
    {
        PictureKind.Budget => Budget(candidate, requirement),
        PictureKind.Schematic => Circuit(Schematic.Draw(candidate, Glyphs.Drawn), CircuitPane.Title(candidate)),
        _ => ChartSvg.Of(chart!.Value, CircuitPane.Title(candidate)),
    };

    /// <summary>The SVG file of a schematic.</summary>
    /// <param name="drawing">The schematic, drawn with <see cref="Glyphs.Drawn"/>.</param>
    /// <param name="subtitle">Of which circuit it is.</param>
    public static string Circuit(ImmutableArray<Line> drawing, string subtitle) =>
        Around("Schematic", subtitle, DrawingSvg.Of(drawing, "Schematic of the circuit"));

    private static string Budget(Candidate candidate, Requirement requirement)
    {
        string limit = ValueText.Format(requirement.BudgetRatio, Dimension.Relative);
        ImmutableArray<BudgetBar> rows = candidate.Budget is { } budget ? BudgetBars.Of(budget) : [];
        var bars = new BarsSvg(
            [
                .. rows.Select(row => new PictureBar(
                    row.Name, Math.Abs(row.Ratio) / requirement.BudgetRatio,
                    $"{(row.IsSpread ? "±" : "")}{Screens.Figures.Ppm(row.Ratio)} ppm{(row.RestsOn is { } rest ? ", " + rest : "")}")),
            ],
            "Terms of the frequency error");
        return rows.IsEmpty
            ? SvgSheet.Of("Error budget", CircuitPane.Title(candidate), 600, SvgSheet.Head + 30, "<text x=\"16\" y=\"70\">It does not run.</text>\n")
            : Around($"Error budget; the line is the limit of {limit}", CircuitPane.Title(candidate), bars.ToString());
    }

    // The drawing knows its size; the sheet is as large as it and the heading need.
    private static string Around(string title, string subtitle, string drawing)
    {
        XElement element = XElement.Parse(drawing);
        double width = double.Parse(element.Attribute("width")!.Value, CultureInfo.InvariantCulture);
        double height = double.Parse(element.Attribute("height")!.Value, CultureInfo.InvariantCulture);
        double words = Math.Max(title.Length, subtitle.Length) * LetterWidth + 2 * Edge;
        string placed = FormattableString.Invariant($"<g transform=\"translate({Edge} {SvgSheet.Head + 10})\">\n{drawing}\n</g>\n");
        return SvgSheet.Of(title, subtitle, Math.Max(width + 2 * Edge, words), SvgSheet.Head + height + 26, placed);
    }
}
