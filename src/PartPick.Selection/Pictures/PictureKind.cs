using System.Collections.Immutable;

namespace PartPick.Selection;

/// <summary>The pictures of a candidate and of its ranking.</summary>
public enum PictureKind
{
    /// <summary>Frequency error over temperature.</summary>
    Error,

    /// <summary>Start-up margin over supply.</summary>
    Margin,

    /// <summary>The error budget as bars.</summary>
    Budget,

    /// <summary>Growth of the amplitude after switch-on.</summary>
    Growth,

    /// <summary>The candidates by error and cost.</summary>
    Scatter,

    /// <summary>The circuit with its values.</summary>
    Schematic,
}

/// <summary>The pictures' words.</summary>
public static class PictureKinds
{
    /// <summary>All pictures in their order.</summary>
    public static ImmutableArray<PictureKind> All { get; } = [.. Enum.GetValues<PictureKind>()];

    /// <summary>The word of a picture, as options and file names have it.</summary>
    /// <param name="kind">The picture.</param>
    public static string Word(this PictureKind kind) => kind.ToString().ToLowerInvariant();
}
