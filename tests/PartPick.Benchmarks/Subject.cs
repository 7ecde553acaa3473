using PartPick.Catalog;
using PartPick.Physics.Circuits;
using PartPick.Selection;

namespace PartPick.Benchmarks;

/// <summary>A circuit of built-in parts that runs, as the ranking meets it: with its corners and a neighbour.</summary>
public sealed class Subject
{
    /// <summary>One step of E12: the distance between neighbours in a search.</summary>
    private const double NextValue = 1.2;

    private readonly CircuitTemplate _template;
    private readonly CircuitValues _values;

    private Subject(
        CircuitKind kind, string crystalId, string amplifierId, CircuitValues values,
        double supplyMinVolts = 4.5, double supplyMaxVolts = 5.5)
    {
        PartsCatalog catalog = PartsCatalog.BuiltIn();
        var crystal = (CrystalPart)catalog.Find(crystalId)!;
        Requirement = new Requirement
        {
            OutputHz = crystal.FrequencyHz,
            SupplyMinVolts = supplyMinVolts,
            SupplyMaxVolts = supplyMaxVolts,
        };
        SupportParts support = SupportParts.For(kind, crystal.FrequencyHz, new Market(catalog, Requirement.Builds));
        _values = values;
        _template = CircuitTemplate.Create(
            Requirement,
            kind,
            CrystalModel.From(crystal),
            catalog.Find(amplifierId)!,
            support.Feedback?.ValueOhms ?? double.PositiveInfinity)!;
        OperatingPoint nominal = OperatingPoint.Nominal(Requirement);
        Circuit = _template.At(values, nominal);
        Neighbour = _template.At(values with { C1Farads = values.C1Farads / NextValue }, nominal);
        Corner = _template.At(values, _template.AmplifierCorners[^1]);
    }

    /// <summary>The words by which subjects are chosen.</summary>
    public static IEnumerable<string> Names => ["gate", "buffered gate", "counter", "port", "follower"];

    /// <summary>Output frequency and supply; everything else is left to its default.</summary>
    public Requirement Requirement { get; }

    /// <summary>The nominal circuit.</summary>
    public OscillatorCircuit Circuit { get; }

    /// <summary>The same circuit with the next smaller C1.</summary>
    public OscillatorCircuit Neighbour { get; }

    /// <summary>The circuit with its strongest device at the highest supply (and ambient, where it matters).</summary>
    public OscillatorCircuit Corner { get; }

    /// <summary>The corners of the circuit with capacitors of 5 %; nothing is computed yet.</summary>
    public CornerAnalysis Corners() => new(_template, Requirement, _values, 0.05, 0.05);

    /// <summary>Finds a subject.</summary>
    /// <param name="name">One of <see cref="Names"/>.</param>
    public static Subject Named(string name) => name switch
    {
        "gate" => new(CircuitKind.Gate, "X-04M0-16-H49-30", "INV-HC-U-1", new CircuitValues(22e-12, 22e-12, 1000)),
        "buffered gate" => new(CircuitKind.Gate, "X-04M0-16-H49-30", "INV-HC-B-1", new CircuitValues(22e-12, 22e-12, 2200)),
        "counter" => new(CircuitKind.Counter, "X-04M096-20-H49-10", "CNT-14-HC", new CircuitValues(15e-12, 47e-12, 680)),
        "port" => new(CircuitKind.Port, "X-04M0-16-H49-30", "MCU-MHZ-A", new CircuitValues(22e-12, 22e-12), 3.0, 3.6),
        "follower" => new(CircuitKind.Follower, "X-04M0-16-H49-30", "TR-GP-0300-A", new CircuitValues(
            100e-12, 100e-12, BaseTopOhms: 100e3, EmitterOhms: 2.2e3)),
        _ => throw new ArgumentOutOfRangeException(nameof(name), name, "Not a subject."),
    };
}
