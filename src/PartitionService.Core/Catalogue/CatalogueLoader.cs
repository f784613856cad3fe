using System.Text;
using PartitionService.Core.Catalogue.Tables;

namespace PartitionService.Core.Catalogue;

/// <summary>Reads and validates the embedded catalogue.</summary>
public static class CatalogueLoader
{
    private const string ResourcePrefix = "PartitionService.Core.Catalogue.";

    private static readonly (string File, Func<string, IEnumerable<Located<Datum>>> Parse)[] DatumTables =
    [
        (OxidationTable.File, OxidationTable.Parse),
        (ChlorideTable.File, ChlorideTable.Parse),
        (GasSpeciesTable.File, GasSpeciesTable.Parse),
        (InfiniteDilutionTable.File, InfiniteDilutionTable.Parse),
        (InteractionTable.File, InteractionTable.Parse),
        (SlagActivityTable.File, SlagActivityTable.Parse),
        (CapacityTable.File, CapacityTable.Parse),
        (OpticalBasicityTable.File, OpticalBasicityTable.Parse),
        (SolubilityLimitTable.File, SolubilityLimitTable.Parse),
        (EntrainmentTable.File, EntrainmentTable.Parse),
    ];

    private static readonly Lazy<ThermochemicalCatalogue> Embedded = new(() => Load(ReadEmbeddedFiles()));

    /// <summary>The embedded catalogue, read and validated once per process.</summary>
    /// <exception cref="CatalogueException">A row is not acceptable; names file, line and reason.</exception>
    public static ThermochemicalCatalogue LoadEmbedded() => Embedded.Value;

    /// <summary>The embedded files by name, as text.</summary>
    internal static Dictionary<string, string> ReadEmbeddedFiles()
    {
        var assembly = typeof(CatalogueLoader).Assembly;
        var files = new Dictionary<string, string>(StringComparer.Ordinal);
        foreach (var resource in assembly.GetManifestResourceNames())
        {
            if (!resource.StartsWith(ResourcePrefix, StringComparison.Ordinal) || !resource.EndsWith(".csv", StringComparison.Ordinal))
                continue;
            using var reader = new StreamReader(assembly.GetManifestResourceStream(resource)!, Encoding.UTF8);
            files[resource[ResourcePrefix.Length..]] = reader.ReadToEnd();
        }

        return files;
    }

    /// <summary>Builds a catalogue from files; all of them are needed and no other is accepted.</summary>
    internal static ThermochemicalCatalogue Load(IReadOnlyDictionary<string, string> filesByName)
    {
        CheckFileNames(filesByName);
        var data = DatumTables.SelectMany(t => t.Parse(filesByName[t.File])).ToList();
        var components = SlagComponentTable.Parse(filesByName[SlagComponentTable.File]);
        var draft = new CatalogueDraft(
            SourceTable.Parse(filesByName[SourceTable.File]),
            ElementTable.Parse(filesByName[ElementTable.File]),
            SlagFamilyTable.Parse(filesByName[SlagFamilyTable.File], components, data),
            components,
            data);
        CatalogueValidation.Check(draft);
        return new ThermochemicalCatalogue(
            CatalogueDigest.Compute(filesByName),
            draft.Sources,
            draft.Elements.ToDictionary(e => e.Value.Symbol, e => e.Value, StringComparer.Ordinal),
            draft.Families.ToDictionary(f => f.Value.Name, f => f.Value, StringComparer.Ordinal),
            [.. data.Select(d => d.Value)]);
    }

    private static void CheckFileNames(IReadOnlyDictionary<string, string> filesByName)
    {
        string[] expected =
        [
            .. DatumTables.Select(t => t.File), SourceTable.File, ElementTable.File, SlagFamilyTable.File, SlagComponentTable.File,
        ];
        if (expected.FirstOrDefault(f => !filesByName.ContainsKey(f)) is { } missing)
            throw new CatalogueException(missing, 0, "the file is missing");
        if (filesByName.Keys.FirstOrDefault(f => !expected.Contains(f)) is { } unknown)
            throw new CatalogueException(unknown, 0, "no table has this file name");
    }
}
