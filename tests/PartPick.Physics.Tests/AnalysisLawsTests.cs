using PartPick.Physics.Circuits;
using PartPick.Physics.Devices;
using PartPick.Physics.Tests.Independent;

namespace PartPick.Physics.Tests;

/// <summary>Laws that hold exactly, or in the range stated, whatever the method of solution (arithmetic, no publication).</summary>
public sealed class AnalysisLawsTests
{
    private const double Pico = 1e-12;

    public static TheoryData<string> Kinds => ["one stage", "buffered", "follower"];

    [Theory]
    [MemberData(nameof(Kinds))]
    public void Scaling_every_admittance_scales_the_current_and_nothing_else(string kind)
    {
        const double Factor = 1.7;
        OscillatorCircuit circuit = Circuit(kind);
        OscillatorResult plain = OscillatorAnalysis.Analyse(circuit);
        OscillatorResult scaled = OscillatorAnalysis.Analyse(Scale(circuit, Factor, Factor, 1));

        Assert.NotNull(plain.Steady);
        Assert.NotNull(scaled.Steady);
        Same(plain.StartUp.Margin, scaled.StartUp.Margin, 1e-7);
        Same(plain.StartUp.NaturalHz, scaled.StartUp.NaturalHz, 1e-10);
        Same(plain.StartUp.CriticalSiemens!.Value * Factor, scaled.StartUp.CriticalSiemens!.Value, 1e-6);
        Same(plain.RunningMargin, scaled.RunningMargin, 0.01);
        Same(plain.Steady.FrequencyHz, scaled.Steady.FrequencyHz, 1e-7);
        Same(plain.Steady.CurrentRmsAmps * Factor, scaled.Steady.CurrentRmsAmps, 0.0025);
        Same(plain.Steady.OutputSwingVolts, scaled.Steady.OutputSwingVolts, 0.01);
    }

    [Theory]
    [MemberData(nameof(Kinds))]
    public void Scaling_time_scales_the_frequency_and_the_growth_and_nothing_else(string kind)
    {
        const double Factor = 2.3;
        OscillatorCircuit circuit = Circuit(kind);
        OscillatorResult plain = OscillatorAnalysis.Analyse(circuit);
        OscillatorResult scaled = OscillatorAnalysis.Analyse(Scale(circuit, 1, 1 / Factor, Factor));

        Assert.NotNull(plain.Steady);
        Assert.NotNull(scaled.Steady);
        Same(plain.StartUp.Margin, scaled.StartUp.Margin, 1e-7);
        Same(plain.StartUp.NaturalHz * Factor, scaled.StartUp.NaturalHz, 1e-10);
        Same(plain.StartUp.GrowthRatePerSecond * Factor, scaled.StartUp.GrowthRatePerSecond, 1e-5);
        Same(plain.Steady.FrequencyHz * Factor, scaled.Steady.FrequencyHz, 1e-7);
        Same(plain.Steady.CurrentRmsAmps, scaled.Steady.CurrentRmsAmps, 0.0025);
        Same(plain.Steady.OutputSwingVolts, scaled.Steady.OutputSwingVolts, 0.01);
    }

    [Fact]
    public void Growth_is_positive_exactly_between_the_critical_and_the_upper_gain()
    {
        var random = new Random(21);
        for (int k = 0; k < 60; k++)
        {
            OscillatorCircuit circuit = RandomCircuits.Next(random);
            StartUp found = OscillatorAnalysis.AnalyseStartUp(circuit);
            bool inside = found.CriticalSiemens is { } critical && found.TransconductanceSiemens > critical
                && !(found.UpperSiemens is { } upper && found.TransconductanceSiemens >= upper);

            Assert.True(inside == found.GrowthRatePerSecond > 0, $"{found}\n{circuit}");
        }
    }

    [Fact]
    public void The_small_signal_figures_are_the_same_through_either_door()
    {
        GateCircuit gate = Samples.StrongGate(3e-3, 5e3, 220);

        Assert.Equal(OscillatorAnalysis.AnalyseStartUp(gate), OscillatorAnalysis.Analyse(gate).StartUp);
        Assert.Equal(OscillatorAnalysis.FindSteadyState(gate), OscillatorAnalysis.Analyse(gate).Steady);
    }

    [Fact]
    public void Start_up_time_is_the_growth_from_the_thermal_current()
    {
        // ln(Î / √(kT/Lm)) / σ, k = 1.380649e-23 J/K (SI).
        GateCircuit gate = Samples.StrongGate(2e-3, 10e3, 1000);
        OscillatorResult found = OscillatorAnalysis.Analyse(gate);
        double thermal = Math.Sqrt(1.380649e-23 * 298.15 / gate.Crystal.InductanceHenries);
        double expected = Math.Log(found.Steady!.CurrentRmsAmps * Math.Sqrt(2) / thermal) / found.StartUp.GrowthRatePerSecond;

        Assert.Equal(StartKind.BuildsUp, found.Start);
        Same(expected, found.StartUpTimeSeconds!.Value, 1e-6);
    }

