namespace PartPick.Physics.Tests.Independent;

/// <summary>Gaussian elimination for the two to four unknowns of a time step, without allocation.</summary>
internal static class Dense
{
    /// <summary>Solves in place; the solution replaces the right-hand side.</summary>
    public static void Solve(double[] matrix, double[] right, int n)
    {
        for (int column = 0; column < n; column++)
        {
            int pivot = column;
            for (int row = column + 1; row < n; row++)
            {
                if (Math.Abs(matrix[row * n + column]) > Math.Abs(matrix[pivot * n + column]))
                {
                    pivot = row;
                }
            }

            if (pivot != column)
            {
                for (int k = 0; k < n; k++)
                {
                    (matrix[pivot * n + k], matrix[column * n + k]) = (matrix[column * n + k], matrix[pivot * n + k]);
                }

                (right[pivot], right[column]) = (right[column], right[pivot]);
            }

            for (int row = column + 1; row < n; row++)
            {
                double factor = matrix[row * n + column] / matrix[column * n + column];
                for (int k = column; k < n; k++)
                {
                    matrix[row * n + k] -= factor * matrix[column * n + k];
                }

                right[row] -= factor * right[column];
            }
        }

        for (int row = n - 1; row >= 0; row--)
        {
            for (int k = row + 1; k < n; k++)
            {
                right[row] -= matrix[row * n + k] * right[k];
            }

            right[row] /= matrix[row * n + row];
        }
    }
}
