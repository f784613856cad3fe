using PartitionService.Core.Catalogue;
using PartitionService.Core.Thermodynamics;
using PartitionService.PublishedChecks.Cases;
using PartitionService.PublishedChecks.Rows;

namespace PartitionService.PublishedChecks.Recipes;

/// <summary>Vapour over pure elements and over alloys.</summary>
/// <param name="furnace">Solves vessels.</param>
internal sealed class VapourRecipes(Furnace furnace)
{
    /// <summary>So little carrier gas that the alloy keeps its composition: the first vapour.</summary>
    private const string FirstVapour = "Ar:0.0001";

    /// <summary>Recipes by name.</summary>
    public IReadOnlyDictionary<string, Recipe> All => new Dictionary<string, Recipe>(StringComparer.Ordinal)
    {
        ["pure-pressure"] = row => [PurePressure(row.Element, row.Setup)],
        ["pure-pressure-ratio"] = row => [PressureRatio(row)],
        ["pure-pressure-distance"] = row => [Math.Abs(Math.Log10(PressureRatio(row)))],
        ["boiling-point"] = row => [BoilingPoint(row)],
        ["fraction-removed"] = row => [100 * furnace.Solve(row.Setup, row.Element).Of(row.Element).GasFraction],
        ["final-content"] = row => [furnace.Solve(row.Setup, row.Element).Of(row.Element).MetalMassPpm!.Value / 1e4],
        ["relative-volatility"] = row => [RelativeVolatility(row)],
        ["vapour-purity"] = row => [VapourPurity(row)],
        ["sulfur-per-tin"] = row => [SulfurPerTin(row)],
        ["chloride-exchange"] = row => [ChlorideExchange(row)],
    };

    /// <summary>Total pressure of the monatomic and polyatomic vapour over the pure element, atm.</summary>
    private double PurePressure(string element, double temperatureKelvin, bool solid)
    {
        var lnActivity = solid
            ? StateConversion.LnReferenceOverState(
                furnace.Catalogue.Elements[element], StandardState.Solid, temperatureKelvin, furnace.Catalogue)!.Value
            : 0;
        return furnace.Catalogue.GasSpecies
            .Where(gas => gas.Atoms.Count == 1 && gas.Atoms.ContainsKey(element))
            .Sum(gas => Math.Exp(
                (gas.Atoms[element] * lnActivity) - (gas.GibbsEnergy(temperatureKelvin) / Constants.Thermal(temperatureKelvin))));
    }

    private double PurePressure(string element, Setup setup) =>
        PurePressure(element, setup.Number("temperature_kelvin"), setup.Has("start"));

    private double PressureRatio(PublishedRow row) =>
        PurePressure(row.Element, row.Setup)
        / PurePressure(row.CompareElement.Length > 0 ? row.CompareElement : row.Setup["other"], row.Setup);

    private double BoilingPoint(PublishedRow row)
    {
        double low = 300, high = 4500;
        while (high - low > 1e-6)
        {
            var middle = 0.5 * (low + high);
            if (PurePressure(row.Element, middle, row.Setup.Has("start")) < 1)
            {
                low = middle;
            }
            else
            {
                high = middle;
            }
        }

        return low;
    }

    /// <summary>Atoms of solute per atom of solvent in the first vapour, over the same ratio in the metal.</summary>
    private double RelativeVolatility(PublishedRow row)
    {
        var solvent = row.Setup["solvent"];
        var answer = furnace.Solve(row.Setup.With("gas", FirstVapour), row.Element);
        double Atoms(string element) => answer.GasKg(element) / furnace.AtomicMass(element);
        return Atoms(row.Element) / Atoms(solvent)
            / (Answer.MoleFraction(answer.Metal!, row.Element) / Answer.MoleFraction(answer.Metal!, solvent));
    }

    /// <summary>Mass % of the element in the first vapour of a binary alloy.</summary>
    private double VapourPurity(PublishedRow row)
    {
        var other = row.Setup["other"];
        var setup = row.Setup.With("gas", FirstVapour).With("solute_mass_percent", row.Setup["other_mass_percent"]);
        var answer = furnace.Solve(setup, other);
        return 100 * answer.GasKg(row.Element) / (answer.GasKg(row.Element) + answer.GasKg(other));
    }

    private double SulfurPerTin(PublishedRow row)
    {
        var answer = furnace.Solve(row.Setup.With("gas", FirstVapour), row.Element);
        return answer.GasKg("S") / furnace.AtomicMass("S") / (answer.GasKg("Sn") / furnace.AtomicMass("Sn"));
    }

    /// <summary>J per mol Cl2 of M + 2/3 AlCl3(g) = MCl2 + 2/3 Al.</summary>
    private double ChlorideExchange(PublishedRow row)
    {
        var temperature = row.Setup.Number("temperature_kelvin");
        var salt = furnace.Catalogue.Slot<ChlorideDatum>($"chloride/{row.Element}Cl2").Single(datum => datum.Preferred);
        var aluminium = furnace.Catalogue.GasSpecies.Single(gas => gas.Species == "AlCl3");
        return salt.GibbsEnergy(temperature) - (2.0 / 3 * aluminium.GibbsEnergy(temperature));
    }
}
