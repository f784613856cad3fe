using System.Globalization;
using PartitionService.Core.Catalogue;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Species of the ideal gas.</summary>
internal static class GasSpecies
{
    /// <summary>Species whose elements are all among <paramref name="present"/>.</summary>
    /// <param name="present">Elements in the equilibrium.</param>
    /// <param name="temperatureKelvin">Temperature in kelvin.</param>
    /// <param name="pressureAtm">Total pressure in atm.</param>
    /// <param name="catalogue">Gas species.</param>
    /// <param name="ledger">Rows and overrides.</param>
    /// <remarks>ln x = -Delta G/RT - ln P + sum of the atoms' ln activities.</remarks>
    public static IEnumerable<SpeciesRecord> Create(
        HashSet<string> present, double temperatureKelvin, double pressureAtm, ThermochemicalCatalogue catalogue, DatumLedger ledger)
    {
        var lnPressure = Math.Log(pressureAtm);
        foreach (var row in catalogue.GasSpecies)
        {
            string? carried = null;
            var usable = true;
            foreach (var (symbol, _) in row.Atoms)
            {
                usable &= present.Contains(symbol);
                if (!LinkComponents.Contains(symbol))
                {
                    // Species of two carried elements (none in the catalogue today) do not fit the elimination.
                    usable &= carried is null;
                    carried = symbol;
                }
            }

            if (!usable)
            {
                continue;
            }

            var given = ledger.Override(row.Slot);
            var energy = given ?? row.GibbsEnergy(temperatureKelvin);
            ledger.Take(
                row.Slot,
                row,
                string.Create(CultureInfo.InvariantCulture, $"Gibbs energy of formation of {row.Species}(g)"),
                energy,
                "J/mol",
                row.SigmaJoulePerMol);
            yield return new SpeciesRecord(
                row.Species,
                PhaseKind.Gas,
                carried,
                row.Atoms.ToDictionary(atom => atom.Key, atom => (double)atom.Value, StringComparer.Ordinal),
                (-energy / (PhysicalConstants.GasConstant * temperatureKelvin)) - lnPressure,
                null,
                "",
                [row.Slot])
            {
                LnKPerKelvin = -StateConversion.GibbsEnergyOverThermalPerKelvin(
                    energy, given is null ? row.GibbsEnergyPerKelvin(temperatureKelvin) : 0, temperatureKelvin),
            };
        }
    }
}
