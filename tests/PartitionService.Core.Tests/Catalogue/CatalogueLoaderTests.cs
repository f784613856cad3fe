using PartitionService.Core.Catalogue;

namespace PartitionService.Core.Tests.Catalogue;

public sealed class CatalogueLoaderTests
{
    [Fact]
    public void Embedded_catalogue_loads_once()
    {
        var catalogue = CatalogueLoader.LoadEmbedded();
        Assert.Same(catalogue, CatalogueLoader.LoadEmbedded());
    }
}
