namespace PartPick.Values;

/// <summary>Prints values with prefixes and units.</summary>
internal static class ValueWriter
{
    public static string Write(double value, Dimension dimension, int? significantDigits)
    {
        if (!double.IsFinite(value))
        {
            return double.IsNaN(value) ? "NaN" : value < 0 ? "-∞" : "∞";
        }

        DecimalDigits digits = DecimalDigits.Of(value, significantDigits);
        UnitTable table = UnitTable.Of(dimension);
        (int power, string unit) = dimension switch
        {
            Dimension.Relative => Ratio(digits, ""),
            Dimension.RelativePerKelvin => (-6, "ppm/K"),
            Dimension.RelativePerSquareKelvin => (-6, "ppm/K²"),
            Dimension.Temperature => (0, "°C"),
            Dimension.Number or Dimension.Count => (0, ""),
            _ => Prefixed(digits, table),
        };
        string number = digits.ScaledBy(-power).ToPlainText();
        return unit.Length == 0 ? number : $"{number} {unit}";
    }

    private static (int Power, string Unit) Ratio(DecimalDigits digits, string suffix) => digits switch
    {
        { Digits: "0" } => (-6, "ppm" + suffix),
        { Power: >= -3 } => (-2, "%" + suffix),
        { Power: >= -7 } => (-6, "ppm" + suffix),
        _ => (-9, "ppb" + suffix),
    };

    private static (int Power, string Unit) Prefixed(DecimalDigits digits, UnitTable table)
    {
        int power = (int)Math.Floor(digits.Power / 3.0) * 3;
        int fit = Math.Min(power, table.LargestPrefix < 0 && power > table.LargestPrefix ? 0 : table.LargestPrefix);

        // Far below the smallest prefix the number has an exponent, and no prefix beside it.
        fit = fit < Prefix.Smallest ? 0 : fit;
        return (fit, Prefix.Write(fit) + table.Symbol);
    }
}
