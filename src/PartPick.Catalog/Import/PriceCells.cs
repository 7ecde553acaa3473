using System.Globalization;
using System.Text.RegularExpressions;

namespace PartPick.Catalog.Import;

/// <summary>Reads prices and price lists, with signs and names of currencies.</summary>
internal static partial class PriceCells
{
    private static readonly (string Sign, string Currency)[] Signs =
    [
        ("US$", "USD"), ("USD", "USD"), ("EUR", "EUR"), ("GBP", "GBP"), ("CHF", "CHF"), ("SEK", "SEK"), ("NOK", "NOK"), ("DKK", "DKK"),
        ("PLN", "PLN"), ("CZK", "CZK"), ("JPY", "JPY"), ("CNY", "CNY"), ("RMB", "CNY"), ("INR", "INR"), ("CAD", "CAD"), ("AUD", "AUD"),
        ("C$", "CAD"), ("A$", "AUD"), ("€", "EUR"), ("£", "GBP"), ("$", "USD"), ("₹", "INR"), ("zł", "PLN"), ("Fr.", "CHF"),
    ];

    /// <summary>The currency that a text names; null for none.</summary>
    public static string? CurrencyIn(string text) =>
        Signs.FirstOrDefault(pair => text.Contains(pair.Sign, StringComparison.Ordinal)).Currency
        ?? Signs
            .Where(pair => pair.Sign.Length == 3)
            .FirstOrDefault(pair => text.Contains(pair.Sign, StringComparison.OrdinalIgnoreCase)).Currency;

    /// <summary>One price; null where the cell is none, or can be read in two ways.</summary>
    public static decimal? Price(string cell, NumberNotation notation)
    {
        string text = CellText.Bare(cell);
        (int start, int end) = WrittenNumber.Locate(text);
        string around = text[..start] + text[end..];
        foreach ((string sign, _) in Signs)
        {
            around = around.Replace(sign, "", StringComparison.OrdinalIgnoreCase);
        }

        return end > start && around.Trim(' ', '/', '.', '-') is "" or "ea" or "each" or "pc" or "pcs" or "Stk" or "St" or "unit"
            && !around.Contains('-', StringComparison.Ordinal)
            && WrittenNumber.Plain(text[start..end], notation) is { } plain
            && decimal.TryParse(plain, NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out decimal price)
            && price <= 1_000_000_000
                ? price
                : null;
    }

    /// <summary>A list of prices in one cell, "1:0.42;10:0.31" or "1+ $0.42 / 10+ $0.31", ascending; null where it is none.</summary>
    public static List<PriceBreak>? List(string cell, NumberNotation notation)
    {
        var prices = new List<PriceBreak>();
        foreach (string entry in cell.Split([';', '|', '/', '\n'], StringSplitOptions.TrimEntries | StringSplitOptions.RemoveEmptyEntries))
        {
            Match match = Entry().Match(entry);
            if (!match.Success
                || !int.TryParse(match.Groups[1].Value, NumberStyles.None, CultureInfo.InvariantCulture, out int quantity)
                || Price(match.Groups[2].Value, notation) is not { } price
                || (prices.Count > 0 && quantity <= prices[^1].Quantity)
                || quantity < 1)
            {
                return null;
            }

            prices.Add(new PriceBreak(quantity, price));
        }

        return prices.Count > 0 ? prices : null;
    }

    /// <summary>The prices in a list, for what their separators say.</summary>
    public static IEnumerable<string> In(string cell) => cell.Split([';', '|', '/', '\n'], StringSplitOptions.RemoveEmptyEntries)
        .Select(entry => Entry().Match(entry.Trim())).Where(match => match.Success).Select(match => match.Groups[2].Value);

    [GeneratedRegex(@"^(\d{1,9})\s*(?:\+|pcs\.?|x|ab)?\s*(?:[:=@]|\s)\s*(.+)$", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex Entry();
}
