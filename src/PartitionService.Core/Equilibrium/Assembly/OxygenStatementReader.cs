using PartitionService.Core.Catalogue;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Turns a statement about oxygen into an oxygen potential.</summary>
internal static class OxygenStatementReader
{
    /// <summary>1/2 ln pO2 of a statement that fixes it at once; null for any other.</summary>
    public static double? Potential(
        OxygenStatement statement, double temperatureKelvin, ThermochemicalCatalogue catalogue, DatumLedger ledger)
    {
        switch (statement)
        {
            case OxygenStatement.Pressure pressure:
                return OxygenPotential.FromLog10(pressure.Log10PressureAtm);
            case OxygenStatement.CarbonDioxideToMonoxide ratio:
                return OxygenPotential.FromRatio(ratio.Ratio, Gas("CO2"), Gas("CO"), temperatureKelvin);
            case OxygenStatement.WaterToHydrogen ratio:
                return OxygenPotential.FromRatio(ratio.Ratio, Gas("H2O"), 0, temperatureKelvin);
            case OxygenStatement.MetalOxidePair pair:
                return Pair(pair, temperatureKelvin, catalogue, ledger);
            default:
                return null;
        }

        double Gas(string species)
        {
            var slot = $"gas/{species}";
            var row = ledger.Select<GasSpeciesDatum>(slot);
            var energy = ledger.Override(slot) ?? row!.GibbsEnergy(temperatureKelvin);
            ledger.Take(slot, row, $"Gibbs energy of formation of {species}(g)", energy, "J/mol", row?.SigmaJoulePerMol);
            return energy;
        }
    }

    /// <summary>The oxide's stable state is the one with the lowest Gibbs energy, the metal's is liquid above its melting point.</summary>
    private static double Pair(
        OxygenStatement.MetalOxidePair pair, double temperatureKelvin, ThermochemicalCatalogue catalogue, DatumLedger ledger)
    {
        var oxide = MetalOxide.Resolve(pair.Oxide, catalogue)
            ?? throw new InvalidOperationException("a validated case holds a known oxide");
        var element = catalogue.Elements[oxide.Element];
        var metalState = temperatureKelvin >= element.MeltingPointKelvin ? StandardState.Liquid : StandardState.Solid;
        var thermal = PhysicalConstants.GasConstant * temperatureKelvin;
        double LnRatio(StandardState state) =>
            StateConversion.LnReferenceOverState(element, state, temperatureKelvin, catalogue) ?? 0;

        OxidationDatum? best = null;
        var bestEnergy = double.PositiveInfinity;
        foreach (var state in new[] { StandardState.Solid, StandardState.Liquid })
        {
            var row = ledger.Select<OxidationDatum>(oxide.Slot, o => o.OxideState == state && o.MetalState == metalState)
                ?? ledger.Select<OxidationDatum>(oxide.Slot, o => o.OxideState == state);
            if (row is null)
            {
                continue;
            }

            // From the row's metal state to the liquid: a_row = a_liquid exp(-ln ratio).
            var energy = row.GibbsEnergy(temperatureKelvin) + (thermal * LnRatio(row.MetalState));
            if (energy < bestEnergy)
            {
                best = row;
                bestEnergy = energy;
            }
        }

        var given = ledger.Override(oxide.Slot);
        var used = given ?? bestEnergy;
        ledger.Take(
            oxide.Slot, best, $"Gibbs energy of oxidation to {best!.Oxide}, from liquid {oxide.Element}", used, "J/mol", best.SigmaJoulePerMol);
        return OxygenPotential.FromPair(
            Math.Log(pair.OxideActivity),
            Math.Log(pair.MetalActivity) + LnRatio(metalState),
            used,
            oxide.OxygenPerMetal,
            temperatureKelvin);
    }
}
