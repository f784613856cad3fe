using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Tests.Output;

/// <summary>An answer with a number for every part of the page, among them traces, nothing and all.</summary>
internal static class HandMadeAnswer
{
    public static ChargeAnswer Create() => new()
    {
        Name = "Hollowmere Works, \"trial\", 1",
        CatalogueDigest = "0123456789abcdef" + new string('0', 48),
        TemperatureKelvin = 1573.15,
        PressureAtm = 1,
        Solvent = "Cu",
        SlagFamily = "iron-silicate",
        Elements =
        {
            new ElementDistribution
            {
                Element = "Cu", InputKg = 1000, MetalFraction = 0.985, SlagFraction = 0.015 - 1e-9, GasFraction = 1e-9, MetalMassPpm = 985_000, SlagMassPpm = 9000,
                PartitionRatioSlagToMetal = 0.00914, Activity = 0.98, ActivityReference = "pure liquid",
            },
            new ElementDistribution { Element = "Zn", InputKg = 2, MetalFraction = 0.1, SlagFraction = 0.3, GasFraction = 0.59, MechanicalDustFraction = 0.01, MetalMassPpm = 200, SlagMassPpm = 600, PartitionRatioSlagToMetal = 3 },
            new ElementDistribution { Element = "Pd", InputKg = 0.25, MetalFraction = 1 - 1e-8, SlagFraction = 1e-8, MetalMassPpm = 250, SlagMassPpm = 2.5e-6, PartitionRatioSlagToMetal = 1.2e-8 },
            new ElementDistribution { Element = "Au", InputKg = 0.5, MetalFraction = 1, MetalMassPpm = 500, SlagMassPpm = 0 },
            new ElementDistribution { Element = "Te", InputKg = 0.1, UnplacedFraction = 1 },
        },
        Metal = new PhaseReport { MassKg = 990, AmountMol = 15600, Elements = { new ElementContent { Element = "Cu", MassKg = 985, MassPercent = 98.5, MassPpm = 985_000 } }, Species = { new SpeciesContent { Species = "Cu", MoleFraction = 0.99, AmountMol = 15500, MassKg = 985, Activity = 0.98, ActivityCoefficient = 0.99, StandardState = "pure liquid" } } },
        Slag = new PhaseReport { MassKg = 190, AmountMol = 2800, Species = { new SpeciesContent { Species = "FeO", MoleFraction = 0.6 } } },
        Gas = new GasReport
        {
            AmountMol = 1300,
            MassKg = 38,
            VolumeNormalCubicMetre = 29.1,
            DustFormingLoadGramPerNormalCubicMetre = 41.2,
            Species = { new GasSpeciesContent { Species = "N2", VolumeFraction = 0.97, PartialPressureAtm = 0.97, AmountMol = 1261 }, new GasSpeciesContent { Species = "Ag", VolumeFraction = 1e-9 } },
        },
        MechanicalDustKg = 0.02,
        Redox = new RedoxReport { Log10Po2Atm = -7, OxygenPotentialKilojoulePerMol = -210.8, Co2ToCoRatio = 22.1, H2OToH2Ratio = 11, DissolvedOxygenMassPpm = 750, OxygenToSupplyKg = -12.5, OxygenToSupplyNormalCubicMetre = -8.755 },
        SolventLoss = new SolventLoss { InputKg = 1000, DissolvedInSlagKg = 12, EntrainedInSlagKg = 3, GasKg = 1e-6, LossFraction = 0.015 },
        Allowances = new AllowancesReport
        {
            MetalInSlagMassPercent = 0.5,
            MetalInSlagKg = 0.95,
            MetalInSlagSlot = "entrainment/iron-silicate",
            MechanicalDustMassFraction = 0.01,
            StageEfficiencies = { new AppliedStageEfficiency { Element = "Sn", Efficiency = 0.8, BypassedKg = 0.6 } },
        },
        Remarks =
        {
            new Remark { Code = RemarkCode.DatumMissing, Severity = Severity.Serious, Element = "Te", Text = "No datum places tellurium in any phase of this vessel, so that its share is left open and the figures of the other elements take no account of it." },
            new Remark { Code = RemarkCode.FromMemory, Severity = Severity.Note, Text = "Some numbers are recalled." },
        },
        Cautions = { new Caution { Substance = "Zn", Text = "Zinc fume; local codes and licensed practice decide.", LoadGramPerNormalCubicMetre = 40.5 } },
        DataUsed =
        {
            new DatumUse { Key = "metal/Cu/Pb#1", Quantity = "ln gamma0 of Pb in liquid Cu", Value = 1.3, Unit = "1", Sigma = 0.25, Access = Access.Derived, SourceIds = { "a-1974" } },
            new DatumUse { Key = "oxidation/PbO#1", Quantity = "Gibbs energy", Value = -75000, Unit = "J/mol", Access = Access.Memory, ExtrapolatedKelvin = 12 },
            new DatumUse { Key = "slag/iron-silicate/SnO2", Quantity = "ln gamma", Value = 0.5, Unit = "1", Overridden = true, SourceIds = { "own assays" } },
        },
        WeakestAccess = Access.Memory,
        Solution = new SolutionReport { Iterations = 12, ActivityPasses = 3, LargestBalanceError = 1e-14 },
    };
}
