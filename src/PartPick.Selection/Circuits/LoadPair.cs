using System.Collections.Immutable;

namespace PartPick.Selection;

/// <summary>One side of a pair: a capacitor, or two in parallel.</summary>
/// <param name="Parts">The capacitors in farads, ascending.</param>
public sealed record LoadSide(ImmutableArray<double> Parts)
{
    /// <summary>Their sum in farads.</summary>
    public double Farads { get; } = Parts.Sum();
}

/// <summary>Two load capacitors and what they give.</summary>
/// <param name="C1">One side, never the larger; the two may be swapped.</param>
/// <param name="C2">The other side.</param>
/// <param name="LoadFarads">The load reached, strays included, in farads.</param>
/// <param name="DeviationRatio">The load reached over the wanted one, less one.</param>
/// <param name="ShiftRatio">The frequency over the nominal one, less one, by the crystal's exact formula; null without a crystal.</param>
public sealed record LoadPair(LoadSide C1, LoadSide C2, double LoadFarads, double DeviationRatio, double? ShiftRatio)
{
    /// <summary>Whether both sides are the same.</summary>
    public bool IsEqual => C1.Farads == C2.Farads;

    /// <summary>Number of capacitors.</summary>
    public int Count => C1.Parts.Length + C2.Parts.Length;
}
