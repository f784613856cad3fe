using PartitionService.Core.Catalogue;

namespace PartitionService.Core.Equilibrium.Derivatives;

/// <summary>A mass that is linear in the masses of the clean metal and the clean slag.</summary>
/// <param name="PerMetal">Share of the metal's mass.</param>
/// <param name="PerSlag">Share of the slag's mass.</param>
internal readonly record struct LinearMass(double PerMetal, double PerSlag)
{
    /// <summary>The mass, or its change.</summary>
    public double Of(double metal, double slag) => (PerMetal * metal) + (PerSlag * slag);

    /// <summary>Droplets that the slag carries and slag that the metal carries, as the answer's streams define them.</summary>
    /// <remarks>
    /// e_M = p (m_S - e_S + e_M) and e_S = q (m_M - e_M + e_S), each between zero and what there is; p + q of 1 or more carries all over.
    /// </remarks>
    public static (LinearMass ToSlag, LinearMass ToMetal) Entrainment(
        double metal, double slag, PracticeAllowances allowances, SlagFamily? family)
    {
        var p = (allowances.MetalInSlagTypical ? family?.TypicalEntrainedMetalMassPercent ?? 0 : allowances.MetalInSlagMassPercent) / 100;
        var q = allowances.SlagInMetalMassPercent / 100;
        var determinant = 1 - p - q;
        if (!(metal > 0 && slag > 0 && (p > 0 || q > 0)))
        {
            return (default, default);
        }

        LinearMass all = new(1, 0), allSlag = new(0, 1);
        return determinant > 0
            ? (new LinearMass(-p * q / determinant, p * (1 - q) / determinant).Limit(metal, slag, all),
                new LinearMass(q * (1 - p) / determinant, -p * q / determinant).Limit(metal, slag, allSlag))
            : (all, allSlag);
    }

    private LinearMass Limit(double metal, double slag, LinearMass all) =>
        Of(metal, slag) < 0 ? default : Of(metal, slag) > all.Of(metal, slag) ? all : this;
}
