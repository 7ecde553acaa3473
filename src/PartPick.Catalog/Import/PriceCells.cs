using System.Globalization;
using System.Text.RegularExpressions;

namespace PartPick.Catalog.Import;

/// <summary>Reads prices and price lists, with signs and names of currencies.</summary>
internal static partial class PriceCells
{
    private static readonly HashSet<string> Pieces = new(StringComparer.OrdinalIgnoreCase)
    {
        "", "ea", "each", "pc", "pcs", "Stk", "St", "Stück", "unit", "szt", "ks", "kpl", "db", "шт", "pz", "ud", "per pc", "per unit",
        "pièce", "p",
    };

    /// <summary>One price; null where the cell is none, or can be read in two ways.</summary>
    public static decimal? Price(string cell, NumberNotation notation)
    {
        string text = CellText.Bare(cell);
        (int start, int end) = WrittenNumber.Locate(text);
        string around = Currencies.Without(text[..start] + " " + text[end..]);
        return end > start && Pieces.Contains(around.Trim(' ', '/', '.', '-', ':', '='))
            && !around.Contains('-', StringComparison.Ordinal)
            && WrittenNumber.Plain(text[start..end], notation) is { } plain
            && decimal.TryParse(plain, NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out decimal price)
            && price <= 1_000_000_000
                ? price
                : null;
    }

    /// <summary>A list of prices in one cell, "1:0.42;10:0.31" or "ab 1.000: 0,31 €", ascending; null where it is none.</summary>
    public static List<PriceBreak>? List(string cell, NumberNotation notation)
    {
        var prices = new List<PriceBreak>();
        foreach (string entry in Entries(cell))
        {
            Match match = Entry().Match(entry);
            if (!match.Success
                || !int.TryParse(Digits(match.Groups[1].Value), NumberStyles.None, CultureInfo.InvariantCulture, out int count)
                || count is < 1 or > 1_000_000
                || Price(match.Groups[3].Value, notation) is not { } price)
            {
                return null;
            }

            int quantity = count * (match.Groups[2].Length > 0 ? 1000 : 1);
            if (prices.Count > 0 && quantity <= prices[^1].Quantity)
            {
                return null;
            }

            prices.Add(new PriceBreak(quantity, price));
        }

        return prices.Count > 0 ? prices : null;
    }

    /// <summary>The prices in a list, for what their separators say.</summary>
    public static IEnumerable<string> In(string cell) => Entries(cell)
        .Select(entry => Entry().Match(entry)).Where(match => match.Success).Select(match => match.Groups[3].Value);

    private static string[] Entries(string cell) =>
        Between().Split(cell.Replace('\u00A0', ' ').Trim('{', '}', '[', ']', ' ', ';')).Select(entry => entry.Trim())
            .Where(entry => entry.Length > 0).ToArray();

    private static string Digits(string quantity) => string.Concat(quantity.Where(char.IsAsciiDigit));

    // A comma parts entries only where a space and a digit follow, so that a decimal comma does not.
    [GeneratedRegex(@"[;|\n]|\s/\s|/(?=\s*\d+\s*(?:\+|:|=))|,\s+(?=\D{0,4}\d)")]
    private static partial Regex Between();

    [GeneratedRegex(
        @"^(?:ab|from|od|desde|dès|da|vanaf|från|fra|à partir de|a partir de|qty|≥|>=?)?\s*(\d{1,3}(?:[., ']\d{3})+|\d{1,9})(k)?"
            + @"\s*(?:(?:-|–|\.\.|to|bis|à)\s*\d[\d.,]*)?"
            + @"\s*(?:\+|pcs\.?|pc\.?|x|ab|Stk\.?|Stück|St\.?|szt\.?|ks|kpl|db|шт\.?|pz\.?|uds?\.?|u)?"
            + @"\s*(?:[:=@>]|-(?=\s)|->|→|à|\s)\s*(.+)$",
        RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex Entry();
}
