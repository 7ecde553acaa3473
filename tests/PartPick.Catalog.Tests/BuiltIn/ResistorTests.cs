using PartPick.Values;

namespace PartPick.Catalog.Tests.BuiltIn;

public class ResistorTests
{
    private static readonly PreferredSeries E24 = PreferredSeries.Named("E24").Value;

    private static ResistorPart[] All => [.. BuiltInParts.Catalog.Resistors];

    [Fact]
    public void Every_value_of_E24_from_one_ohm_to_22_megohms_is_there()
    {
        IReadOnlyList<double> wanted = E24.ValuesBetween(1, 22e6);

        // 7 decades of 24 values and 10 to 22 MΩ: arithmetic.
        Assert.Equal((7 * 24) + 9, wanted.Count);
        Assert.Equal(wanted, All.Select(resistor => resistor.ValueOhms).Distinct().Order());
    }

    [Fact]
    public void Up_to_ten_megohms_every_value_is_there_with_one_percent() => Assert.Equal(
        E24.ValuesBetween(1, 10e6),
        All.Where(resistor => Math.Abs(resistor.ToleranceRatio - 0.01) < 1e-9).Select(resistor => resistor.ValueOhms).Distinct().Order());

    [Fact]
    public void Tolerances_are_one_or_five_percent() =>
        Assert.All(All, resistor => Assert.Contains(Math.Round(resistor.ToleranceRatio * 100, 9), new[] { 1.0, 5 }));

    [Fact]
    public void A_tighter_tolerance_never_costs_less()
    {
        var pairs = All.GroupBy(resistor => (resistor.ValueOhms, resistor.Package))
            .SelectMany(group => group.OrderBy(resistor => resistor.ToleranceRatio).Neighbours()).ToArray();
        Assert.True(pairs.Length >= 80);
        Assert.All(pairs, pair => Assert.All(
            [1, 10, 100, 1000], quantity => Assert.True(pair.First.CostEach(quantity) > pair.Second.CostEach(quantity), pair.First.Id)));
    }
}
