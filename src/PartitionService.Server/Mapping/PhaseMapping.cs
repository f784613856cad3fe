using PartitionService.Core.Equilibrium;
using Wire = PartitionService.Contracts.V1;

namespace PartitionService.Server.Mapping;

/// <summary>Turns the phases of an answer into those that are sent.</summary>
internal static class PhaseMapping
{
    /// <summary>Maps a condensed phase.</summary>
    public static Wire.PhaseReport ToWire(PhaseReport phase)
    {
        var sent = new Wire.PhaseReport { MassKg = phase.MassKg, AmountMol = phase.AmountMol };
        sent.Elements.AddRange(phase.Elements.Select(ToWire));
        sent.Species.AddRange(phase.Species.Select(ToWire));
        return sent;
    }

    /// <summary>Maps the gas.</summary>
    public static Wire.GasReport ToWire(GasReport gas)
    {
        var sent = new Wire.GasReport
        {
            AmountMol = gas.AmountMol,
            MassKg = gas.MassKg,
            VolumeNormalCubicMetre = gas.VolumeNormalCubicMetre,
            DustFormingLoadGramPerNormalCubicMetre = gas.DustFormingLoadGramPerNormalCubicMetre,
        };
        sent.Species.AddRange(gas.Species.Select(s => new Wire.GasSpeciesContent
        {
            Species = s.Species,
            VolumeFraction = s.VolumeFraction,
            PartialPressureAtm = s.PartialPressureAtm,
            AmountMol = s.AmountMol,
            LoadGramPerNormalCubicMetre = s.LoadGramPerNormalCubicMetre,
        }));
        sent.Elements.AddRange(gas.Elements.Select(ToWire));
        return sent;
    }

    private static Wire.ElementContent ToWire(ElementContent content) => new()
    {
        Element = content.Element,
        MassKg = content.MassKg,
        MassPercent = content.MassPercent,
        MassPpm = content.MassPpm,
    };

    private static Wire.SpeciesContent ToWire(SpeciesContent species)
    {
        var sent = new Wire.SpeciesContent
        {
            Species = species.Species,
            MoleFraction = species.MoleFraction,
            AmountMol = species.AmountMol,
            MassKg = species.MassKg,
            StandardState = species.StandardState,
        };
        if (species.Activity is { } activity)
            sent.Activity = activity;
        if (species.ActivityCoefficient is { } coefficient)
            sent.ActivityCoefficient = coefficient;
        return sent;
    }
}
