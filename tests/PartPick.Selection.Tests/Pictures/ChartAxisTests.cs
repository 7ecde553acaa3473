using System.Globalization;
using PartPick.Values;

namespace PartPick.Selection.Tests.Pictures;

public class ChartAxisTests
{
    [Theory]
    [InlineData(-10, 60, 8, "-10 0 10 20 30 40 50 60")]
    [InlineData(-10, 60, 5, "0 20 40 60")]
    [InlineData(4.5, 5.5, 6, "4.6 4.8 5.0 5.2 5.4")]
    [InlineData(0, 0.37, 4, "0.0 0.1 0.2 0.3")]
    [InlineData(3.31, 3.34, 4, "3.31 3.32 3.33 3.34")]
    public void Ticks_stand_at_round_numbers(double from, double to, int most, string expected) =>
        Assert.Equal(expected, string.Join(' ', new ChartAxis("x", "V", from, to).Ticks(most).Select(tick => tick.Text)));

    [Fact]
    public void Ticks_are_counted_in_the_unit_of_the_heading_and_stand_at_values_in_SI()
    {
        var axis = new ChartAxis("error", "ppm", -90e-6, 90e-6) { UnitSize = 1e-6 };

        Assert.Equal("error (ppm)", axis.Heading);
        Assert.Equal(["-50", "0", "50"], axis.Ticks(4).Select(tick => tick.Text));
        Assert.Equal(-50e-6, axis.Ticks(4)[0].Value, 1e-15);
    }

    [Fact]
    public void Decades_have_prefixes()
    {
        var axis = new ChartAxis("current", "", 3e-10, 4e-3) { Logarithmic = Dimension.Current };

        Assert.Equal(["1 nA", "10 nA", "100 nA", "1 µA", "10 µA", "100 µA", "1 mA"], axis.Ticks(9).Select(tick => tick.Text));
        Assert.Equal(["1 nA", "100 nA", "10 µA", "1 mA"], axis.Ticks(4).Select(tick => tick.Text));
        Assert.Equal(0.5, axis.Place(Math.Sqrt(3e-10 * 4e-3)), 1e-9);
    }

    [Theory]
    [InlineData(0.0031, "ms")]
    [InlineData(2.5, "s")]
    [InlineData(4e-4, "µs")]
    public void Time_has_the_unit_that_suits_it(double seconds, string unit) => Assert.Equal(unit, ChartAxis.Time("time", seconds).Unit);

    [Fact]
    public void There_are_never_more_ticks_than_asked_for_and_all_lie_on_the_axis()
    {
        var random = new Random(7);
        for (int k = 0; k < 2000; k++)
        {
            double from = (random.NextDouble() - 0.5) * Math.Pow(10, random.Next(-8, 6));
            double to = from + random.NextDouble() * Math.Pow(10, random.Next(-4, 5)) + 1e-6;
            int most = random.Next(1, 12);
            AxisTick[] ticks = [.. new ChartAxis("x", "", from, to).Ticks(most)];
            Assert.True(ticks.Length <= most);
            Assert.All(ticks, tick => Assert.InRange(tick.Value, from - 1e-6 * (to - from), to + 1e-6 * (to - from)));
            Assert.Equal(ticks.Length, ticks.Select(tick => tick.Text).Distinct().Count());
            Assert.All(ticks, tick => Assert.Equal(
                tick.Value, double.Parse(tick.Text, CultureInfo.InvariantCulture), 1e-6 * (to - from)));
        }
    }
}
