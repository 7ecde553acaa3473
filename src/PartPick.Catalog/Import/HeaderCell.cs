using System.Globalization;
using System.Text.RegularExpressions;

namespace PartPick.Catalog.Import;

/// <summary>The cell of a header taken apart: what it names, the unit it states, and minimum, typical or maximum.</summary>
/// <param name="Text">The cell as it stands.</param>
/// <param name="Name">Its words without the unit.</param>
/// <param name="Unit">The unit in brackets or at the end; empty for none.</param>
/// <param name="Basis">What its figures rest on; stated where it says nothing.</param>
internal sealed partial record HeaderCell(string Text, string Name, string Unit, Basis Basis)
{
    private static readonly string[] Units =
    [
        "pF", "nF", "uF", "µF", "μF", "fF", "aF", "F", "Hz", "kHz", "KHz", "khz", "MHz", "mhz", "MHZ", "KHZ", "GHz", "Ohm", "Ohms", "ohm",
        "ohms", "OHM", "Ω", "kOhm", "kΩ", "k", "MOhm", "MΩ", "mΩ", "ppm", "PPM", "ppb", "%", "µW", "uW", "μW", "mW", "W",
        "V", "VDC", "Volts", "mV", "A", "mA", "°C", "C", "degC", "pf", "PF", "nf", "uf", "UF", "NF", "ppm/K", "ppm/°C",
        "uw", "mw", "UW", "MW", "ppm/K2", "in ppm",
        "ppm/year", "pcs", "EUR", "USD", "GBP", "CHF", "SEK", "JPY", "CNY", "€", "$", "£",
    ];

    private static readonly HashSet<string> Noise = new(StringComparer.Ordinal)
    {
        "max", "maximum", "min", "minimum", "typ", "typical", "nominal", "nom", "rated", "at", "25c", "25", "in", "the", "of",
        "value", "all",
    };

    /// <summary>The words of the name without those that only qualify it.</summary>
    public string BareName { get; } = string.Join(' ', Name.Split(' ').Where(word => !Noise.Contains(word)));

    /// <summary>Takes a cell apart.</summary>
    public static HeaderCell Of(string text)
    {
        string trimmed = text.Trim().Trim('\uFEFF');
        string unit = "";
        string rest = Brackets().Replace(trimmed, match =>
        {
            string inner = match.Groups[1].Value.Trim().TrimStart('±').Trim();
            if (unit.Length == 0 && IsUnit(inner))
            {
                unit = inner;
                return " ";
            }

            return " " + inner + " ";
        });
        if (unit.Length == 0)
        {
            string[] words = rest.Split([' ', '_', ',', '/', '-'], StringSplitOptions.RemoveEmptyEntries);
            if (words.Length > 1 && IsUnit(words[^1]) && words[^1].Length > 1)
            {
                unit = words[^1];
                rest = rest[..rest.LastIndexOf(unit, StringComparison.Ordinal)];
            }
        }

        string name = Trade.Words(rest);
        string[] all = name.Split(' ');
        Basis basis = all.Contains("max") || all.Contains("maximum") ? Basis.Maximum
            : all.Contains("typ") || all.Contains("typical") ? Basis.Typical
            : all.Contains("min") || all.Contains("minimum") ? Basis.Minimum : Basis.Stated;
        return new HeaderCell(trimmed, name, unit.StartsWith("in ", StringComparison.Ordinal) ? unit[3..] : unit, basis);
    }

    /// <summary>The quantity of a price column: 100 of "Qty 100 price", "100+", "Price @ 100"; null where it is none.</summary>
    public int? PriceQuantity()
    {
        Match quantity = WholeNumber().Match(Text);
        string[] words = Trade.Words(Text).Split(' ');
        bool isPrice = Text.Contains('+', StringComparison.Ordinal)
            || words.Any(word => word is "price" or "preis" or "prix" or "cost" or "pc" or "pcs" or "each" or "ab" or "vk"
                or "ea" or "stk" or "stuck");
        bool several = WholeNumber().Count(Text) is 1 or 2;
        return quantity.Success && isPrice && several
            && int.TryParse(quantity.Value.Replace(",", "", StringComparison.Ordinal).Replace(".", "", StringComparison.Ordinal),
                NumberStyles.None, CultureInfo.InvariantCulture, out int count) && count >= 1
                ? count
                : null;
    }

    private static bool IsUnit(string text) => Units.Contains(text, StringComparer.Ordinal);

    [GeneratedRegex(@"[\(\[\{]([^\)\]\}]*)[\)\]\}]")]
    private static partial Regex Brackets();

    [GeneratedRegex(@"\d{1,3}(?:[.,]\d{3})+|\d+")]
    private static partial Regex WholeNumber();
}
