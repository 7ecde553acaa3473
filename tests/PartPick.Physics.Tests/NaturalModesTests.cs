using MathNet.Numerics;
using PartPick.Physics.Circuits;
using PartPick.Physics.Tests.Independent;
using Complex = System.Numerics.Complex;

namespace PartPick.Physics.Tests;

/// <summary>The eigenvalue solution, before the analysis is measured against it.</summary>
public sealed class NaturalModesTests
{
    [Fact]
    public void Three_capacitors_have_the_window_of_the_closed_form()
    {
        // Vittoz, Degrauwe, Bitz, IEEE J. Solid-State Circuits 23(3), 1988 (formulas from memory, numbers arithmetic).
        GainWindow window = GainWindow.Of(Samples.ThreeCapacitors(1e-3));

        Assert.Equal(0.234199e-3, window.Critical!.Value, 0.234199e-3 * 1e-4);
        Assert.Equal(101.807e-3, window.Upper!.Value, 101.807e-3 * 2e-4);
    }

    [Theory]
    [InlineData(1e-3, -328.594, -1237.551)]
    [InlineData(5e-3, -835.663, -2025.955)]
    [InlineData(25e-3, -314.532, -2780.619)]
    public void Three_capacitors_have_the_impedance_of_the_closed_form(double gm, double real, double imaginary)
    {
        // Vittoz, Degrauwe, Bitz 1988 (formula from memory, numbers arithmetic).
        Complex impedance = SmallSignalNetwork.Of(Samples.ThreeCapacitors(gm), gm).Impedance(new Complex(0, 2 * Math.PI * 8e6));

        Assert.Equal(real, impedance.Real, 1e-3);
        Assert.Equal(imaginary, impedance.Imaginary, 1e-3);
    }

    [Fact]
    public void A_mode_zeroes_the_motional_branch_with_the_network()
    {
        // Arithmetic: the definition Rm + s Lm + 1/(s Cm) + Zc(s) = 0, by Newton's method from the eigenvalue.
        var random = new Random(5);
        for (int k = 0; k < 40; k++)
        {
            OscillatorCircuit circuit = RandomCircuits.Next(random);
            double gm = RandomCircuits.Transconductance(circuit);
            Complex s = NaturalModes.Mode(circuit, gm);
            Crystal crystal = circuit.Crystal;
            SmallSignalNetwork network = SmallSignalNetwork.Of(circuit, gm);
            Complex rest = crystal.ResistanceOhms + s * crystal.InductanceHenries
                + 1 / (s * crystal.MotionalFarads) + network.Impedance(s);
            Complex correction = rest / (2 * crystal.InductanceHenries);

            Assert.True(
                correction.Magnitude < 1e-9 * s.Imaginary
                && Math.Abs(correction.Real) < 2e-5 * crystal.ResistanceOhms / (2 * crystal.InductanceHenries),
                $"{circuit}: s {s}, still {correction}");
        }
    }

    [Fact]
    public void Without_delay_a_vanishing_delay_changes_nothing()
    {
        GateCircuit plain = Samples.StrongGate(3e-3, 5e3, 220);
        GateCircuit late = plain with { Inverter = plain.Inverter with { DelaySeconds = 1e-18 } };
        Complex a = NaturalModes.Mode(plain, 3e-3), b = NaturalModes.Mode(late, 3e-3);

        Assert.Equal(a.Imaginary, b.Imaginary, 1e-9 * a.Imaginary);
        Assert.Equal(a.Real, b.Real, 1e-5 * Math.Abs(a.Real));
    }

    [Theory]
    [InlineData(0, double.NegativeInfinity, 1)]
    [InlineData(100e3, 1.05, 1.15)]
    [InlineData(330e3, 6.05, 6.15)]
    public void A_strong_gate_at_32768_Hz_has_its_margins(double rs, double least, double most)
    {
        // Arithmetic on the model's definitions; that 220 to 330 kΩ is needed is common practice.
        GateCircuit gate = Samples.StrongClock(rs);

        Assert.InRange(NaturalModes.NegativeResistance(gate, 5e-3) / gate.Crystal.ResistanceOhms, least, most);
    }

    [Theory]
    [InlineData(22e-12, 0.08, 0.12)]
    [InlineData(100e-12, 6.45, 6.55)]
    public void A_follower_can_have_too_much_gain(double capacitors, double least, double most)
    {
        // Arithmetic on the model's definitions.
        FollowerCircuit follower = Samples.FullFollower(capacitors);

        Assert.InRange(NaturalModes.NegativeResistance(follower, FollowerBias.Of(follower).Transconductance) / 100, least, most);
    }

    [Theory]
    [InlineData(1, 0.89277993)]
    [InlineData(2, 1.39554932)]
    [InlineData(5, 1.78676627)]
    [InlineData(10, 1.89719965)]
    public void The_ratio_of_Bessel_functions_is_that_of_long_arithmetic(double x, double ratio)
    {
        // 40-digit arithmetic (no publication).
        Assert.Equal(ratio, 2 * SpecialFunctions.BesselI1(x) / SpecialFunctions.BesselI0(x), 1e-7);
    }
}
