using System.Numerics;
using System.Runtime.InteropServices;

namespace PartPick.Physics.Numerics;

/// <summary>
/// Gaussian elimination with partial pivoting on a dense row-major matrix, in place and without allocation: the inner loop
/// of the harmonic balance, too small and too frequent for a general library call.
/// </summary>
internal static class DenseSolver
{
    /// <summary>
    /// Solves the leading n×n system for every right-hand column that follows it in the same row. On return the columns
    /// n … n + rightHandSides − 1 hold the solutions. False where the matrix is singular.
    /// </summary>
    /// <param name="matrix">Rows of <paramref name="stride"/> numbers.</param>
    /// <param name="n">Number of equations.</param>
    /// <param name="rightHandSides">Number of columns to solve for.</param>
    /// <param name="stride">Length of a row, at least n + rightHandSides.</param>
    public static bool Solve(Span<double> matrix, int n, int rightHandSides, int stride)
    {
        int width = n + rightHandSides;
        for (int column = 0; column < n; column++)
        {
            int pivot = column;
            double largest = Math.Abs(matrix[column * stride + column]);
            for (int row = column + 1; row < n; row++)
            {
                double size = Math.Abs(matrix[row * stride + column]);
                if (size > largest)
                {
                    largest = size;
                    pivot = row;
                }
            }

            if (!(largest > 0) || !double.IsFinite(largest))
            {
                return false;
            }

            Span<double> pivotRow = matrix.Slice(column * stride, width);
            if (pivot != column)
            {
                Span<double> other = matrix.Slice(pivot * stride, width);
                for (int k = column; k < width; k++)
                {
                    (pivotRow[k], other[k]) = (other[k], pivotRow[k]);
                }
            }

            double inverse = 1 / pivotRow[column];
            ReadOnlySpan<double> tail = pivotRow[(column + 1)..];
            for (int row = column + 1; row < n; row++)
            {
                Span<double> target = matrix.Slice(row * stride, width);
                double factor = target[column] * inverse;
                if (factor != 0)
                {
                    SubtractMultiple(target[(column + 1)..], tail, factor);
                }
            }
        }

        return BackSubstitute(matrix, n, width, stride);
    }

    private static bool BackSubstitute(Span<double> matrix, int n, int width, int stride)
    {
        for (int right = n; right < width; right++)
        {
            for (int row = n - 1; row >= 0; row--)
            {
                Span<double> line = matrix.Slice(row * stride, width);
                double sum = line[right];
                for (int k = row + 1; k < n; k++)
                {
                    sum -= line[k] * matrix[k * stride + right];
                }

                line[right] = sum / line[row];
                if (!double.IsFinite(line[right]))
                {
                    return false;
                }
            }
        }

        return true;
    }

    private static void SubtractMultiple(Span<double> target, ReadOnlySpan<double> source, double factor)
    {
        Span<Vector<double>> targets = MemoryMarshal.Cast<double, Vector<double>>(target);
        ReadOnlySpan<Vector<double>> sources = MemoryMarshal.Cast<double, Vector<double>>(source[..target.Length]);
        var factors = new Vector<double>(factor);
        for (int i = 0; i < targets.Length; i++)
        {
            targets[i] -= factors * sources[i];
        }

        for (int i = targets.Length * Vector<double>.Count; i < target.Length; i++)
        {
            target[i] -= factor * source[i];
        }
    }
}
