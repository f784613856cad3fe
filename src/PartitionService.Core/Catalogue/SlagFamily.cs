namespace PartitionService.Core.Catalogue;

/// <summary>A kind of slag with its usual composition window.</summary>
/// <param name="Name">Name, for example <c>iron-silicate</c>.</param>
/// <param name="Description">What it is and where it is used.</param>
/// <param name="MinimumTemperatureKelvin">Lower end of the usual temperature range in kelvin.</param>
/// <param name="MaximumTemperatureKelvin">Upper end of the usual temperature range in kelvin.</param>
/// <param name="MonoCationMolPer100Gram">Mol of mono-cations in 100 g of typical slag.</param>
/// <param name="Components">Usual composition, mass % of whole oxides or salts.</param>
/// <param name="TypicalEntrainedMetalMassPercent">Metal droplets in settled slag, mass % of slag; null where there is none.</param>
/// <param name="EntrainmentSlot">Slot of the entrainment row that the typical value comes from; empty where there is none.</param>
/// <param name="CapacityFormulas">Ids of the capacity formulas that apply to the family (sulfur, phosphorus).</param>
/// <param name="Access">How the window was obtained.</param>
/// <param name="SourceIds">Ids of the sources.</param>
/// <param name="Note">Free text; may be empty.</param>
public sealed record SlagFamily(
    string Name,
    string Description,
    double MinimumTemperatureKelvin,
    double MaximumTemperatureKelvin,
    double MonoCationMolPer100Gram,
    IReadOnlyList<SlagComponent> Components,
    double? TypicalEntrainedMetalMassPercent,
    string EntrainmentSlot,
    IReadOnlyList<string> CapacityFormulas,
    Access Access,
    IReadOnlyList<string> SourceIds,
    string Note);

/// <summary>One constituent of a slag family's usual composition, mass %.</summary>
/// <param name="Formula">Whole oxide or salt, for example <c>SiO2</c>.</param>
/// <param name="LowMassPercent">Lower end of the usual window.</param>
/// <param name="TypicalMassPercent">Typical value.</param>
/// <param name="HighMassPercent">Upper end of the usual window.</param>
public sealed record SlagComponent(string Formula, double LowMassPercent, double TypicalMassPercent, double HighMassPercent);
