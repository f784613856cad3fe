using PartitionService.Core.Equilibrium;
using Wire = PartitionService.Contracts.V1;

namespace PartitionService.Server.Mapping;

/// <summary>Turns an answer of the core into the answer that is sent.</summary>
internal static class AnswerMapping
{
    /// <summary>Maps one answer.</summary>
    public static Wire.ChargeAnswer ToWire(VesselAnswer answer)
    {
        var sent = new Wire.ChargeAnswer
        {
            Name = answer.Name,
            CatalogueDigest = answer.CatalogueDigest,
            TemperatureKelvin = answer.TemperatureKelvin,
            PressureAtm = answer.PressureAtm,
            Solvent = answer.Solvent,
            SlagFamily = answer.SlagFamily ?? "",
            Metal = answer.Metal is null ? null : PhaseMapping.ToWire(answer.Metal),
            Slag = answer.Slag is null ? null : PhaseMapping.ToWire(answer.Slag),
            Gas = answer.Gas is null ? null : PhaseMapping.ToWire(answer.Gas),
            UnburntCarbonKg = answer.UnburntCarbonKg,
            MechanicalDustKg = answer.MechanicalDustKg,
            Redox = RedoxMapping.ToWire(answer.Redox),
            SolventLoss = ToWire(answer.SolventLoss),
            Allowances = answer.Allowances is null ? null : ToWire(answer.Allowances),
            WeakestAccess = EnumMapping.ToWire(answer.WeakestAccess),
            Solution = ToWire(answer.Solution),
            Derivatives = answer.Derivatives is null ? null : DerivativeMapping.ToWire(answer.Derivatives),
        };
        sent.Elements.AddRange(answer.Elements.Select(ToWire));
        sent.Remarks.AddRange(answer.Remarks.Select(ProvenanceMapping.ToWire));
        sent.Cautions.AddRange(answer.Cautions.Select(ProvenanceMapping.ToWire));
        sent.DataUsed.AddRange(answer.DataUsed.Select(ProvenanceMapping.ToWire));
        return sent;
    }

    private static Wire.ElementDistribution ToWire(ElementDistribution element)
    {
        var sent = new Wire.ElementDistribution
        {
            Element = element.Element,
            InputKg = element.InputKg,
            MetalFraction = element.MetalFraction,
            SlagFraction = element.SlagFraction,
            GasFraction = element.GasFraction,
            MechanicalDustFraction = element.MechanicalDustFraction,
            UnburntCarbonFraction = element.UnburntCarbonFraction,
            UnplacedFraction = element.UnplacedFraction,
            ActivityReference = element.ActivityReference,
        };
        if (element.MetalMassPpm is { } metal)
            sent.MetalMassPpm = metal;
        if (element.SlagMassPpm is { } slag)
            sent.SlagMassPpm = slag;
        if (element.PartitionRatioSlagToMetal is { } ratio)
            sent.PartitionRatioSlagToMetal = ratio;
        if (element.Activity is { } activity)
            sent.Activity = activity;
        return sent;
    }

    private static Wire.SolventLoss ToWire(SolventLoss loss) => new()
    {
        InputKg = loss.InputKg,
        DissolvedInSlagKg = loss.DissolvedInSlagKg,
        EntrainedInSlagKg = loss.EntrainedInSlagKg,
        GasKg = loss.GasKg,
        MechanicalDustKg = loss.MechanicalDustKg,
        LossFraction = loss.LossFraction,
    };

    private static Wire.AllowancesReport ToWire(AllowancesReport allowances)
    {
        var sent = new Wire.AllowancesReport
        {
            MetalInSlagMassPercent = allowances.MetalInSlagMassPercent,
            MetalInSlagKg = allowances.MetalInSlagKg,
            MetalInSlagSlot = allowances.MetalInSlagSlot,
            SlagInMetalMassPercent = allowances.SlagInMetalMassPercent,
            SlagInMetalKg = allowances.SlagInMetalKg,
            MechanicalDustMassFraction = allowances.MechanicalDustMassFraction,
        };
        sent.StageEfficiencies.AddRange(allowances.StageEfficiencies.Select(s => new Wire.AppliedStageEfficiency
        {
            Element = s.Element,
            Efficiency = s.Efficiency,
            BypassedKg = s.BypassedKg,
        }));
        return sent;
    }

    private static Wire.SolutionReport ToWire(SolutionReport solution) => new()
    {
        Iterations = solution.Iterations,
        ActivityPasses = solution.ActivityPasses,
        LargestBalanceError = solution.LargestBalanceError,
        UsedBarrierMethod = solution.UsedBarrierMethod,
    };
}
