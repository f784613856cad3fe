namespace PartitionService.Core.Equilibrium.Charging;

/// <summary>The phase that a constituent comes with; what does not react stays there.</summary>
internal enum ChargeOrigin
{
    /// <summary>Metals, alloys, intermetallics, sulfides and other constituents without oxygen or halogen.</summary>
    Metal,

    /// <summary>Oxides, halides and salts.</summary>
    Slag,

    /// <summary>Gases, air and organic matter.</summary>
    Gas,

    /// <summary>Carbon: coke, electrode, char.</summary>
    Carbon,
}
