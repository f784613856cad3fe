using System.Collections.Concurrent;
using PartitionService.Core.Catalogue;

namespace PartitionService.Core.Thermodynamics;

/// <summary>Resolved formulas of the whole oxides and salts that slag compositions are made of.</summary>
/// <remarks>The names come from fixed tables and the catalogue, so the cache stays small; passes over a slag ask for them again and again.</remarks>
internal static class OxideFormulas
{
    private static readonly ConcurrentDictionary<string, ChemicalFormula?> Known = new(StringComparer.Ordinal);

    /// <summary>The resolved formula; null where the text is none.</summary>
    public static ChemicalFormula? Get(string oxide) =>
        Known.GetOrAdd(oxide, text => ChemicalFormula.TryParse(text, out var formula, out _) ? formula : null);
}
