namespace PartPick.Catalog.Tests.BuiltIn;

public class TransistorTests
{
    // kT/q at 298.15 K: SI exact constants.
    private const double ThermalVolts = 25.692579e-3;

    private static TransistorPart[] All => [.. BuiltInParts.Catalog.Transistors];

    [Fact]
    public void Classes_reach_from_100_MHz_to_5_GHz() => Assert.Equal(
        [100e6, 250e6, 300e6, 600e6, 1e9, 2.5e9, 5e9], All.Select(part => part.TransitionFrequencyHz!.Value).Distinct().Order());

    [Fact]
    public void Transit_time_and_capacitances_give_the_transition_frequency() => Assert.All(All, part =>
    {
        // fT = 1 / (2π (τF + (Cje + Cµ) / gm)), the textbook relation, at 10 mA.
        double charging = (part.CjeFarads!.Value + part.CmuFarads!.Value) * ThermalVolts / 10e-3;
        double frequency = 1 / (2 * Math.PI * (part.TfSeconds!.Value + charging));
        Assert.InRange(frequency / part.TransitionFrequencyHz!.Value, 0.97, 1.03);
        Assert.True(part.TfSeconds > charging, part.Id);
    });

    [Fact]
    public void Faster_transistors_have_less_of_everything_that_slows() => Assert.All(
        All.OrderBy(part => part.TransitionFrequencyHz).Neighbours().Where(pair => pair.First.TransitionFrequencyHz >= 300e6
            && pair.First.TransitionFrequencyHz < pair.Second.TransitionFrequencyHz),
        pair => Assert.True(pair.Second.CjeFarads < pair.First.CjeFarads && pair.Second.CmuFarads < pair.First.CmuFarads
            && pair.Second.RbbOhms < pair.First.RbbOhms && pair.Second.VoltageMaxVolts <= pair.First.VoltageMaxVolts, pair.Second.Id));

    [Fact]
    public void Current_gain_has_a_range() => Assert.All(All, part =>
    {
        Assert.InRange(part.BetaMin!.Value, 40, 250);
        Assert.InRange(part.Beta / part.BetaMin.Value, 1.3, 2.5);
        Assert.InRange(part.BetaMax!.Value / part.Beta, 1.3, 2.5);
    });

    // A general-purpose NPN type registered with JEDEC, makers' tables: fT ≥ 300 MHz, Cob ≤ 4 pF, Cib ≤ 8 pF, hFE ≥ 70 at 1 mA,
    // 100 to 300 at 10 mA.
    [Theory]
    [InlineData("TR-GP-0300-A")]
    [InlineData("TR-GP-0300-B")]
    public void The_300_MHz_class_keeps_the_registered_limits(string id)
    {
        TransistorPart part = Assert.Single(All, part => part.Id == id);
        Assert.True(part is
        {
            TransitionFrequencyHz: >= 300e6, CmuFarads: <= 4.0001e-12, CjeFarads: <= 8.0001e-12, BetaMin: >= 70, BetaMax: <= 300,
        });
        Assert.Equal(Basis.Minimum, part.BasisOf("transitionFrequency"));
    }

    [Fact]
    public void Base_voltage_and_limits_are_plausible() => Assert.All(All, part =>
    {
        Assert.InRange(part.VbeVolts!.Value, 0.62, 0.70);
        Assert.InRange(part.CurrentMaxAmperes!.Value, 0.03, 0.5);
        Assert.InRange(part.VoltageMaxVolts!.Value, 10, 60);
        Assert.InRange(part.RbbOhms!.Value, 5, 200);
        Assert.True(part is { TemperatureMinCelsius: <= -40, TemperatureMaxCelsius: >= 125 });
    });

    [Fact]
    public void Limits_of_the_current_gain_carry_their_marks() => Assert.All(All, part =>
        Assert.Equal(
            (Basis.Minimum, Basis.Typical, Basis.Maximum), (part.BasisOf("betaMin"), part.BasisOf("beta"), part.BasisOf("betaMax"))));
}
