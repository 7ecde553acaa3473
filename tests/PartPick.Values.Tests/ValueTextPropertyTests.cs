using CsCheck;

namespace PartPick.Values.Tests;

public sealed class ValueTextPropertyTests
{
    private static readonly Gen<Dimension> AnyDimension = Gen.Enum<Dimension>();

    private static readonly Gen<string> LikeAValue =
        Gen.String[Gen.Char["0123456789.,eE+-±−pnuµmkKMGTfFRVΩHzppm%/KC° \t\u00A0²^"], 0, 12];

    [Theory]
    [InlineData(Dimension.Frequency)]
    [InlineData(Dimension.Capacitance)]
    [InlineData(Dimension.Resistance)]
    [InlineData(Dimension.Transconductance)]
    [InlineData(Dimension.Voltage)]
    [InlineData(Dimension.Current)]
    [InlineData(Dimension.Power)]
    [InlineData(Dimension.Time)]
    [InlineData(Dimension.Relative)]
    [InlineData(Dimension.RelativePerKelvin)]
    [InlineData(Dimension.RelativePerSquareKelvin)]
    [InlineData(Dimension.Number)]
    public void What_FormatExact_prints_reads_back_as_the_same_value(Dimension dimension) =>
        Gen.OneOf(Gen.Double.Where(double.IsFinite), EngineeringValue).Sample(value =>
            ValueText.Parse(ValueText.FormatExact(value, dimension), dimension, "field", allowNegative: true).Value == value);

    [Fact]
    public void Temperatures_and_counts_read_back_as_the_same_value()
    {
        Gen.Double[-273.15, 1e6].Sample(value =>
            ValueText.Parse(ValueText.FormatExact(value, Dimension.Temperature), Dimension.Temperature, "field").Value == value);
        Gen.Int[0, int.MaxValue].Sample(value =>
            ValueText.Parse(ValueText.FormatExact(value, Dimension.Count), Dimension.Count, "field").Value == value);
    }

    [Fact]
    public void Seventeen_digits_read_back_as_the_same_value() =>
        EngineeringValue.Sample(value =>
            ValueText.Parse(ValueText.Format(value, Dimension.Resistance, 17), Dimension.Resistance, "field", true).Value == value);

    [Fact]
    public void What_FormatIn_prints_ParseIn_reads_back_as_the_same_value() =>
        Gen.Select(EngineeringValue, Gen.Int[-15, 6]).Sample((value, power) =>
            ValueText.ParseIn(ValueText.FormatIn(value, power), Dimension.Number, power, "field", true).Value == value);

    [Fact]
    public void Three_printed_digits_are_within_half_a_percent() =>
        EngineeringValue.Sample(value =>
        {
            double read = ValueText.Parse(ValueText.Format(value, Dimension.Capacitance), Dimension.Capacitance, "field", true).Value;
            return Math.Abs(read - value) <= 0.00501 * Math.Abs(value);
        });

    [Fact]
    public void No_text_throws_and_every_value_read_is_finite() =>
        Gen.Select(Gen.OneOf(Gen.String, LikeAValue), AnyDimension, Gen.Bool).Sample((text, dimension, negative) =>
        {
            Result<double> result = ValueText.Parse(text, dimension, "field", negative);
            return result.IsOk
                ? double.IsFinite(result.Value)
                : !result.Problem.ToString().Contains('\n', StringComparison.Ordinal);
        });

    private static Gen<double> EngineeringValue => Gen.Select(Gen.Double[-10, 10], Gen.Int[-18, 14])
        .Select((mantissa, power) => mantissa * Math.Pow(10, power));
}
