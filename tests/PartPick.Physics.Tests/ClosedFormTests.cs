using MathNet.Numerics;
using PartPick.Physics.Circuits;
using PartPick.Physics.Tests.Independent;
using Complex = System.Numerics.Complex;

namespace PartPick.Physics.Tests;

/// <summary>Closed forms that come near the steady state, and bounds that it keeps.</summary>
public sealed class ClosedFormTests
{
    [Fact]
    public void A_hard_driven_follower_comes_within_a_hundredth_and_a_half_of_the_Bessel_functions()
    {
        // Clarke & Hess, Communication Circuits, 1971 (from memory): Gm/gm = 2 I1(x)/(x I0(x)). The gain that the crystal needs
        // is the critical one; the amplitude follows from it, and the motional current from the linear network.
        FollowerCircuit follower = Samples.HardFollower;
        double gm = FollowerBias.Of(follower).Transconductance;
        double needed = GainWindow.Of(follower).Critical!.Value;
        double x = Amplitude(needed / gm);
        double closed = x * FollowerBias.Of(follower).ThermalVolts / BaseEmitterVoltsPerAmp(follower, needed);
        double found = OscillatorAnalysis.FindSteadyState(follower)!.CurrentRmsAmps * Math.Sqrt(2);

        // Arithmetic on the model's definitions: x near 15, 1.258 mA peak by the closed form, 1.240 in full.
        Assert.InRange(x, 14, 16);
        Assert.Equal(1.258e-3, closed, 0.002e-3);
        Assert.Equal(1.240e-3, found, 0.003e-3);
        Assert.InRange(found / closed, 0.985, 1.0);
    }

    [Theory]
    [InlineData(2, 3.32584810)]
    [InlineData(3, 5.41291667)]
    [InlineData(5, 9.45542186)]
    public void The_amplitude_of_a_gain_ratio_is_that_of_long_arithmetic(double ratio, double x)
    {
        // 40-digit arithmetic (no publication).
        Assert.Equal(x, Amplitude(1 / ratio), 1e-6);
    }

    [Theory]
    [InlineData(0.6e-3, 40e3)]
    [InlineData(1.5e-3, 10e3)]
    [InlineData(3e-3, 5e3)]
    [InlineData(10e-3, 2e3)]
    public void The_first_harmonic_at_the_output_stays_below_that_of_a_square_wave_from_rail_to_rail(double gm, double ro)
    {
        // Arithmetic: 2 VDD/π. The voltage at B = D follows from the current through the crystal's known impedance.
        GateCircuit gate = Samples.StrongGate(gm, ro, 0);
        SteadyState found = OscillatorAnalysis.FindSteadyState(gate)!;
        double omega = 2 * Math.PI * found.FrequencyHz;
        Crystal crystal = gate.Crystal;
        Complex motional = new(
            crystal.ResistanceOhms, omega * crystal.InductanceHenries - 1 / (omega * crystal.MotionalFarads));
        double current = found.CurrentRmsAmps * Math.Sqrt(2);
        Complex across = motional * current;
        Complex through = current + new Complex(0, omega * (crystal.ShuntFarads + gate.Strays.AcrossFarads)) * across;
        Complex input = through / new Complex(0, omega * gate.C1Farads);
        double output = (input + across).Magnitude;

        Assert.InRange(output, 0.5 * gate.SupplyVolts / 2, 2 * gate.SupplyVolts / Math.PI);
    }

    private static double Amplitude(double share) => MathNet.Numerics.RootFinding.Bisection.FindRoot(
        x => 2 * SpecialFunctions.BesselI1(x) / (x * SpecialFunctions.BesselI0(x)) - share, 1e-3, 200, 1e-12, 200);

    /// <summary>|V(B) − V(E)| per ampere of motional current, by the full matrix at the mode's frequency.</summary>
    private static double BaseEmitterVoltsPerAmp(FollowerCircuit follower, double gm)
    {
        double omega = NaturalModes.Mode(follower, gm).Imaginary;
        SmallSignalNetwork network = SmallSignalNetwork.Of(follower, gm);
        return (network.Voltage(new Complex(0, omega), 0) - network.Voltage(new Complex(0, omega), 1)).Magnitude;
    }
}
