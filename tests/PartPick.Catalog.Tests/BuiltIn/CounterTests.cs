namespace PartPick.Catalog.Tests.BuiltIn;

public class CounterTests
{
    // Makers' data sheets: stages 4 to 10 and 12 to 14 of a 14-stage counter with oscillator have a pin.
    [Theory]
    [InlineData("CNT-14-BS")]
    [InlineData("CNT-14-HC")]
    [InlineData("CNT-14-HCT")]
    public void A_14_stage_counter_has_the_usual_taps(string id) =>
        Assert.Equal([4, 5, 6, 7, 8, 9, 10, 12, 13, 14], Counter(id).Taps.AsEnumerable());

    [Fact]
    public void A_24_stage_counter_divides_a_fast_crystal_down_to_seconds()
    {
        Assert.Equal(Enumerable.Range(16, 9), Counter("CNT-24-BS").Taps);

        // 2^22 = 4 194 304 and 2^24 = 16 777 216: arithmetic. 4.194304 MHz gives 1 Hz at stage 22.
        Assert.Equal(1, 4194304 / Math.Pow(2, 22));
        Assert.Contains(22, Counter("CNT-24-BS").Taps);
        Assert.Contains(BuiltInParts.Catalog.Crystals, crystal => crystal.FrequencyHz == 4194304);
    }

    // B series: 3.5 or 4, 8 or 10, 12 or 15 MHz guaranteed at 5, 10, 15 V, typically twice that (memory; "12 MHz at 15 V" seen).
    [Theory]
    [InlineData(5, 3.5e6, 4e6)]
    [InlineData(10, 8e6, 10e6)]
    [InlineData(15, 12e6, 15e6)]
    public void The_B_series_counter_is_as_fast_as_the_family(double supply, double least, double most)
    {
        SupplyPoint point = Assert.Single(Counter("CNT-14-BS").Points, point => point.SupplyVolts == supply);
        Assert.InRange(point.ClockMinHz!.Value, least, most);
        Assert.Equal(2 * point.ClockMinHz.Value, point.ClockHz!.Value, 1);
    }

    [Fact]
    public void At_12_V_the_B_series_counter_reaches_18_432_MHz_typically_and_not_by_guarantee()
    {
        CounterPart counter = Counter("CNT-14-BS");
        Assert.True(At(counter, 12, point => point.ClockMinHz!.Value) < 18.432e6);
        Assert.InRange(At(counter, 12, point => point.ClockHz!.Value), 18.432e6, 22e6);
    }

    [Fact]
    public void The_HC_counter_reaches_87_MHz_typically_at_5_V() =>
        // 87 MHz typical at 5 V: makers' data sheets.
        Assert.InRange(At(Counter("CNT-14-HC"), 5, point => point.ClockHz!.Value), 85e6, 89e6);

    // 74HC/HCT4060 data sheet, December 1990: about 1.5, 7, 10 mS (values from memory).
    [Theory]
    [InlineData(2, 1.5e-3)]
    [InlineData(4.5, 7e-3)]
    [InlineData(6, 10e-3)]
    public void The_HC_counter_has_the_usual_transconductance(double supply, double siemens) =>
        Assert.InRange(At(Counter("CNT-14-HC"), supply, point => point.GmSiemens!.Value), siemens * 0.9, siemens * 1.1);

    private static CounterPart Counter(string id) => Assert.Single(BuiltInParts.Catalog.Counters, counter => counter.Id == id);

    private static double At(CounterPart counter, double supply, Func<SupplyPoint, double> figure)
    {
        var (low, high) = counter.Points.Neighbours().First(pair => pair.Second.SupplyVolts >= supply);
        double share = (supply - low.SupplyVolts) / (high.SupplyVolts - low.SupplyVolts);
        return figure(low) + (share * (figure(high) - figure(low)));
    }
}
