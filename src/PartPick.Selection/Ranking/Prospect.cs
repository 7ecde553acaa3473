namespace PartPick.Selection.Search;

/// <summary>A combination of values that may still change the answer, and the choices of parts in it that may.</summary>
/// <param name="Spot">What the first look knows of it.</param>
/// <param name="Pairs">The choices of its load capacitors.</param>
internal sealed record Prospect(Spot Spot, List<CapacitorPair> Pairs);

/// <summary>A choice of two load capacitors and what is known of it so far: each figure is exact, or the best it could be.</summary>
internal sealed class CapacitorPair
{
    /// <summary>C1.</summary>
    public required Contender C1 { get; init; }

    /// <summary>C2.</summary>
    public required Contender C2 { get; init; }

    /// <summary>Cost per unit of the whole circuit.</summary>
    public required decimal Cost { get; init; }

    /// <summary>Frequency error, worst case, as a ratio: never more than the full analysis gives.</summary>
    public double ErrorRatio { get; set; }

    /// <summary>Start-up margin: never less than the full analysis gives.</summary>
    public double Margin { get; set; }

    /// <summary>Number of combinations of parts it stands for.</summary>
    public int Stands => C1.Stands * C2.Stands;
}
