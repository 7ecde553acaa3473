using PartPick.Physics.Circuits;
using PartPick.Physics.Tests.Independent;

namespace PartPick.Physics.Tests;

/// <summary>
/// The integration in time, before the analysis is measured against it. Values: an earlier, separate integration in time of
/// the same circuits (arithmetic on the model's definitions, no publication).
/// </summary>
public sealed class SteadyInTimeTableTests
{
    [Theory]
    [InlineData(10e-3, 2e3, 1000, 14.226e-12)]
    [InlineData(10e-3, 2e3, 220, 13.225e-12)]
    [InlineData(10e-3, 2e3, 0, 13.288e-12)]
    [InlineData(3e-3, 5e3, 0, 15.305e-12)]
    public void The_load_of_four_strong_gates_is_measured_to_two_femtofarads(double gm, double ro, double rs, double load)
    {
        Oscillation oscillation = TimeDomain.Settle(Samples.StrongGate(gm, ro, rs))!;

        Assert.Equal(load, oscillation.LoadFarads, 2e-15);
    }

    [Fact]
    public void Halving_the_step_changes_the_load_by_less_than_a_femtofarad_and_the_current_by_less_than_a_thousandth()
    {
        GateCircuit gate = Samples.StrongGate(10e-3, 2e3, 220);
        Oscillation coarse = TimeDomain.Settle(gate, 256)!;
        Oscillation fine = TimeDomain.Settle(gate, 512)!;

        Assert.Equal(fine.LoadFarads, coarse.LoadFarads, 1e-15);
        Assert.Equal(fine.PeakAmps, coarse.PeakAmps, 1e-3 * fine.PeakAmps);
    }

    [Fact]
    public void The_steady_state_does_not_depend_on_the_amplitude_it_starts_from()
    {
        GateCircuit gate = Samples.StrongGate(3e-3, 5e3, 0);
        Oscillation above = TimeDomain.Settle(gate, startPeakAmps: 6e-3)!;
        Oscillation below = TimeDomain.Settle(gate, startPeakAmps: 0.5e-3)!;

        Assert.Equal(above.PeakAmps, below.PeakAmps, 1e-4 * above.PeakAmps);
        Assert.Equal(above.LoadFarads, below.LoadFarads, 2e-16);
    }

    [Fact]
    public void A_follower_driven_hard_settles_at_the_current_of_an_earlier_integration()
    {
        // Arithmetic on the model's definitions: 1.240 mA peak.
        Oscillation oscillation = TimeDomain.Settle(Samples.HardFollower)!;

        Assert.Equal(1.240e-3, oscillation.PeakAmps, 0.002e-3);
    }

    [Fact]
    public void A_gate_below_its_critical_gain_dies()
    {
        Assert.Null(TimeDomain.Settle(Samples.StrongGate(0.05e-3, 200e3, 0)));
    }
}
