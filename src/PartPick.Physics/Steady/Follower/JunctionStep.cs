using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;
using PartPick.Physics.Numerics;

namespace PartPick.Physics.Steady;

/// <summary>
/// Both junctions in one step: finds their voltages at the three stages by Newton's method, and how they depend on the unknowns
/// of the period. A voltage v here is ln of the current that it makes, in units of the emitter current at rest.
/// </summary>
internal sealed class JunctionStep
{
    /// <summary>Columns of a row of derivatives: the unknowns of the period, then the step's own correction.</summary>
    public const int Width = 8;

    /// <summary>The column of the step's own correction.</summary>
    public const int Correction = 6;

    /// <summary>Number of voltages in a step: base–emitter, then base–collector, at three stages.</summary>
    public const int Voltages = 6;

    private const int Stages = Radau.Stages;
    private const int MostIterations = 60;
    private const double LargestLeft = 1e-3;
    private const double Negligible = -18;
    private const double Knee = 2;
    private readonly double[] _rows = new double[Voltages * 16];

    /// <summary>Solves a step; returns the largest correction of the last iteration, infinite where there is no solution.</summary>
    /// <param name="map">The step's map.</param>
    /// <param name="offsets">The voltages with no current in either junction.</param>
    /// <param name="right">Their derivatives by the unknowns, in rows of <see cref="Width"/>; zero in the last two columns.</param>
    /// <param name="volts">The voltages: a guess, then the solution.</param>
    /// <param name="currents">Receives the currents.</param>
    /// <param name="slopes">Receives the voltages' derivatives, in rows of <see cref="Width"/>.</param>
    public double Solve(
        ReadOnlySpan<double> map,
        ReadOnlySpan<double> offsets,
        ReadOnlySpan<double> right,
        Span<double> volts,
        Span<double> currents,
        Span<double> slopes)
    {
        bool both = !IsNegligible(volts[Stages..]);
        for (int iteration = 0; iteration < MostIterations; iteration++)
        {
            for (int k = 0; k < Stages; k++)
            {
                currents[k] = Math.Exp(volts[k]);
                currents[Stages + k] = both ? Math.Exp(volts[Stages + k]) : 0;
            }

            int order = both ? Voltages : Stages;
            int columns = both ? 2 : 1;
            Fill(map, offsets, right, volts, currents, order, columns);
            if (!GaussJordan.Reduce(_rows, order, columns + 2))
            {
                break;
            }

            double left = Correct(volts, currents, order, columns);
            if (!both)
            {
                Follow(map, offsets, volts, currents);
                if (!IsNegligible(volts[Stages..]))
                {
                    both = true;
                    for (int k = Stages; k < Voltages; k++)
                    {
                        volts[k] = Math.Min(volts[k], 0);
                    }

                    continue;
                }
            }

            if (left < LargestLeft)
            {
                Slopes(map, right, currents, slopes, order, columns);
                return left;
            }
        }

        return double.PositiveInfinity;
    }

    // Rises of a conducting junction's voltage by Newton's method overshoot: its current's logarithm takes their place.
    public static double Limit(double volts, double change)
    {
        double next = volts + change;
        if (volts > 0 && change < -4)
        {
            return Math.Max(next, Math.Min(volts - 4, -5));
        }

        if (change <= Knee || next <= Knee)
        {
            return next;
        }

        double from = Math.Max(volts, Knee);
        return from + Math.Log(1 + next - from);
    }

    private static bool IsNegligible(ReadOnlySpan<double> reverse) =>
        reverse[0] < Negligible && reverse[1] < Negligible && reverse[2] < Negligible;

    private void Fill(
        ReadOnlySpan<double> map, ReadOnlySpan<double> offsets, ReadOnlySpan<double> right, ReadOnlySpan<double> volts, ReadOnlySpan<double> currents, int order, int columns)
    {
        int stride = 4 * (columns + 2);
        for (int k = 0; k < order; k++)
        {
            ReadOnlySpan<double> gains = map.Slice(k * FollowerElements.MapWidth + FollowerElements.ForwardColumn, order);
            Span<double> row = _rows.AsSpan(k * stride, stride);
            double residual = volts[k] - offsets[k];
            for (int j = 0; j < gains.Length; j++)
            {
                double term = gains[j] * currents[j];
                residual -= term;
                row[j] = -term;
            }

            row[k] += 1;
            right.Slice(k * Width, Width).CopyTo(row[(4 * columns)..]);
            row[4 * columns + Correction] = -residual;
        }
    }

    private double Correct(Span<double> volts, Span<double> currents, int order, int columns)
    {
        int stride = 4 * (columns + 2);
        double largest = 0;
        for (int k = 0; k < order; k++)
        {
            double change = _rows[k * stride + 4 * columns + Correction];
            largest = Math.Max(largest, Math.Abs(change));
            volts[k] = Limit(volts[k], change);
            currents[k] *= 1 + change * (1 + change / 2);
        }

        return double.IsNaN(largest) ? double.PositiveInfinity : largest;
    }

    private static void Follow(ReadOnlySpan<double> map, ReadOnlySpan<double> offsets, Span<double> volts, ReadOnlySpan<double> currents)
    {
        for (int k = Stages; k < Voltages; k++)
        {
            int at = k * FollowerElements.MapWidth + FollowerElements.ForwardColumn;
            volts[k] = offsets[k] + map[at] * currents[0] + map[at + 1] * currents[1] + map[at + 2] * currents[2];
        }
    }

    private void Slopes(ReadOnlySpan<double> map, ReadOnlySpan<double> right, ReadOnlySpan<double> currents, Span<double> slopes, int order, int columns)
    {
        int stride = 4 * (columns + 2);
        for (int k = 0; k < order; k++)
        {
            _rows.AsSpan(k * stride + 4 * columns, Width).CopyTo(slopes[(k * Width)..]);
        }

        if (order == Voltages)
        {
            return;
        }

        Span<Vector256<double>> lines = MemoryMarshal.Cast<double, Vector256<double>>(slopes);
        ReadOnlySpan<Vector256<double>> rights = MemoryMarshal.Cast<double, Vector256<double>>(right);
        for (int k = Stages; k < Voltages; k++)
        {
            int at = k * FollowerElements.MapWidth + FollowerElements.ForwardColumn;
            var first = Vector256.Create(map[at] * currents[0]);
            var second = Vector256.Create(map[at + 1] * currents[1]);
            var third = Vector256.Create(map[at + 2] * currents[2]);
            for (int half = 0; half < 2; half++)
            {
                lines[2 * k + half] = rights[2 * k + half]
                    + first * lines[half] + second * lines[2 + half] + third * lines[4 + half];
            }
        }
    }
}
