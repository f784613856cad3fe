namespace PartitionService.Core.Catalogue;

/// <summary>An element with the properties that unit and standard-state conversions need.</summary>
/// <param name="Symbol">IUPAC symbol, for example <c>Cu</c>.</param>
/// <param name="AtomicMassGramPerMol">Standard atomic mass in g/mol.</param>
/// <param name="MeltingPointKelvin">Melting point in kelvin.</param>
/// <param name="EnthalpyOfFusionJoulePerMol">Enthalpy of fusion in J/mol of atoms (of molecules for diatomic gases).</param>
/// <param name="BoilingPointKelvin">Boiling or sublimation point at 1 atm in kelvin.</param>
/// <param name="EnthalpyOfVaporisationJoulePerMol">Enthalpy of vaporisation in J/mol at the boiling point.</param>
/// <param name="Access">How the numbers were obtained.</param>
/// <param name="SourceIds">Ids of the sources.</param>
/// <param name="Note">Free text; may be empty.</param>
public sealed record Element(
    string Symbol,
    double AtomicMassGramPerMol,
    double MeltingPointKelvin,
    double EnthalpyOfFusionJoulePerMol,
    double BoilingPointKelvin,
    double EnthalpyOfVaporisationJoulePerMol,
    Access Access,
    IReadOnlyList<string> SourceIds,
    string Note);
