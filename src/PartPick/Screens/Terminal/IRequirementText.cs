using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>A requirement as text, in the form of requirement files.</summary>
public interface IRequirementText
{
    /// <summary>Reads a requirement.</summary>
    /// <param name="text">The text.</param>
    /// <param name="where">Where the text comes from, for messages.</param>
    Result<Requirement> Read(string text, string where);

    /// <summary>Writes a requirement.</summary>
    /// <param name="requirement">The requirement.</param>
    string Write(Requirement requirement);
}
