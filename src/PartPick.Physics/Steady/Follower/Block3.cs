using System.Runtime.Intrinsics;

namespace PartPick.Physics.Steady;

/// <summary>A matrix of three rows and columns, for the three stages of a step.</summary>
internal readonly struct Block3
{
    private readonly double _a00, _a01, _a02, _a10, _a11, _a12, _a20, _a21, _a22;

    public Block3(double a00, double a01, double a02, double a10, double a11, double a12, double a20, double a21, double a22)
    {
        (_a00, _a01, _a02) = (a00, a01, a02);
        (_a10, _a11, _a12) = (a10, a11, a12);
        (_a20, _a21, _a22) = (a20, a21, a22);
    }

    /// <summary>Three rows of a step's map from a column on, each column times a stage's current.</summary>
    public static Block3 Of(ReadOnlySpan<double> map, int row, int column, ReadOnlySpan<double> currents)
    {
        ReadOnlySpan<double> first = map.Slice(row * FollowerElements.MapWidth + column, 3);
        ReadOnlySpan<double> second = map.Slice((row + 1) * FollowerElements.MapWidth + column, 3);
        ReadOnlySpan<double> third = map.Slice((row + 2) * FollowerElements.MapWidth + column, 3);
        double x = currents[0], y = currents[1], z = currents[2];
        return new Block3(
            first[0] * x, first[1] * y, first[2] * z,
            second[0] * x, second[1] * y, second[2] * z,
            third[0] * x, third[1] * y, third[2] * z);
    }

    /// <summary>The sums of the rows.</summary>
    public (double First, double Second, double Third) Sums => (_a00 + _a01 + _a02, _a10 + _a11 + _a12, _a20 + _a21 + _a22);

    /// <summary>1 − A.</summary>
    public Block3 FromOne() => new(1 - _a00, -_a01, -_a02, -_a10, 1 - _a11, -_a12, -_a20, -_a21, 1 - _a22);

    /// <summary>A⁻¹, by the adjugate.</summary>
    public Block3 Inverse()
    {
        double c00 = _a11 * _a22 - _a12 * _a21, c10 = _a12 * _a20 - _a10 * _a22, c20 = _a10 * _a21 - _a11 * _a20;
        double scale = 1 / (_a00 * c00 + _a01 * c10 + _a02 * c20);
        return new Block3(
            c00 * scale, (_a02 * _a21 - _a01 * _a22) * scale, (_a01 * _a12 - _a02 * _a11) * scale,
            c10 * scale, (_a00 * _a22 - _a02 * _a20) * scale, (_a02 * _a10 - _a00 * _a12) * scale,
            c20 * scale, (_a01 * _a20 - _a00 * _a21) * scale, (_a00 * _a11 - _a01 * _a10) * scale);
    }

    /// <summary>A x.</summary>
    public (double First, double Second, double Third) Times(double x, double y, double z) => (
        _a00 * x + _a01 * y + _a02 * z,
        _a10 * x + _a11 * y + _a12 * z,
        _a20 * x + _a21 * y + _a22 * z);

    /// <summary>A B.</summary>
    public Block3 Times(in Block3 b)
    {
        (double a00, double a10, double a20) = Times(b._a00, b._a10, b._a20);
        (double a01, double a11, double a21) = Times(b._a01, b._a11, b._a21);
        (double a02, double a12, double a22) = Times(b._a02, b._a12, b._a22);
        return new Block3(a00, a01, a02, a10, a11, a12, a20, a21, a22);
    }

    /// <summary>A − B.</summary>
    public Block3 Minus(in Block3 b) => new(
        _a00 - b._a00, _a01 - b._a01, _a02 - b._a02,
        _a10 - b._a10, _a11 - b._a11, _a12 - b._a12,
        _a20 - b._a20, _a21 - b._a21, _a22 - b._a22);

    /// <summary>to = from + A with, in three rows of two vectors each.</summary>
    public void AddTimes(ReadOnlySpan<Vector256<double>> from, ReadOnlySpan<Vector256<double>> with, Span<Vector256<double>> to)
    {
        for (int half = 0; half < 2; half++)
        {
            Vector256<double> x = with[half], y = with[2 + half], z = with[4 + half];
            to[half] = from[half] + x * _a00 + y * _a01 + z * _a02;
            to[2 + half] = from[2 + half] + x * _a10 + y * _a11 + z * _a12;
            to[4 + half] = from[4 + half] + x * _a20 + y * _a21 + z * _a22;
        }
    }

    /// <summary>to = A with, in three rows of two vectors each; both may be the same rows.</summary>
    public void Times(ReadOnlySpan<Vector256<double>> with, Span<Vector256<double>> to)
    {
        for (int half = 0; half < 2; half++)
        {
            Vector256<double> x = with[half], y = with[2 + half], z = with[4 + half];
            to[half] = x * _a00 + y * _a01 + z * _a02;
            to[2 + half] = x * _a10 + y * _a11 + z * _a12;
            to[4 + half] = x * _a20 + y * _a21 + z * _a22;
        }
    }
}
