using PartPick.Requirements;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>A row of the page of kept requirements.</summary>
/// <param name="Requirement">The requirement.</param>
/// <param name="Kept">What is kept; null for the sentence as it stands.</param>
internal sealed record KeptRow(Requirement Requirement, KeptRequirement? Kept)
{
    /// <summary>Its name.</summary>
    public string Name => Kept?.Name ?? (Requirement.Name.Length == 0 ? "Wanted" : Requirement.Name);
}
