using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;

namespace PartPick.Physics.Steady;

/// <summary>A step in which the collector junction carries nothing: its voltages follow from the other's currents.</summary>
internal static class SingleJunction
{
    private const int Stages = Radau.Stages;
    private const int Forward = FollowerElements.ForwardColumn;

    /// <summary>Solves the step as <see cref="JunctionStep"/> does.</summary>
    public static double Solve(
        ReadOnlySpan<double> map,
        ReadOnlySpan<double> offsets,
        ReadOnlySpan<double> right,
        Span<double> volts,
        Span<double> currents,
        Span<double> slopes)
    {
        currents[Stages..].Clear();
        for (int iteration = 0; iteration < JunctionStep.MostIterations; iteration++)
        {
            for (int k = 0; k < Stages; k++)
            {
                currents[k] = Math.Exp(volts[k]);
            }

            var gains = Block3.Of(map, 0, Forward, currents);
            (double r0, double r1, double r2) = gains.Sums;
            Block3 inverse = gains.FromOne().Inverse();
            (double d0, double d1, double d2) = inverse.Times(
                offsets[0] - volts[0] + r0, offsets[1] - volts[1] + r1, offsets[2] - volts[2] + r2);
            double left = Math.Max(Math.Abs(d0), Math.Max(Math.Abs(d1), Math.Abs(d2)));
            JunctionStep.Correct(volts, currents, d0, d1, d2);
            if (left < JunctionStep.LargestLeft)
            {
                ReadOnlySpan<Vector256<double>> from = MemoryMarshal.Cast<double, Vector256<double>>(right);
                Span<Vector256<double>> to = MemoryMarshal.Cast<double, Vector256<double>>(slopes);
                inverse.Times(from, to);
                var following = Block3.Of(map, Stages, Forward, currents);
                following.AddTimes(from[6..], to, to[6..]);
                (double w0, double w1, double w2) = following.Sums;
                volts[3] = offsets[3] + w0;
                volts[4] = offsets[4] + w1;
                volts[5] = offsets[5] + w2;
                return left;
            }

            if (!double.IsFinite(left))
            {
                break;
            }
        }

        return double.PositiveInfinity;
    }
}
