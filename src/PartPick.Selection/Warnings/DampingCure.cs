using PartPick.Physics;
using PartPick.Physics.Circuits;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>A damping resistor that keeps the drive level within a limit.</summary>
/// <param name="Ohms">The resistor, of the E12 series.</param>
/// <param name="DriveWatts">Drive level with it, in watts.</param>
/// <param name="Margin">Start-up margin with it.</param>
internal sealed record DampingCure(double Ohms, double DriveWatts, double Margin)
{
    private const double LargestOhms = 10e6;
    private const int FurtherValues = 12;

    /// <summary>
    /// The smallest resistor of E12 above the circuit's own that brings the drive within the limit and keeps the margin.
    /// </summary>
    /// <param name="gate">The circuit.</param>
    /// <param name="limitWatts">The limit in watts.</param>
    /// <param name="leastMargin">Smallest start-up margin.</param>
    /// <returns>The resistor; null where no value does both.</returns>
    public static DampingCure? Find(GateCircuit gate, double limitWatts, double leastMargin)
    {
        IReadOnlyList<double> values = PreferredSeries.Named("E12").Value.ValuesBetween(Math.Max(gate.SeriesOhms * 1.0001, 1), LargestOhms);
        int first = FirstWithin(gate, values, limitWatts);
        for (int i = first; i < Math.Min(first + FurtherValues, values.Count); i++)
        {
            GateCircuit damped = gate with { SeriesOhms = values[i] };
            if (OscillatorAnalysis.AnalyseStartUp(damped).Margin >= leastMargin
                && OscillatorAnalysis.Analyse(damped) is { Start: StartKind.BuildsUp, Steady: { } steady } result
                && steady.DriveWatts <= limitWatts)
            {
                return new DampingCure(values[i], steady.DriveWatts, result.StartUp.Margin);
            }
        }

        return null;
    }

    /// <summary>The smallest resistor of E12 above the circuit's own with which it starts with a margin.</summary>
    /// <param name="gate">The circuit.</param>
    /// <param name="leastMargin">Smallest start-up margin.</param>
    /// <returns>The resistor in ohms and the margin; null where none does it.</returns>
    public static (double Ohms, double Margin)? FindStart(GateCircuit gate, double leastMargin)
    {
        foreach (double ohms in PreferredSeries.Named("E12").Value.ValuesBetween(Math.Max(gate.SeriesOhms * 1.0001, 1), LargestOhms))
        {
            StartUp start = OscillatorAnalysis.AnalyseStartUp(gate with { SeriesOhms = ohms });
            if (start.Margin >= leastMargin && start.GrowthRatePerSecond > 0)
            {
                return (ohms, start.Margin);
            }
        }

        return null;
    }

    // The drive falls as Rs grows: halve the list until the first value within the limit stands.
    private static int FirstWithin(GateCircuit gate, IReadOnlyList<double> values, double limitWatts)
    {
        int low = 0;
        int high = values.Count;
        while (low < high)
        {
            int middle = (low + high) / 2;
            SteadyState? steady = OscillatorAnalysis.FindSteadyState(gate with { SeriesOhms = values[middle] });
            if (steady is null || steady.DriveWatts <= limitWatts)
            {
                high = middle;
            }
            else
            {
                low = middle + 1;
            }
        }

        return low;
    }
}
