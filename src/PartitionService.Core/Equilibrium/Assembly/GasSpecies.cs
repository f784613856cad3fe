using System.Runtime.CompilerServices;
using PartitionService.Core.Catalogue;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Species of the ideal gas.</summary>
internal static class GasSpecies
{
    private static readonly ConditionalWeakTable<ThermochemicalCatalogue, Template[]> Templates = [];

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
        foreach (var template in Templates.GetValue(catalogue, Prepare))
        {
            if (!Array.TrueForAll(template.Elements, present.Contains))
            {
                continue;
            }

            var row = template.Row;
            var given = ledger.Override(row.Slot);
            var energy = given ?? row.GibbsEnergy(temperatureKelvin);
            ledger.Take(row.Slot, row, template.Quantity, energy, "J/mol", row.SigmaJoulePerMol);
            yield return new SpeciesRecord(
                row.Species,
                PhaseKind.Gas,
                template.Carried,
                template.Atoms,
                (-energy / (PhysicalConstants.GasConstant * temperatureKelvin)) - lnPressure,
                null,
                "",
                template.Slots)
            {
                LnKPerKelvin = -StateConversion.GibbsEnergyOverThermalPerKelvin(
                    energy, given is null ? row.GibbsEnergyPerKelvin(temperatureKelvin) : 0, temperatureKelvin),
            };
        }
    }

    /// <summary>What of a species does not depend on the case. Species of two carried elements do not fit the elimination and are left out.</summary>
    private static Template[] Prepare(ThermochemicalCatalogue catalogue) =>
    [
        .. catalogue.GasSpecies
            .Where(row => row.Atoms.Keys.Count(e => !LinkComponents.Contains(e)) <= 1)
            .Select(row => new Template(
                row,
                row.Atoms.Keys.FirstOrDefault(e => !LinkComponents.Contains(e)),
                [.. row.Atoms.Keys],
                row.Atoms.ToDictionary(atom => atom.Key, atom => (double)atom.Value, StringComparer.Ordinal),
                $"Gibbs energy of formation of {row.Species}(g)",
                [row.Slot])),
    ];

    private sealed record Template(
        GasSpeciesDatum Row,
        string? Carried,
        string[] Elements,
        IReadOnlyDictionary<string, double> Atoms,
        string Quantity,
        string[] Slots);
}
