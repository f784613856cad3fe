namespace PartitionService.Core.Thermodynamics;

/// <summary>Composition dependence of activity coefficients in a liquid metal from first-order interaction parameters.</summary>
/// <remarks>
/// <para>
/// Unified interaction parameter formalism (Pelton and Bale, Metall. Trans. A 17 (1986) 1211, eq. 6 and 7):
/// ln gamma_solvent = -1/2 sum_jk eps_jk x_j x_k, ln gamma_i = ln gamma0_i + ln gamma_solvent + sum_j eps_ij x_j.
/// </para>
/// <para>
/// It follows from the excess Gibbs energy g = sum_i x_i ln gamma0_i + 1/2 sum_jk eps_jk x_j x_k. First-order parameters of strong
/// oxide formers reach 1e5 and mean nothing beyond traces, so the model uses g with x replaced by
/// phi(x) = x / (1 + (eps x / 2)^4)^(1/4). Up to |eps x| = 0.2 phi is x within 3e-5 and its slope 1 within 2e-4 (relative); far
/// beyond it saturates at 2/|eps|. The coefficients are the exact derivatives of that g: Gibbs-Duhem holds everywhere, and the
/// published formalism is recovered where it is valid.
/// </para>
/// </remarks>
public sealed class InteractionModel
{
    /// <summary>|eps x| at which a term is bounded.</summary>
    public const double Bound = 2;

    private readonly int[] first;
    private readonly int[] second;
    private readonly double[] epsilon;

    /// <summary>Builds the model.</summary>
    /// <param name="pairs">Solute indices i, j (once per unordered pair) and eps_ij at the temperature of the case.</param>
    public InteractionModel(IReadOnlyCollection<(int First, int Second, double Epsilon)> pairs)
    {
        first = [.. pairs.Select(p => p.First)];
        second = [.. pairs.Select(p => p.Second)];
        epsilon = [.. pairs.Select(p => p.Epsilon)];
    }

    /// <summary>True where there is no parameter.</summary>
    public bool IsEmpty => epsilon.Length == 0;

    /// <summary>Evaluates the coefficients.</summary>
    /// <param name="moleFraction">Mole fraction of each solute.</param>
    /// <param name="lnGammaExcess">Receives ln gamma_i - ln gamma0_i of each solute.</param>
    /// <param name="lnGammaSolvent">Receives ln gamma of the solvent.</param>
    public void Evaluate(ReadOnlySpan<double> moleFraction, Span<double> lnGammaExcess, out double lnGammaSolvent)
    {
        lnGammaExcess.Clear();
        var energy = 0.0;
        for (var pair = 0; pair < epsilon.Length; pair++)
        {
            var i = first[pair];
            var j = second[pair];
            var eps = epsilon[pair];
            var (phiI, slopeI) = Bounded(moleFraction[i], eps);
            if (i == j)
            {
                energy += 0.5 * eps * phiI * phiI;
                lnGammaExcess[i] += eps * phiI * slopeI;
                continue;
            }

            var (phiJ, slopeJ) = Bounded(moleFraction[j], eps);
            energy += eps * phiI * phiJ;
            lnGammaExcess[i] += eps * slopeI * phiJ;
            lnGammaExcess[j] += eps * slopeJ * phiI;
        }

        // ln gamma_i = dg/dx_i + g - sum_m x_m dg/dx_m; the last two are ln gamma of the solvent.
        lnGammaSolvent = energy;
        for (var i = 0; i < moleFraction.Length; i++)
        {
            lnGammaSolvent -= moleFraction[i] * lnGammaExcess[i];
        }

        for (var i = 0; i < moleFraction.Length; i++)
        {
            lnGammaExcess[i] += lnGammaSolvent;
        }
    }

    /// <summary>Pairs whose term is far enough from first order that the bound changes it by more than 2 %.</summary>
    /// <param name="moleFraction">Mole fraction of each solute.</param>
    /// <returns>Solute indices and the larger |eps x| of each such pair.</returns>
    public IEnumerable<(int First, int Second, double Strength)> BoundedPairs(double[] moleFraction)
    {
        for (var pair = 0; pair < epsilon.Length; pair++)
        {
            var strength = Math.Abs(epsilon[pair]) * Math.Max(moleFraction[first[pair]], moleFraction[second[pair]]);
            if (strength > Bound / 2)
            {
                yield return (first[pair], second[pair], strength);
            }
        }
    }

    private static (double Value, double Slope) Bounded(double x, double eps)
    {
        var u = eps * x / Bound;
        var root = 1 + (u * u * (u * u));
        if (!double.IsFinite(root))
        {
            return (Bound / Math.Abs(eps), 0);
        }

        var quarter = Math.Sqrt(Math.Sqrt(root));
        return (x / quarter, 1 / (root * quarter));
    }
}
