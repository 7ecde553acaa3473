using System.Collections.Immutable;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>A list at a glance.</summary>
/// <param name="Name">Its name; empty where there is none.</param>
/// <param name="Lists">How many lists there are.</param>
/// <param name="Rows">Its candidates.</param>
public sealed record ListGlance(string Name, int Lists, ImmutableArray<ShortlistGlance> Rows)
{
    /// <summary>What is seen before the first list is made.</summary>
    public static ListGlance None { get; } = new("", 0, []);
}
