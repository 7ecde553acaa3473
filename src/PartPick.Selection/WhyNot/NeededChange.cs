namespace PartPick.Selection;

/// <summary>One thing that would have to be another one for a part to be let in.</summary>
/// <param name="What">What it is, in words: "budget", "drive level of X".</param>
/// <param name="Key">The key of the requirement; null where it is no matter of the requirement.</param>
/// <param name="Was">What it is now, with its unit.</param>
/// <param name="Becomes">What lets the part in; for a key of the requirement, as its option takes it.</param>
/// <param name="Size">How large the change is: a ratio above one, the same measure for all.</param>
public sealed record NeededChange(string What, RequirementKey? Key, string Was, string Becomes, double Size)
{
    /// <summary>The change in words: "budget 80 ppm -> 92 ppm".</summary>
    public override string ToString() => $"{What} {Was} -> {Becomes}";
}
