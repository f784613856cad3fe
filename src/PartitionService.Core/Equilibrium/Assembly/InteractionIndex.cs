using System.Runtime.CompilerServices;
using PartitionService.Core.Catalogue;

namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Pairs with an interaction parameter by solvent, found once per catalogue.</summary>
internal sealed class InteractionIndex
{
    private static readonly ConditionalWeakTable<ThermochemicalCatalogue, InteractionIndex> Indexes = [];

    private readonly Dictionary<string, List<Pair>> bySolvent = new(StringComparer.Ordinal);

    private InteractionIndex(ThermochemicalCatalogue catalogue)
    {
        foreach (var row in catalogue.Data.OfType<InteractionDatum>().Where(row => row.Preferred))
        {
            if (!bySolvent.TryGetValue(row.Solvent, out var pairs))
            {
                bySolvent[row.Solvent] = pairs = [];
            }

            if (!pairs.Exists(pair => pair.Slot == row.Slot))
            {
                pairs.Add(new Pair(row.First, row.Second, row.Slot));
            }
        }
    }

    /// <summary>A pair in ordinal order.</summary>
    public sealed record Pair(string First, string Second, string Slot);

    /// <summary>Pairs of a solvent, those that only an override names included.</summary>
    public static IEnumerable<Pair> Pairs(ThermochemicalCatalogue catalogue, string solvent, IReadOnlyList<DatumOverride> overrides)
    {
        var known = Indexes.GetValue(catalogue, key => new InteractionIndex(key)).bySolvent.GetValueOrDefault(solvent, []);
        var prefix = $"interaction/{solvent}/";
        return known.Concat(overrides
            .Where(o => o.Slot.StartsWith(prefix, StringComparison.Ordinal) && !known.Exists(pair => pair.Slot == o.Slot))
            .Select(o => o.Slot.Split('/'))
            .Select(parts => new Pair(parts[2], parts[3], string.Join('/', parts))));
    }
}
