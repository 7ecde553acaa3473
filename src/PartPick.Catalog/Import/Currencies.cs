namespace PartPick.Catalog.Import;

/// <summary>
/// Finds the currency that a text names, as its code of ISO 4217. Signs that several countries share (kr, ¥, Rs) name none; a
/// dollar sign alone is taken for the US dollar (common practice).
/// </summary>
internal static class Currencies
{
    private static readonly (string Sign, string Code)[] Signs =
    [
        ("US$", "USD"), ("C$", "CAD"), ("A$", "AUD"), ("S$", "SGD"), ("HK$", "HKD"), ("NT$", "TWD"), ("NZ$", "NZD"), ("R$", "BRL"),
        ("MX$", "MXN"), ("€", "EUR"), ("£", "GBP"), ("$", "USD"), ("₹", "INR"), ("zł", "PLN"), ("Kč", "CZK"), ("₺", "TRY"), ("₽", "RUB"),
        ("₩", "KRW"), ("元", "CNY"), ("人民币", "CNY"), ("円", "JPY"), ("руб", "RUB"), ("₪", "ILS"), ("₴", "UAH"),
    ];

    private static readonly Dictionary<string, string> Names = new(StringComparer.OrdinalIgnoreCase)
    {
        ["euro"] = "EUR", ["euros"] = "EUR", ["RMB"] = "CNY", ["Fr"] = "CHF", ["SFr"] = "CHF", ["zl"] = "PLN", ["Kc"] = "CZK",
        ["Ft"] = "HUF",
        ["lei"] = "RON", ["TL"] = "TRY", ["dollar"] = "USD", ["dollars"] = "USD", ["yen"] = "JPY", ["pound"] = "GBP",
    };

    private static readonly HashSet<string> Codes = new(StringComparer.OrdinalIgnoreCase)
    {
        "EUR", "USD", "GBP", "CHF", "SEK", "NOK", "DKK", "PLN", "CZK", "HUF", "RON", "JPY", "CNY", "INR", "CAD", "AUD", "SGD", "HKD", "TWD",
        "KRW", "BRL", "MXN", "TRY", "RUB", "ZAR", "NZD", "ILS", "UAH", "BGN", "ISK", "THB", "MYR", "IDR", "PHP", "VND",
    };

    private static readonly HashSet<string> Shared = new(StringComparer.OrdinalIgnoreCase) { "kr", "kr.", "Rs", "Rs.", "¥", "￥" };

    /// <summary>The currency that a text names; null for none.</summary>
    public static string? In(string text)
    {
        foreach ((string sign, string code) in Signs)
        {
            if (text.Contains(sign, StringComparison.Ordinal))
            {
                return code;
            }
        }

        for (int start = 0; start < text.Length; start++)
        {
            int end = start;
            while (end < text.Length && char.IsLetter(text[end]))
            {
                end++;
            }

            if (end - start is >= 2 and <= 7 && Named(text[start..end]) is { } code)
            {
                return code;
            }

            start = Math.Max(start, end);
        }

        return null;
    }

    /// <summary>Whether a text is the name or sign of a currency, also of a shared one, and nothing else.</summary>
    public static bool IsName(string text) => Named(text) is not null || Shared.Contains(text)
        || Array.Exists(Signs, pair => pair.Sign == text);

    /// <summary>A text without the names and signs of currencies, also those that say nothing certain.</summary>
    public static string Without(string text)
    {
        foreach ((string sign, _) in Signs)
        {
            text = text.Replace(sign, "", StringComparison.Ordinal);
        }

        string[] words = text.Split(' ', StringSplitOptions.RemoveEmptyEntries);
        return string.Join(' ', words.Where(word => Named(word.Trim('.', '-')) is null
            && !Shared.Contains(word)).Select(word => word.TrimStart('¥', '￥').TrimEnd('¥', '￥')));
    }

    private static string? Named(string word) => Names.TryGetValue(word, out string? code) ? code
        : word.Length == 3 && Codes.Contains(word) ? word.ToUpperInvariant() : null;
}
