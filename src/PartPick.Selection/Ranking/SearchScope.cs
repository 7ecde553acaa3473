using PartPick.Catalog;

namespace PartPick.Selection.Search;

/// <summary>Which circuits a requirement allows, and at which crystal frequencies their amplifiers give what is wanted.</summary>
internal sealed class SearchScope(Requirement requirement, PartsCatalog catalog)
{
    /// <summary>The circuits.</summary>
    public IEnumerable<CircuitKind> Kinds => requirement.Circuits.Distinct().Order().Where(kind => requirement.Waveform switch
    {
        Waveform.Sine => kind == CircuitKind.Follower,
        Waveform.Square => kind != CircuitKind.Follower,
        _ => true,
    });

    /// <summary>The amplifiers of a circuit, for sale or not.</summary>
    public IEnumerable<Part> Amplifiers(CircuitKind kind) => kind switch
    {
        CircuitKind.Gate => catalog.Inverters,
        CircuitKind.Counter => catalog.Counters,
        CircuitKind.Port => catalog.Ports,
        _ => catalog.Transistors,
    };

    /// <summary>The divider stages of an amplifier; stage 0 divides nothing.</summary>
    public static IEnumerable<int> Taps(Part amplifier) => (amplifier as CounterPart)?.Taps ?? [0];

    /// <summary>The wanted frequency at the crystal, in hertz, before a divider stage.</summary>
    public double TargetHz(int tap) => requirement.OutputHz * Math.Pow(2, tap);

    /// <summary>All wanted frequencies at the crystal, in hertz.</summary>
    public IEnumerable<double> TargetsHz => Kinds.SelectMany(Amplifiers).SelectMany(Taps).Distinct().Select(TargetHz);
}
