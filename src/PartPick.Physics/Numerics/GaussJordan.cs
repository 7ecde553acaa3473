using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;

namespace PartPick.Physics.Numerics;

/// <summary>Elimination with partial pivoting of a few equations with many right-hand sides, in rows of whole vectors.</summary>
internal static class GaussJordan
{
    /// <summary>Turns [A | B] into [1 | A⁻¹B] in place; false where A is singular.</summary>
    /// <param name="rows">The rows, one after another.</param>
    /// <param name="order">Number of equations.</param>
    /// <param name="vectors">Length of a row in vectors of four numbers.</param>
    public static bool Reduce(Span<double> rows, int order, int vectors)
    {
        int stride = 4 * vectors;
        Span<Vector256<double>> lines = MemoryMarshal.Cast<double, Vector256<double>>(rows);
        for (int column = 0; column < order; column++)
        {
            int pivot = Pivot(rows, order, stride, column);
            double largest = Math.Abs(rows[pivot * stride + column]);
            if (!(largest > 0) || !double.IsFinite(largest))
            {
                return false;
            }

            int first = column / 4;
            Span<Vector256<double>> line = lines.Slice(column * vectors, vectors);
            if (pivot != column)
            {
                Span<Vector256<double>> other = lines.Slice(pivot * vectors, vectors);
                for (int k = first; k < vectors; k++)
                {
                    (line[k], other[k]) = (other[k], line[k]);
                }
            }

            double inverse = 1 / rows[column * stride + column];
            for (int k = first; k < line.Length; k++)
            {
                line[k] *= inverse;
            }

            for (int row = 0; row < order; row++)
            {
                double factor = rows[row * stride + column];
                if (row == column || factor == 0)
                {
                    continue;
                }

                Span<Vector256<double>> target = lines.Slice(row * vectors, vectors);
                var factors = Vector256.Create(-factor);
                for (int k = first; k < target.Length; k++)
                {
                    target[k] = Vector256.FusedMultiplyAdd(factors, line[k], target[k]);
                }
            }
        }

        return true;
    }

    private static int Pivot(ReadOnlySpan<double> rows, int order, int stride, int column)
    {
        int pivot = column;
        double largest = Math.Abs(rows[column * stride + column]);
        for (int row = column + 1; row < order; row++)
        {
            double size = Math.Abs(rows[row * stride + column]);
            if (size > largest)
            {
                (pivot, largest) = (row, size);
            }
        }

        return pivot;
    }
}
