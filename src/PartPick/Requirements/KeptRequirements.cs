using System.Collections.Immutable;
using PartPick.Values;

namespace PartPick.Requirements;

/// <summary>What is kept, as it was read.</summary>
/// <param name="Items">The requirements by name.</param>
/// <param name="Problems">A line for each file that cannot be read; it is left as it is.</param>
public sealed record KeptRequirements(ImmutableArray<KeptRequirement> Items, ImmutableArray<Problem> Problems)
{
    /// <summary>Nothing.</summary>
    public static KeptRequirements None { get; } = new([], []);
}
