namespace PartitionService.Core.Catalogue;

/// <summary>Reads and validates the embedded catalogue.</summary>
public static class CatalogueLoader
{
    private static readonly Lazy<ThermochemicalCatalogue> Embedded = new(() => throw new InvalidOperationException("pending"));

    /// <summary>The embedded catalogue, read and validated once per process.</summary>
    /// <exception cref="CatalogueException">A row is not acceptable; names file, line and reason.</exception>
    public static ThermochemicalCatalogue LoadEmbedded() => Embedded.Value;
}
