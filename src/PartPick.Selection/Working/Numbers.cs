using System.Globalization;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>Numbers inside the working: enough digits to follow the arithmetic.</summary>
internal static class Numbers
{
    /// <summary>A plain number to six digits.</summary>
    public static string Of(double value) => value.ToString("G6", CultureInfo.InvariantCulture);

    /// <summary>A frequency to ten digits.</summary>
    public static string Hertz(double value) => ValueText.Format(value, Dimension.Frequency, 10);

    /// <summary>A value to six digits with prefix and unit.</summary>
    public static string Of(double value, Dimension dimension) => ValueText.Format(value, dimension, 6);

    /// <summary>A capacitance.</summary>
    public static string Farads(double value) => Of(value, Dimension.Capacitance);

    /// <summary>A resistance.</summary>
    public static string Ohms(double value) => Of(value, Dimension.Resistance);

    /// <summary>A transconductance.</summary>
    public static string Siemens(double value) => Of(value, Dimension.Transconductance);

    /// <summary>A complex resistance from its two parts.</summary>
    public static string Ohms(double real, double imaginary) =>
        $"{Of(real)} {(imaginary < 0 ? "-" : "+")} j{Of(Math.Abs(imaginary))} Ω";
}
