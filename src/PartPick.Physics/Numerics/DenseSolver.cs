using System.Numerics;
using System.Runtime.InteropServices;

namespace PartPick.Physics.Numerics;

/// <summary>
/// LU factors with partial pivoting of a dense row-major matrix, in place and without allocation once sized: the inner loop of
/// the harmonic balance, too small and too frequent for a general library call.
/// </summary>
internal sealed class DenseSolver
{
    private double[] _matrix = [];
    private int[] _pivots = [];
    private int _n;
    private int _stride;

    /// <summary>True while factors of the last matrix are there to solve with.</summary>
    public bool IsFactored { get; private set; }

    /// <summary>Number of equations of the last matrix.</summary>
    public int Order => _n;

    /// <summary>Sizes the matrix and gives its storage, rows of <paramref name="stride"/> numbers.</summary>
    public Span<double> Matrix(int n, out int stride)
    {
        _n = n;
        _stride = (n + 3) / 4 * 4;
        if (_matrix.Length < n * _stride)
        {
            _matrix = new double[n * _stride];
            _pivots = new int[n];
        }

        IsFactored = false;
        stride = _stride;
        return _matrix;
    }

    /// <summary>Factors the matrix in place; false where it is singular.</summary>
    public bool Factor()
    {
        Span<double> matrix = _matrix;
        for (int column = 0; column < _n; column++)
        {
            int pivot = column;
            double largest = Math.Abs(matrix[column * _stride + column]);
            for (int row = column + 1; row < _n; row++)
            {
                double size = Math.Abs(matrix[row * _stride + column]);
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

            _pivots[column] = pivot;
            Span<double> pivotRow = matrix.Slice(column * _stride, _n);
            if (pivot != column)
            {
                Swap(pivotRow, matrix.Slice(pivot * _stride, _n));
            }

            double inverse = 1 / pivotRow[column];
            ReadOnlySpan<double> tail = pivotRow[(column + 1)..];
            for (int row = column + 1; row < _n; row++)
            {
                Span<double> target = matrix.Slice(row * _stride, _n);
                double factor = target[column] * inverse;
                target[column] = factor;
                if (factor != 0)
                {
                    SubtractMultiple(target[(column + 1)..], tail, factor);
                }
            }
        }

        IsFactored = true;
        return true;
    }

    /// <summary>Solves for one right-hand side, in place; false where the solution is not finite.</summary>
    public bool Solve(Span<double> right)
    {
        ReadOnlySpan<double> matrix = _matrix;
        for (int row = 0; row < _n; row++)
        {
            int pivot = _pivots[row];
            if (pivot != row)
            {
                (right[row], right[pivot]) = (right[pivot], right[row]);
            }
        }

        for (int row = 1; row < _n; row++)
        {
            right[row] -= Rows.Dot(matrix.Slice(row * _stride, row), right[..row]);
        }

        for (int row = _n - 1; row >= 0; row--)
        {
            ReadOnlySpan<double> line = matrix.Slice(row * _stride, _n);
            double sum = right[row] - Rows.Dot(line[(row + 1)..], right[(row + 1).._n]);
            right[row] = sum / line[row];
            if (!double.IsFinite(right[row]))
            {
                return false;
            }
        }

        return true;
    }

    private static void Swap(Span<double> left, Span<double> right)
    {
        for (int k = 0; k < left.Length; k++)
        {
            (left[k], right[k]) = (right[k], left[k]);
        }
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
