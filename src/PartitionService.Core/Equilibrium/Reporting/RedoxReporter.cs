using PartitionService.Core.Catalogue;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Equilibrium.Reporting;

/// <summary>Reports oxygen and the other potentials.</summary>
internal static class RedoxReporter
{
    /// <summary>The report.</summary>
    public static RedoxReport Report(ReportContext context)
    {
        var temperature = context.Case.TemperatureKelvin;
        var supplyMol = context.Streams.Supply;
        var report = new RedoxReport
        {
            OxygenToSupplyKg = supplyMol * context.Catalogue.Elements["O"].AtomicMassGramPerMol / 1000,
            OxygenToSupplyNormalCubicMetre = 0.5 * supplyMol * PhysicalConstants.NormalCubicMetrePerMol,
            Log10SulfurPressureAtm = context.State.LnActivity("S") is { } sulfur ? OxygenPotential.ToLog10(sulfur) : null,
            Log10ChlorinePressureAtm = context.State.LnActivity("Cl") is { } chlorine ? OxygenPotential.ToLog10(chlorine) : null,
        };
        if (context.State.LnActivity("O") is not { } oxygen)
        {
            return report;
        }

        return report with
        {
            Log10OxygenPressureAtm = OxygenPotential.ToLog10(oxygen),
            OxygenPotentialKilojoulePerMol = 2 * oxygen * PhysicalConstants.GasConstant * temperature / 1000,
            CarbonDioxideToMonoxide = OxygenPotential.ToRatio(oxygen, Gas("CO2"), Gas("CO"), temperature),
            WaterToHydrogen = OxygenPotential.ToRatio(oxygen, Gas("H2O"), 0, temperature),
            DissolvedOxygenMassPpm = Dissolved(context),
        };

        double Gas(string species) =>
            context.Assembly.Ledger.Override($"gas/{species}")
            ?? context.Assembly.Ledger.Select<GasSpeciesDatum>($"gas/{species}")!.GibbsEnergy(temperature);
    }

    private static double? Dissolved(ReportContext context)
    {
        var metal = context.Streams.EquilibriumMetal;
        return context.HasMetal && metal["O"] > 0
            ? 1e6 * context.Streams.MassKg(metal, "O") / metal.MassKg(context.Catalogue.Elements)
            : null;
    }
}
