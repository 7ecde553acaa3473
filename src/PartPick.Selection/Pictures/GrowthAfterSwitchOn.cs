using PartPick.Physics;
using PartPick.Physics.Circuits;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>
/// The growth of the amplitude of a circuit after switch-on, and the growth at its first rate alone, which by definition reaches
/// the running amplitude at the start-up time.
/// </summary>
public static class GrowthAfterSwitchOn
{
    private const double Air = 2;

    /// <summary>The picture of a candidate, at nominal values; a problem where it does not build up.</summary>
    /// <param name="candidate">The candidate.</param>
    /// <param name="cancellation">Ends it.</param>
    public static Result<Chart> Of(Candidate candidate, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(candidate);
        return Of(candidate.Nominal, cancellation).Map(chart => candidate.StartUpTime is not { } slowest ? chart : chart with
        {
            Notes =
            [
                .. chart.Notes,
                $"Nominal values; the longest start-up time is {Time(slowest.Value)}, at {slowest.Corner}.",
            ],
        });
    }

    /// <summary>The picture of a circuit; a problem where it does not build up.</summary>
    /// <param name="circuit">The circuit.</param>
    /// <param name="cancellation">Ends it.</param>
    public static Result<Chart> Of(OscillatorCircuit circuit, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(circuit);
        return OscillatorAnalysis.FindGrowth(circuit, cancellation) is { } growth
            ? Result.Ok(Draw(growth))
            : Result.Fail<Chart>("growth", Why(circuit), "a circuit that builds up from noise");
    }

    private static string Why(OscillatorCircuit circuit) => OscillatorAnalysis.AnalyseStartUp(circuit).GrowthRatePerSecond > 0
        ? "cannot be followed up to a running amplitude"
        : "cannot be drawn, for the circuit does not build up from noise";

    private static Chart Draw(AmplitudeGrowth growth)
    {
        double end = Math.Max(growth.Points[^1].Seconds, 1.05 * growth.StartUpTimeSeconds);
        var start = new ChartPoint(0, growth.StartPeakAmps);
        var reached = new ChartPoint(growth.StartUpTimeSeconds, growth.SteadyPeakAmps);
        var ninety = new ChartPoint(growth.NinetyPercentSeconds, 0.9 * growth.SteadyPeakAmps);
        string running = ValueText.Format(growth.SteadyPeakAmps, Dimension.Current);
        return new Chart(
            "Growth of the amplitude after switch-on",
            ChartAxis.Time("time", end),
            new ChartAxis("motional current, peak", "", growth.StartPeakAmps / Air, growth.SteadyPeakAmps * Air)
            {
                Logarithmic = Dimension.Current,
            })
        {
            Curves =
            [
                new ChartCurve('g', "growth", [.. growth.Points.Select(point => new ChartPoint(point.Seconds, point.PeakAmps))]),
                new ChartCurve('r', "at its first rate alone", [start, reached]),
            ],
            Limits = [new ChartLimit("runs at " + running, growth.SteadyPeakAmps)],
            Marks =
            [
                new ChartMark('A', "start-up time " + Time(growth.StartUpTimeSeconds), reached),
                new ChartMark('B', "nine tenths at " + Time(growth.NinetyPercentSeconds), ninety),
            ],
            Notes = ["It begins at the thermal current of the crystal, " + ValueText.Format(growth.StartPeakAmps, Dimension.Current) + "."],
        };
    }

    private static string Time(double seconds) => ValueText.Format(seconds, Dimension.Time);
}
