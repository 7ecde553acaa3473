namespace PartPick.Selection.Search;

/// <summary>Bounds of the load capacitance seen by the crystal, in farads.</summary>
/// <param name="Lowest">Least.</param>
/// <param name="Highest">Largest.</param>
internal readonly record struct LoadRange(double Lowest, double Highest)
{
    /// <summary>Nothing is known.</summary>
    public static LoadRange Any { get; } = new(0, double.PositiveInfinity);
}
