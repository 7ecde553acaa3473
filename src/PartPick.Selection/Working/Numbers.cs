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

    /// <summary>A frequency to thirteen digits, for small differences.</summary>
    public static string Finely(double value) => ValueText.Format(value, Dimension.Frequency, 13);

    /// <summary>A ratio in ppm to six digits.</summary>
    public static string Ppm(double ratio) => Of(ratio * 1e6) + " ppm";

    /// <summary>A ratio in ppm as the screens show it: about three figures.</summary>
    public static string ShownPpm(double ratio)
    {
        double ppm = ratio * 1e6;
        string format = Math.Abs(ppm) >= 99.95 ? "0" : Math.Abs(ppm) >= 9.995 ? "0.0" : "0.00";
        return ppm.ToString(format, CultureInfo.InvariantCulture) + " ppm";
    }

    /// <summary>The size of a relative change per farad, in ppm/pF to six digits.</summary>
    public static string PerPicofarad(double perFarad) => Of(Math.Abs(perFarad) * 1e-12 * 1e6) + " ppm/pF";

    /// <summary>A margin as the lists show it, to two decimals.</summary>
    public static string Two(double value) => value.ToString("0.00", CultureInfo.InvariantCulture);

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
