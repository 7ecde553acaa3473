using PartPick.Selection;

namespace PartPick.Requirements;

/// <summary>A requirement that is kept under a name.</summary>
/// <param name="Id">The name of its file, which is a requirement file as <c>rank</c> takes it.</param>
/// <param name="Requirement">The requirement; it always has a name.</param>
/// <param name="Text">The text of the file as it was read.</param>
public sealed record KeptRequirement(string Id, Requirement Requirement, string Text)
{
    /// <summary>Its name.</summary>
    public string Name => Requirement.Name;
}
