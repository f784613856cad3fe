namespace PartitionService.Core.Equilibrium.Solvers;

/// <summary>Dense linear solve of the few border unknowns.</summary>
internal static class BorderSystem
{
    /// <summary>Solves A x = b in place by Gaussian elimination with partial pivoting after row scaling.</summary>
    /// <param name="matrix">Row-major, <paramref name="stride"/> columns; destroyed.</param>
    /// <param name="right">Right side; holds the solution on return.</param>
    /// <param name="size">Number of unknowns.</param>
    /// <param name="stride">Columns per row of <paramref name="matrix"/>.</param>
    /// <returns>False where the matrix is singular to working precision.</returns>
    /// <remarks>Potentials and amounts differ by many decades, so each row is scaled by its largest entry first.</remarks>
    public static bool Solve(Span<double> matrix, Span<double> right, int size, int stride)
    {
        for (var row = 0; row < size; row++)
        {
            var largest = 0.0;
            for (var column = 0; column < size; column++)
            {
                largest = Math.Max(largest, Math.Abs(matrix[(row * stride) + column]));
            }

            if (!(largest > 0) || !double.IsFinite(largest))
            {
                return false;
            }

            var scale = 1 / largest;
            for (var column = 0; column < size; column++)
            {
                matrix[(row * stride) + column] *= scale;
            }

            right[row] *= scale;
        }

        for (var pivot = 0; pivot < size; pivot++)
        {
            var best = pivot;
            for (var row = pivot + 1; row < size; row++)
            {
                if (Math.Abs(matrix[(row * stride) + pivot]) > Math.Abs(matrix[(best * stride) + pivot]))
                {
                    best = row;
                }
            }

            if (!(Math.Abs(matrix[(best * stride) + pivot]) > 1e-300))
            {
                return false;
            }

            if (best != pivot)
            {
                for (var column = pivot; column < size; column++)
                {
                    (matrix[(pivot * stride) + column], matrix[(best * stride) + column]) =
                        (matrix[(best * stride) + column], matrix[(pivot * stride) + column]);
                }

                (right[pivot], right[best]) = (right[best], right[pivot]);
            }

            var inverse = 1 / matrix[(pivot * stride) + pivot];
            for (var row = pivot + 1; row < size; row++)
            {
                var factor = matrix[(row * stride) + pivot] * inverse;
                if (factor == 0)
                {
                    continue;
                }

                for (var column = pivot + 1; column < size; column++)
                {
                    matrix[(row * stride) + column] -= factor * matrix[(pivot * stride) + column];
                }

                right[row] -= factor * right[pivot];
            }
        }

        for (var row = size - 1; row >= 0; row--)
        {
            var sum = right[row];
            for (var column = row + 1; column < size; column++)
            {
                sum -= matrix[(row * stride) + column] * right[column];
            }

            right[row] = sum / matrix[(row * stride) + row];
        }

        return true;
    }
}
