using PartitionService.Core.Catalogue;

namespace PartitionService.Core.Equilibrium;

/// <summary>Where every element of one vessel goes.</summary>
/// <remarks>Member names and units follow the service's ChargeAnswer; see each record.</remarks>
public sealed record VesselAnswer
{
    /// <summary>Label of the case.</summary>
    public required string Name { get; init; }

    /// <summary>Digest of the catalogue.</summary>
    public required string CatalogueDigest { get; init; }

    /// <summary>Temperature in kelvin.</summary>
    public required double TemperatureKelvin { get; init; }

    /// <summary>Total pressure in atm.</summary>
    public required double PressureAtm { get; init; }

    /// <summary>Solvent, as sent or as found.</summary>
    public required string Solvent { get; init; }

    /// <summary>Slag family; null without a slag.</summary>
    public required string? SlagFamily { get; init; }

    /// <summary>One entry per element, in descending order of input mass.</summary>
    public required IReadOnlyList<ElementDistribution> Elements { get; init; }

    /// <summary>The leaving metal; null where none is left.</summary>
    public required PhaseReport? Metal { get; init; }

    /// <summary>The leaving slag; null where none formed.</summary>
    public required PhaseReport? Slag { get; init; }

    /// <summary>The leaving gas; null where none formed.</summary>
    public required GasReport? Gas { get; init; }

    /// <summary>Unburnt solid carbon, kg.</summary>
    public required double UnburntCarbonKg { get; init; }

    /// <summary>Mechanical dust, kg.</summary>
    public required double MechanicalDustKg { get; init; }

    /// <summary>Oxygen potential and what it takes.</summary>
    public required RedoxReport Redox { get; init; }

    /// <summary>Where the solvent goes.</summary>
    public required SolventLoss SolventLoss { get; init; }

    /// <summary>Allowances that were on; null where none.</summary>
    public required AllowancesReport? Allowances { get; init; }

    /// <summary>Remarks, most severe first.</summary>
    public required IReadOnlyList<Remark> Remarks { get; init; }

    /// <summary>Hazards of what leaves.</summary>
    public required IReadOnlyList<Caution> Cautions { get; init; }

    /// <summary>Every row and override that entered.</summary>
    public required IReadOnlyList<DatumUse> DataUsed { get; init; }

    /// <summary>Weakest access among <see cref="DataUsed"/>; null where only overrides entered.</summary>
    public required Access? WeakestAccess { get; init; }

    /// <summary>How the solution was found.</summary>
    public required SolutionReport Solution { get; init; }

    /// <summary>Derivatives; null unless they were asked for.</summary>
    public DerivativeReport? Derivatives { get; init; }
}

/// <summary>Balance of one element; the six fractions are shares of the input and add up to 1.</summary>
public sealed record ElementDistribution
{
    /// <summary>Element symbol.</summary>
    public required string Element { get; init; }

    /// <summary>Input in kg; for oxygen the supplied or removed oxygen is included.</summary>
    public required double InputKg { get; init; }

    /// <summary>Share to the metal.</summary>
    public required double MetalFraction { get; init; }

    /// <summary>Share to the slag, dissolved and entrained.</summary>
    public required double SlagFraction { get; init; }

    /// <summary>Share to the gas.</summary>
    public required double GasFraction { get; init; }

    /// <summary>Share to mechanical dust.</summary>
    public required double MechanicalDustFraction { get; init; }

    /// <summary>Share that stays as unburnt carbon.</summary>
    public required double UnburntCarbonFraction { get; init; }

    /// <summary>Share that cannot be placed for want of data.</summary>
    public required double UnplacedFraction { get; init; }

    /// <summary>Mass ppm in the leaving metal; null without metal.</summary>
    public double? MetalMassPpm { get; init; }

    /// <summary>Mass ppm in the leaving slag; null without slag.</summary>
    public double? SlagMassPpm { get; init; }

    /// <summary>L = (mass %)slag/[mass %]metal at equilibrium; null where not in both.</summary>
    public double? PartitionRatioSlagToMetal { get; init; }

