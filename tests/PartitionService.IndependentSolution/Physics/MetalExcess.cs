using PartitionService.Core.Catalogue;

namespace PartitionService.IndependentSolution.Physics;

/// <summary>Excess Gibbs energy of the metal beyond Henry's law, in the unified formalism with every term bounded.</summary>
/// <remarks>
/// Only the energy is written down: G/RT = N sum of eps phi(x_i) phi(x_j) over pairs (half of it for i = j), phi(x) = x/(1 + (eps x/2)^4)^(1/4).
/// Chemical potentials come from differentiating it with dual numbers, so that no formula for a coefficient is needed.
/// </remarks>
internal sealed class MetalExcess
{
    private readonly (int First, int Second, double Epsilon)[] pairs;
    private readonly int count;

    /// <param name="names">Elements of the metal, solvent included.</param>
    /// <param name="solvent">Solvent.</param>
    /// <param name="rows">Rows.</param>
    public MetalExcess(string[] names, string solvent, Rows rows)
    {
        count = names.Length;
        pairs =
        [
            .. rows.All<InteractionDatum>(r => r.Solvent == solvent && names.Contains(r.First) && names.Contains(r.Second))
                .Select(r => (r.First, r.Second)).Distinct()
                .Select(p => (
                    Array.IndexOf(names, p.First),
                    Array.IndexOf(names, p.Second),
                    rows.Nearest<InteractionDatum>(r => r.Solvent == solvent && r.First == p.First && r.Second == p.Second)!))
                .Select(p => (p.Item1, p.Item2, p.Item3.Constant + (p.Item3.InverseTemperatureKelvin / rows.Temperature))),
        ];
    }

    public bool IsEmpty => pairs.Length == 0;

    /// <summary>Excess potentials over RT of all metal species at amounts in mol.</summary>
    public double[] Potentials(double[] amounts)
    {
        var total = amounts.Sum();
        var potentials = new double[count];
        for (var k = 0; k < count; k++)
        {
            // d/dn_k of N h(n/N): x_i carries dx_i = (delta_ik - x_i)/N, N carries dN = 1.
            double h = 0, dh = 0;
            foreach (var (i, j, epsilon) in pairs)
            {
                var (a, da) = Bounded(amounts[i] / total, ((i == k ? 1 : 0) - (amounts[i] / total)) / total, epsilon);
                var (b, db) = Bounded(amounts[j] / total, ((j == k ? 1 : 0) - (amounts[j] / total)) / total, epsilon);
                var weight = i == j ? 0.5 * epsilon : epsilon;
                h += weight * a * b;
                dh += weight * ((da * b) + (a * db));
            }

            potentials[k] = h + (total * dh);
        }

        return potentials;
    }

    private static (double Value, double Dual) Bounded(double x, double dx, double epsilon)
    {
        var strength = Math.Abs(epsilon * x / 2);
        if (strength > 1e50)
        {
            return (2 / Math.Abs(epsilon), 0);
        }

        var root = 1 + Math.Pow(strength, 4);
        var scale = Math.Pow(root, -0.25);

        // d(x root^(-1/4)) = root^(-1/4) dx - x/4 root^(-5/4) d(root), d(root) = 4 strength^4 dx/x.
        return (x * scale, (scale * dx) - (scale / root * Math.Pow(strength, 4) * dx));
    }
}
