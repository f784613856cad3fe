using PartitionService.Core.Catalogue;

namespace PartitionService.Core.Thermodynamics;

/// <summary>Converts activities between the standard states of a row and the reference of the component.</summary>
/// <remarks>
/// The reference is the pure liquid for every metallic element, graphite for C and half a mole of the diatomic gas at 1 atm
/// for O, S, Cl, Br, H and N. At one chemical potential mu_state + RT ln a_state = mu_ref + RT ln a_ref.
/// </remarks>
public static class StateConversion
{
    /// <summary>Elements whose reference is half a mole of the diatomic gas.</summary>
    private static readonly HashSet<string> DiatomicReference = new(StringComparer.Ordinal) { "O", "S", "Cl", "Br", "H", "N", "F", "I" };

    /// <summary>Reference of an element in words.</summary>
    public static string ReferenceName(string element) =>
        element == "C" ? "graphite"
        : DiatomicReference.Contains(element) ? $"1/2 {element}2 gas, 1 atm"
        : "pure liquid";

    /// <summary>True where the element's reference is a diatomic gas.</summary>
    public static bool HasDiatomicReference(string element) => DiatomicReference.Contains(element);

    /// <summary>ln(a_ref/a_state) at a temperature: what turns an activity on the row's state into one on the reference.</summary>
    /// <param name="element">The element.</param>
    /// <param name="state">Standard state of the row.</param>
    /// <param name="temperatureKelvin">Temperature in kelvin.</param>
    /// <param name="catalogue">Fusion data and gas species.</param>
    /// <returns>The logarithm; null where the catalogue lacks what the conversion needs.</returns>
    /// <remarks>
    /// Solid: Delta G of fusion = Delta H (1 - T/T_m), heat capacities of solid and liquid taken as equal.
    /// Gas: Delta G of the species M(g) or M2(g) from the liquid.
    /// </remarks>
    public static double? LnReferenceOverState(
        Element element, StandardState state, double temperatureKelvin, ThermochemicalCatalogue catalogue)
    {
        var thermal = PhysicalConstants.GasConstant * temperatureKelvin;
        switch (state)
        {
            case StandardState.Liquid:
            case StandardState.Graphite when element.Symbol == "C":
            case StandardState.HalfDiatomicGas when HasDiatomicReference(element.Symbol):
                return 0;
            case StandardState.Solid:
                var fusion = element.EnthalpyOfFusionJoulePerMol * (1 - (temperatureKelvin / element.MeltingPointKelvin));
                return -fusion / thermal;
            case StandardState.MonatomicGas:
                return GasEnergy(catalogue, element.Symbol, temperatureKelvin) / thermal;
            case StandardState.HalfDiatomicGas:
                return GasEnergy(catalogue, $"{element.Symbol}2", temperatureKelvin) / (2 * thermal);
            default:
                return null;
        }
    }

    /// <summary>Derivative of <see cref="LnReferenceOverState"/> with respect to temperature, per kelvin; zero where there is no conversion.</summary>
    /// <param name="element">The element.</param>
    /// <param name="state">Standard state of the row.</param>
    /// <param name="temperatureKelvin">Temperature in kelvin.</param>
    /// <param name="catalogue">Fusion data and gas species.</param>
    public static double LnReferenceOverStatePerKelvin(
        Element element, StandardState state, double temperatureKelvin, ThermochemicalCatalogue catalogue)
    {
        switch (state)
        {
            case StandardState.Solid:
                return element.EnthalpyOfFusionJoulePerMol
                    / (PhysicalConstants.GasConstant * temperatureKelvin * temperatureKelvin);
            case StandardState.MonatomicGas:
                return GasSlope(element.Symbol);
            case StandardState.HalfDiatomicGas when !HasDiatomicReference(element.Symbol):
                return GasSlope($"{element.Symbol}2") / 2;
            default:
                return 0;
        }

        double GasSlope(string species) =>
            Gas(catalogue, species) is { } row
                ? GibbsEnergyOverThermalPerKelvin(
                    row.GibbsEnergy(temperatureKelvin), row.GibbsEnergyPerKelvin(temperatureKelvin), temperatureKelvin)
                : 0;
    }

    /// <summary>Derivative of Delta G/RT with respect to temperature, per kelvin.</summary>
    /// <param name="gibbsEnergy">Delta G in J/mol.</param>
    /// <param name="perKelvin">Its derivative in J/(mol K); zero for a number that does not vary.</param>
    /// <param name="temperatureKelvin">Temperature in kelvin.</param>
    public static double GibbsEnergyOverThermalPerKelvin(double gibbsEnergy, double perKelvin, double temperatureKelvin) =>
        (perKelvin - (gibbsEnergy / temperatureKelvin)) / (PhysicalConstants.GasConstant * temperatureKelvin);

    private static double? GasEnergy(ThermochemicalCatalogue catalogue, string species, double temperatureKelvin) =>
        Gas(catalogue, species)?.GibbsEnergy(temperatureKelvin);

    private static GasSpeciesDatum? Gas(ThermochemicalCatalogue catalogue, string species) =>
        catalogue.Slot<GasSpeciesDatum>($"gas/{species}").FirstOrDefault(row => row.Preferred);
}
