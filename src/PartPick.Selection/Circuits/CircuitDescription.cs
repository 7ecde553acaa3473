using PartPick.Catalog;
using PartPick.Physics.Circuits;

namespace PartPick.Selection;

/// <summary>One circuit as a circuit file says it: the physics, the divider and target, and what is known of the parts.</summary>
public sealed record CircuitDescription
{
    /// <summary>The kind of circuit.</summary>
    public required CircuitKind Kind { get; init; }

    /// <summary>The circuit in the terms of the model.</summary>
    public required OscillatorCircuit Circuit { get; init; }

    /// <summary>Divider stage k whose output is taken: the frequency over 2 to the k. Zero for the oscillator itself.</summary>
    public int Tap { get; init; }

    /// <summary>Wanted output frequency in hertz; null where none is stated.</summary>
    public double? TargetHz { get; init; }

    /// <summary>The crystal's ratings.</summary>
    public CrystalRatings Ratings { get; init; } = CrystalRatings.None;

    /// <summary>The crystal of the catalogue; null where the file gives plain values.</summary>
    public CrystalPart? Crystal { get; init; }

    /// <summary>The amplifier of the catalogue; null where the file gives plain values.</summary>
    public Part? Amplifier { get; init; }

    /// <summary>C1 of the catalogue; null where the file gives a plain value.</summary>
    public CapacitorPart? C1 { get; init; }

    /// <summary>C2 of the catalogue; null where the file gives a plain value.</summary>
    public CapacitorPart? C2 { get; init; }

    /// <summary>Frequency in hertz that counts as right at the crystal: target times 2^tap, else the nominal frequency.</summary>
    public double ReferenceHz => TargetHz is { } target ? target * Math.Pow(2, Tap) : Circuit.Crystal.NominalHz;
}
