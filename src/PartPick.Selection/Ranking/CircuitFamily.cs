using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection.Search;

/// <summary>
/// A circuit and an amplifier with all crystals of one equivalent circuit: they differ in rated load, tolerance and price only,
/// so the search solves their circuits once.
/// </summary>
internal sealed class CircuitFamily
{
    /// <summary>The circuit.</summary>
    public required CircuitKind Kind { get; init; }

    /// <summary>Whether a gate, counter or port: everything but a follower.</summary>
    public bool IsGate => Kind != CircuitKind.Follower;

    /// <summary>The amplifier.</summary>
    public required Part Amplifier { get; init; }

    /// <summary>Support parts.</summary>
    public required SupportParts Support { get; init; }

    /// <summary>What may stand round the amplifier.</summary>
    public required ImmutableArray<AmplifierOption> Options { get; init; }

    /// <summary>What each of them adds to the cost per unit; equal parts are bought together.</summary>
    public required ImmutableArray<decimal> OptionCosts { get; init; }

    /// <summary>The groups.</summary>
    public required ImmutableArray<FamilyMember> Members { get; init; }
}
