namespace PartitionService.Core.Catalogue;

/// <summary>The embedded, read-only collection of thermodynamic numbers with their ranges, trust and sources.</summary>
/// <remarks>Immutable and safe to share between threads. Build it with <see cref="CatalogueLoader"/>.</remarks>
public sealed class ThermochemicalCatalogue
{
    private readonly Dictionary<string, IReadOnlyList<Datum>> slots;
    private readonly Dictionary<string, Datum> byKey;

    internal ThermochemicalCatalogue(
        string digest,
        IReadOnlyDictionary<string, Source> sources,
        IReadOnlyDictionary<string, Element> elements,
        IReadOnlyDictionary<string, SlagFamily> slagFamilies,
        IReadOnlyList<Datum> data)
    {
        Digest = digest;
        Sources = sources;
        Elements = elements;
        SlagFamilies = slagFamilies;
        Data = data;
        slots = data.GroupBy(d => d.Slot, StringComparer.Ordinal)
            .ToDictionary(g => g.Key, g => (IReadOnlyList<Datum>)[.. g], StringComparer.Ordinal);
        byKey = data.ToDictionary(d => d.Key, StringComparer.Ordinal);
        Solvents = [.. data.OfType<InfiniteDilutionDatum>().Select(d => d.Solvent).Distinct().Order(StringComparer.Ordinal)];
        GasSpecies = [.. data.OfType<GasSpeciesDatum>().Where(d => d.Preferred)];
    }

    /// <summary>SHA-256 of the catalogue's content, 64 lower-case hexadecimal digits; the same content gives the same digest.</summary>
    public string Digest { get; }

    /// <summary>Sources by id.</summary>
    public IReadOnlyDictionary<string, Source> Sources { get; }

    /// <summary>Elements by symbol.</summary>
    public IReadOnlyDictionary<string, Element> Elements { get; }

    /// <summary>Slag families by name.</summary>
    public IReadOnlyDictionary<string, SlagFamily> SlagFamilies { get; }

    /// <summary>Every datum in the order of the files.</summary>
    public IReadOnlyList<Datum> Data { get; }

    /// <summary>Metals that have at least one solute, ordinal order.</summary>
    public IReadOnlyList<string> Solvents { get; }

    /// <summary>Preferred gas species in the order of the file.</summary>
    public IReadOnlyList<GasSpeciesDatum> GasSpecies { get; }

    /// <summary>All rows of a slot in file order; empty where the catalogue has none.</summary>
    public IReadOnlyList<Datum> Slot(string slot) => slots.TryGetValue(slot, out var rows) ? rows : [];

    /// <summary>The row with this key, or null.</summary>
    public Datum? Find(string key) => byKey.GetValueOrDefault(key);

    /// <summary>Rows of a slot of one kind, in file order.</summary>
    public IEnumerable<T> Slot<T>(string slot)
        where T : Datum => Slot(slot).OfType<T>();
}
