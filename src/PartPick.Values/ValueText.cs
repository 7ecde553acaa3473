namespace PartPick.Values;

/// <summary>
/// Values as people write them, and as they are printed: plain SI numbers, prefix and unit, the letter code of IEC 60062.
/// Reading and printing never depend on the culture, and reading never throws on any text.
/// </summary>
public static class ValueText
{
    /// <summary>Reads a value.</summary>
    /// <param name="text">The text: <c>22e-12</c>, <c>22 pF</c>, <c>22p</c>, <c>4k7</c>, <c>4,7k</c>, <c>±30 ppm</c>.</param>
    /// <param name="dimension">What the field measures.</param>
    /// <param name="where">The name of the field, for the problem.</param>
    /// <param name="allowNegative">Whether a negative value makes sense here; a temperature may always be negative.</param>
    /// <returns>The value in the unit that <see cref="Dimension"/> names, or the problem.</returns>
    public static Result<double> Parse(string? text, Dimension dimension, string where, bool allowNegative = false) =>
        ParseIn(text, dimension, 0, where, allowNegative);

    /// <summary>Reads a value from a column whose plain numbers are in a scaled unit, such as pF.</summary>
    /// <param name="text">The text; a number without prefix and unit is in the scaled unit, all else as in <see cref="Parse"/>.</param>
    /// <param name="dimension">What the field measures.</param>
    /// <param name="plainPower">The power of ten of a plain number's unit: -12 where the column is in pF, -6 for ppm.</param>
    /// <param name="where">The name of the field, for the problem.</param>
    /// <param name="allowNegative">Whether a negative value makes sense here.</param>
    /// <returns>The value in the unit that <see cref="Dimension"/> names, or the problem.</returns>
    public static Result<double> ParseIn(
        string? text, Dimension dimension, int plainPower, string where, bool allowNegative = false)
    {
        ArgumentNullException.ThrowIfNull(where);
        UnitTable table = UnitTable.Of(dimension);
        if (ValueReader.Read(text ?? "", table, plainPower, out double value) is { } what)
        {
            return Result.Fail<double>(where, what, table.Fits);
        }

        string? unfit = dimension switch
        {
            Dimension.Temperature => value < -273.15 ? "is below absolute zero" : null,
            _ when value < 0 && !allowNegative => "is negative, which makes no sense here",
            Dimension.Count when value != Math.Floor(value) || value > int.MaxValue => "is not a whole number in range",
            _ => null,
        };
        return unfit is null
            ? Result.Ok(value)
            : Result.Fail<double>(where, $"{Problem.Quote(text)} {unfit}", table.Fits);
    }

    /// <summary>Prints a value with an engineering prefix and its unit: <c>22 pF</c>, <c>4.7 kΩ</c>, <c>30 ppm</c>.</summary>
    /// <param name="value">The value in the unit that <see cref="Dimension"/> names.</param>
    /// <param name="dimension">What it measures.</param>
    /// <param name="significantDigits">How many digits to keep, 1 to 17; zeros after the decimal point are left out.</param>
    /// <returns>The text, which <see cref="Parse"/> reads again (a value that is not finite gives NaN or ∞, which it does not).</returns>
    public static string Format(double value, Dimension dimension, int significantDigits = 3)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(significantDigits, 1);
        ArgumentOutOfRangeException.ThrowIfGreaterThan(significantDigits, 17);
        return ValueWriter.Write(value, dimension, significantDigits);
    }

    /// <summary>Prints a value with all the digits it needs, so that reading the text gives the same value.</summary>
    /// <param name="value">The value in the unit that <see cref="Dimension"/> names.</param>
    /// <param name="dimension">What it measures.</param>
    /// <returns>The text.</returns>
    public static string FormatExact(double value, Dimension dimension) => ValueWriter.Write(value, dimension, null);

    /// <summary>Prints the shortest plain number that <see cref="ParseIn"/> reads as the same value, without a unit.</summary>
    /// <param name="value">The value, finite, in the SI unit.</param>
    /// <param name="plainPower">The power of ten of the unit to print in: -12 for pF.</param>
    /// <returns>A decimal number; with an exponent where it is very long.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The value is not finite.</exception>
    public static string FormatIn(double value, int plainPower)
    {
        if (!double.IsFinite(value))
        {
            throw new ArgumentOutOfRangeException(nameof(value), value, "Only a finite value can be printed as a number.");
        }

        return DecimalDigits.Of(value, null).ScaledBy(-plainPower).ToPlainText();
    }
}
