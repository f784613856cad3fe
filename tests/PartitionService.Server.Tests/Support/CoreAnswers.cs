using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;

namespace PartitionService.Server.Tests.Support;

/// <summary>Answers of the core in which every number differs, so that a mix-up in a mapping shows.</summary>
public static class CoreAnswers
{
    public static VesselAnswer Full(string name = "case") => new()
    {
        Name = name,
        CatalogueDigest = new string('a', 64),
        TemperatureKelvin = 1573,
        PressureAtm = 1.01,
        Solvent = "Cu",
        SlagFamily = "iron-silicate",
        Elements =
        [
            new ElementDistribution
            {
                Element = "Cu",
                InputKg = 1000,
                MetalFraction = 0.91,
                SlagFraction = 0.04,
                GasFraction = 0.02,
                MechanicalDustFraction = 0.015,
                UnburntCarbonFraction = 0.01,
                UnplacedFraction = 0.005,
                MetalMassPpm = 981000,
                SlagMassPpm = 12000,
                PartitionRatioSlagToMetal = 0.0122,
                Activity = 0.978,
                ActivityReference = "pure liquid",
            },
        ],
        Metal = new PhaseReport(901, 14201, [new("Cu", 900, 99.9)], [new("Cu", 0.999, 14190, 900.5, 0.998, 0.9995, "pure liquid")]),
        Slag = new PhaseReport(402, 5203, [new("Fe", 200, 49.8)], [new("FeO", 0.55, 2861, 205.5, 0.44, 0.8, "pure liquid oxide")]),
        Gas = new GasReport(2231, 62.5, 50.1, [new("N2", 0.97, 0.98, 2164, 1250)], [new("N", 60.6, 97.0)], 3.25),
        UnburntCarbonKg = 1.5,
        MechanicalDustKg = 2.5,
        Redox = new RedoxReport
        {
            Log10OxygenPressureAtm = -8.1,
            OxygenPotentialKilojoulePerMol = -243.9,
            CarbonDioxideToMonoxide = 11.5,
            WaterToHydrogen = 6.7,
            DissolvedOxygenMassPpm = 812,
            OxygenToSupplyKg = 4.5,
            OxygenToSupplyNormalCubicMetre = 3.15,
            Log10SulfurPressureAtm = -5.5,
            Log10ChlorinePressureAtm = -9.5,
        },
        SolventLoss = new SolventLoss(1000.5, 4.25, 3.75, 0.5, 0.75, 0.00925),
        Allowances = new AllowancesReport(1.1, 4.4, "entrainment/x", 0.6, 5.4, 0.007, [new("Zn", 0.8, 0.33)]),
        Remarks = [new Remark(RemarkCode.FromMemory, Severity.Warning, "Pb", "metal/Cu/Pb", "A sentence.", [new("sigma", 0.31, "1")])],
        Cautions = [new Caution("Pb", "Lead fume.", 1.75)],
        DataUsed =
        [
            new DatumUse("metal/Cu/Pb#1", "ln gamma0 of Pb in liquid Cu", 1.73, "1", 0.21, Access.Derived, ["a", "b"], ["flag"], true, 12),
        ],
        WeakestAccess = Access.Memory,
        Solution = new SolutionReport(37, 4, 1.2e-13, true),
        Derivatives = new DerivativeReport(
            [new(DerivativeOutputKind.MetalFraction, "Cu")],
            [new(DerivativeParameterKind.ChargeQuantity, "PbO", 3, "kg", 21.5, true, [-0.00125])]),
    };
}
