using System.Collections.Immutable;

namespace PartPick.Physics.Growth;

/// <summary>Integrates the envelope from the thermal to the running amplitude.</summary>
internal static class GrowthSolver
{
    private const double LastDepth = 0.005;
    private const double NearDepth = 0.3;
    private const int FarPoints = 160;
    private const int NearPoints = 48;
    private static readonly double NinetyDepth = Math.Log(1 / 0.9);

    /// <summary>The growth.</summary>
    /// <param name="startPeakAmps">Amplitude at the beginning in amperes peak, well below the running one.</param>
    /// <param name="steadyPeakAmps">Running amplitude in amperes peak.</param>
    /// <param name="ratePerSecond">Growth rate of small amplitudes in 1/s.</param>
    /// <param name="excessShare">Excess of negative resistance over that of small signals, by the depth ln(Î/I).</param>
    public static AmplitudeGrowth Integrate(
        double startPeakAmps, double steadyPeakAmps, double ratePerSecond, Func<double, double> excessShare)
    {
        double start = Math.Log(steadyPeakAmps / startPeakAmps);
        var points = ImmutableArray.CreateBuilder<GrowthPoint>();
        points.Add(new GrowthPoint(0, startPeakAmps));
        double seconds = 0;
        double ninety = 0;
        double depth = start;
        foreach (double next in Depths(start))
        {
            // Simpson's rule over the time that each e-fold takes.
            double middle = (depth + next) / 2;
            double sum = 1 / excessShare(depth) + 4 / excessShare(middle) + 1 / excessShare(next);
            seconds += (depth - next) / 6 * sum / ratePerSecond;
            depth = next;
            points.Add(new GrowthPoint(seconds, steadyPeakAmps * Math.Exp(-depth)));
            if (depth == NinetyDepth)
            {
                ninety = seconds;
            }
        }

        return new AmplitudeGrowth
        {
            StartPeakAmps = startPeakAmps,
            SteadyPeakAmps = steadyPeakAmps,
            GrowthRatePerSecond = ratePerSecond,
            StartUpTimeSeconds = start / ratePerSecond,
            NinetyPercentSeconds = ninety,
            Points = points.ToImmutable(),
        };
    }

    // Evenly down to near the running amplitude; from there closer and closer, for the rate goes to zero.
    private static IEnumerable<double> Depths(double start)
    {
        for (int k = 1; k <= FarPoints; k++)
        {
            yield return start + (NearDepth - start) * k / FarPoints;
        }

        bool passed = false;
        for (int k = 1; k <= NearPoints; k++)
        {
            double depth = NearDepth * Math.Pow(LastDepth / NearDepth, (double)k / NearPoints);
            if (depth < NinetyDepth && !passed)
            {
                passed = true;
                yield return NinetyDepth;
            }

            yield return depth;
        }
    }
}
