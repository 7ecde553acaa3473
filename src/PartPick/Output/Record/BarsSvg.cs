using System.Globalization;
using System.Text;

namespace PartPick.Output;

/// <summary>A bar of a picture.</summary>
/// <param name="Name">What it shows.</param>
/// <param name="Share">Its length: 1 at the limit; null for none.</param>
/// <param name="Words">The figure in words.</param>
internal sealed record PictureBar(string Name, double? Share, string Words);

/// <summary>Draws shares of a limit as bars; a bar beyond its limit is hollow, so that a print without colours shows it.</summary>
/// <param name="bars">The bars, from above.</param>
/// <param name="title">What they show.</param>
internal sealed class BarsSvg(IReadOnlyList<PictureBar> bars, string title)
{
    private const int LetterWidth = 8;
    private const int BarWidth = 240;
    private const int Beyond = 46;
    private const int RowHeight = 20;

    private int Left => bars.Max(bar => bar.Name.Length) * LetterWidth + LetterWidth;

    private int Right => Left + BarWidth + Beyond;

    /// <summary>The picture as an SVG element.</summary>
    public override string ToString()
    {
        int width = Right + bars.Max(bar => bar.Words.Length) * LetterWidth, height = bars.Count * RowHeight + 6;
        var rows = new StringBuilder();
        for (int i = 0; i < bars.Count; i++)
        {
            Row(rows, bars[i], i * RowHeight + 4);
        }

        return string.Create(
            CultureInfo.InvariantCulture,
            $"""
            <svg class="bars" xmlns="http://www.w3.org/2000/svg" role="img"
             width="{width}" height="{height}" viewBox="0 0 {width} {height}">
            <title>{Html.Encode(title)}</title>
            {rows}<path d="M{Left + BarWidth} 0V{height}" stroke="currentColor" stroke-dasharray="3 3"/>
            </svg>
            """);
    }

    private void Row(StringBuilder rows, PictureBar bar, int y)
    {
        Text(rows, 0, y, bar.Name);
        if (bar.Share is { } share && !double.IsNaN(share))
        {
            // The line at the limit stands free of bars that stay below it; what goes beyond ends soon after it.
            double length = Math.Clamp(share, 0, 1.15) * BarWidth;
            string look = share > 1 ? "fill=\"none\" stroke-width=\"2\"" : "fill=\"currentColor\" fill-opacity=\"0.55\"";
            rows.Append(CultureInfo.InvariantCulture, $"<rect x=\"{Left}\" y=\"{y}\" width=\"{length:0.#}\" height=\"12\"")
                .Append(CultureInfo.InvariantCulture, $" {look} stroke=\"currentColor\"/>\n");
        }

        Text(rows, Right, y, bar.Words);
    }

    private static void Text(StringBuilder rows, int x, int y, string text) =>
        rows.Append(CultureInfo.InvariantCulture, $"<text x=\"{x}\" y=\"{y + 11}\">{Html.Encode(text)}</text>\n");
}
