using System.Collections.Immutable;

namespace PartPick.Selection;

/// <summary>A point of a picture, SI.</summary>
/// <param name="X">Across.</param>
/// <param name="Y">Upwards.</param>
public readonly record struct ChartPoint(double X, double Y);

/// <summary>A curve.</summary>
/// <param name="Letter">The letter that stands on it where lines cannot differ in style.</param>
/// <param name="Name">What it is.</param>
/// <param name="Points">Its points, rising in X.</param>
public sealed record ChartCurve(char Letter, string Name, ImmutableArray<ChartPoint> Points);

/// <summary>A place of a band, SI.</summary>
/// <param name="X">Across.</param>
/// <param name="Low">Its lower edge.</param>
/// <param name="High">Its upper edge.</param>
public readonly record struct BandPoint(double X, double Low, double High);

/// <summary>An area between two curves.</summary>
/// <param name="Name">What it is.</param>
/// <param name="Points">Its edges, rising in X.</param>
public sealed record ChartBand(string Name, ImmutableArray<BandPoint> Points);

/// <summary>A line at a limit.</summary>
/// <param name="Words">The limit in words, with its figure.</param>
/// <param name="Value">Where it lies, SI.</param>
/// <param name="IsUpright">Whether it stands at a value of the axis across; else it lies at one of the axis upwards.</param>
public sealed record ChartLimit(string Words, double Value, bool IsUpright = false);

/// <summary>A point with words.</summary>
/// <param name="Letter">The capital letter that stands there.</param>
/// <param name="Words">What it is, with its figure.</param>
/// <param name="Point">Where it lies.</param>
public sealed record ChartMark(char Letter, string Words, ChartPoint Point);

/// <summary>The kinds of single points.</summary>
public enum SpotKind
{
    /// <summary>One of many.</summary>
    Other,

    /// <summary>One of the front.</summary>
    Front,

    /// <summary>The chosen one.</summary>
    Chosen,
}

/// <summary>A single point.</summary>
/// <param name="Kind">Its kind.</param>
/// <param name="Point">Where it lies.</param>
public readonly record struct ChartSpot(SpotKind Kind, ChartPoint Point);
