using PartPick.Physics.Circuits;
using PartPick.Physics.Devices;

namespace PartPick.Physics.Tests.Independent;

/// <summary>Circuits that more than one test uses.</summary>
internal static class Samples
{
    public const double Pico = 1e-12;

    /// <summary>4 MHz series resonance, 100 Ω, 0.3 pF: a quality of about 1300, which settles soon in time.</summary>
    public static Crystal LowQuality => new()
    {
        NominalHz = 4e6, ShuntFarads = 5 * Pico, MotionalFarads = 0.3 * Pico, ResistanceOhms = 100,
    };

    /// <summary>28 pF at A, 25 pF at B, 5 pF at D, 7 pF across, 1 MΩ, 5 V, threshold 0.8 V.</summary>
    public static GateCircuit StrongGate(double gm, double ro, double rs) => new()
    {
        Crystal = LowQuality,
        C1Farads = 28 * Pico,
        C2Farads = 25 * Pico,
        Strays = new Strays(0, 0, 2 * Pico),
        SupplyVolts = 5,
        FeedbackOhms = 1e6,
        SeriesOhms = rs,
        Inverter = new OneStageInverter(gm, ro) { ThresholdVolts = 0.8, OutputFarads = 5 * Pico },
    };

    /// <summary>The same surroundings with a buffered inverter.</summary>
    public static GateCircuit BufferedGate(double gain, double ron, double rs, double delay) =>
        StrongGate(1e-3, 1e4, rs) with
        {
            Inverter = new BufferedInverter(gain, ron) { DelaySeconds = delay, OutputFarads = 5 * Pico },
        };

    /// <summary>8 MHz, 80 Ω, C0 7 pF, 20 pF on each side and nothing else: the network of published examples.</summary>
    public static GateCircuit ThreeCapacitors(double gm) => new()
    {
        Crystal = new Crystal
        {
            NominalHz = 8e6, LoadFarads = 10 * Pico, ShuntFarads = 7 * Pico, MotionalFarads = 1e-15, ResistanceOhms = 80,
        },
        C1Farads = 20 * Pico,
        C2Farads = 20 * Pico,
        SupplyVolts = 5,
        Inverter = new OneStageInverter(gm, double.PositiveInfinity),
    };

    /// <summary>A strong gate at 32.768 kHz with a tuning fork.</summary>
    public static GateCircuit StrongClock(double rs) => new()
    {
        Crystal = new Crystal
        {
            NominalHz = 32768,
            LoadFarads = 12.5 * Pico,
            ShuntFarads = 1.2 * Pico,
            MotionalFarads = 3.5e-15,
            ResistanceOhms = 50e3,
        },
        C1Farads = 25 * Pico,
        C2Farads = 24 * Pico,
        Strays = new Strays(0, 0, 1 * Pico),
        SupplyVolts = 5,
        FeedbackOhms = 10e6,
        SeriesOhms = rs,
        Inverter = new OneStageInverter(5e-3, 5e3) { OutputFarads = 5 * Pico, FeedbackFarads = 0.5 * Pico },
    };

    /// <summary>Base drive of some fifteen thermal voltages: 100 pF each, 11 pF across, 150 Ω, 0.3 mA given.</summary>
    public static FollowerCircuit HardFollower => new()
    {
        Crystal = LowQuality with { ResistanceOhms = 150 },
        C1Farads = 100 * Pico,
        C2Farads = 100 * Pico,
        Strays = new Strays(0, 0, 6 * Pico),
        SupplyVolts = 12,
        EmitterCurrentAmps = 0.3e-3,
        Transistor = new Transistor { Beta = 1e5 },
    };

    /// <summary>A follower of 1 mA with all its parts, its load capacitors to choose.</summary>
    public static FollowerCircuit FullFollower(double capacitors) => new()
    {
        Crystal = LowQuality,
        C1Farads = capacitors,
        C2Farads = capacitors,
        Strays = new Strays(0, 0, 6 * Pico),
        SupplyVolts = 5,
        BaseTopOhms = 100e3,
        EmitterOhms = 1e3,
        EmitterCurrentAmps = 1e-3,
        Transistor = new Transistor
        {
            Beta = 150,
            JunctionFarads = 8 * Pico,
            TransitSeconds = 0.5e-9,
            CollectorFarads = 4 * Pico,
            BaseSpreadingOhms = 50,
        },
    };
}
