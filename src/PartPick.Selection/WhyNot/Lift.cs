using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection.Search;

/// <summary>What stands in the way of a part, and the requirement and the part without it.</summary>
/// <param name="Requirement">The requirement, as far as it had to be changed.</param>
/// <param name="Part">The part, as far as it had to be changed.</param>
/// <param name="Hurdles">What stood in the way.</param>
internal sealed record Lift(Requirement Requirement, Part Part, ImmutableArray<Hurdle> Hurdles)
{
    /// <summary>Whether something stands in the way that nothing lifts.</summary>
    public bool IsFinal => Hurdles.Any(hurdle => !hurdle.CanBeLifted);

    /// <summary>This with one hurdle more, and the requirement that lifts it; null where nothing does.</summary>
    public Lift Over(HurdleName name, string wanted, string has, string distance, Requirement? lifted) => this with
    {
        Requirement = lifted ?? Requirement,
        Hurdles = Hurdles.Add(new Hurdle(name, wanted, has, distance, lifted is not null)),
    };

    /// <summary>What has to be changed: of the requirement that was asked about, and of the part.</summary>
    /// <param name="asked">The requirement that was asked about.</param>
    /// <param name="part">The part as it is.</param>
    public ImmutableArray<NeededChange> Changes(Requirement asked, Part part)
    {
        ImmutableArray<NeededChange> changes = RequirementChanges.Between(asked, Requirement);
        return part.Excluded ? [new NeededChange($"{part.Id} excluded", null, "yes", "no", 1), .. changes] : changes;
    }
}
