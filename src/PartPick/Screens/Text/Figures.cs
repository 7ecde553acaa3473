using System.Globalization;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>Numbers as the screens print them.</summary>
public static class Figures
{
    /// <summary>A number with a fixed count of decimals.</summary>
    /// <param name="value">The number.</param>
    /// <param name="decimals">Digits after the point.</param>
    public static string Fixed(double value, int decimals) => double.IsFinite(value)
        ? value.ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture)
        : "-";

    /// <summary>A number with about three figures: 912, 41.2, 9.13, 0.83; thousands and more are whole.</summary>
    /// <param name="value">The number.</param>
    public static string Three(double value)
    {
        double size = Math.Abs(value);
        return Fixed(value, size >= 99.95 ? 0 : size >= 9.995 ? 1 : 2);
    }

    /// <summary>A ratio in ppm with about three figures, without the unit.</summary>
    /// <param name="ratio">The ratio.</param>
    public static string Ppm(double ratio) => Three(ratio * 1e6);

    /// <summary>A value and the limit beside it, in the limit's unit: "96 of 500 µW".</summary>
    /// <param name="value">The value.</param>
    /// <param name="limit">The limit, above zero.</param>
    /// <param name="dimension">What both measure.</param>
    public static (string Value, string Limit) OfLimit(double value, double limit, Dimension dimension)
    {
        string text = ValueText.Format(limit, dimension);
        int space = text.IndexOf(' ', StringComparison.Ordinal);
        double shown = double.Parse(space < 0 ? text : text[..space], NumberStyles.Float, CultureInfo.InvariantCulture);
        return (Three(value * shown / limit), text);
    }

    /// <summary>An amount of money.</summary>
    /// <param name="amount">The amount.</param>
    public static string Money(decimal amount) => amount.ToString("F2", CultureInfo.InvariantCulture);

    /// <summary>A large count: 31, 4200, 4.1 million.</summary>
    /// <param name="count">The count.</param>
    public static string Count(double count) => count switch
    {
        >= 999_950_000_000 => count.ToString("0.0E+0", CultureInfo.InvariantCulture),
        >= 999_950_000 => Fixed(count / 1e9, 1) + " billion",
        >= 999_950 => Fixed(count / 1e6, 1) + " million",
        _ => Fixed(count, 0),
    };

    /// <summary>Lines numbers up on their points: each text is filled on both sides to the same width.</summary>
    /// <param name="texts">The numbers; what is no number stands as if it were whole.</param>
    public static string[] LineUp(IReadOnlyCollection<string> texts)
    {
        ArgumentNullException.ThrowIfNull(texts);
        int whole = texts.Select(WholeLength).DefaultIfEmpty().Max();
        int part = texts.Select(text => text.Length - WholeLength(text)).DefaultIfEmpty().Max();
        return [.. texts.Select(text =>
            new string(' ', whole - WholeLength(text)) + text + new string(' ', part - text.Length + WholeLength(text)))];
    }

    private static int WholeLength(string text)
    {
        int point = text.IndexOf('.', StringComparison.Ordinal);
        return point < 0 ? text.Length : point;
    }
}
