using System.Globalization;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>Values inside sentences, with their units, to three digits.</summary>
internal static class Say
{
    public static string Hertz(double value) => ValueText.Format(value, Dimension.Frequency, 6);

    public static string Farads(double value) => ValueText.Format(value, Dimension.Capacitance);

    public static string Ohms(double value) => ValueText.Format(value, Dimension.Resistance);

    public static string Siemens(double value) => ValueText.Format(value, Dimension.Transconductance);

    public static string Volts(double value) => ValueText.Format(value, Dimension.Voltage);

    public static string Amps(double value) => ValueText.Format(value, Dimension.Current);

    public static string Watts(double value) => ValueText.Format(value, Dimension.Power);

    public static string Celsius(double value) => ValueText.Format(value, Dimension.Temperature);

    public static string Seconds(double value) => ValueText.Format(value, Dimension.Time);

    /// <summary>An amount of money: two decimals, more where it has them.</summary>
    public static string Money(decimal amount) => amount.ToString("0.00##", CultureInfo.InvariantCulture);

    /// <summary>A plain number to three digits, never with an exponent below a million.</summary>
    public static string Number(double value) => ValueText.Format(value, Dimension.Number);

    /// <summary>A ratio in ppm with its sign, one decimal.</summary>
    public static string SignedPpm(double ratio) => (ratio * 1e6).ToString("+0.0;-0.0;0.0", CultureInfo.InvariantCulture) + " ppm";

    /// <summary>A list in words: "a, b and c".</summary>
    public static string List(IReadOnlyList<string> words) => words.Count < 2
        ? string.Concat(words)
        : string.Join(", ", words.Take(words.Count - 1)) + " and " + words[^1];
}
