using System.Collections.Immutable;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Two circuits for one requirement.</summary>
/// <param name="A">One of them.</param>
/// <param name="AIs">What it is, in a word: marked, ranked.</param>
/// <param name="B">The other one.</param>
/// <param name="BIs">What that is, in a word: chosen, changed.</param>
/// <param name="Requirement">What is needed of both.</param>
internal sealed record CircuitPair(Candidate A, string AIs, Candidate B, string BIs, Requirement Requirement)
{
    /// <summary>Whether two circuits are made of the same parts.</summary>
    public static bool IsSame(Candidate one, Candidate other) =>
        one.Choice.Circuit == other.Choice.Circuit
        && one.Choice.Tap == other.Choice.Tap
        && one.Parts.Select(use => (use.Role, use.Part.Id)).SequenceEqual(other.Parts.Select(use => (use.Role, use.Part.Id)));

    /// <summary>The places of both, each once.</summary>
    public ImmutableArray<SwapPlace> Places => [.. SwapPlaces.Of(A.Choice).Union(SwapPlaces.Of(B.Choice)).Order()];
}
