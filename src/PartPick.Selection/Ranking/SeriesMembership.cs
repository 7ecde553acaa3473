using PartPick.Values;

namespace PartPick.Selection.Search;

/// <summary>Whether a value belongs to a series of preferred values.</summary>
internal sealed class SeriesMembership
{
    private readonly PreferredSeries _series;

    /// <param name="name">Name of the series: E3 … E192.</param>
    public SeriesMembership(string name) => _series = PreferredSeries.Named(name).Value;

    /// <summary>True where the value is one of the series, in whatever decade.</summary>
    public bool Contains(double value) => value > 0 && Math.Abs(_series.Nearest(value) / value - 1) < 1e-6;
}
