using PartPick.Values;

namespace PartPick.Catalog.Tests.BuiltIn;

public class CapacitorTests
{
    private const double LeastFarads = 1e-12;
    private const double MostFarads = 1e-9;

    private static CapacitorPart[] All => [.. BuiltInParts.Catalog.Capacitors];

    private static CapacitorPart[] ClassOne => [.. All.Where(capacitor => capacitor.Dielectric == "C0G")];

    [Theory]
    [InlineData("E24", 2)]
    [InlineData("E12", 3)]
    public void Every_value_of_the_series_comes_in_several_tolerances(string series, int grades) => Assert.All(
        PreferredSeries.Named(series).Value.ValuesBetween(LeastFarads, MostFarads),
        value => Assert.True(
            ClassOne.Where(capacitor => capacitor.ValueFarads == value)
                .Select(capacitor => (capacitor.ToleranceRatio, capacitor.ToleranceFarads)).Distinct().Count() >= grades,
            $"{value}"));

    [Fact]
    public void Every_value_is_a_preferred_one() => Assert.All(All, capacitor =>
    {
        PreferredSeries series = PreferredSeries.Named("E24").Value;
        Assert.Equal(series.Nearest(capacitor.ValueFarads), capacitor.ValueFarads);
    });

    [Fact]
    public void Below_ten_picofarads_the_tolerance_is_in_farads()
    {
        // Tolerance letters of IEC 60062 in public reference tables: B 0.1, C 0.25 pF; F, G, J, K, M 1, 2, 5, 10, 20 %.
        double[] picofarads = [0.05, 0.1, 0.25];
        double[] percent = [1, 2, 5, 10, 20];
        Assert.All(All, capacitor =>
        {
            if (capacitor.ValueFarads < 9.99e-12)
            {
                Assert.Null(capacitor.ToleranceRatio);
                Assert.Contains(Math.Round(capacitor.ToleranceFarads!.Value / BuiltInParts.Pico, 6), picofarads);
            }
            else
            {
                Assert.Null(capacitor.ToleranceFarads);
                Assert.Contains(Math.Round(capacitor.ToleranceRatio!.Value * 100, 6), percent);
            }
        });
    }

    [Fact]
    public void Only_class_one_states_a_temperature_coefficient() => Assert.All(All, capacitor =>
    {
        Assert.Contains(capacitor.Dielectric, new[] { "C0G", "X7R", "Y5V" });

        // EIA-198 letter table: C0G is 0 ± 30 ppm/K.
        Assert.Equal(capacitor.Dielectric == "C0G" ? 30e-6 : 0, capacitor.TemperatureCoefficientPerKelvin ?? 0, 1e-12);
        Assert.Equal(capacitor.Dielectric == "C0G", capacitor.TemperatureCoefficientPerKelvin is not null);
        Assert.Equal(50, capacitor.VoltageVolts);
    });

    [Theory]
    [InlineData(10e-9)]
    [InlineData(47e-9)]
    [InlineData(100e-9)]
    [InlineData(1e-6)]
    public void Decoupling_capacitors_are_there_and_in_stock(double farads) => Assert.Contains(
        All, capacitor => capacitor.Dielectric == "X7R" && Math.Abs(capacitor.ValueFarads / farads - 1) < 1e-9 && capacitor.Stock > 100);

    [Fact]
    public void Class_two_reaches_down_into_the_range_of_load_capacitors() => Assert.Contains(
        All, capacitor => capacitor.Dielectric != "C0G" && capacitor.ValueFarads is > 90e-12 and < 1e-9);

    [Fact]
    public void A_tighter_tolerance_never_costs_less()
    {
        int compared = 0;
        foreach (var group in ClassOne.GroupBy(capacitor => (capacitor.ValueFarads, capacitor.Package)))
        {
            var ordered = group.OrderBy(capacitor => capacitor.ToleranceRatio ?? (capacitor.ToleranceFarads / capacitor.ValueFarads));
            foreach (var (tight, loose) in ordered.Neighbours())
            {
                compared++;
                Assert.All([1, 10, 100, 1000], quantity => Assert.True(tight.CostEach(quantity) > loose.CostEach(quantity), tight.Id));
            }
        }

        Assert.True(compared >= 73);
    }
}
