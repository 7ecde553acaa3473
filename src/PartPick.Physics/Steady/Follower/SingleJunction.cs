using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;

namespace PartPick.Physics.Steady;

/// <summary>
/// A step in which the collector junction carries nothing: three equations, by their adjugate. Most steps are such, and most of
/// the time of a follower's analysis goes here.
/// </summary>
internal static class SingleJunction
{
    private const int Stages = Radau.Stages;
    private const int Width = FollowerElements.MapWidth;
    private const int Forward = FollowerElements.ForwardColumn;
    private const int MostIterations = 60;
    private const double LargestLeft = 1e-3;

    /// <summary>Solves the step as <see cref="JunctionStep"/> does; the collector junction's voltages follow.</summary>
    public static double Solve(
        ReadOnlySpan<double> map,
        ReadOnlySpan<double> offsets,
        ReadOnlySpan<double> right,
        Span<double> volts,
        Span<double> currents,
        Span<double> slopes)
    {
        double g00 = map[Forward], g01 = map[Forward + 1], g02 = map[Forward + 2];
        double g10 = map[Width + Forward], g11 = map[Width + Forward + 1], g12 = map[Width + Forward + 2];
        double g20 = map[2 * Width + Forward], g21 = map[2 * Width + Forward + 1], g22 = map[2 * Width + Forward + 2];
        double v0 = volts[0], v1 = volts[1], v2 = volts[2];
        for (int iteration = 0; iteration < MostIterations; iteration++)
        {
            double i0 = Math.Exp(v0), i1 = Math.Exp(v1), i2 = Math.Exp(v2);

            // Residuals, and the derivatives a of the voltages left by the currents.
            double r0 = offsets[0] - v0 + g00 * i0 + g01 * i1 + g02 * i2;
            double r1 = offsets[1] - v1 + g10 * i0 + g11 * i1 + g12 * i2;
            double r2 = offsets[2] - v2 + g20 * i0 + g21 * i1 + g22 * i2;
            double a00 = 1 - g00 * i0, a01 = -g01 * i1, a02 = -g02 * i2;
            double a10 = -g10 * i0, a11 = 1 - g11 * i1, a12 = -g12 * i2;
            double a20 = -g20 * i0, a21 = -g21 * i1, a22 = 1 - g22 * i2;
            double c00 = a11 * a22 - a12 * a21, c10 = a12 * a20 - a10 * a22, c20 = a10 * a21 - a11 * a20;
            double inverse = 1 / (a00 * c00 + a01 * c10 + a02 * c20);
            double b00 = c00 * inverse, b01 = (a02 * a21 - a01 * a22) * inverse, b02 = (a01 * a12 - a02 * a11) * inverse;
            double b10 = c10 * inverse, b11 = (a00 * a22 - a02 * a20) * inverse, b12 = (a02 * a10 - a00 * a12) * inverse;
            double b20 = c20 * inverse, b21 = (a01 * a20 - a00 * a21) * inverse, b22 = (a00 * a11 - a01 * a10) * inverse;
            double d0 = b00 * r0 + b01 * r1 + b02 * r2;
            double d1 = b10 * r0 + b11 * r1 + b12 * r2;
            double d2 = b20 * r0 + b21 * r1 + b22 * r2;
            double left = Math.Max(Math.Abs(d0), Math.Max(Math.Abs(d1), Math.Abs(d2)));
            v0 = JunctionLimit.Change(v0, d0);
            v1 = JunctionLimit.Change(v1, d1);
            v2 = JunctionLimit.Change(v2, d2);
            if (left < LargestLeft)
            {
                (volts[0], volts[1], volts[2]) = (v0, v1, v2);
                currents[0] = i0 * (1 + d0 * (1 + d0 / 2));
                currents[1] = i1 * (1 + d1 * (1 + d1 / 2));
                currents[2] = i2 * (1 + d2 * (1 + d2 / 2));
                Combine(right, slopes, 0, b00, b01, b02);
                Combine(right, slopes, 1, b10, b11, b12);
                Combine(right, slopes, 2, b20, b21, b22);
                Follow(map, offsets, right, volts, currents, slopes);
                return left;
            }

            if (!double.IsFinite(left))
            {
                break;
            }
        }

        return double.PositiveInfinity;
    }

    private static void Combine(ReadOnlySpan<double> right, Span<double> slopes, int row, double first, double second, double third)
    {
        ReadOnlySpan<Vector256<double>> from = MemoryMarshal.Cast<double, Vector256<double>>(right);
        Span<Vector256<double>> to = MemoryMarshal.Cast<double, Vector256<double>>(slopes).Slice(2 * row, 2);
        to[0] = from[0] * first + from[2] * second + from[4] * third;
        to[1] = from[1] * first + from[3] * second + from[5] * third;
    }

    private static void Follow(
        ReadOnlySpan<double> map,
        ReadOnlySpan<double> offsets,
        ReadOnlySpan<double> right,
        Span<double> volts,
        Span<double> currents,
        Span<double> slopes)
    {
        ReadOnlySpan<Vector256<double>> from = MemoryMarshal.Cast<double, Vector256<double>>(right);
        Span<Vector256<double>> lines = MemoryMarshal.Cast<double, Vector256<double>>(slopes);
        for (int k = Stages; k < 2 * Stages; k++)
        {
            ReadOnlySpan<double> gains = map.Slice(k * Width + Forward, Stages);
            double first = gains[0] * currents[0];
            double second = gains[1] * currents[1];
            double third = gains[2] * currents[2];
            currents[k] = 0;
            volts[k] = offsets[k] + first + second + third;
            lines[2 * k] = from[2 * k] + lines[0] * first + lines[2] * second + lines[4] * third;
            lines[2 * k + 1] = from[2 * k + 1] + lines[1] * first + lines[3] * second + lines[5] * third;
        }
    }
}
