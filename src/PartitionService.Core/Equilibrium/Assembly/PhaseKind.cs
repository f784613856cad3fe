namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Phases of a vessel.</summary>
internal enum PhaseKind
{
    /// <summary>Liquid metal.</summary>
    Metal,

    /// <summary>Slag or salt.</summary>
    Slag,

    /// <summary>Gas.</summary>
    Gas,

    /// <summary>Unburnt solid carbon.</summary>
    Carbon,
}
