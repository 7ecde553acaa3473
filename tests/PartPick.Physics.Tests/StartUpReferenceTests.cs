using PartPick.Physics.Circuits;
using PartPick.Physics.Devices;
using PartPick.Physics.Tests.Independent;

namespace PartPick.Physics.Tests;

/// <summary>Start-up figures against published examples and closed forms.</summary>
public sealed class StartUpReferenceTests
{
    private const double Pico = 1e-12;

    [Fact]
    public void Three_capacitors_have_the_critical_and_the_upper_gain_of_the_closed_form()
    {
        // Vittoz, Degrauwe, Bitz, IEEE J. Solid-State Circuits 23(3), 1988 (formulas from memory, numbers arithmetic).
        StartUp found = OscillatorAnalysis.AnalyseStartUp(Samples.ThreeCapacitors(25e-3));

        Assert.Equal(0.234199e-3, found.CriticalSiemens!.Value, 1e-4 * 0.234199e-3);
        Assert.Equal(101.807e-3, found.UpperSiemens!.Value, 2e-4 * 101.807e-3);
    }

    [Fact]
    public void The_published_critical_gain_is_the_first_order_of_the_exact_one()
    {
        // ST AN2867 §3.4: 0.23 mS and a gain margin of 107 at 25 mS; its formula 4 R (2πf)² (C0 + CL)² is 0.233662 mS.
        StartUp found = OscillatorAnalysis.AnalyseStartUp(Samples.ThreeCapacitors(25e-3));

        Assert.Equal(0.233662e-3, found.CriticalSiemens!.Value, 0.003 * 0.233662e-3);
        Assert.Equal(107, found.GainMargin!.Value, 0.5);
    }

    [Fact]
    public void A_large_gain_margin_can_be_a_small_start_up_margin()
    {
        // Arithmetic on the model's definitions: 314.5 Ω over 80 Ω.
        StartUp found = OscillatorAnalysis.AnalyseStartUp(Samples.ThreeCapacitors(25e-3));

        Assert.Equal(3.93, found.Margin, 0.01);
        Assert.True(found.GainMargin > 100);
    }

    [Theory]
    [InlineData(1e-3, 328.594)]
    [InlineData(4.882933e-3, 835.898)]
    [InlineData(5e-3, 835.663)]
    [InlineData(25e-3, 314.532)]
    public void Three_capacitors_have_the_negative_resistance_of_the_closed_form(double gm, double expected)
    {
        // Vittoz, Degrauwe, Bitz 1988 (formula from memory, numbers arithmetic, at exactly 8 MHz).
        StartUp found = OscillatorAnalysis.AnalyseStartUp(Samples.ThreeCapacitors(gm));

        Assert.Equal(expected, found.NegativeResistanceOhms, 2e-4 * expected);
    }

    [Theory]
    [InlineData(90e3, 1.5, 5, 0.6447e-6)]
    [InlineData(90e3, 1.5, 9, 1.6824e-6)]
    [InlineData(90e3, 1.5, 12.5, 2.9910e-6)]
    [InlineData(80e3, 1.5, 4, 0.4103e-6)]
    [InlineData(60e3, 1.5, 9, 1.1216e-6)]
    [InlineData(70e3, 2, 4, 0.4272e-6)]
    public void Clock_crystals_have_the_published_critical_gain(double resistance, double shunt, double load, double expected)
    {
        // ST AN2867, Table 7, whose formula is first order in the losses: the exact network lies within a hundredth above.
        var circuit = new GateCircuit
        {
            Crystal = new Crystal
            {
                NominalHz = 32768,
                LoadFarads = load * Pico,
                ShuntFarads = shunt * Pico,
                MotionalFarads = 3e-15,
                ResistanceOhms = resistance,
            },
            C1Farads = 2 * load * Pico,
            C2Farads = 2 * load * Pico,
            SupplyVolts = 3,
            Inverter = new OneStageInverter(10e-6, double.PositiveInfinity),
        };
        double found = OscillatorAnalysis.AnalyseStartUp(circuit).CriticalSiemens!.Value;

        Assert.InRange(found / expected, 0.9998, 1.01);
    }

    [Theory]
    [InlineData(0, double.NegativeInfinity, 1)]
    [InlineData(100e3, 1.05, 1.15)]
    [InlineData(330e3, 6.05, 6.15)]
    public void A_strong_gate_at_32768_Hz_needs_its_resistor(double rs, double least, double most)
    {
        // Arithmetic on the model's definitions; that 220 to 330 kΩ is needed is common practice.
        StartUp found = OscillatorAnalysis.AnalyseStartUp(Samples.StrongClock(rs));

        Assert.InRange(found.Margin, least, most);
        Assert.Equal(least > 1, found.GrowthRatePerSecond > 0);
    }

    [Fact]
    public void A_strong_gate_at_32768_Hz_without_its_resistor_does_not_build_up() =>
        Assert.NotEqual(StartKind.BuildsUp, OscillatorAnalysis.Analyse(Samples.StrongClock(0)).Start);

    [Fact]
    public void A_follower_with_small_capacitors_has_too_much_gain()
    {
        // Arithmetic on the model's definitions.
        StartUp found = OscillatorAnalysis.AnalyseStartUp(Samples.FullFollower(22 * Pico));

        Assert.InRange(found.Margin, 0.08, 0.12);
        Assert.True(found.TransconductanceSiemens > 2 * found.UpperSiemens, $"{found}");
    }

    [Fact]
    public void The_same_follower_with_large_capacitors_builds_up()
    {
        // Arithmetic on the model's definitions.
        StartUp found = OscillatorAnalysis.AnalyseStartUp(Samples.FullFollower(100 * Pico));

        Assert.InRange(found.Margin, 6.45, 6.55);
        Assert.False(found.TransconductanceSiemens >= found.UpperSiemens, $"{found}");
    }

    [Fact]
    public void A_given_emitter_current_has_the_transconductance_of_the_exact_constants()
    {
        // SI constants: kT/q at 298.15 K is 25.692579 mV; IC = IE β/(β + 1).
        StartUp found = OscillatorAnalysis.AnalyseStartUp(Samples.FullFollower(100 * Pico));

        Assert.Equal(1e-3 * 150 / 151 / 25.692579e-3, found.TransconductanceSiemens, 1e-9);
    }
}
