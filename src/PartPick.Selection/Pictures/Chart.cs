using System.Collections.Immutable;

namespace PartPick.Selection;

/// <summary>A picture as numbers: what is drawn, whoever draws it. All values are in SI units.</summary>
/// <param name="Title">What it shows.</param>
/// <param name="X">The axis across.</param>
/// <param name="Y">The axis upwards.</param>
public sealed record Chart(string Title, ChartAxis X, ChartAxis Y)
{
    /// <summary>Areas between two curves, below all else.</summary>
    public ImmutableArray<ChartBand> Bands { get; init; } = [];

    /// <summary>Lines at limits.</summary>
    public ImmutableArray<ChartLimit> Limits { get; init; } = [];

    /// <summary>Curves.</summary>
    public ImmutableArray<ChartCurve> Curves { get; init; } = [];

    /// <summary>Single points of several kinds.</summary>
    public ImmutableArray<ChartSpot> Spots { get; init; } = [];

    /// <summary>Points with words.</summary>
    public ImmutableArray<ChartMark> Marks { get; init; } = [];

    /// <summary>What is to be known besides, as sentences.</summary>
    public ImmutableArray<string> Notes { get; init; } = [];
}