    /// <summary>Activity at equilibrium; null where the element is not in equilibrium.</summary>
    public double? Activity { get; init; }

    /// <summary>Reference of the activity in words.</summary>
    public required string ActivityReference { get; init; }
}

/// <summary>A condensed phase as it leaves.</summary>
/// <param name="MassKg">Mass in kg, allowances included.</param>
/// <param name="AmountMol">Amount at equilibrium in mol: atoms for metal, mono-cations (and sulfur) for slag.</param>
/// <param name="Elements">Elements, allowances included, descending mass.</param>
/// <param name="Species">Species of the equilibrium phase, descending mole fraction.</param>
public sealed record PhaseReport(
    double MassKg, double AmountMol, IReadOnlyList<ElementContent> Elements, IReadOnlyList<SpeciesContent> Species);

/// <summary>One element in a phase.</summary>
/// <param name="Element">Element symbol.</param>
/// <param name="MassKg">Mass in kg.</param>
/// <param name="MassPercent">Content in mass %.</param>
public sealed record ElementContent(string Element, double MassKg, double MassPercent)
{
    /// <summary>Content in mass ppm.</summary>
    public double MassPpm => MassPercent * 1e4;
}

/// <summary>One species of a condensed phase at equilibrium.</summary>
/// <param name="Species">Formula.</param>
/// <param name="MoleFraction">Mole fraction.</param>
/// <param name="AmountMol">Amount in mol.</param>
/// <param name="MassKg">Mass in kg.</param>
/// <param name="Activity">Activity; null where none is defined.</param>
/// <param name="ActivityCoefficient">Activity coefficient; null where none is defined.</param>
/// <param name="StandardState">Standard state in words; empty where no activity is defined.</param>
public sealed record SpeciesContent(
    string Species,
    double MoleFraction,
    double AmountMol,
    double MassKg,
    double? Activity,
    double? ActivityCoefficient,
    string StandardState);

/// <summary>The gas as it leaves.</summary>
/// <param name="AmountMol">Amount in mol.</param>
/// <param name="MassKg">Mass in kg.</param>
/// <param name="VolumeNormalCubicMetre">Volume at 0 degC and 1 atm.</param>
/// <param name="Species">Species, descending partial pressure.</param>
/// <param name="Elements">Elements, descending mass.</param>
/// <param name="DustFormingLoadGramPerNormalCubicMetre">Elements that condense on cooling, g/Nm3.</param>
public sealed record GasReport(
    double AmountMol,
    double MassKg,
    double VolumeNormalCubicMetre,
    IReadOnlyList<GasSpeciesContent> Species,
    IReadOnlyList<ElementContent> Elements,
    double DustFormingLoadGramPerNormalCubicMetre);

/// <summary>One gas species.</summary>
/// <param name="Species">Formula.</param>
/// <param name="VolumeFraction">Volume fraction.</param>
/// <param name="PartialPressureAtm">Partial pressure in atm.</param>
/// <param name="AmountMol">Amount in mol.</param>
/// <param name="LoadGramPerNormalCubicMetre">Load in g/Nm3.</param>
public sealed record GasSpeciesContent(
    string Species, double VolumeFraction, double PartialPressureAtm, double AmountMol, double LoadGramPerNormalCubicMetre);

/// <summary>Oxygen and the other potentials; null where the component is not in the vessel.</summary>
public sealed record RedoxReport
{
    /// <summary>log10 pO2 in atm.</summary>
    public double? Log10OxygenPressureAtm { get; init; }

    /// <summary>RT ln pO2 in kJ per mol O2.</summary>
    public double? OxygenPotentialKilojoulePerMol { get; init; }

    /// <summary>CO2/CO volume ratio at this potential.</summary>
    public double? CarbonDioxideToMonoxide { get; init; }

    /// <summary>H2O/H2 volume ratio at this potential.</summary>
    public double? WaterToHydrogen { get; init; }

    /// <summary>Oxygen dissolved in the metal, mass ppm.</summary>
    public double? DissolvedOxygenMassPpm { get; init; }

    /// <summary>Oxygen to supply beyond the charge, kg; negative: to remove.</summary>
    public required double OxygenToSupplyKg { get; init; }