    [Fact]
    public void The_envelope_grows_with_twice_the_inductance_over_the_net_resistance()
    {
        // 55.45 mH and 20.53 Ω (Abracon ABM8-16.000MHz-10-1-U test report): 1/σ = 2 Lm/(Rn − Rm), to the first order in 1/Q.
        var crystal = new Crystal
        {
            NominalHz = 16e6, LoadFarads = 10 * Pico, ShuntFarads = 0.87 * Pico, MotionalFarads = 1.78e-15, ResistanceOhms = 20.53,
        };
        GateCircuit gate = Samples.ThreeCapacitors(5e-3) with { Crystal = crystal };
        StartUp found = OscillatorAnalysis.AnalyseStartUp(gate);

        Same((found.NegativeResistanceOhms - 20.53) / (2 * crystal.InductanceHenries), found.GrowthRatePerSecond, 2e-3);
    }

    [Theory]
    [InlineData("C1")]
    [InlineData("C2")]
    [InlineData("across")]
    public void More_capacitance_lowers_the_frequency_of_a_gate_of_moderate_gain(string where)
    {
        double last = double.MaxValue;
        foreach (double more in (double[])[0, 0.5, 1, 2, 4, 8])
        {
            GateCircuit gate = Samples.StrongGate(1.5e-3, 20e3, 0);
            gate = where switch
            {
                "C1" => gate with { C1Farads = gate.C1Farads + more * Pico },
                "C2" => gate with { C2Farads = gate.C2Farads + more * Pico },
                _ => gate with { Strays = gate.Strays with { AcrossFarads = gate.Strays.AcrossFarads + more / 4 * Pico } },
            };
            double frequency = OscillatorAnalysis.FindSteadyState(gate)!.FrequencyHz;

            Assert.True(frequency < last, $"{where} + {more} pF: {frequency} Hz after {last} Hz");
            last = frequency;
        }
    }

    [Fact]
    public void A_damping_resistor_above_the_reactance_lowers_the_drive()
    {
        // 25 pF at 4 MHz are 1.6 kΩ; below that a resistor can raise the drive, for it moves the phase as well.
        double last = double.MaxValue;
        foreach (double rs in (double[])[2200, 3300, 4700, 6800, 10e3])
        {
            double drive = OscillatorAnalysis.FindSteadyState(Samples.StrongGate(10e-3, 2e3, rs))!.DriveWatts;

            Assert.True(drive < last, $"{rs} Ω: {drive} W after {last} W");
            last = drive;
        }
    }

    private static OscillatorCircuit Circuit(string kind) => kind switch
    {
        "one stage" => Samples.StrongGate(3e-3, 5e3, 470),
        "buffered" => Samples.BufferedGate(40, 100, 2200, 5e-9),
        _ => Samples.FullFollower(100 * Pico) with { SupplyVolts = 15 },
    };

    /// <summary>Admittances by one factor, capacitances by another (their product with frequency), frequency by a third.</summary>
    private static OscillatorCircuit Scale(OscillatorCircuit circuit, double admittance, double capacitance, double frequency)
    {
        Crystal crystal = circuit.Crystal with
        {
            NominalHz = circuit.Crystal.NominalHz * frequency,
            ShuntFarads = circuit.Crystal.ShuntFarads * capacitance,
            MotionalFarads = circuit.Crystal.MotionalFarads * capacitance,
            ResistanceOhms = circuit.Crystal.ResistanceOhms / admittance,
        };
        var strays = new Strays(
            circuit.Strays.InputFarads * capacitance, circuit.Strays.OutputFarads * capacitance, circuit.Strays.AcrossFarads * capacitance);
        OscillatorCircuit common = circuit with
        {
            Crystal = crystal,
            Strays = strays,
            C1Farads = circuit.C1Farads * capacitance,
            C2Farads = circuit.C2Farads * capacitance,
        };
        return common switch
        {
            GateCircuit gate => gate with
            {
                SeriesOhms = gate.SeriesOhms / admittance,
                FeedbackOhms = gate.FeedbackOhms / admittance,
                Inverter = ScaleGain(gate.Inverter, admittance) with
                {
                    InputFarads = gate.Inverter.InputFarads * capacitance,
                    OutputFarads = gate.Inverter.OutputFarads * capacitance,
                    FeedbackFarads = gate.Inverter.FeedbackFarads * capacitance,
                    DelaySeconds = gate.Inverter.DelaySeconds / frequency,
                },
            },
            FollowerCircuit follower => follower with
            {
                BaseTopOhms = follower.BaseTopOhms / admittance,
                EmitterOhms = follower.EmitterOhms / admittance,
                EmitterCurrentAmps = follower.EmitterCurrentAmps * admittance,
                Transistor = follower.Transistor with
                {
                    JunctionFarads = follower.Transistor.JunctionFarads * capacitance,
                    CollectorFarads = follower.Transistor.CollectorFarads * capacitance,
                    TransitSeconds = follower.Transistor.TransitSeconds / frequency,
                    BaseSpreadingOhms = follower.Transistor.BaseSpreadingOhms / admittance,
                },
            },
            _ => common,
        };
    }

    private static Inverter ScaleGain(Inverter inverter, double admittance) => inverter switch
    {
        OneStageInverter one => one with { Gm = one.Gm * admittance, Ro = one.Ro / admittance },
        BufferedInverter buffered => buffered with { Ron = buffered.Ron / admittance },
        _ => inverter,
    };

    private static void Same(double expected, double found, double relative) =>
        Assert.True(
            Math.Abs(found - expected) <= relative * Math.Abs(expected),
            FormattableString.Invariant($"expected {expected:G12}, found {found:G12}, ratio − 1 = {found / expected - 1:E2}"));
}
