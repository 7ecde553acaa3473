using PartPick.Catalog;
using PartPick.Physics;

namespace PartPick.Selection.Tests.Trade;

/// <summary>Common practice: 22 pF on each side, 220 Ω and 1 MΩ round an HC inverter run.</summary>
public class GateOfTheTradeTests
{
    // Common practice: from 2 V to 5 V at 4 MHz.
    [Theory]
    [InlineData("INV-HC-U-1", 2)]
    [InlineData("INV-HC-U-1", 3.3)]
    [InlineData("INV-HC-U-1", 5)]
    [InlineData("INV-HC-U-2", 2)]
    [InlineData("INV-HC-U-2", 5)]
    [InlineData("INV-HC-U-3", 2)]
    [InlineData("INV-HC-U-3", 5)]
    public void Four_megahertz_builds_up_on_an_unbuffered_inverter(string inverter, double supply) => Assert.All(
        Bench.FullSize(4e6),
        crystal =>
        {
            OscillatorResult found = OscillatorAnalysis.Analyse(Bench.Gate(crystal, inverter, supply, 220));

            Assert.Equal(StartKind.BuildsUp, found.Start);
            Assert.InRange(found.StartUp.Margin, 3, 40);
            Assert.InRange(found.Steady!.OutputSwingVolts / supply, 0.8, 1.3);
        });

    // Common practice: a buffered inverter runs too, where the supply's step kicks it.
    [Theory]
    [InlineData(2)]
    [InlineData(3.3)]
    [InlineData(5)]
    public void Four_megahertz_at_least_needs_a_disturbance_on_a_buffered_inverter(double supply) => Assert.All(
        Bench.FullSize(4e6),
        crystal =>
        {
            OscillatorResult found = OscillatorAnalysis.Analyse(Bench.Gate(crystal, "INV-HC-B-1", supply, 220));

            Assert.True(found.Start is StartKind.BuildsUp or StartKind.NeedsDisturbance, $"{crystal.Id}: {found.RunningMargin}");
            Assert.NotNull(found.Steady);
        });

    // Common practice: the same circuit runs at 8, 16 and 27 MHz.
    [Theory]
    [InlineData("INV-HC-U-1", 8e6)]
    [InlineData("INV-HC-U-1", 16e6)]
    [InlineData("INV-HC-U-1", 27e6)]
    [InlineData("INV-HC-B-1", 8e6)]
    [InlineData("INV-HC-B-1", 16e6)]
    [InlineData("INV-HC-B-1", 27e6)]
    public void The_same_circuit_runs_at_higher_frequencies(string inverter, double hertz)
    {
        CrystalPart[] crystals = Bench.FullSize(hertz);
        Assert.True(crystals.Length >= 2);
        Assert.All(crystals, crystal =>
        {
            OscillatorResult found = OscillatorAnalysis.Analyse(Bench.Gate(crystal, inverter, 5, 220));

            Assert.True(inverter == "INV-HC-B-1" ? found.Start != StartKind.None : found.Start == StartKind.BuildsUp, crystal.Id);
            Assert.InRange(found.Steady!.FrequencyHz / hertz - 1, -300e-6, 500e-6);
        });
    }
}
