using PartitionService.Core.Catalogue;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Species of the metal: the solvent by Raoult's law, solutes by Henry's law.</summary>
internal static class MetalSpecies
{
    /// <summary>Slot of a solute in a solvent.</summary>
    public static string Slot(string solvent, string solute) => $"metal/{solvent}/{solute}";

    /// <summary>The species of one element in the metal; null where the catalogue has no datum.</summary>
    /// <param name="element">The element.</param>
    /// <param name="solvent">The solvent.</param>
    /// <param name="temperatureKelvin">Temperature in kelvin.</param>
    /// <param name="catalogue">Fusion and vaporisation for conversions.</param>
    /// <param name="ledger">Rows and overrides.</param>
    public static SpeciesRecord? Create(
        Element element, string solvent, double temperatureKelvin, ThermochemicalCatalogue catalogue, DatumLedger ledger)
    {
        var reference = StateConversion.ReferenceName(element.Symbol);
        if (element.Symbol == solvent)
        {
            return Species(element.Symbol, 0, 0, reference, []);
        }

        var slot = Slot(solvent, element.Symbol);
        var row = ledger.Select<InfiniteDilutionDatum>(slot);
        if (ledger.Override(slot) is { } given)
        {
            ledger.Take(slot, row, $"ln gamma0 of {element.Symbol} in liquid {solvent}, {reference}", given, "1", null);
            return Species(element.Symbol, given, 0, reference, [slot]);
        }

        if (row is null
            || StateConversion.LnReferenceOverState(element, row.SoluteState, temperatureKelvin, catalogue) is not { } conversion)
        {
            return null;
        }

        var lnGamma = row.LnGamma(temperatureKelvin) + conversion;
        ledger.Take(
            slot, row, $"ln gamma0 of {element.Symbol} in liquid {solvent}, {reference}", lnGamma, "1", row.SigmaLnGamma);
        var perKelvin = row.LnGammaPerKelvin(temperatureKelvin)
            + StateConversion.LnReferenceOverStatePerKelvin(element, row.SoluteState, temperatureKelvin, catalogue);
        return Species(element.Symbol, lnGamma, perKelvin, reference, [slot]);
    }

    private static SpeciesRecord Species(string element, double lnGamma, double lnGammaPerKelvin, string reference, string[] slots) =>
        new(
            element,
            PhaseKind.Metal,
            LinkComponents.Contains(element) ? null : element,
            new Dictionary<string, double>(StringComparer.Ordinal) { [element] = 1 },
            -lnGamma,
            lnGamma,
            reference,
            slots)
        {
            LnKPerKelvin = -lnGammaPerKelvin,
        };
}
