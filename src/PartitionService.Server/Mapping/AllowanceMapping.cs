using PartitionService.Core.Equilibrium;
using Wire = PartitionService.Contracts.V1;

namespace PartitionService.Server.Mapping;

/// <summary>Turns the allowances of a request into those of the core.</summary>
internal static class AllowanceMapping
{
    /// <summary>Maps the allowances; unset ones are off.</summary>
    /// <param name="sent">The allowances as sent; null: none.</param>
    /// <param name="violations">Receives what only the message shows; paths start at the vessel.</param>
    public static PracticeAllowances ToAllowances(Wire.PracticeAllowances? sent, ICollection<CaseViolation> violations)
    {
        if (sent is null)
            return PracticeAllowances.None;
        var mapped = new PracticeAllowances
        {
            StageEfficiencies = [.. sent.StageEfficiencies.Select(s => new StageEfficiency(s.Element, s.Efficiency))],
        };
        if (sent.HasSlagInMetalMassPercent)
            mapped = mapped with { SlagInMetalMassPercent = sent.SlagInMetalMassPercent };
        if (sent.HasMechanicalDustMassFraction)
            mapped = mapped with { MechanicalDustMassFraction = sent.MechanicalDustMassFraction };
        return sent.MetalInSlag is null ? mapped : WithMetalInSlag(mapped, sent.MetalInSlag, violations);
    }

    private static PracticeAllowances WithMetalInSlag(
        PracticeAllowances mapped, Wire.EntrainedMetal sent, ICollection<CaseViolation> violations)
    {
        const string path = "allowances.metal_in_slag";
        switch (sent.BasisCase)
        {
            case Wire.EntrainedMetal.BasisOneofCase.MassPercent:
                return mapped with { MetalInSlagMassPercent = sent.MassPercent };
            case Wire.EntrainedMetal.BasisOneofCase.FamilyTypical when sent.FamilyTypical:
                return mapped with { MetalInSlagTypical = true };
            case Wire.EntrainedMetal.BasisOneofCase.FamilyTypical:
                violations.Add(new CaseViolation(path + ".family_typical", "false", "must be true; leave metal_in_slag unset for none"));
                return mapped;
            default:
                violations.Add(new CaseViolation(path, "", "needs exactly one of mass_percent, family_typical"));
                return mapped;
        }
    }
}
