using System.Collections.Immutable;

namespace PartPick.Catalog;

/// <summary>A binary counter with an oscillator inverter.</summary>
public sealed record CounterPart : AmplifierPart
{
    /// <inheritdoc/>
    public override PartKind Kind => PartKind.Counter;

    /// <summary>The stages k that have a pin, ascending; the output of stage k is the frequency divided by 2 to the k.</summary>
    public required ImmutableArray<int> Taps { get; init; }
}
