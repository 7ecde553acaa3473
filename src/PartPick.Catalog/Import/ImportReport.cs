using System.Collections.Immutable;

namespace PartPick.Catalog.Import;

/// <summary>What became of a file: every row that was read is in exactly one of the counts.</summary>
public sealed record ImportReport
{
    /// <summary>How many of the rejections are listed.</summary>
    public const int MostListed = 100;

    /// <summary>Rows below the header.</summary>
    public required long Read { get; init; }

    /// <summary>Parts that are new.</summary>
    public required int Added { get; init; }

    /// <summary>Parts that were there and changed.</summary>
    public required int Updated { get; init; }

    /// <summary>Rows that say what the catalogue holds already.</summary>
    public required int Unchanged { get; init; }

    /// <summary>Rows that were not taken.</summary>
    public required long Rejected { get; init; }

    /// <summary>The columns.</summary>
    public required ImmutableArray<ImportColumn> Columns { get; init; }

    /// <summary>The first rejections.</summary>
    public required ImmutableArray<RowRejection> Rejections { get; init; }

    /// <summary>The file with the rejected rows; null where there are none, or where nothing was written.</summary>
    public string? RejectedFile { get; init; }

    /// <summary>The encoding of the file.</summary>
    public required string Encoding { get; init; }

    /// <summary>The delimiter.</summary>
    public required char Delimiter { get; init; }

    /// <summary>The line of the header.</summary>
    public required long HeaderLine { get; init; }

    /// <summary>Whether nothing was written.</summary>
    public required bool DryRun { get; init; }

    /// <summary>How long it took.</summary>
    public required TimeSpan Elapsed { get; init; }
}
