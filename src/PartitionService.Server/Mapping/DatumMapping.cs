using PartitionService.Core.Catalogue;
using Wire = PartitionService.Contracts.V1;

namespace PartitionService.Server.Mapping;

/// <summary>Turns catalogue rows into what is sent.</summary>
internal static class DatumMapping
{
    /// <summary>Maps one row.</summary>
    /// <param name="datum">The row.</param>
    /// <param name="catalogue">Catalogue that holds its sources.</param>
    /// <param name="temperatureKelvin">Temperature of the value; null: the middle of the row's range.</param>
    public static Wire.CatalogueDatum ToWire(Datum datum, ThermochemicalCatalogue catalogue, double? temperatureKelvin)
    {
        var description = DatumDescription.Of(datum);
        var temperature = ValueTemperature(datum, temperatureKelvin);
        var sent = new Wire.CatalogueDatum
        {
            Key = datum.Key,
            Slot = datum.Slot,
            Kind = description.Kind,
            Description = description.Words,
            Formula = description.Formula,
            Unit = description.Unit,
            ValueTemperatureKelvin = temperature,
            MinimumTemperatureKelvin = datum.MinimumTemperatureKelvin,
            MaximumTemperatureKelvin = datum.MaximumTemperatureKelvin,
            Preferred = datum.Preferred,
            PreferredReason = datum.PreferredReason,
            Access = EnumMapping.ToWire(datum.Access),
            Note = datum.Note,
        };
        if (description.Value is { } value)
            sent.Value = value(temperature);
        if (description.Sigma is { } sigma)
            sent.Sigma = sigma;
        sent.Sources.AddRange(datum.SourceIds.Select(id => ToWire(catalogue.Sources[id])));
        sent.Flags.AddRange(datum.Flags);
        return sent;
    }

    /// <summary>Temperature in kelvin that a value refers to: the one asked for, or the middle of the row's range.</summary>
    public static double ValueTemperature(Datum datum, double? temperatureKelvin) =>
        temperatureKelvin ?? ((datum.MinimumTemperatureKelvin + datum.MaximumTemperatureKelvin) / 2);

    private static Wire.Source ToWire(Source source) => new() { Id = source.Id, Citation = source.Citation, Locator = source.Locator };
}
