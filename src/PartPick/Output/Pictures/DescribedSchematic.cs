using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Physics;
using PartPick.Physics.Circuits;
using PartPick.Screens;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Output;

/// <summary>
/// The schematic of a circuit that a file gives by its values: drawn as a candidate's is, with the file's own names in the places of
/// the designators.
/// </summary>
internal static class DescribedSchematic
{
    private static readonly Offer None = new("", [], 1, 1);

    /// <summary>The drawing.</summary>
    /// <param name="description">The circuit.</param>
    public static ImmutableArray<Line> Draw(CircuitDescription description)
    {
        OscillatorCircuit circuit = description.Circuit;
        CapacitorPart c1 = Capacitor("C1", circuit.C1Farads), c2 = Capacitor("C2", circuit.C2Farads);
        (GateCircuit? gate, FollowerCircuit? follower) = (circuit as GateCircuit, circuit as FollowerCircuit);
        ResistorPart? series = Resistor("Rs", gate?.SeriesOhms), feedback = Resistor("Rf", gate?.FeedbackOhms);
        ResistorPart? top = Resistor("RB1", follower?.BaseTopOhms), bottom = Resistor("RB2", follower?.BaseBottomOhms);
        ResistorPart? emitter = Resistor("RE", follower?.EmitterOhms);
        var crystal = new CrystalPart
        {
            Id = "Y1", Description = "", Offer = None, Cut = CrystalCut.AT, Overtone = 1, FrequencyHz = circuit.Crystal.NominalHz,
        };
        Part amplifier = description.Amplifier ?? new InverterPart { Id = "U1", Description = "", Offer = None, Stages = 1, Points = [] };
        var choice = new CandidateParts
        {
            Circuit = description.Kind, Crystal = crystal, Amplifier = amplifier, Tap = description.Tap,
            C1 = c1, C2 = c2, Series = series, BaseTop = top, BaseBottom = bottom, Emitter = emitter,
        };
        PartUse[] resistors =
        [
            .. new[] { series, top, bottom, emitter }.OfType<ResistorPart>().Select(part => Use(part, "")),
            .. feedback is null ? Array.Empty<PartUse>() : [Use(feedback, PartRoles.Feedback)],
        ];
        string frequency = ValueText.Format(circuit.Crystal.NominalHz, Dimension.Frequency, 8);
        return Schematic.Draw(
            Undecided(description, choice,
            [
                new PartUse("C1", "", c1, Farads(circuit.C1Farads)), new PartUse("C2", "", c2, Farads(circuit.C2Farads)), .. resistors,
                new PartUse(follower is null ? "U1" : "Q1", "", amplifier, ""), new PartUse("Y1", "", crystal, frequency),
            ]),
            Glyphs.Drawn);
    }

    // What a drawing asks a candidate for is there; nothing is known of corners and costs.
    private static Candidate Undecided(CircuitDescription description, CandidateParts choice, ImmutableArray<PartUse> parts) => new()
    {
        Id = "", Choice = choice, Parts = parts, Nominal = description.Circuit, Result = OscillatorAnalysis.Analyse(description.Circuit),
        Budget = null, Margin = new AtCorner(double.NaN, ""), Drive = null, StartUpTime = null, RatedDriveWatts = null,
        Cost = 0, Currency = "", Misses = [], Warnings = [],
    };

    private static PartUse Use(ResistorPart part, string role) =>
        new(part.Id, role, part, ValueText.Format(part.ValueOhms, Dimension.Resistance));

    private static CapacitorPart Capacitor(string name, double farads) =>
        new() { Id = name, Description = "", Offer = None, ValueFarads = farads };

    // Nothing stands where a resistor would be open or a wire.
    private static ResistorPart? Resistor(string name, double? ohms) => ohms is > 0 and < double.PositiveInfinity
        ? new ResistorPart { Id = name, Description = "", Offer = None, ValueOhms = ohms.Value, ToleranceRatio = 0 }
        : null;

    private static string Farads(double farads) => ValueText.Format(farads, Dimension.Capacitance);
}
