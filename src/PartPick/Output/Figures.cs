using System.Globalization;

namespace PartPick.Output;

/// <summary>Plain numbers for columns whose heading names the unit; a dash where there is none.</summary>
internal static class Figures
{
    /// <summary>What stands for a figure that does not exist.</summary>
    public const string None = "-";

    /// <summary>A number with fixed decimals.</summary>
    /// <param name="value">The value in SI units; null for none.</param>
    /// <param name="unit">What one of the column's units is in SI.</param>
    /// <param name="decimals">Decimals.</param>
    public static string Fixed(double? value, double unit, int decimals) =>
        value is { } number && double.IsFinite(number)
            ? (number / unit).ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture)
            : None;

    /// <summary>A number to four digits without an exponent.</summary>
    public static string Short(double? value, double unit)
    {
        if (value is not { } number || !double.IsFinite(number))
        {
            return None;
        }

        double scaled = number / unit;
        double size = Math.Abs(scaled);
        int decimals = size == 0 ? 0 : Math.Clamp(3 - (int)Math.Floor(Math.Log10(size)), 0, 9);
        string text = scaled.ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
        return text.Contains('.', StringComparison.Ordinal) ? text.TrimEnd('0').TrimEnd('.') : text;
    }

    /// <summary>All digits that a number needs, for files; empty where there is none.</summary>
    public static string Exact(double? value) =>
        value is { } number && double.IsFinite(number) ? number.ToString("R", CultureInfo.InvariantCulture) : "";

    /// <summary>A whole number.</summary>
    public static string Whole(long value) => value.ToString(CultureInfo.InvariantCulture);

    /// <summary>A number of combinations, whole and with its thousands apart.</summary>
    public static string Count(double value) =>
        value < 1e15
            ? value.ToString("#,##0", CultureInfo.InvariantCulture).Replace(',', ' ')
            : value.ToString("0.###e0", CultureInfo.InvariantCulture);
}
