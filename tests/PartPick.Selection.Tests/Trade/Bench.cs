using PartPick.Catalog;
using PartPick.Physics;
using PartPick.Physics.Circuits;

namespace PartPick.Selection.Tests.Trade;

/// <summary>Circuits of built-in parts on a two-layer board, analysed as they are.</summary>
internal static class Bench
{
    public const double Pico = 1e-12;

    public static PartsCatalog Parts { get; } = PartsCatalog.BuiltIn();

    /// <summary>Full-size crystals of a frequency, for use on their fundamental.</summary>
    public static CrystalPart[] FullSize(double hertz) =>
        [.. Parts.Crystals.Where(part => part.FrequencyHz == hertz && part.Overtone == 1 && part.Holder == "HC-49/U")];

    public static CrystalPart Crystal(string id) => Parts.Crystals.Single(part => part.Id == id);

    /// <summary>A gate with equal capacitors and 1 MΩ, of a typical device.</summary>
    public static OscillatorCircuit Gate(CrystalPart crystal, string amplifier, double supply, double rs, double c = 22 * Pico) =>
        new GateCircuit
        {
            Crystal = CrystalModel.From(crystal).Crystal,
            C1Farads = c,
            C2Farads = c,
            SeriesOhms = rs,
            FeedbackOhms = 1e6,
            Strays = Board.TwoLayer.Strays,
            SupplyVolts = supply,
            Inverter = InverterModel.At((AmplifierPart)Parts.Find(amplifier)!, supply, DeviceStrength.Typical)!,
        };

    /// <summary>An emitter follower with equal capacitors and one base resistor, of a typical general-purpose transistor.</summary>
    public static OscillatorCircuit Follower(CrystalPart crystal, double supply, double c, double emitter, double baseOhms) =>
        new FollowerCircuit
        {
            Crystal = CrystalModel.From(crystal).Crystal,
            C1Farads = c,
            C2Farads = c,
            EmitterOhms = emitter,
            BaseTopOhms = baseOhms,
            Strays = Board.TwoLayer.Strays,
            SupplyVolts = supply,
            Transistor = TransistorModel.At((TransistorPart)Parts.Find("TR-GP-0300-A")!, DeviceStrength.Typical),
        };

    /// <summary>The warnings that go with a counter at a stage.</summary>
    public static string[] Warnings(CrystalPart crystal, string counter, double supply, double rs, int tap)
    {
        OscillatorCircuit circuit = Gate(crystal, counter, supply, rs);
        var description = new CircuitDescription
        {
            Kind = CircuitKind.Counter,
            Circuit = circuit,
            Tap = tap,
            Crystal = crystal,
            Amplifier = (AmplifierPart)Parts.Find(counter)!,
        };
        return [.. CircuitWarnings.Of(description, OscillatorAnalysis.Analyse(circuit))];
    }
}
