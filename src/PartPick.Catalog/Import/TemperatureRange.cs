using System.Globalization;
using System.Text.RegularExpressions;

namespace PartPick.Catalog.Import;

/// <summary>A temperature range in one cell: "-20°C ~ 70°C", "-40 to +85", "-10..60 °C", "-20/+70".</summary>
internal static partial class TemperatureRange
{
    /// <summary>The lowest and the highest temperature, °C; null where the cell is no range.</summary>
    public static (double Lowest, double Highest)? Read(string cell)
    {
        string bare = CellText.Bare(cell).Replace('\u2013', '-').Replace('\u2014', '-')
            .Replace("'C", "°C", StringComparison.OrdinalIgnoreCase)
            .Trim('(', ')', '[', ']', ' ');
        Match match = Form().Match(bare);
        if (!match.Success)
        {
            return null;
        }

        double lowest = Number(match.Groups[1].Value);
        double highest = Number(match.Groups[2].Value);
        return lowest < highest && lowest > -274 && highest < 1000 ? (lowest, highest) : null;
    }

    private static double Number(string text) =>
        double.Parse(text.Replace(',', '.').Replace(" ", "", StringComparison.Ordinal), NumberStyles.Float, CultureInfo.InvariantCulture);

    [GeneratedRegex(
        @"^(?:von|from|de|da|fra|från|van|od|от)?\s*([+-]?\s?\d{1,3}(?:[.,]\d)?)\s*(?:[°º]\s*C?|C|deg\.?\s*C|℃)?"
            + @"\s*(?:~|～|〜|to|bis|à|a|up to|tot|till|til|do|до|hasta|ate|até|\.{2,3}|…|/|÷|-|;|,)\s*"
            + @"([+-]?\s?\d{1,3}(?:[.,]\d)?)\s*(?:[°º]\s*C?|C|deg\.?\s*C|℃)?$",
        RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex Form();
}
