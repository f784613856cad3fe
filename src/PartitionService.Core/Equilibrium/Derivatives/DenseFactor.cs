namespace PartitionService.Core.Equilibrium.Derivatives;

/// <summary>LU factors of a small dense matrix, for many right sides.</summary>
internal sealed class DenseFactor
{
    private readonly int size;
    private readonly double[] factors;
    private readonly int[] order;
    private readonly double[] scale;

    private DenseFactor(int size, double[] factors, int[] order, double[] scale)
    {
        this.size = size;
        this.factors = factors;
        this.order = order;
        this.scale = scale;
    }

    /// <summary>Factors a matrix by Gaussian elimination with row scaling and partial pivoting.</summary>
    /// <param name="matrix">Row-major, <paramref name="size"/> columns; destroyed.</param>
    /// <param name="size">Number of unknowns.</param>
    /// <returns>The factors; null where the matrix is singular to working precision.</returns>
    public static DenseFactor? Of(double[] matrix, int size)
    {
        var order = new int[size];
        var scale = new double[size];
        for (var row = 0; row < size; row++)
        {
            order[row] = row;
            var line = matrix.AsSpan(row * size, size);
            var largest = 0.0;
            foreach (var value in line)
            {
                largest = Math.Max(largest, Math.Abs(value));
            }

            if (!(largest > 0) || !double.IsFinite(largest))
            {
                return null;
            }

            scale[row] = 1 / largest;
            foreach (ref var value in line)
            {
                value *= scale[row];
            }
        }

        for (var pivot = 0; pivot < size; pivot++)
        {
            var best = pivot;
            for (var row = pivot + 1; row < size; row++)
            {
                best = Math.Abs(matrix[(row * size) + pivot]) > Math.Abs(matrix[(best * size) + pivot]) ? row : best;
            }

            if (!(Math.Abs(matrix[(best * size) + pivot]) > 1e-300))
            {
                return null;
            }

            if (best != pivot)
            {
                (order[pivot], order[best]) = (order[best], order[pivot]);
                for (var column = 0; column < size; column++)
                {
                    (matrix[(pivot * size) + column], matrix[(best * size) + column]) =
                        (matrix[(best * size) + column], matrix[(pivot * size) + column]);
                }
            }

            Eliminate(matrix, size, pivot);
        }

        return new DenseFactor(size, matrix, order, scale);
    }

    /// <summary>Solves for one right side.</summary>
    /// <param name="right">Right side.</param>
    /// <param name="solution">Receives the solution; must not overlap <paramref name="right"/>.</param>
    public void Solve(ReadOnlySpan<double> right, Span<double> solution)
    {
        for (var row = 0; row < size; row++)
        {
            var sum = right[order[row]] * scale[order[row]];
            var line = factors.AsSpan(row * size, row);
            for (var column = 0; column < line.Length; column++)
            {
                sum -= line[column] * solution[column];
            }

            solution[row] = sum;
        }

        for (var row = size - 1; row >= 0; row--)
        {
            var line = factors.AsSpan(row * size, size);
            var sum = solution[row];
            for (var column = row + 1; column < line.Length; column++)
            {
                sum -= line[column] * solution[column];
            }

            solution[row] = sum / line[row];
        }
    }

    private static void Eliminate(double[] matrix, int size, int pivot)
    {
        var source = matrix.AsSpan(pivot * size, size);
        var inverse = 1 / source[pivot];
        for (var row = pivot + 1; row < size; row++)
        {
            var target = matrix.AsSpan(row * size, size);
            var factor = target[pivot] * inverse;
            target[pivot] = factor;
            if (factor == 0)
            {
                continue;
            }

            for (var column = pivot + 1; column < source.Length; column++)
            {
                target[column] -= factor * source[column];
            }
        }
    }
}
