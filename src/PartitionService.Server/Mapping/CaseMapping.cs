using PartitionService.Core.Equilibrium;
using Wire = PartitionService.Contracts.V1;

namespace PartitionService.Server.Mapping;

/// <summary>Turns the vessel of a request into a case of the core.</summary>
/// <remarks>
/// Unset optional fields take the core's default; an unset choice becomes the core's Unstated, so that its checks report it.
/// Only what the core cannot see is reported here: the shape of the message.
/// </remarks>
internal static class CaseMapping
{
    /// <summary>Maps one vessel.</summary>
    /// <param name="vessel">The vessel as sent.</param>
    /// <param name="violations">Receives what only the message shows; paths start at the vessel.</param>
    public static VesselCase ToCase(Wire.VesselCase vessel, ICollection<CaseViolation> violations)
    {
        var mapped = new VesselCase
        {
            Name = vessel.Name,
            TemperatureKelvin = vessel.TemperatureKelvin,
            Charge = [.. vessel.Charge.Select(ToItem)],
            Solvent = string.IsNullOrEmpty(vessel.Metal?.Solvent) ? null : vessel.Metal.Solvent,
            SlagFamily = vessel.Slag?.Family,
            GasAllowed = vessel.Gas is not null,
            Oxygen = OxygenMapping.ToStatement(vessel.Oxygen),
            Allowances = AllowanceMapping.ToAllowances(vessel.Allowances, violations),
            Overrides = [.. vessel.Overrides.Select(ToOverride)],
        };
        if (vessel.Slag is { Family: "" })
            violations.Add(new CaseViolation("slag.family", "", "required: the name of a slag family that ListSlagFamilies returns"));
        return vessel.HasPressureAtm ? mapped with { PressureAtm = vessel.PressureAtm } : mapped;
    }

    private static ChargeItem ToItem(Wire.ChargeItem item) => item.QuantityCase switch
    {
        Wire.ChargeItem.QuantityOneofCase.MassKg => new ChargeItem(item.Formula, item.MassKg, ChargeUnit.Kilogram),
        Wire.ChargeItem.QuantityOneofCase.VolumeNormalCubicMetre =>
            new ChargeItem(item.Formula, item.VolumeNormalCubicMetre, ChargeUnit.NormalCubicMetre),
        _ => new ChargeItem(item.Formula, 0, ChargeUnit.Unstated),
    };

    private static DatumOverride ToOverride(Wire.DatumOverride sent)
    {
        var (kind, value) = sent.ValueCase switch
        {
            Wire.DatumOverride.ValueOneofCase.LnGamma => (OverrideKind.LnGamma, sent.LnGamma),
            Wire.DatumOverride.ValueOneofCase.GibbsEnergyJoulePerMol => (OverrideKind.GibbsEnergy, sent.GibbsEnergyJoulePerMol),
            Wire.DatumOverride.ValueOneofCase.Epsilon => (OverrideKind.Epsilon, sent.Epsilon),
            _ => (OverrideKind.Unstated, 0),
        };
        var mapped = new DatumOverride(sent.Slot, kind, value);
        return sent.Source.Length == 0 ? mapped : mapped with { Source = sent.Source };
    }
}
