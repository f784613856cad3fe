using PartitionService.Core.Catalogue;
using Wire = PartitionService.Contracts.V1;

namespace PartitionService.Server.Mapping;

/// <summary>Turns what the catalogue covers (solvents, solutes, slag families) into what is sent.</summary>
internal static class InventoryMapping
{
    /// <summary>Maps a solvent.</summary>
    public static Wire.Solvent ToWire(string solvent, ThermochemicalCatalogue catalogue) => new()
    {
        Element = solvent,
        MeltingPointKelvin = catalogue.Elements[solvent].MeltingPointKelvin,
        SoluteCount = catalogue.Data.OfType<InfiniteDilutionDatum>()
            .Where(d => d.Preferred && d.Solvent == solvent).Select(d => d.Solute).Distinct().Count(),
        InteractionCount = catalogue.Data.OfType<InteractionDatum>()
            .Where(d => d.Preferred && d.Solvent == solvent).Select(d => d.Slot).Distinct().Count(),
    };

    /// <summary>Maps a solute.</summary>
    /// <param name="row">The row that counts.</param>
    /// <param name="temperatureKelvin">Temperature of the value; null: the middle of the row's range.</param>
    public static Wire.Solute ToWire(InfiniteDilutionDatum row, double? temperatureKelvin)
    {
        var temperature = DatumMapping.ValueTemperature(row, temperatureKelvin);
        return new Wire.Solute
        {
            Solvent = row.Solvent,
            Element = row.Solute,
            LnGamma0 = row.LnGamma(temperature),
            TemperatureKelvin = temperature,
            StandardState = StandardStateWords.Of(row.SoluteState),
            SigmaLnGamma = row.SigmaLnGamma,
            MinimumTemperatureKelvin = row.MinimumTemperatureKelvin,
            MaximumTemperatureKelvin = row.MaximumTemperatureKelvin,
            Access = EnumMapping.ToWire(row.Access),
            Key = row.Key,
        };
    }

    /// <summary>Maps a slag family.</summary>
    public static Wire.SlagFamily ToWire(SlagFamily family, ThermochemicalCatalogue catalogue)
    {
        var sent = new Wire.SlagFamily
        {
            Name = family.Name,
            Description = family.Description,
            MinimumTemperatureKelvin = family.MinimumTemperatureKelvin,
            MaximumTemperatureKelvin = family.MaximumTemperatureKelvin,
            Access = EnumMapping.ToWire(family.Access),
        };
        if (family.TypicalEntrainedMetalMassPercent is { } typical)
            sent.TypicalEntrainedMetalMassPercent = typical;
        sent.Components.AddRange(family.Components.Select(c => new Wire.SlagComponent
        {
            Formula = c.Formula,
            LowMassPercent = c.LowMassPercent,
            TypicalMassPercent = c.TypicalMassPercent,
            HighMassPercent = c.HighMassPercent,
        }));
        sent.Oxides.AddRange(catalogue.Data.OfType<SlagActivityDatum>()
            .Where(d => d.Preferred && d.Family == family.Name)
            .Select(d => new Wire.SlagOxide
            {
                Oxide = d.Oxide,
                Element = d.Element,
                Access = EnumMapping.ToWire(d.Access),
                SigmaLnGamma = d.SigmaLnGamma,
                Key = d.Key,
            }));
        return sent;
    }
}
