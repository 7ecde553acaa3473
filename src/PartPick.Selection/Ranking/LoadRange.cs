namespace PartPick.Selection.Search;

/// <summary>Bounds of the load capacitance seen by the crystal, in farads.</summary>
/// <param name="Lowest">Least.</param>
/// <param name="Highest">Largest.</param>
/// <param name="HarmonicShare">The largest of the estimates that it comes from.</param>
internal readonly record struct LoadRange(double Lowest, double Highest, double HarmonicShare)
{
    /// <summary>The load of an estimate.</summary>
    public static LoadRange Of(Estimate estimate) => new(estimate.LoadFarads, estimate.LoadFarads, estimate.HarmonicShare);

    /// <summary>Nothing is known.</summary>
    public static LoadRange Any { get; } = new(0, double.PositiveInfinity, 0);
}
