using System.Collections.Immutable;

namespace PartPick.Catalog;

/// <summary>The columns of a directory, one entry a crystal in each; an unknown figure is not a number, an unknown package -1.</summary>
internal sealed class DirectoryColumns
{
    public required string Mark { get; init; }

    public required string Currency { get; init; }

    public required double[] Frequencies { get; init; }

    public required double[] Loads { get; init; }

    public required double[] Shunts { get; init; }

    public required double[] Motionals { get; init; }

    public required byte[] Cuts { get; init; }

    public required int[] Packages { get; init; }

    /// <summary>Where each id ends in <see cref="IdBytes"/>.</summary>
    public required int[] IdEnds { get; init; }

    /// <summary>All ids of crystals in UTF-8, one after the other.</summary>
    public required byte[] IdBytes { get; init; }

    public required ImmutableArray<string> PackageWords { get; init; }

    public required ImmutableArray<string> OtherIds { get; init; }
}
