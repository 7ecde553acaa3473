namespace PartPick.Catalog.Tests.BuiltIn;

public class SupplyPointTests
{
    private static AmplifierPart[] Logic => [.. BuiltInParts.Catalog.Inverters, .. BuiltInParts.Catalog.Counters];

    [Fact]
    public void Transconductance_rises_with_the_supply_and_its_limits_bracket_it() => Assert.All(
        BuiltInParts.Amplifiers.Where(part => part.Points[0].GmSiemens is not null),
        part =>
        {
            Assert.All(part.Points.Neighbours(), pair => Assert.True(pair.Second.GmSiemens > pair.First.GmSiemens, part.Id));
            Assert.All(part.Points, point =>
            {
                double spread = part.Stages == 1 ? 1.6 : 2.6;
                Assert.InRange(point.GmMinSiemens!.Value / point.GmSiemens!.Value, 0.39, 0.7);
                Assert.InRange(point.GmMaxSiemens!.Value / point.GmSiemens.Value, 1.35, spread);
            });
        });

    [Fact]
    public void The_clock_is_guaranteed_below_its_typical_figure_and_rises_with_the_supply() => Assert.All(Logic, part =>
    {
        Assert.All(part.Points, point => Assert.InRange(point.ClockHz!.Value / point.ClockMinHz!.Value, 1.4, 4));
        Assert.All(part.Points.Neighbours(), pair =>
            Assert.True(pair.Second.ClockMinHz > pair.First.ClockMinHz && pair.Second.ClockHz > pair.First.ClockHz, part.Id));
    });

    // HC 2 to 6, HCT 4.5 to 5.5, B series 3 to 18 V: JESD7A and JESD13-B as quoted by makers. The rest: common practice.
    [Theory]
    [InlineData("-HC", 2, 6)]
    [InlineData("-HCT", 4.5, 5.5)]
    [InlineData("-BS", 3, 18)]
    [InlineData("-FC", 2, 5.5)]
    [InlineData("-LV", 1.65, 5.5)]
    public void The_specified_supply_is_that_of_the_family(string family, double least, double most)
    {
        AmplifierPart[] parts = [.. Logic.Where(part => $"{part.Id}-".Contains(family + "-", StringComparison.Ordinal))];
        Assert.NotEmpty(parts);
        Assert.All(parts, part => Assert.Equal(least, part.Points[0].SupplyVolts));
        Assert.All(parts, part => Assert.InRange(part.Points[^1].SupplyVolts, least, most));
        Assert.All(parts, part => Assert.InRange(part.Points.Length, 3, 4));
    }

    [Fact]
    public void Buffered_inverters_state_the_gain_of_the_chain_behind_an_on_resistance()
    {
        InverterPart[] buffered = [.. BuiltInParts.Catalog.Inverters.Where(part => part.IsBuffered)];
        Assert.True(buffered.Length >= 4);
        Assert.All(buffered, part =>
        {
            Assert.All(part.Points, point =>
            {
                Assert.InRange(point.Gain!.Value, 1000, 10000);
                Assert.InRange(point.GmSiemens!.Value * point.RonOhms!.Value / point.Gain.Value, 0.99, 1.01);
                Assert.True(point.DelaySeconds > 1e-9 && point.RoOhms is null);
            });
            Assert.All(part.Points.Neighbours(), pair =>
                Assert.True(pair.Second.RonOhms < pair.First.RonOhms && pair.Second.DelaySeconds < pair.First.DelaySeconds, part.Id));
        });
    }

    [Fact]
    public void Unbuffered_inverters_come_in_every_supply_class() =>
        Assert.Equal(
            ["BS", "FC", "HC", "LV"],
            BuiltInParts.Catalog.Inverters.Where(part => !part.IsBuffered).Select(part => part.Id.Split('-')[1]).Distinct().Order());

    [Fact]
    public void Pin_capacitances_and_temperatures_are_plausible() => Assert.All(Logic, part =>
    {
        Assert.InRange(part.InputFarads!.Value / BuiltInParts.Pico, 2.5, 7.5);
        Assert.InRange(part.OutputFarads!.Value / BuiltInParts.Pico, 3, 8);
        Assert.InRange(part.FeedbackFarads!.Value / BuiltInParts.Pico, 0.2, 5.001);
        Assert.Equal(-40, part.TemperatureMinCelsius);
        Assert.Contains(part.TemperatureMaxCelsius, new double?[] { 85, 125 });
    });

    [Fact]
    public void A_buffered_chain_feeds_back_less_than_a_single_stage() => Assert.True(
        BuiltInParts.Catalog.Inverters.Where(part => part.IsBuffered).Max(part => part.FeedbackFarads)
        < BuiltInParts.Catalog.Inverters.Where(part => !part.IsBuffered).Min(part => part.FeedbackFarads));

    [Fact]
    public void Guaranteed_and_typical_figures_carry_their_marks() => Assert.All(Logic, part =>
    {
        Assert.Equal(Basis.Minimum, part.BasisOf("clockMin"));
        Assert.Equal(Basis.Typical, part.BasisOf("clock"));
        Assert.Equal(Basis.Typical, part.BasisOf("gm"));
        Assert.Contains(part.BasisOf("gmMin"), new[] { Basis.Minimum, Basis.Assumed });
        Assert.Contains(part.BasisOf("gmMax"), new[] { Basis.Maximum, Basis.Assumed });
    });
}
