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
/// beyond it saturates at 2/|eps|. A positive self-interaction up to 20 has 10 in place of 2. The coefficients are the exact derivatives of that g: Gibbs-Duhem holds everywhere, and the
/// published formalism is recovered where it is valid.
/// </para>
/// </remarks>
public sealed class InteractionModel
{
    /// <summary>|eps x| at which a term is bounded.</summary>
    public const double Bound = 2;

    /// <summary>
    /// eps x at which a moderate repulsion of a solute with itself is bounded: it only stabilises the melt, and carbon in iron reaches
    /// eps x = 1.5 well inside the range that its parameter was measured in.
    /// </summary>
    public const double RepulsionBound = 10;

    /// <summary>Largest self-interaction parameter that counts as moderate.</summary>
    public const double ModerateEpsilon = 20;

    private readonly int[] first;
    private readonly int[] second;
    private readonly double[] epsilon;
    private readonly double[] bound;

    /// <summary>Builds the model.</summary>
    /// <param name="pairs">Solute indices i, j (once per unordered pair) and eps_ij at the temperature of the case.</param>
    public InteractionModel(IReadOnlyCollection<(int First, int Second, double Epsilon)> pairs)
    {
        first = [.. pairs.Select(p => p.First)];
        second = [.. pairs.Select(p => p.Second)];
        epsilon = [.. pairs.Select(p => p.Epsilon)];
        bound = [.. pairs.Select(p => BoundOf(p.First == p.Second, p.Epsilon))];
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
            var (phiI, slopeI) = Bounded(moleFraction[i], eps, bound[pair]);
            if (i == j)
            {
                energy += 0.5 * eps * phiI * phiI;
                lnGammaExcess[i] += eps * phiI * slopeI;
                continue;
            }

            var (phiJ, slopeJ) = Bounded(moleFraction[j], eps, bound[pair]);
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

    /// <summary>Second derivatives of g, from which the derivatives of the coefficients with respect to the composition follow.</summary>
    /// <param name="moleFraction">Mole fraction of each solute.</param>
    /// <param name="curvature">Receives d2g/dx_i dx_j, row-major, one row per solute.</param>
    /// <remarks>
    /// d ln gamma_solvent/dx_j = -sum_m x_m g_mj, and d ln gamma_i/dx_j = g_ij + d ln gamma_solvent/dx_j.
    /// </remarks>
    public void Curvature(ReadOnlySpan<double> moleFraction, Span<double> curvature)
    {
        var size = moleFraction.Length;
        curvature.Clear();
        for (var pair = 0; pair < epsilon.Length; pair++)
        {
            var i = first[pair];
            var j = second[pair];
            var eps = epsilon[pair];
            var (phiI, slopeI) = Bounded(moleFraction[i], eps, bound[pair]);
            var bendI = Bend(moleFraction[i], eps, bound[pair]);
            if (i == j)
            {
                curvature[(i * size) + i] += eps * ((slopeI * slopeI) + (phiI * bendI));
                continue;
            }

            var (phiJ, slopeJ) = Bounded(moleFraction[j], eps, bound[pair]);
            curvature[(i * size) + i] += eps * bendI * phiJ;
            curvature[(j * size) + j] += eps * Bend(moleFraction[j], eps, bound[pair]) * phiI;
            curvature[(i * size) + j] += eps * slopeI * slopeJ;
            curvature[(j * size) + i] += eps * slopeI * slopeJ;
        }
    }

    /// <summary>Derivatives of g and of its two slopes with respect to the parameter of one pair.</summary>
    /// <param name="fractionFirst">Mole fraction of the first solute.</param>
    /// <param name="fractionSecond">Mole fraction of the second solute; not used for a self-interaction.</param>
    /// <param name="eps">The parameter.</param>
    /// <param name="same">True for a self-interaction.</param>
    /// <returns>dg/deps, d(dg/dx_first)/deps and d(dg/dx_second)/deps, the last zero for a self-interaction.</returns>
    public static (double Energy, double First, double Second) PerEpsilon(
        double fractionFirst, double fractionSecond, double eps, bool same)
    {
        var limit = BoundOf(same, eps);
        var (phiI, slopeI) = Bounded(fractionFirst, eps, limit);
        var (phiIe, slopeIe) = BoundedPerEpsilon(fractionFirst, eps, limit);
        if (same)
        {
            return (
                (0.5 * phiI * phiI) + (eps * phiI * phiIe),
                (phiI * slopeI) + (eps * ((phiIe * slopeI) + (phiI * slopeIe))),
                0);
        }

        var (phiJ, slopeJ) = Bounded(fractionSecond, eps, limit);
        var (phiJe, slopeJe) = BoundedPerEpsilon(fractionSecond, eps, limit);
        return (
            (phiI * phiJ) + (eps * ((phiIe * phiJ) + (phiI * phiJe))),
            (slopeI * phiJ) + (eps * ((slopeIe * phiJ) + (slopeI * phiJe))),
            (slopeJ * phiI) + (eps * ((slopeJe * phiI) + (slopeJ * phiIe))));
    }

    /// <summary>Pairs whose term is far enough from first order that the bound changes it by more than 2 %.</summary>
    /// <param name="moleFraction">Mole fraction of each solute.</param>
    /// <returns>Solute indices and the larger |eps x| of each such pair.</returns>
    public IEnumerable<(int First, int Second, double Strength)> BoundedPairs(double[] moleFraction)
    {
        for (var pair = 0; pair < epsilon.Length; pair++)
        {
            var strength = Math.Abs(epsilon[pair]) * Math.Max(moleFraction[first[pair]], moleFraction[second[pair]]);
            if (strength > bound[pair] / 2)
            {
                yield return (first[pair], second[pair], strength);
            }
        }
    }

    private static double BoundOf(bool self, double eps) => self && eps is > 0 and <= ModerateEpsilon ? RepulsionBound : Bound;

    private static (double Value, double Slope) Bounded(double x, double eps, double bound)
    {
        var u = eps * x / bound;
        var root = 1 + (u * u * (u * u));
        if (!double.IsFinite(root))
        {
            return (bound / Math.Abs(eps), 0);
        }

        var quarter = Math.Sqrt(Math.Sqrt(root));
        return (x / quarter, 1 / (root * quarter));
    }

    /// <summary>d2phi/dx2 = -5 u^3 (eps/2)/(1 + u^4)^(9/4) with u = eps x/2 (2: the bound).</summary>
    private static double Bend(double x, double eps, double bound)
    {
        var u = eps * x / bound;
        var root = 1 + (u * u * (u * u));
        return double.IsFinite(root) ? -5 * u * u * u * (eps / bound) / (root * root * Math.Sqrt(Math.Sqrt(root))) : 0;
    }

    /// <summary>dphi/deps = -(x^2/2) u^3/(1 + u^4)^(5/4) and d2phi/dx deps = -(5/2) x u^3/(1 + u^4)^(9/4).</summary>
    private static (double Value, double Slope) BoundedPerEpsilon(double x, double eps, double bound)
    {
        var u = eps * x / bound;
        var root = 1 + (u * u * (u * u));
        if (!double.IsFinite(root))
        {
            return (-bound / (eps * Math.Abs(eps)), 0);
        }

        var quarter = Math.Sqrt(Math.Sqrt(root));
        var cube = u * u * u;
        return (-x * x / bound * cube / (root * quarter), -5 / bound * x * cube / (root * root * quarter));
    }
}
