using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium.Assembly;

namespace PartitionService.Core.Equilibrium.Reporting;

/// <summary>What the rules for remarks and cautions look at.</summary>
/// <param name="Case">The case.</param>
/// <param name="Catalogue">The catalogue.</param>
/// <param name="Assembly">The assembled case.</param>
/// <param name="State">The solution.</param>
/// <param name="Streams">What leaves.</param>
/// <param name="Elements">Distribution of every element.</param>
/// <param name="Gas">The gas; null where none formed.</param>
/// <param name="Data">Data that entered.</param>
internal sealed record ReportContext(
    VesselCase Case,
    ThermochemicalCatalogue Catalogue,
    VesselAssembly Assembly,
    EquilibriumState State,
    VesselStreams Streams,
    IReadOnlyList<ElementDistribution> Elements,
    GasReport? Gas,
    IReadOnlyList<DatumUse> Data)
{
    /// <summary>True where the metal is present.</summary>
    public bool HasMetal => State.Amount(PhaseKind.Metal) > 0;

    /// <summary>True where the slag is present.</summary>
    public bool HasSlag => State.Amount(PhaseKind.Slag) > 0;

    /// <summary>True where the gas is present.</summary>
    public bool HasGas => State.Amount(PhaseKind.Gas) > 0;
}
