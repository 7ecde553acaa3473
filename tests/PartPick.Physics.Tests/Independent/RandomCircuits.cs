using PartPick.Physics.Circuits;
using PartPick.Physics.Devices;

namespace PartPick.Physics.Tests.Independent;

/// <summary>Circuits with values as they are built, drawn at random: gates of both kinds and followers of three kinds of bias.</summary>
internal static class RandomCircuits
{
    private const double Pico = 1e-12;

    public static OscillatorCircuit Next(Random random) => random.Next(4) switch
    {
        0 => OneStage(random),
        1 => Clock(random),
        2 => Buffered(random),
        _ => Follower(random),
    };

    public static OscillatorCircuit Next(Random random, string kind) => kind switch
    {
        "one stage" => OneStage(random),
        "clock" => Clock(random),
        "buffered" => Buffered(random),
        "follower" => Follower(random),
        _ => throw new ArgumentException("No such kind.", nameof(kind)),
    };

    /// <summary>
    /// The same circuit with a crystal of some fifteen hundred in quality, which settles soon in time; its motional capacitance
    /// stays a tenth of C0, so that harmonics still find it open. A given emitter current gets a supply that does not limit it,
    /// for the base's mean voltage is not defined then.
    /// </summary>
    public static OscillatorCircuit LowQuality(OscillatorCircuit circuit)
    {
        Crystal crystal = circuit.Crystal;
        double motional = 1 / (2 * Math.PI * crystal.NominalHz * crystal.ResistanceOhms * 1500);
        return (circuit is FollowerCircuit { EmitterCurrentAmps: not null } ? circuit with { SupplyVolts = 60 } : circuit) with
        {
            Crystal = crystal with { MotionalFarads = Math.Min(motional, crystal.ShuntFarads / 10) },
        };
    }

    public static double Transconductance(OscillatorCircuit circuit) => circuit switch
    {
        GateCircuit gate => gate.Inverter.TransconductanceSiemens,
        FollowerCircuit follower => FollowerBias.Of(follower).Transconductance,
        _ => throw new ArgumentException("No such circuit.", nameof(circuit)),
    };

    public static GateCircuit OneStage(Random random)
    {
        double gm = Between(random, 0.3e-3, 25e-3);
        return Gate(random, Megahertz(random)) with
        {
            Inverter = new OneStageInverter(gm, Chance(random, 0.15) ? double.PositiveInfinity : Between(random, 10, 100) / gm)
            {
                ThresholdVolts = Between(random, 0.4, 0.9),
                InputFarads = Between(random, 2, 8) * Pico,
                OutputFarads = Between(random, 2, 8) * Pico,
                FeedbackFarads = Chance(random, 0.3) ? 0 : Between(random, 0.1, 3) * Pico,
                DelaySeconds = Chance(random, 0.5) ? 0 : Between(random, 0.1e-9, 2e-9),
            },
        };
    }

    public static GateCircuit Buffered(Random random) => Gate(random, Megahertz(random)) with
    {
        Inverter = new BufferedInverter(Between(random, 30, 5000), Between(random, 20, 300))
        {
            InputFarads = Between(random, 2, 8) * Pico,
            OutputFarads = Between(random, 2, 8) * Pico,
            FeedbackFarads = Chance(random, 0.3) ? 0 : Between(random, 0.1, 1) * Pico,
            DelaySeconds = Between(random, 1e-9, 15e-9),
        },
    };

    public static GateCircuit Clock(Random random)
    {
        var crystal = new Crystal
        {
            NominalHz = 32768,
            LoadFarads = Between(random, 4, 12.5) * Pico,
            ShuntFarads = Between(random, 0.6, 2) * Pico,
            MotionalFarads = Between(random, 1.5e-15, 7e-15),
            ResistanceOhms = Between(random, 30e3, 90e3),
        };
        double gm = Between(random, 2e-6, 5e-3);
        return Gate(random, crystal) with
        {
            SeriesOhms = Chance(random, 0.4) ? 0 : Between(random, 20e3, 500e3),
            FeedbackOhms = Chance(random, 0.2) ? double.PositiveInfinity : Between(random, 5e6, 22e6),
            Inverter = new OneStageInverter(gm, Between(random, 10, 100) / gm)
            {
                InputFarads = Between(random, 2, 5) * Pico,
                OutputFarads = Between(random, 2, 5) * Pico,
                FeedbackFarads = Chance(random, 0.5) ? 0 : Between(random, 0.1, 1) * Pico,
            },
        };
    }

    public static FollowerCircuit Follower(Random random)
    {
        var circuit = new FollowerCircuit
        {
            Crystal = Megahertz(random),
            C1Farads = Between(random, 22, 330) * Pico,
            C2Farads = Between(random, 22, 330) * Pico,
            Strays = new Strays(0, Between(random, 1, 5) * Pico, Between(random, 0.3, 4) * Pico),
            SupplyVolts = Between(random, 4, 12),
            TemperatureCelsius = Between(random, 1, 125) - 40,
            LoadOhms = Chance(random, 0.5) ? double.PositiveInfinity : Between(random, 1e3, 50e3),
            EmitterOhms = Between(random, 470, 4700),
            Transistor = new Transistor
            {
                Beta = Between(random, 40, 400),
                JunctionFarads = Between(random, 4, 20) * Pico,
                TransitSeconds = Between(random, 0.2e-9, 0.8e-9),
                CollectorFarads = Between(random, 1, 6) * Pico,
                BaseSpreadingOhms = Chance(random, 0.3) ? 0 : Between(random, 10, 150),
                BaseEmitterVolts = Between(random, 0.6, 0.72),
            },
        };
        return random.Next(3) switch
        {
            0 => circuit with { BaseTopOhms = Between(random, 47e3, 470e3) },
            1 => circuit with { BaseTopOhms = Between(random, 10e3, 100e3), BaseBottomOhms = Between(random, 10e3, 100e3) },
            _ => circuit with { BaseTopOhms = Between(random, 47e3, 470e3), EmitterCurrentAmps = Between(random, 0.1e-3, 5e-3) },
        };
    }

    /// <summary>A value between two limits, even on a logarithmic scale.</summary>
    public static double Between(Random random, double low, double high) =>
        low * Math.Exp(random.NextDouble() * Math.Log(high / low));

    private static bool Chance(Random random, double share) => random.NextDouble() < share;

    private static Crystal Megahertz(Random random) => new()
    {
        NominalHz = Between(random, 1e6, 30e6),
        LoadFarads = Chance(random, 0.2) ? null : Between(random, 8, 32) * Pico,
        ShuntFarads = Between(random, 1, 7) * Pico,
        MotionalFarads = Between(random, 3e-15, 30e-15),
        ResistanceOhms = Between(random, 10, 300),
    };

    private static GateCircuit Gate(Random random, Crystal crystal) => new()
    {
        Crystal = crystal,
        C1Farads = Between(random, 4, 47) * Pico,
        C2Farads = Between(random, 4, 47) * Pico,
        Strays = new Strays(Between(random, 0.5, 4) * Pico, Between(random, 0.5, 4) * Pico, Between(random, 0.2, 2) * Pico),
        SupplyVolts = Between(random, 2.5, 6),
        SeriesOhms = Chance(random, 0.4) ? 0 : Between(random, 47, 4700),
        FeedbackOhms = Chance(random, 0.2) ? double.PositiveInfinity : Between(random, 0.47e6, 10e6),
        Inverter = new OneStageInverter(1e-3, 1e4),
    };
}
