using System.Collections.Immutable;

namespace PartPick.Catalog.Import;

/// <summary>What is to be imported, and how.</summary>
public sealed record ImportRequest
{
    /// <summary>The kind of the parts.</summary>
    public required PartKind Kind { get; init; }

    /// <summary>The name of the file, for messages and origins.</summary>
    public required string Name { get; init; }

    /// <summary>Where rejected rows go; null to write no such file.</summary>
    public string? RejectedPath { get; init; }

    /// <summary>Whether nothing is to be written.</summary>
    public bool DryRun { get; init; }

    /// <summary>The name of a column map: used where there is one, kept where there is none yet; null for neither.</summary>
    public string? Map { get; init; }

    /// <summary>Columns that are stated, each as HEADER=FIELD or HEADER=FIELD:UNIT; without a field to leave it out.</summary>
    public ImmutableArray<string> Columns { get; init; } = [];

    /// <summary>The decimal sign, "point" or "comma"; null to find it.</summary>
    public string? DecimalSign { get; init; }

    /// <summary>The currency of prices that name none; null for none.</summary>
    public string? Currency { get; init; }

    /// <summary>The supplier of rows that name none; null for none.</summary>
    public string? Supplier { get; init; }

    /// <summary>The day of the import.</summary>
    public required DateOnly Date { get; init; }
}
