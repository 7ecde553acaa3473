using PartPick.Physics.Numerics;

namespace PartPick.Physics.Steady;

/// <summary>
/// Both junctions in one step: finds their voltages at the three stages by Newton's method, and how they depend on the unknowns
/// of the period. A voltage v here is ln of the current that it makes, in units of the emitter current at rest.
/// </summary>
internal sealed class JunctionStep
{
    /// <summary>Columns of a row of derivatives: the unknowns of the period, and room for what solves for them.</summary>
    public const int Width = 8;

    /// <summary>Number of voltages in a step: base–emitter, then base–collector, at three stages.</summary>
    public const int Voltages = 6;

    private const int Stages = Radau.Stages;
    private const int Vectors = 4;
    private const int RightColumn = 8;
    private const int Correction = RightColumn + 6;
    private const int MostIterations = 60;
    private const double LargestLeft = 1e-3;
    private const double Negligible = -18;
    private readonly double[] _rows = new double[Voltages * 4 * Vectors];

    /// <summary>Solves a step; returns the largest correction of the last iteration, infinite where there is no solution.</summary>
    /// <param name="map">The step's map.</param>
    /// <param name="offsets">The voltages with no current in either junction.</param>
    /// <param name="right">Their derivatives by the unknowns, in rows of <see cref="Width"/>.</param>
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

    private static bool IsNegligible(ReadOnlySpan<double> reverse) =>
        reverse[0] < Negligible && reverse[1] < Negligible && reverse[2] < Negligible;

    private double SolveBoth(
        ReadOnlySpan<double> map,
        ReadOnlySpan<double> offsets,
        ReadOnlySpan<double> right,
        Span<double> volts,
        Span<double> currents,
        Span<double> slopes)
    {
        for (int iteration = 0; iteration < MostIterations; iteration++)
        {
            for (int k = 0; k < Voltages; k++)
            {
                currents[k] = Math.Exp(volts[k]);
            }

            Fill(map, offsets, right, volts, currents);
            if (!GaussJordan.Reduce(_rows, Voltages, Vectors))
            {
                return double.PositiveInfinity;
            }

            double left = 0;
            for (int k = 0; k < Voltages; k++)
            {
                double change = _rows[k * 4 * Vectors + Correction];
                left = Math.Max(left, Math.Abs(change));
                volts[k] = JunctionLimit.Change(volts[k], change);
                currents[k] *= 1 + change * (1 + change / 2);
            }

            if (left < LargestLeft)
            {
                for (int k = 0; k < Voltages; k++)
                {
                    _rows.AsSpan(k * 4 * Vectors + RightColumn, Width).CopyTo(slopes[(k * Width)..]);
                }

                return left;
            }
        }

        return double.PositiveInfinity;
    }

    private void Fill(
        ReadOnlySpan<double> map,
        ReadOnlySpan<double> offsets,
        ReadOnlySpan<double> right,
        ReadOnlySpan<double> volts,
        ReadOnlySpan<double> currents)
    {
        for (int k = 0; k < Voltages; k++)
        {
            ReadOnlySpan<double> gains = map.Slice(k * FollowerElements.MapWidth + FollowerElements.ForwardColumn, Voltages);
            Span<double> row = _rows.AsSpan(k * 4 * Vectors, 4 * Vectors);
            double residual = volts[k] - offsets[k];
            for (int j = 0; j < gains.Length; j++)
            {
                double term = gains[j] * currents[j];
                residual -= term;
                row[j] = -term;
            }

            row[k] += 1;
            row[6] = row[7] = 0;
            right.Slice(k * Width, Width).CopyTo(row[RightColumn..]);
            row[Correction] = -residual;
        }
    }
}
