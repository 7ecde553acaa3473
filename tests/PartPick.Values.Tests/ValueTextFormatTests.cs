namespace PartPick.Values.Tests;

public sealed class ValueTextFormatTests
{
    [Theory]
    [InlineData(22e-12, Dimension.Capacitance, 3, "22 pF")]
    [InlineData(12e-15, Dimension.Capacitance, 3, "12 fF")]
    [InlineData(1.5, Dimension.Capacitance, 3, "1.5 F")]
    [InlineData(0, Dimension.Capacitance, 3, "0 F")]
    [InlineData(4.096e6, Dimension.Frequency, 4, "4.096 MHz")]
    [InlineData(3999876.54, Dimension.Frequency, 7, "3.999877 MHz")]
    [InlineData(999.96, Dimension.Resistance, 3, "1 kΩ")]
    [InlineData(4700, Dimension.Resistance, 3, "4.7 kΩ")]
    [InlineData(0.47, Dimension.Resistance, 3, "470 mΩ")]
    [InlineData(123456, Dimension.Resistance, 1, "100 kΩ")]
    [InlineData(1e-20, Dimension.Power, 3, "1e-20 W")]
    [InlineData(3e-5, Dimension.Relative, 3, "30 ppm")]
    [InlineData(-22.725e-6, Dimension.Relative, 4, "-22.73 ppm")]
    [InlineData(0.05, Dimension.Relative, 3, "5 %")]
    [InlineData(5e-8, Dimension.Relative, 3, "50 ppb")]
    [InlineData(3e-5, Dimension.RelativePerKelvin, 3, "30 ppm/K")]
    [InlineData(-10, Dimension.Temperature, 3, "-10 °C")]
    [InlineData(14.25, Dimension.Number, 3, "14.2")]
    [InlineData(200, Dimension.Count, 3, "200")]
    [InlineData(double.NaN, Dimension.Number, 3, "NaN")]
    [InlineData(double.NegativeInfinity, Dimension.Number, 3, "-∞")]
    public void Format_prints_engineering_prefixes_and_units(double value, Dimension dimension, int digits, string expected) =>
        Assert.Equal(expected, ValueText.Format(value, dimension, digits));

    [Theory]
    [InlineData(22e-12, -12, "22")]
    [InlineData(3e-5, -6, "30")]
    [InlineData(0.05, -2, "5")]
    [InlineData(1.5e-12, -15, "1500")]
    [InlineData(-3.4e-8, -6, "-0.034")]
    [InlineData(0, -12, "0")]
    [InlineData(1e20, 0, "1e20")]
    [InlineData(1.25e-20, 0, "1.25e-20")]
    public void FormatIn_prints_the_shortest_plain_number_in_the_unit(double value, int power, string expected) =>
        Assert.Equal(expected, ValueText.FormatIn(value, power));

    [Fact]
    public void FormatIn_refuses_what_is_no_number() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => ValueText.FormatIn(double.NaN, 0));
}
