using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>
/// The choice that makes a candidate: every part that the ranking varies. What else the circuit needs (feedback resistor,
/// decoupling, output coupling) follows from it.
/// </summary>
public sealed record CandidateParts
{
    /// <summary>The circuit.</summary>
    public required CircuitKind Circuit { get; init; }

    /// <summary>The crystal.</summary>
    public required CrystalPart Crystal { get; init; }

    /// <summary>Inverter, counter, port or transistor.</summary>
    public required Part Amplifier { get; init; }

    /// <summary>Divider stage whose output is taken; zero for the oscillator itself.</summary>
    public int Tap { get; init; }

    /// <summary>Load capacitor C1.</summary>
    public required CapacitorPart C1 { get; init; }

    /// <summary>Load capacitor C2.</summary>
    public required CapacitorPart C2 { get; init; }

    /// <summary>Damping resistor Rs; null for a direct connection, and in a follower.</summary>
    public ResistorPart? Series { get; init; }

    /// <summary>Bias resistor from the supply to the base; null outside a follower.</summary>
    public ResistorPart? BaseTop { get; init; }

    /// <summary>Bias resistor from the base to ground; null outside a follower and with one base resistor.</summary>
    public ResistorPart? BaseBottom { get; init; }

    /// <summary>Emitter resistor; null outside a follower.</summary>
    public ResistorPart? Emitter { get; init; }
}
