using PartitionService.Core.Catalogue;

namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Chooses rows, applies overrides and remembers every number that was taken.</summary>
/// <param name="catalogue">The catalogue.</param>
/// <param name="overrides">Overrides of the case.</param>
/// <param name="temperatureKelvin">Temperature of the case in kelvin.</param>
internal sealed class DatumLedger(
    ThermochemicalCatalogue catalogue, IReadOnlyList<DatumOverride> overrides, double temperatureKelvin)
{
    private readonly Dictionary<string, DatumOverride> overridden =
        overrides.ToDictionary(item => item.Slot, StringComparer.Ordinal);

    private readonly Dictionary<string, List<DatumUse>> bySlot = new(StringComparer.Ordinal);

    /// <summary>Uses by slot.</summary>
    public IReadOnlyDictionary<string, List<DatumUse>> Uses => bySlot;

    /// <summary>The preferred row of a slot that is nearest in temperature, among those that <paramref name="accept"/> takes.</summary>
    public T? Select<T>(string slot, Func<T, bool>? accept = null)
        where T : Datum
    {
        T? best = null;
        foreach (var row in catalogue.Slot(slot))
        {
            if (row is T { Preferred: true } candidate
                && (accept is null || accept(candidate))
                && (best is null || candidate.DistanceKelvin(temperatureKelvin) < best.DistanceKelvin(temperatureKelvin)))
            {
                best = candidate;
            }
        }

        return best;
    }

    /// <summary>The caller's number for a slot, or null.</summary>
    public double? Override(string slot) => overridden.TryGetValue(slot, out var item) ? item.Value : null;

    /// <summary>Oxides that overrides name in a slag family.</summary>
    public IEnumerable<string> OverriddenOxides(string family)
    {
        var prefix = $"slag/{family}/";
        return overridden.Keys.Where(slot => slot.StartsWith(prefix, StringComparison.Ordinal)).Select(slot => slot[prefix.Length..]);
    }

    /// <summary>Replaces the value of a slot's only use by the one at the final composition.</summary>
    public void Adjust(string slot, double value)
    {
        if (bySlot.TryGetValue(slot, out var uses) && uses.Count == 1 && !uses[0].Overridden)
        {
            uses[0] = uses[0] with { Value = value };
        }
    }

    /// <summary>Remembers that a row entered with a value; the caller's number where it was overridden.</summary>
    public void Take(string slot, Datum? row, string quantity, double value, string unit, double? sigma)
    {
        var replaced = overridden.TryGetValue(slot, out var item);
        var use = replaced
            ? new DatumUse(row?.Key ?? slot, quantity, value, unit, null, null, [item!.Source], [], true, 0)
            : new DatumUse(
                row!.Key, quantity, value, unit, sigma, row.Access, row.SourceIds, row.Flags, false, row.DistanceKelvin(temperatureKelvin));
        if (!bySlot.TryGetValue(slot, out var uses))
        {
            bySlot[slot] = uses = [];
        }

        if (!uses.Exists(known => known.Key == use.Key))
        {
            uses.Add(use);
        }
    }
}
