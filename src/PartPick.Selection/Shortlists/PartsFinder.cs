using System.Collections.Immutable;
using System.Text.Json.Nodes;
using PartPick.Catalog;
using PartPick.Physics.Circuits;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>
/// Finds the parts of the catalogue that a circuit of plain values is made of. Where several have the same figures the cheapest
/// for the build is taken, and that is said.
/// </summary>
internal sealed class PartsFinder
{
    private const double Equal = 1e-6;

    private readonly CircuitDescription _circuit;
    private readonly string _where;
    private readonly PartsCatalog _catalog;
    private readonly Market _market;
    private readonly ImmutableArray<string>.Builder _remarks;
    private Problem? _problem;

    private PartsFinder(
        CircuitDescription circuit, string where, PartsCatalog catalog, Market market, ImmutableArray<string>.Builder remarks)
    {
        _circuit = circuit;
        _where = where;
        _catalog = catalog;
        _market = market;
        _remarks = remarks;
    }

    /// <summary>The parts, or what has none.</summary>
    public static Result<(CandidateParts Choice, SupportParts? Support)> Find(
        CircuitDescription circuit, string where, PartsCatalog catalog, Market market, ImmutableArray<string>.Builder remarks) =>
        new PartsFinder(circuit, where, catalog, market, remarks).Find();

    private Result<(CandidateParts Choice, SupportParts? Support)> Find()
    {
        OscillatorCircuit circuit = _circuit.Circuit;
        CrystalPart? crystal = _circuit.Crystal ?? Cheapest("crystal", _catalog.Crystals.Where(IsThisCrystal), "crystal");
        Part? amplifier = _circuit.Amplifier ?? Cheapest("amplifier", _catalog.All.Where(IsThisAmplifier), "amplifier");
        CapacitorPart? c1 = _circuit.C1 ?? Capacitor("c1", circuit.C1Farads);
        CapacitorPart? c2 = _circuit.C2 ?? Capacitor("c2", circuit.C2Farads);
        var follower = circuit as FollowerCircuit;
        if (follower?.EmitterCurrentAmps is not null)
        {
            Fail("emitterCurrent", "is given in the place of the bias", "bias resistors: the list orders parts");
        }

        if (follower is not null && double.IsFinite(follower.LoadOhms))
        {
            Fail("rl", "is a load of its own", "a follower without it, as the ranking makes them");
        }

        ResistorPart? series = Resistor("rs", (circuit as GateCircuit)?.SeriesOhms ?? 0);
        ResistorPart? top = Resistor(_circuit.Kind == CircuitKind.Follower ? "rbTop" : "rb", follower?.BaseTopOhms ?? 0);
        ResistorPart? bottom = Resistor("rbBottom", follower?.BaseBottomOhms ?? 0);
        ResistorPart? emitter = Resistor("re", follower?.EmitterOhms ?? 0);
        ResistorPart? feedback = Resistor("rf", (circuit as GateCircuit)?.FeedbackOhms ?? 0);
        if (_circuit.Kind == CircuitKind.Counter && amplifier is CounterPart counter && !counter.Taps.Contains(_circuit.Tap))
        {
            Fail("tap", $"{counter.Id} has no pin at stage {_circuit.Tap}", "one of " + string.Join(", ", counter.Taps));
        }
        else if (_circuit.Kind != CircuitKind.Counter && _circuit.Tap != 0)
        {
            Fail("tap", "only a counter divides", "0, or a counter");
        }

        if (_problem is not null)
        {
            return Result.Fail<(CandidateParts, SupportParts?)>(_problem);
        }

        var choice = new CandidateParts
        {
            Circuit = _circuit.Kind,
            Tap = _circuit.Tap,
            Crystal = crystal!,
            Amplifier = amplifier!,
            C1 = c1!,
            C2 = c2!,
            Series = series,
            BaseTop = top,
            BaseBottom = bottom,
            Emitter = emitter,
        };
        SupportParts usual = SupportParts.For(_circuit.Kind, crystal!.FrequencyHz, _market);
        return Result.Ok<(CandidateParts, SupportParts?)>((choice, usual with { Feedback = feedback ?? usual.Feedback }));
    }

    private bool IsThisCrystal(CrystalPart part) => Same(
        CrystalFields.Write(PartPhysics.Crystal(part), PartPhysics.Ratings(part)),
        CrystalFields.Write(_circuit.Circuit.Crystal, _circuit.Ratings));

    private bool IsThisAmplifier(Part part) => (_circuit.Circuit, part) switch
    {
        (FollowerCircuit follower, TransistorPart transistor) =>
            Same(TransistorFields.Write(PartPhysics.Transistor(transistor)), TransistorFields.Write(follower.Transistor)),
        (GateCircuit gate, AmplifierPart device) when IsOfKind(device) =>
            PartPhysics.Inverter(device, gate.SupplyVolts) is { IsOk: true } typical
            && Same(InverterFields.Write(typical.Value), InverterFields.Write(gate.Inverter)),
        _ => false,
    };

    private bool IsOfKind(AmplifierPart part) => _circuit.Kind switch
    {
        CircuitKind.Gate => part is InverterPart,
        CircuitKind.Counter => part is CounterPart,
        _ => part is PortPart,
    };

    private CapacitorPart? Capacitor(string place, double farads) => Cheapest(
        place, _catalog.Capacitors.Where(part => Near(part.ValueFarads, farads)), "capacitor of " + Say.Farads(farads));

    // Zero and infinite ohms are no part: a wire, and nothing.
    private ResistorPart? Resistor(string place, double ohms) => ohms > 0 && double.IsFinite(ohms)
        ? Cheapest(place, _catalog.Resistors.Where(part => Near(part.ValueOhms, ohms)), "resistor of " + Say.Ohms(ohms))
        : null;

    private T? Cheapest<T>(string place, IEnumerable<T> fitting, string what)
        where T : Part
    {
        T[] parts =
        [
            .. fitting.OrderBy(part => _market.IsListed(part) && _market.Covers(part, 1) ? 0 : 1)
                .ThenBy(part => _market.UnitCost(part, 1))
                .ThenBy(part => part.Id, StringComparer.Ordinal),
        ];
        if (parts.Length == 0)
        {
            string figures = typeof(T) == typeof(CapacitorPart) || typeof(T) == typeof(ResistorPart) ? "" : " with these figures";
            string fits = typeof(T) == typeof(ResistorPart) ? "a value that it holds" : "the figures of a part, or { \"part\": \"ID\" }";
            Fail(place, $"the catalogue holds no {what}{figures}", fits);
            return null;
        }

        if (parts.Length > 1)
        {
            _remarks.Add($"{place}: {parts[0].Id} is the cheapest of {parts.Length} parts of these figures.");
        }

        return parts[0];
    }

    private void Fail(string key, string what, string fits) => _problem ??= new Problem(_where + key, what, fits);

    private static bool Near(double one, double other) => Math.Abs(one - other) <= Equal * Math.Abs(other);

    // A figure that the file leaves out is open; one that it gives has to be the part's.
    private static bool Same(JsonObject part, JsonObject given) => given.All(pair =>
        pair.Value is null || (part[pair.Key] is { } figure && Near(figure.GetValue<double>(), pair.Value.GetValue<double>())));
}
