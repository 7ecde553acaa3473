using System.Collections.Immutable;

namespace PartPick.Catalog;

/// <summary>
/// A candidate as it was put on a list: the texts say which circuit and what was wanted, the parts are those of that day. The
/// catalogue keeps the texts and does not read them.
/// </summary>
public sealed record ShortlistEntry
{
    /// <summary>Its number within the list, from 1; kept for as long as it is there.</summary>
    public int Number { get; init; }

    /// <summary>The day it was put there, as in 2026-03-01.</summary>
    public required string Added { get; init; }

    /// <summary>Number of boards built, one or more.</summary>
    public required int Builds { get; init; }

    /// <summary>Free text.</summary>
    public string? Note { get; init; }

    /// <summary>Which part stands where, as JSON.</summary>
    public required string Choice { get; init; }

    /// <summary>The nominal circuit of that day as a circuit file.</summary>
    public required string Circuit { get; init; }

    /// <summary>What was wanted, as a requirement file with every key.</summary>
    public required string Requirement { get; init; }

    /// <summary>The figures of that day, as JSON.</summary>
    public required string Figures { get; init; }

    /// <summary>Every part on the board with its data, prices and stock of that day, each once.</summary>
    public required ImmutableArray<Part> Parts { get; init; }
}
