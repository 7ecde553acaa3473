namespace PartPick.Catalog;

/// <summary>A fixed resistor.</summary>
public sealed record ResistorPart : Part
{
    /// <inheritdoc/>
    public override PartKind Kind => PartKind.Resistor;

    /// <summary>The nominal resistance, Ω.</summary>
    public required double ValueOhms { get; init; }

    /// <summary>The tolerance, a ratio to both sides.</summary>
    public required double ToleranceRatio { get; init; }
}
