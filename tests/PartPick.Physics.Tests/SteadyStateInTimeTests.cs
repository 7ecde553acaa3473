using PartPick.Physics.Circuits;
using PartPick.Physics.Devices;
using PartPick.Physics.Tests.Independent;

namespace PartPick.Physics.Tests;

/// <summary>
/// The steady state against an integration of the whole circuit in time (arithmetic on the model's definitions): current
/// within 1 % and load within 0.1 pF everywhere, and closer where the model states it.
/// </summary>
public sealed class SteadyStateInTimeTests
{
    private const double Pico = 1e-12;

    public static TheoryData<string> OneStageNames => [.. OneStageGates.Keys];

    public static TheoryData<string> BufferedNames => [.. BufferedGates.Keys];

    public static TheoryData<string> FollowerNames => [.. Followers.Keys];

    private static Dictionary<string, OscillatorCircuit> OneStageGates { get; } = new()
    {
        ["weak, no resistor"] = Samples.StrongGate(0.6e-3, 40e3, 0),
        ["moderate, no resistor"] = Samples.StrongGate(1.5e-3, 10e3, 0),
        ["moderate, 2.2 kΩ"] = Samples.StrongGate(2e-3, 10e3, 2200),
        ["strong, 470 Ω"] = Samples.StrongGate(15e-3, 1.5e3, 470),
        ["ideal output"] = WithInverter(new OneStageInverter(2e-3, double.PositiveInfinity) { OutputFarads = 4 * Pico }),
        ["channel modulation at its limit"] = WithInverter(new OneStageInverter(2e-3, 2e3) { OutputFarads = 4 * Pico }),
        ["feedback capacitance"] = WithInverter(
            new OneStageInverter(4e-3, 6e3) { InputFarads = 4 * Pico, OutputFarads = 5 * Pico, FeedbackFarads = 2 * Pico }),
        ["delay"] = WithInverter(new OneStageInverter(4e-3, 6e3) { OutputFarads = 5 * Pico, DelaySeconds = 4e-9 }) with
        {
            SeriesOhms = 330,
        },
        ["port of limited swing"] = WithInverter(new OneStageInverter(3e-3, 20e3) { OutputFarads = 4 * Pico, SwingVolts = 2.2 }),
        ["low supply"] = Samples.StrongGate(2e-3, 8e3, 0) with { SupplyVolts = 2.2 },
        ["low feedback resistor"] = Samples.StrongGate(3e-3, 5e3, 220) with { FeedbackOhms = 47e3 },
    };

    private static Dictionary<string, OscillatorCircuit> BufferedGates { get; } = new()
    {
        ["low gain, 1 kΩ"] = Samples.BufferedGate(20, 100, 1000, 5e-9),
        ["gain 100, 2.2 kΩ, 10 ns"] = Samples.BufferedGate(100, 80, 2200, 10e-9),
        ["gain 1000, 2.2 kΩ, 10 ns"] = Samples.BufferedGate(1000, 50, 2200, 10e-9),
        ["gain 1000, 4.7 kΩ, 15 ns"] = Samples.BufferedGate(1000, 50, 4700, 15e-9),
        ["gain 300, 1 kΩ, no delay"] = Samples.BufferedGate(300, 100, 1000, 0),
    };

    private static Dictionary<string, OscillatorCircuit> Followers { get; } = new()
    {
        ["given current, hard"] = Samples.HardFollower,
        ["given current, softer"] = Samples.HardFollower with { EmitterCurrentAmps = 0.08e-3 },
        ["given current, all parts"] = Samples.FullFollower(100 * Pico) with { SupplyVolts = 15 },
        ["one base resistor"] = OneResistor,
        ["one base resistor, free of the supply"] = OneResistor with
        {
            BaseTopOhms = 470e3,
            EmitterOhms = 4.7e3,
            SupplyVolts = 12,
            C1Farads = 220 * Pico,
            C2Farads = 220 * Pico,
        },
        ["divider, free of the supply"] = OneResistor with
        {
            BaseTopOhms = 100e3,
            BaseBottomOhms = 68e3,
            EmitterOhms = 3.3e3,
            SupplyVolts = 12,
            C1Farads = 220 * Pico,
            LoadOhms = 10e3,
        },
        ["one base resistor, hot"] = OneResistor with { TemperatureCelsius = 70 },
        ["divider with load"] = OneResistor with { BaseTopOhms = 47e3, BaseBottomOhms = 47e3, LoadOhms = 3.3e3, SupplyVolts = 9 },
        ["limited by the supply"] = OneResistor with { BaseTopOhms = 22e3, SupplyVolts = 3 },
    };

    private static FollowerCircuit OneResistor => Samples.FullFollower(82 * Pico) with
    {
        EmitterCurrentAmps = null,
        BaseTopOhms = 220e3,
        EmitterOhms = 2.2e3,
        SupplyVolts = 9,
    };

    [Theory]
    [InlineData(10e-3, 2e3, 1000)]
    [InlineData(10e-3, 2e3, 220)]
    [InlineData(10e-3, 2e3, 0)]
    [InlineData(3e-3, 5e3, 0)]
    public void Four_strong_gates_agree_to_a_hundredth_of_a_picofarad(double gm, double ro, double rs) =>
        TimeDomainAgreement.Check(Samples.StrongGate(gm, ro, rs), 0.003, 0.01 * Pico);

    [Theory]
    [MemberData(nameof(OneStageNames))]
    public void Gates_of_one_stage_agree(string name) => TimeDomainAgreement.Check(OneStageGates[name], 0.01, 0.1 * Pico);

    [Theory]
    [MemberData(nameof(BufferedNames))]
    public void Buffered_gates_agree(string name) => TimeDomainAgreement.Check(BufferedGates[name], 0.01, 0.1 * Pico);

    [Theory]
    [MemberData(nameof(FollowerNames))]
    public void Followers_agree(string name) => TimeDomainAgreement.Check(Followers[name], 0.01, 0.1 * Pico);

    [Fact]
    public void A_gate_below_its_critical_gain_has_no_steady_state() =>
        Assert.Null(OscillatorAnalysis.FindSteadyState(Samples.StrongGate(0.05e-3, 200e3, 0)));

    private static GateCircuit WithInverter(Inverter inverter) => Samples.StrongGate(1e-3, 1e4, 0) with { Inverter = inverter };
}
