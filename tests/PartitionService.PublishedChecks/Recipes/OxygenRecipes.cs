using PartitionService.Core.Thermodynamics;
using PartitionService.PublishedChecks.Cases;
using PartitionService.PublishedChecks.Rows;

namespace PartitionService.PublishedChecks.Recipes;

/// <summary>Oxygen potentials, buffers, sensors and dissolved oxygen.</summary>
/// <param name="furnace">Solves vessels.</param>
internal sealed class OxygenRecipes(Furnace furnace)
{
    /// <summary>Recipes by name.</summary>
    public IReadOnlyDictionary<string, Recipe> All => new Dictionary<string, Recipe>(StringComparer.Ordinal)
    {
        ["log10-ratio-constant"] = row => [RatioConstant(row.Setup)],
        ["pair-oxygen-pressure"] = row => [PairPressure(row.Setup, row.Setup["oxide"])],
        ["cell-voltage"] = row => [CellVoltage(row.Setup)],
        ["dissolved-oxygen"] = row => [furnace.Solve(row.Setup).Redox.DissolvedOxygenMassPpm!.Value / 1e4],
        ["carbon-gas-ratio"] = row => [GasRatio(row.Setup)],
        ["deoxidation"] = row => [Deoxidation(row)],
    };

    private double GibbsEnergy(string gas, double temperature) =>
        furnace.Catalogue.GasSpecies.Single(row => row.Species == gas).GibbsEnergy(temperature);

    /// <summary>log10 of the rich-to-poor ratio at 1 atm O2, which is log10 K.</summary>
    private double RatioConstant(Setup setup)
    {
        var temperature = setup.Number("temperature_kelvin");
        var poor = setup.Has("poor") ? GibbsEnergy(setup["poor"], temperature) : 0;
        return Math.Log10(OxygenPotential.ToRatio(0, GibbsEnergy(setup["rich"], temperature), poor, temperature));
    }

    /// <summary>log10 pO2 that the product finds for a pure metal and its pure oxide.</summary>
    private double PairPressure(Setup setup, string oxide) =>
        furnace.Solve(setup.With("oxygen", $"pair:{oxide}:1")).Redox.Log10OxygenPressureAtm!.Value;

    /// <summary>Nernst equation of the zirconia cell, RT/4F ln(p/p'), in V.</summary>
    private double CellVoltage(Setup setup)
    {
        var poor = PairPressure(setup, setup["oxide"]);
        var rich = setup.Has("oxide_after")
            ? PairPressure(setup, setup["oxide_after"])
            : Math.Log10(setup.Number("reference_pressure_atm"));
        return Constants.Thermal(setup.Number("temperature_kelvin")) * Math.Log(10) * (rich - poor) / (4 * Constants.FaradayCoulombPerMol);
    }

    private double GasRatio(Setup setup)
    {
        var temperature = setup.Number("temperature_kelvin");
        var potential = OxygenPotential.FromLog10(furnace.Solve(setup).Redox.Log10OxygenPressureAtm!.Value);
        return OxygenPotential.ToRatio(potential, GibbsEnergy("CO2", temperature), GibbsEnergy("CO", temperature), temperature);
    }

    /// <summary>Mass % of oxygen in iron with a deoxidiser under its pure oxide; the deoxidiser's activity is iterated.</summary>
    private double Deoxidation(PublishedRow row)
    {
        var answer = furnace.Solve(row.Setup, row.Element);
        for (var pass = 0; pass < 60; pass++)
        {
            var activity = Answer.Species(answer.Metal!, row.Element).Activity!.Value;
            var pair = string.Create(System.Globalization.CultureInfo.InvariantCulture, $"pair:{row.Setup["oxide"]}:1:{activity}");
            answer = furnace.Solve(row.Setup.With("oxygen", pair), row.Element);
        }

        return answer.Redox.DissolvedOxygenMassPpm!.Value / 1e4;
    }
}
