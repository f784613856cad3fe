using PartitionService.Core.Catalogue;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Turns a statement about oxygen into an oxygen potential.</summary>
internal static class OxygenStatementReader
{
    /// <summary>Potential of a statement that fixes it at once; null for any other.</summary>
    public static FixedPotential? Potential(
        OxygenStatement statement, double temperatureKelvin, ThermochemicalCatalogue catalogue, DatumLedger ledger)
    {
        switch (statement)
        {
            case OxygenStatement.Pressure pressure:
                return new FixedPotential(OxygenPotential.FromLog10(pressure.Log10PressureAtm), 0, []);
            case OxygenStatement.CarbonDioxideToMonoxide ratio:
                return Ratio(ratio.Ratio, Gas("CO2"), Gas("CO"));
            case OxygenStatement.WaterToHydrogen ratio:
                return Ratio(ratio.Ratio, Gas("H2O"), null);
            case OxygenStatement.MetalOxidePair pair:
                return Pair(pair, temperatureKelvin, catalogue, ledger);
            default:
                return null;
        }

        FixedPotential Ratio(double value, Energy rich, Energy? poor)
        {
            var perJoule = 1 / (PhysicalConstants.GasConstant * temperatureKelvin);
            var difference = rich.JoulePerMol - (poor?.JoulePerMol ?? 0);
            return new FixedPotential(
                OxygenPotential.FromRatio(value, rich.JoulePerMol, poor?.JoulePerMol ?? 0, temperatureKelvin),
                StateConversion.GibbsEnergyOverThermalPerKelvin(
                    difference, rich.PerKelvin - (poor?.PerKelvin ?? 0), temperatureKelvin),
                poor is null ? [(rich.Slot, perJoule)] : [(rich.Slot, perJoule), (poor.Slot, -perJoule)]);
        }

        Energy Gas(string species)
        {
            var slot = $"gas/{species}";
            var row = ledger.Select<GasSpeciesDatum>(slot);
            var given = ledger.Override(slot);
            var energy = given ?? row!.GibbsEnergy(temperatureKelvin);
            ledger.Take(slot, row, $"Gibbs energy of formation of {species}(g)", energy, "J/mol", row?.SigmaJoulePerMol);
            return new Energy(slot, energy, given is null ? row!.GibbsEnergyPerKelvin(temperatureKelvin) : 0);
        }
    }

    /// <summary>The oxide's stable state is the one with the lowest Gibbs energy, the metal's is liquid above its melting point.</summary>
    private static FixedPotential Pair(
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
        var perKelvin = StateConversion.GibbsEnergyOverThermalPerKelvin(
            used, given is null ? best.GibbsEnergyPerKelvin : 0, temperatureKelvin) - LnRatioPerKelvin(metalState);
        if (given is null)
        {
            // bestEnergy/RT = Delta G of the row/RT + ln ratio of the row's metal.
            perKelvin += LnRatioPerKelvin(best.MetalState) + (LnRatio(best.MetalState) / temperatureKelvin);
        }

        return new FixedPotential(
            OxygenPotential.FromPair(
                Math.Log(pair.OxideActivity),
                Math.Log(pair.MetalActivity) + LnRatio(metalState),
                used,
                oxide.OxygenPerMetal,
                temperatureKelvin),
            perKelvin / oxide.OxygenPerMetal,
            [(oxide.Slot, 1 / (thermal * oxide.OxygenPerMetal))]);

        double LnRatioPerKelvin(StandardState state) =>
            StateConversion.LnReferenceOverStatePerKelvin(element, state, temperatureKelvin, catalogue);
    }

    private sealed record Energy(string Slot, double JoulePerMol, double PerKelvin);
}
