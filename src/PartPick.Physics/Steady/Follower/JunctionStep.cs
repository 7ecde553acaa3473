using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;

namespace PartPick.Physics.Steady;

/// <summary>
/// Both junctions in one step: finds their voltages at the three stages by Newton's method, and how they depend on the unknowns
/// of the period. A voltage v here is ln of the current that it makes, in units of the emitter current at rest.
/// </summary>
internal static class JunctionStep
{
    /// <summary>Columns of a row of derivatives: the unknowns of the period, filled up to whole vectors.</summary>
    public const int Width = 8;

    /// <summary>Number of voltages in a step: base–emitter, then base–collector, at three stages.</summary>
    public const int Voltages = 6;

    /// <summary>Iterations after which a step is given up.</summary>
    public const int MostIterations = 60;

    /// <summary>Correction after which a step is left: the passes to come correct the rest.</summary>
    public const double LargestLeft = 1e-3;

    private const int Stages = Radau.Stages;
    private const double Negligible = -18;

    /// <summary>Solves a step; returns the largest correction of the last iteration, infinite where there is no solution.</summary>
    /// <param name="map">The step's map.</param>
    /// <param name="offsets">The voltages with no current in either junction.</param>
    /// <param name="right">Their derivatives by the unknowns, in rows of <see cref="Width"/>.</param>
    /// <param name="volts">The voltages: a guess, then the solution.</param>
    /// <param name="currents">Receives the currents.</param>
    /// <param name="slopes">Receives the voltages' derivatives, in rows of <see cref="Width"/>.</param>
    public static double Solve(
        ReadOnlySpan<double> map,
        ReadOnlySpan<double> offsets,
        ReadOnlySpan<double> right,
        Span<double> volts,
        Span<double> currents,
        Span<double> slopes)
    {
        // A current lowers the voltage that makes it: where neither junction would conduct without one, neither does.
        if (IsNegligible(offsets) && IsNegligible(offsets[Stages..]))
        {
            offsets.CopyTo(volts);
            right.CopyTo(slopes);
            currents.Clear();
            return 0;
        }

        if (IsNegligible(volts[Stages..]))
        {
            double left = SingleJunction.Solve(map, offsets, right, volts, currents, slopes);
            if (!double.IsFinite(left) || IsNegligible(volts[Stages..]))
            {
                return left;
            }

            for (int k = Stages; k < Voltages; k++)
            {
                volts[k] = Math.Min(volts[k], 0);
            }
        }

        return SolveBoth(map, offsets, right, volts, currents, slopes);
    }

    /// <summary>Takes a correction of three voltages, and of the currents where it is small.</summary>
    public static void Correct(Span<double> volts, Span<double> currents, double first, double second, double third)
    {
        volts[0] = JunctionLimit.Change(volts[0], first);
        volts[1] = JunctionLimit.Change(volts[1], second);
        volts[2] = JunctionLimit.Change(volts[2], third);
        currents[0] *= 1 + first * (1 + first / 2);
        currents[1] *= 1 + second * (1 + second / 2);
        currents[2] *= 1 + third * (1 + third / 2);
    }

    private static bool IsNegligible(ReadOnlySpan<double> reverse) =>
        reverse[0] < Negligible && reverse[1] < Negligible && reverse[2] < Negligible;

    // The forward junction's three voltages are eliminated first, then the reverse one's are solved for.
    private static double SolveBoth(
        ReadOnlySpan<double> map,
        ReadOnlySpan<double> offsets,
        ReadOnlySpan<double> right,
        Span<double> volts,
        Span<double> currents,
        Span<double> slopes)
    {
        const int Forward = FollowerElements.ForwardColumn;
        const int Reverse = FollowerElements.ReverseColumn;
        Span<double> backward = currents[Stages..];
        Span<double> inner = volts[Stages..];
        for (int iteration = 0; iteration < MostIterations; iteration++)
        {
            for (int k = 0; k < Voltages; k++)
            {
                currents[k] = Math.Exp(volts[k]);
            }

            var forward = Block3.Of(map, 0, Forward, currents);
            var across = Block3.Of(map, 0, Reverse, backward);
            var back = Block3.Of(map, Stages, Forward, currents);
            var reverse = Block3.Of(map, Stages, Reverse, backward);
            (double f0, double f1, double f2) = forward.Sums;
            (double a0, double a1, double a2) = across.Sums;
            (double b0, double b1, double b2) = back.Sums;
            (double r0, double r1, double r2) = reverse.Sums;
            Block3 eliminated = forward.FromOne().Inverse();
            Block3 carried = eliminated.Times(across);
            Block3 inverse = reverse.FromOne().Minus(back.Times(carried)).Inverse();
            (double u0, double u1, double u2) = eliminated.Times(
                offsets[0] - volts[0] + f0 + a0, offsets[1] - volts[1] + f1 + a1, offsets[2] - volts[2] + f2 + a2);
            (double c0, double c1, double c2) = back.Times(u0, u1, u2);
            (double w0, double w1, double w2) = inverse.Times(
                offsets[3] - inner[0] + b0 + r0 + c0, offsets[4] - inner[1] + b1 + r1 + c1, offsets[5] - inner[2] + b2 + r2 + c2);
            (double e0, double e1, double e2) = carried.Times(w0, w1, w2);
            (u0, u1, u2) = (u0 + e0, u1 + e1, u2 + e2);
            double left = Math.Max(
                Math.Max(Math.Abs(u0), Math.Max(Math.Abs(u1), Math.Abs(u2))),
                Math.Max(Math.Abs(w0), Math.Max(Math.Abs(w1), Math.Abs(w2))));
            Correct(volts, currents, u0, u1, u2);
            Correct(inner, backward, w0, w1, w2);
            if (left < LargestLeft)
            {
                ReadOnlySpan<Vector256<double>> from = MemoryMarshal.Cast<double, Vector256<double>>(right);
                Span<Vector256<double>> to = MemoryMarshal.Cast<double, Vector256<double>>(slopes);
                eliminated.Times(from, to);
                back.AddTimes(from[6..], to, to[6..]);
                inverse.Times(to[6..], to[6..]);
                carried.AddTimes(to, to[6..], to);
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
