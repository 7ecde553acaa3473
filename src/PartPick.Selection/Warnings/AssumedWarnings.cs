using PartPick.Catalog;
using PartPick.Physics.Circuits;
using PartPick.Physics.Devices;

namespace PartPick.Selection;

/// <summary>Says which figures of the parts are assumed: class defaults that no one has stated.</summary>
internal static class AssumedWarnings
{
    public static IEnumerable<string> Of(CircuitDescription description)
    {
        if (description.Crystal is { } crystal && Sentence(crystal, OfCrystal(description, crystal)) is { } first)
        {
            yield return first;
        }

        if (description.Amplifier is { } amplifier && Sentence(amplifier, OfAmplifier(description, amplifier)) is { } second)
        {
            yield return second;
        }
    }

    private static string? Sentence(Part part, IEnumerable<string?> figures)
    {
        string[] assumed = [.. figures.OfType<string>()];
        return assumed.Length == 0 ? null : $"Assumed, not stated, for {part.Id}: {Say.List(assumed)}.";
    }

    private static string?[] OfCrystal(CircuitDescription description, CrystalPart part) =>
    [
        If(part, "motional", part.MotionalFarads, "motional capacitance " + Say.Farads(description.Circuit.Crystal.MotionalFarads)),
        If(part, "shunt", part.ShuntFarads, "shunt capacitance " + Say.Farads(description.Circuit.Crystal.ShuntFarads)),
        If(part, "resistance", part.ResistanceOhms, "motional resistance " + Say.Ohms(description.Circuit.Crystal.ResistanceOhms)),
    ];

    private static string?[] OfAmplifier(CircuitDescription description, Part part) => description.Circuit switch
    {
        GateCircuit { Inverter: OneStageInverter inverter } =>
        [
            If(part, "gm", Transconductance(part), "transconductance " + Say.Siemens(inverter.Gm)),
            If(part, "ro", 0, "output resistance " + Say.Ohms(inverter.Ro)),
            If(part, "vt", (part as AmplifierPart)?.ThresholdVolts, "threshold " + Say.Volts(inverter.ThresholdVolts)),
            .. Pins(part, inverter),
        ],
        GateCircuit { Inverter: BufferedInverter inverter } =>
        [
            If(part, "gain", 0, "gain " + Say.Number(inverter.Gain)),
            If(part, "ron", 0, "on-resistance " + Say.Ohms(inverter.Ron)),
            If(part, "delay", 0, "excess delay " + Values.ValueText.Format(inverter.DelaySeconds, Values.Dimension.Time)),
            .. Pins(part, inverter),
        ],
        FollowerCircuit follower => OfTransistor(part, follower.Transistor),
        _ => [],
    };

    private static string?[] Pins(Part part, Inverter inverter) =>
    [
        If(part, "cin", (part as AmplifierPart)?.InputFarads, "input capacitance " + Say.Farads(inverter.InputFarads)),
        If(part, "cout", (part as AmplifierPart)?.OutputFarads, "output capacitance " + Say.Farads(inverter.OutputFarads)),
        If(part, "cf", 0, "feedback capacitance " + Say.Farads(inverter.FeedbackFarads)),
    ];

    private static string?[] OfTransistor(Part part, Transistor transistor) =>
    [
        If(part, "beta", 0, "current gain " + Say.Number(transistor.Beta)),
        If(part, "cje", 0, "emitter junction capacitance " + Say.Farads(transistor.JunctionFarads)),
        If(part, "tf", 0, "transit time " + Values.ValueText.Format(transistor.TransitSeconds, Values.Dimension.Time)),
        If(part, "cmu", 0, "base–collector capacitance " + Say.Farads(transistor.CollectorFarads)),
        If(part, "rbb", 0, "base resistance " + Say.Ohms(transistor.BaseSpreadingOhms)),
        If(part, "vbe", 0, "base–emitter voltage " + Say.Volts(transistor.BaseEmitterVolts)),
    ];

    // A port can be stated by its largest critical transconductance alone; its gm is then five times that, and assumed.
    private static double? Transconductance(Part part) => (part as AmplifierPart)?.Points[0].GmSiemens;

    private static string? If(Part part, string key, double? stated, string text) =>
        stated is null || part.BasisOf(key) == Basis.Assumed ? text : null;
}
