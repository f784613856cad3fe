using PartitionService.Core.Catalogue;
using Wire = PartitionService.Contracts.V1;

namespace PartitionService.Server.Mapping;

/// <summary>A catalogue row in words and numbers, whatever its kind.</summary>
/// <param name="Kind">What the row is about.</param>
/// <param name="Words">Quantity, species and standard state.</param>
/// <param name="Formula">The formula with its numbers; T in kelvin.</param>
/// <param name="Unit">Unit of value and sigma, "1" where it has none.</param>
/// <param name="Sigma">One standard deviation; null where unknown.</param>
/// <param name="Value">Value at a temperature in kelvin; null where the row has no single value.</param>
/// <param name="Elements">Elements that the row is about; a solvent only where it is also a solute.</param>
internal sealed record DatumDescription(
    Wire.DatumKind Kind,
    string Words,
    string Formula,
    string Unit,
    double? Sigma,
    Func<double, double>? Value,
    IReadOnlyCollection<string> Elements)
{
    private const string Dimensionless = "1";
    private const string JoulePerMol = "J/mol";

    /// <summary>Describes a row.</summary>
    public static DatumDescription Of(Datum datum) => datum switch
    {
        InfiniteDilutionDatum row => Describe(row),
        InteractionDatum row => Describe(row),
        OxidationDatum row => Describe(row),
        ChlorideDatum row => Describe(row),
        GasSpeciesDatum row => Describe(row),
        SlagActivityDatum row => SlagActivityDescription.Of(row),
        SolubilityLimitDatum row => Describe(row),
        CapacityDatum row => Describe(row),
        OpticalBasicityDatum row => Describe(row),
        EntrainmentDatum row => Describe(row),
        _ => throw new ArgumentException($"no description for {datum.GetType().Name}", nameof(datum)),
    };

    private static DatumDescription Describe(InfiniteDilutionDatum row) => new(
        Wire.DatumKind.InfiniteDilution,
        $"ln gamma0 of {row.Solute} in liquid {row.Solvent}, referred to {StandardStateWords.Of(row.SoluteState)}",
        $"ln gamma0 = {FormulaText.InverseTemperature(row.Constant, row.InverseTemperatureKelvin)}",
        Dimensionless,
        row.SigmaLnGamma,
        row.LnGamma,
        [row.Solute]);

    private static DatumDescription Describe(InteractionDatum row) => new(
        Wire.DatumKind.Interaction,
        $"interaction parameter epsilon of {row.First} and {row.Second} in liquid {row.Solvent}, mole fraction, natural logarithm",
        $"epsilon = {FormulaText.InverseTemperature(row.Constant, row.InverseTemperatureKelvin)}",
        Dimensionless,
        row.SigmaEpsilon,
        row.Epsilon,
        [row.First, row.Second]);

    private static DatumDescription Describe(OxidationDatum row) => new(
        Wire.DatumKind.Oxidation,
        $"Gibbs energy of oxidation of {row.Element} ({StandardStateWords.Of(row.MetalState)}) to {row.Oxide} "
        + $"({StandardStateWords.Of(row.OxideState)}), per mol of {row.Element}",
        $"dG = {FormulaText.GibbsEnergy(row.EnthalpyJoulePerMol, row.SlopeJoulePerMolKelvin)} J/mol",
        JoulePerMol,
        row.SigmaJoulePerMol,
        row.GibbsEnergy,
        [row.Element]);

    private static DatumDescription Describe(ChlorideDatum row) => new(
        Wire.DatumKind.Chloride,
        $"Gibbs energy of formation of {row.Chloride} ({StandardStateWords.Of(row.ChlorideState)}) from liquid {row.Element} and Cl2, "
        + $"per mol of {row.Element}",
        $"dG = {FormulaText.GibbsEnergy(row.EnthalpyJoulePerMol, row.SlopeJoulePerMolKelvin)} J/mol",
        JoulePerMol,
        row.SigmaJoulePerMol,
        row.GibbsEnergy,
        [row.Element, "Cl"]);

    private static DatumDescription Describe(GasSpeciesDatum row) => new(
        Wire.DatumKind.GasSpecies,
        $"Gibbs energy of formation of gas {row.Species} at 1 atm, per mol of {row.Species}",
        $"dG = {FormulaText.GibbsEnergy(row.ConstantJoulePerMol, row.LinearJoulePerMolKelvin, row.LogarithmicJoulePerMolKelvin)} J/mol",
        JoulePerMol,
        row.SigmaJoulePerMol,
        row.GibbsEnergy,
        [.. row.Atoms.Keys]);

    private static DatumDescription Describe(SolubilityLimitDatum row)
    {
        var product = string.Concat(row.Exponents.Select(e => e.Value == 1 ? $"[mass % {e.Key}]" : $"[mass % {e.Key}]^{e.Value}"));
        return new(
            Wire.DatumKind.SolubilityLimit,
            $"log10 of the solubility limit of {string.Join(" and ", row.Exponents.Keys)} in liquid {row.Solvent}, "
            + $"beyond which {row.PrecipitatingPhase} precipitates",
            $"log10({product}) = {FormulaText.InverseTemperature(row.Constant, row.InverseTemperatureKelvin)}",
            Dimensionless,
            row.SigmaLog10,
            row.Log10Limit,
            [.. row.Exponents.Keys]);
    }

    private static DatumDescription Describe(CapacityDatum row) => new(
        Wire.DatumKind.Capacity,
        $"{row.Quantity}; {row.Symbols}; valid for {row.Validity}",
        row.Formula,
        Dimensionless,
        row.SigmaLog10,
        null,
        row.Quantity.Contains("phosph", StringComparison.OrdinalIgnoreCase) ? ["P"] : ["S"]);

    private static DatumDescription Describe(OpticalBasicityDatum row) => new(
        Wire.DatumKind.OpticalBasicity,
        $"optical basicity of {row.Oxide}, set {row.Set}",
        $"optical basicity = {FormulaText.Number(row.OpticalBasicity)}",
        Dimensionless,
        row.Sigma,
        _ => row.OpticalBasicity,
        [.. ChemicalFormula.Parse(row.Oxide).Atoms.Keys.Where(symbol => symbol != "O")]);

    private static DatumDescription Describe(EntrainmentDatum row) => new(
        Wire.DatumKind.Entrainment,
        $"{row.EntrainedPhase} held in slag, mass % of slag: {row.Process}, {row.Vessel}",
        $"typical {FormulaText.Number(row.TypicalMassPercent)}, usually {FormulaText.Number(row.LowMassPercent)} to "
        + $"{FormulaText.Number(row.HighMassPercent)} mass %",
        "mass %",
        // Low and high are the ends of a usual range, not a spread with a known share of cases.
        null,
        _ => row.TypicalMassPercent,
        []);
}
