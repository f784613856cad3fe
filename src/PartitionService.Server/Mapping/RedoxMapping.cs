using PartitionService.Core.Equilibrium;
using Wire = PartitionService.Contracts.V1;

namespace PartitionService.Server.Mapping;

/// <summary>Turns the potentials of an answer into those that are sent.</summary>
internal static class RedoxMapping
{
    /// <summary>Maps the report; a potential that is null stays unset.</summary>
    public static Wire.RedoxReport ToWire(RedoxReport redox)
    {
        var sent = new Wire.RedoxReport
        {
            OxygenToSupplyKg = redox.OxygenToSupplyKg,
            OxygenToSupplyNormalCubicMetre = redox.OxygenToSupplyNormalCubicMetre,
        };
        if (redox.Log10OxygenPressureAtm is { } oxygen)
            sent.Log10Po2Atm = oxygen;
        if (redox.OxygenPotentialKilojoulePerMol is { } potential)
            sent.OxygenPotentialKilojoulePerMol = potential;
        if (redox.CarbonDioxideToMonoxide is { } carbon)
            sent.Co2ToCoRatio = carbon;
        if (redox.WaterToHydrogen is { } water)
            sent.H2OToH2Ratio = water;
        if (redox.DissolvedOxygenMassPpm is { } dissolved)
            sent.DissolvedOxygenMassPpm = dissolved;
        if (redox.Log10SulfurPressureAtm is { } sulfur)
            sent.Log10Ps2Atm = sulfur;
        if (redox.Log10ChlorinePressureAtm is { } chlorine)
            sent.Log10Pcl2Atm = chlorine;
        return sent;
    }
}
