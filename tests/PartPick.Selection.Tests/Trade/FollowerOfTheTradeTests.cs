using PartPick.Physics;

namespace PartPick.Selection.Tests.Trade;

/// <summary>Common practice: the one-transistor circuit, an emitter follower with the crystal from base to ground.</summary>
public class FollowerOfTheTradeTests
{
    // Common practice: 12 V and 4 MHz with 220 pF give a sine of a few volts peak to peak.
    [Theory]
    [InlineData(1000, 220e3)]
    [InlineData(2200, 100e3)]
    [InlineData(2200, 220e3)]
    [InlineData(4700, 100e3)]
    public void Four_megahertz_at_12_V_gives_a_few_volts(double emitter, double baseOhms) => Assert.All(
        Bench.FullSize(4e6),
        crystal =>
        {
            OscillatorResult found = OscillatorAnalysis.Analyse(Bench.Follower(crystal, 12, 220 * Bench.Pico, emitter, baseOhms));

            Assert.Equal(StartKind.BuildsUp, found.Start);
            Assert.InRange(found.Steady!.OutputSwingVolts, 2, 9);
        });

    // Common practice: it still starts at 1.2 V with a suitable bias.
    [Theory]
    [InlineData(100, 470, 22e3)]
    [InlineData(100, 1000, 22e3)]
    [InlineData(150, 470, 22e3)]
    [InlineData(150, 1000, 47e3)]
    public void It_starts_at_1_2_V_with_a_suitable_bias(double picofarads, double emitter, double baseOhms)
    {
        OscillatorResult found = OscillatorAnalysis.Analyse(
            Bench.Follower(Bench.Crystal("X-04M0-20-H49-10"), 1.2, picofarads * Bench.Pico, emitter, baseOhms));

        Assert.Equal(StartKind.BuildsUp, found.Start);
        Assert.InRange(found.StartUp.Margin, 3, 20);
        Assert.InRange(found.Steady!.OutputSwingVolts, 0.3, 1.3);
    }

    [Fact]
    public void It_has_no_bias_left_at_half_a_volt() => Assert.Equal(
        StartKind.None,
        OscillatorAnalysis.Analyse(Bench.Follower(Bench.Crystal("X-04M0-20-H49-10"), 0.5, 100 * Bench.Pico, 1000, 22e3)).Start);

    // Common practice: it runs to 27 MHz, with smaller capacitors at the higher frequencies.
    [Theory]
    [InlineData(8e6, 150)]
    [InlineData(16e6, 68)]
    [InlineData(27e6, 47)]
    public void It_runs_up_to_27_MHz(double hertz, double picofarads) => Assert.All(Bench.FullSize(hertz), crystal =>
    {
        OscillatorResult found = OscillatorAnalysis.Analyse(Bench.Follower(crystal, 12, picofarads * Bench.Pico, 2200, 100e3));

        Assert.Equal(StartKind.BuildsUp, found.Start);
        Assert.InRange(found.StartUp.Margin, 5, 40);
    });

    // Common practice: 150 to 220 pF are a usual choice at 4 MHz; 22 pF leave too much gain.
    [Theory]
    [InlineData(150)]
    [InlineData(180)]
    [InlineData(220)]
    public void Larger_capacitors_give_a_better_margin_than_22_pF(double picofarads) => Assert.All(Bench.FullSize(4e6), crystal =>
    {
        double large = Margin(picofarads);

        Assert.InRange(large, 5, 40);
        Assert.True(large > 4 * Margin(22), crystal.Id);

        double Margin(double value) =>
            OscillatorAnalysis.Analyse(Bench.Follower(crystal, 12, value * Bench.Pico, 2200, 220e3)).StartUp.Margin;
    });
}
