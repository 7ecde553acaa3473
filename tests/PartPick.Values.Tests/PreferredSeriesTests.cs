using CsCheck;

namespace PartPick.Values.Tests;

public sealed class PreferredSeriesTests
{
    // IEC 60063, the list from memory.
    [Fact]
    public void E24_is_the_listed_values() => Assert.Equal(
        [
            1.0, 1.1, 1.2, 1.3, 1.5, 1.6, 1.8, 2.0, 2.2, 2.4, 2.7, 3.0, 3.3, 3.6, 3.9, 4.3, 4.7, 5.1, 5.6, 6.2, 6.8, 7.5, 8.2, 9.1,
        ],
        Series("E24").MantissasOfDecade);

    // IEC 60063, from memory: eight entries differ from the rounded powers of ten.
    [Fact]
    public void E24_differs_from_the_formula_in_eight_values()
    {
        double[] formula = [.. Enumerable.Range(0, 24).Select(k => Math.Round(Math.Pow(10, k / 24.0), 1))];
        Assert.Equal([2.7, 3.0, 3.3, 3.6, 3.9, 4.3, 4.7, 8.2], Series("E24").MantissasOfDecade.Except(formula));
    }

    // IEC 60063, from memory.
    [Theory]
    [InlineData("E3", "1 2.2 4.7")]
    [InlineData("E6", "1 1.5 2.2 3.3 4.7 6.8")]
    [InlineData("E12", "1 1.2 1.5 1.8 2.2 2.7 3.3 3.9 4.7 5.6 6.8 8.2")]
    public void The_coarse_series_are_every_second_fourth_and_eighth_value(string name, string expected) => Assert.Equal(
        expected, string.Join(' ', Series(name).MantissasOfDecade.Select(value => ValueText.FormatExact(value, Dimension.Number))));

    // Arithmetic.
    [Theory]
    [InlineData("E24", 90.1)]
    [InlineData("E48", 183.13)]
    [InlineData("E96", 370.70)]
    [InlineData("E192", 745.99)]
    public void One_decade_has_the_known_sum(string name, double sum) =>
        Assert.Equal(sum, Series(name).MantissasOfDecade.Sum(), 1e-9);

    // The exception was seen in public engineering text; the rounding trap is arithmetic (10^(42/192) is 1.6548171).
    [Fact]
    public void E192_has_its_one_exception_and_rounds_once()
    {
        IReadOnlyList<double> values = Series("E192").MantissasOfDecade;
        Assert.Equal(9.20, values[185]);
        Assert.Equal(1.65, values[42]);
        int differing = Enumerable.Range(0, 192)
            .Count(k => Math.Abs(values[k] - Math.Pow(10, k / 192.0)) > 0.005);
        Assert.Equal(1, differing);
    }

    // Arithmetic.
    [Fact]
    public void The_fine_series_nest_and_thirteen_values_of_E24_are_not_in_E192()
    {
        Assert.Subset(Series("E96").MantissasOfDecade.ToHashSet(), Series("E48").MantissasOfDecade.ToHashSet());
        Assert.Subset(Series("E192").MantissasOfDecade.ToHashSet(), Series("E96").MantissasOfDecade.ToHashSet());
        Assert.Equal(13, Series("E24").MantissasOfDecade.Except(Series("E192").MantissasOfDecade).Count());
    }

    // Arithmetic: percent of the value looked for, halfway between two neighbours.
    [Theory]
    [InlineData("E3", 37.5)]
    [InlineData("E6", 20.0)]
    [InlineData("E12", 11.11)]
    [InlineData("E24", 7.143)]
    [InlineData("E48", 2.594)]
    [InlineData("E96", 1.481)]
    [InlineData("E192", 0.971)]
    public void The_largest_distance_to_the_nearest_value_is_known(string name, double percent)
    {
        PreferredSeries series = Series(name);
        double[] values = [.. series.ValuesBetween(1, 10)];
        double largest = values.Zip(values.Skip(1), (low, high) => (low + high) / 2)
            .Max(middle => Math.Abs(series.Nearest(middle) - middle) / middle);
        Assert.Equal(percent, 100 * largest, 0.006);
    }

    [Fact]
    public void Values_are_the_same_numbers_as_their_written_form()
    {
        Assert.Equal([10e-12, 12e-12, 15e-12, 18e-12, 22e-12], Series("E12").ValuesBetween(10e-12, 22e-12));
        Assert.Equal([8.2e3, 10e3, 12e3], Series("E12").ValuesBetween(8e3, 13e3));
        Assert.Empty(Series("E12").ValuesBetween(2, 1));
        Assert.Equal(10, Series("E12").Nearest(9.9));
        Assert.Equal(1e-12, Series("E12").Nearest(0.97e-12));
    }

    [Fact]
    public void Nearest_is_the_best_of_all_values_around() =>
        Gen.Select(Gen.OneOf(PreferredSeries.All.ToArray()), Gen.Double[0.011, 95]).Sample((series, value) =>
            series.Nearest(value) == series.ValuesBetween(0.001, 1000).MinBy(candidate => Math.Abs(candidate - value)));

    [Fact]
    public void An_unknown_series_is_a_problem_that_lists_the_known_ones()
    {
        Problem problem = PreferredSeries.Named("E13", "capacitorSeries").Problem!;
        Assert.Equal(
            "capacitorSeries: 'E13' is no series of preferred values; fits one of E3, E6, E12, E24, E48, E96, E192",
            problem.ToString());
        Assert.False(PreferredSeries.Named(null).IsOk);
        Assert.True(PreferredSeries.Named(" e24 ").IsOk);
    }

    [Theory]
    [InlineData(0)]
    [InlineData(-1)]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    public void Nearest_refuses_what_has_no_nearest_value(double value) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => Series("E12").Nearest(value));

    private static PreferredSeries Series(string name) => PreferredSeries.Named(name).Value;
}