    /// <summary>The same in normal cubic metres of O2.</summary>
    public required double OxygenToSupplyNormalCubicMetre { get; init; }

    /// <summary>log10 pS2 in atm.</summary>
    public double? Log10SulfurPressureAtm { get; init; }

    /// <summary>log10 pCl2 in atm.</summary>
    public double? Log10ChlorinePressureAtm { get; init; }
}

/// <summary>Where the solvent goes.</summary>
/// <param name="InputKg">Solvent that goes in, kg.</param>
/// <param name="DissolvedInSlagKg">Dissolved in the slag, kg.</param>
/// <param name="EntrainedInSlagKg">Carried by the slag as droplets, kg.</param>
/// <param name="GasKg">In the gas, kg.</param>
/// <param name="MechanicalDustKg">In mechanical dust, kg.</param>
/// <param name="LossFraction">All losses as a share of the input.</param>
public sealed record SolventLoss(
    double InputKg, double DissolvedInSlagKg, double EntrainedInSlagKg, double GasKg, double MechanicalDustKg, double LossFraction);

/// <summary>What was switched on beyond the plain equilibrium.</summary>
/// <param name="MetalInSlagMassPercent">Droplets in the leaving slag, mass %.</param>
/// <param name="MetalInSlagKg">Mass of those droplets, kg.</param>
/// <param name="MetalInSlagSlot">Slot of the row of a typical value; empty where the caller gave the number.</param>
/// <param name="SlagInMetalMassPercent">Slag in the leaving metal, mass %.</param>
/// <param name="SlagInMetalKg">Mass of that slag, kg.</param>
/// <param name="MechanicalDustMassFraction">Share of the solid charge that leaves as mechanical dust.</param>
/// <param name="StageEfficiencies">Efficiencies below 1 with the mass that stayed out.</param>
public sealed record AllowancesReport(
    double MetalInSlagMassPercent,
    double MetalInSlagKg,
    string MetalInSlagSlot,
    double SlagInMetalMassPercent,
    double SlagInMetalKg,
    double MechanicalDustMassFraction,
    IReadOnlyList<AppliedStageEfficiency> StageEfficiencies);

/// <summary>A stage efficiency that was applied.</summary>
/// <param name="Element">Element symbol.</param>
/// <param name="Efficiency">Share that took part.</param>
/// <param name="BypassedKg">Mass that stayed out, kg.</param>
public sealed record AppliedStageEfficiency(string Element, double Efficiency, double BypassedKg);

/// <summary>A datum that entered the answer.</summary>
/// <param name="Key">Key of the row; the slot for an override of a missing row.</param>
/// <param name="Quantity">What the number is.</param>
/// <param name="Value">The number at the temperature of the case.</param>
/// <param name="Unit">Unit of value and sigma, "1" where it has none.</param>
/// <param name="Sigma">One standard deviation; null where unknown.</param>
/// <param name="Access">How it was obtained; null for an override.</param>
/// <param name="SourceIds">Sources, or the caller's words.</param>
/// <param name="Flags">Cautions of the row.</param>
/// <param name="Overridden">True where the caller's number replaced the catalogue's.</param>
/// <param name="ExtrapolatedKelvin">Distance from the fitted range in kelvin.</param>
public sealed record DatumUse(
    string Key,
    string Quantity,
    double Value,
    string Unit,
    double? Sigma,
    Access? Access,
    IReadOnlyList<string> SourceIds,
    IReadOnlyList<string> Flags,
    bool Overridden,
    double ExtrapolatedKelvin);

/// <summary>How the solution was found.</summary>
/// <param name="Iterations">Newton steps of all passes together.</param>
/// <param name="ActivityPasses">Passes over composition-dependent activity coefficients.</param>
/// <param name="LargestBalanceError">Largest relative error of an element balance.</param>
/// <param name="UsedBarrierMethod">True where the slower, always convergent method was needed.</param>
public sealed record SolutionReport(int Iterations, int ActivityPasses, double LargestBalanceError, bool UsedBarrierMethod);
