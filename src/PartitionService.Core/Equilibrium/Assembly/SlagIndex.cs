using System.Runtime.CompilerServices;
using PartitionService.Core.Catalogue;

namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Oxides and chlorides by slag family and element, found once per catalogue.</summary>
internal sealed class SlagIndex
{
    private static readonly ConditionalWeakTable<ThermochemicalCatalogue, SlagIndex> Indexes = [];

    private readonly Dictionary<(string Family, string Element), List<string>> oxides = [];
    private readonly Dictionary<string, string> elementOfOxide = new(StringComparer.Ordinal);

    private readonly Dictionary<string, double> usualOxygen = new(StringComparer.Ordinal) { ["C"] = 2, ["N"] = 2.5 };

    private readonly List<(string Element, string Slot)> oxidationSlots = [];

    private SlagIndex(ThermochemicalCatalogue catalogue)
    {
        foreach (var row in catalogue.Data.OfType<SlagActivityDatum>().Where(row => row.Preferred))
        {
            var key = (row.Family, row.Element);
            if (!oxides.TryGetValue(key, out var names))
            {
                oxides[key] = names = [];
            }

            if (!names.Contains(row.Oxide))
            {
                names.Add(row.Oxide);
            }
        }

        foreach (var row in catalogue.Data.OfType<OxidationDatum>())
        {
            if (elementOfOxide.TryAdd(row.Oxide, row.Element))
            {
                oxidationSlots.Add((row.Element, row.Slot));
            }

            usualOxygen[row.Element] = Math.Min(usualOxygen.GetValueOrDefault(row.Element, double.PositiveInfinity), row.OxygenPerMetal);
        }
    }

    /// <summary>The index of a catalogue.</summary>
    public static SlagIndex For(ThermochemicalCatalogue catalogue) => Indexes.GetValue(catalogue, key => new SlagIndex(key));

    /// <summary>Element and slot of every oxide with a Gibbs energy of oxidation, in the order of the catalogue.</summary>
    public IReadOnlyList<(string Element, string Slot)> OxidationSlots => oxidationSlots;

    /// <summary>Oxygen atoms per atom in the lowest oxide of the catalogue (carbonate, nitrate for C, N); 1 where it has none.</summary>
    public double UsualOxygen(string element) => usualOxygen.GetValueOrDefault(element, 1);

    /// <summary>Oxides and chlorides of an element in a family, those that only an override names included.</summary>
    public IEnumerable<string> Oxides(string family, string element, DatumLedger ledger)
    {
        var known = oxides.GetValueOrDefault((family, element), []);
        foreach (var name in known)
        {
            yield return name;
        }

        foreach (var name in ledger.OverriddenOxides(family))
        {
            if (!known.Contains(name) && elementOfOxide.GetValueOrDefault(name) == element)
            {
                yield return name;
            }
        }
    }
}
