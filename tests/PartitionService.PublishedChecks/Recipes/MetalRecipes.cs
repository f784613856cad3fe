using PartitionService.Core.Catalogue;
using PartitionService.Core.Thermodynamics;
using PartitionService.PublishedChecks.Cases;
using PartitionService.PublishedChecks.Rows;

namespace PartitionService.PublishedChecks.Recipes;

/// <summary>Quantities of a liquid metal alone.</summary>
/// <param name="furnace">Solves vessels.</param>
internal sealed class MetalRecipes(Furnace furnace)
{
    /// <summary>Recipes by name.</summary>
    public IReadOnlyDictionary<string, Recipe> All => new Dictionary<string, Recipe>(StringComparer.Ordinal)
    {
        ["activity-coefficient"] = row => [ActivityCoefficient(row)],
        ["two-metal-ratio"] = row => [TwoMetalRatio(row)],
        ["one-mass-percent-energy"] = row => [OneMassPercentEnergy(row)],
        ["gas-solubility"] = row => [furnace.Solve(row.Setup).Of(row.Element).MetalMassPpm!.Value / 1e4],
        ["carbon-content"] = row => [furnace.Solve(row.Setup).Of("C").MetalMassPpm!.Value / 1e4],
        ["carbon-oxygen-product"] = row => [CarbonOxygenProduct(row)],
    };

    /// <summary>Raoultian coefficient, or the one referred to the pure solid where the row says so.</summary>
    private double ActivityCoefficient(PublishedRow row)
    {
        var metal = furnace.Solve(row.Setup, row.Element).Metal!;
        var coefficient = Answer.Species(metal, row.Element).ActivityCoefficient!.Value;
        if (!row.Setup.Has("reference"))
        {
            return coefficient;
        }

        var shift = StateConversion.LnReferenceOverState(
            furnace.Catalogue.Elements[row.Element], StandardState.Solid, row.Setup.Number("temperature_kelvin"), furnace.Catalogue);
        return coefficient / Math.Exp(shift!.Value);
    }

    /// <summary>Two liquid metals side by side: equal activities, so L by mass is the ratio of coefficients times that of the mean masses.</summary>
    private double TwoMetalRatio(PublishedRow row)
    {
        (double Coefficient, double MeanMass) Side(Setup setup)
        {
            var metal = furnace.Solve(setup, row.Element).Metal!;
            return (Answer.Species(metal, row.Element).ActivityCoefficient!.Value, metal.MassKg / metal.AmountMol);
        }

        var first = Side(row.Setup);
        var second = Side(new Setup($"solvent={row.Setup["solvent_after"]};temperature_kelvin={row.Setup["temperature_kelvin"]}"));
        return first.Coefficient / second.Coefficient * first.MeanMass / second.MeanMass;
    }

    /// <summary>RT ln(gamma0 M_solvent / (100 M_solute)) from the reference of the element.</summary>
    private double OneMassPercentEnergy(PublishedRow row)
    {
        var temperature = row.Setup.Number("temperature_kelvin");
        var solvent = row.Setup["solvent"];
        var datum = furnace.Catalogue.Slot<InfiniteDilutionDatum>($"metal/{solvent}/{row.Element}").First(entry => entry.Preferred);
        var shift = StateConversion.LnReferenceOverState(
            furnace.Catalogue.Elements[row.Element], datum.SoluteState, temperature, furnace.Catalogue);
        var masses = furnace.AtomicMass(solvent) / (100 * furnace.AtomicMass(row.Element));
        return Constants.Thermal(temperature) * (datum.LnGamma(temperature) + shift!.Value + Math.Log(masses));
    }

    /// <summary>[mass % C][mass % O] of iron under 1 atm of nearly pure CO, all oxygen accounted for.</summary>
    private double CarbonOxygenProduct(PublishedRow row)
    {
        var answer = furnace.Solve(row.Setup.With("oxygen", "closed").With("gas", "CO:20"));
        return answer.Of("C").MetalMassPpm!.Value * answer.Redox.DissolvedOxygenMassPpm!.Value / 1e8;
    }
}
