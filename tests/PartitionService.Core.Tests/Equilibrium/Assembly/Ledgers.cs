using PartitionService.Core.Equilibrium;
using PartitionService.Core.Equilibrium.Assembly;

namespace PartitionService.Core.Tests.Equilibrium.Assembly;

/// <summary>Ledgers of data and assembled cases for tests below the solver.</summary>
internal static class Ledgers
{
    public static DatumLedger At(double temperatureKelvin, params DatumOverride[] overrides) =>
        new(Vessels.Catalogue, overrides, temperatureKelvin);

    public static VesselAssembly Assemble(VesselCase vessel)
    {
        var assembly = new VesselAssembler(vessel, Vessels.Catalogue).Assemble(out var failure);
        Assert.True(assembly is not null, failure?.Message);
        return assembly;
    }
}
