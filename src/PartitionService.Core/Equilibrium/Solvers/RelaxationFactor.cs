namespace PartitionService.Core.Equilibrium.Solvers;

/// <summary>Step length of a fixed-point iteration from its last two residuals.</summary>
/// <remarks>
/// Aitken's rule for vectors (Irons and Tuck, Int. J. Numer. Methods Eng. 1 (1969) 275): omega_(k+1) = -omega_k r_k.(r_(k+1) - r_k) /
/// |r_(k+1) - r_k|^2. It shortens steps that overshoot and lengthens steps that creep; bounds keep one bad pair of residuals harmless.
/// </remarks>
internal sealed class RelaxationFactor
{
    private const double Shortest = 0.05;
    private const double Longest = 20;
    private const double LargestGrowth = 3;

    private double[] last = [];
    private bool hasLast;

    /// <summary>The step length; 1 at the start.</summary>
    public double Value { get; private set; } = 1;

    /// <summary>Takes the next residual and renews <see cref="Value"/>.</summary>
    public void Update(ReadOnlySpan<double> residual)
    {
        if (hasLast)
        {
            double along = 0, square = 0;
            for (var i = 0; i < residual.Length; i++)
            {
                var change = residual[i] - last[i];
                along += last[i] * change;
                square += change * change;
            }

            var next = square > 0 ? -Value * along / square : Longest;

            // A negative value means that the residual grows in its own direction: keep the direction and grow the step.
            var wanted = next > 0 ? next : LargestGrowth * Value;
            Value = Math.Clamp(Math.Min(wanted, LargestGrowth * Value), Shortest, Longest);
        }

        if (last.Length != residual.Length)
        {
            last = new double[residual.Length];
        }

        residual.CopyTo(last);
        hasLast = true;
    }
}
