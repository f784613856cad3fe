namespace PartitionService.Core.Equilibrium;

/// <summary>Departures of real furnaces from one equilibrium; each is off unless set.</summary>
public sealed record PracticeAllowances
{
    /// <summary>Nothing is switched on.</summary>
    public static PracticeAllowances None { get; } = new();

    /// <summary>Metal droplets in the leaving slag, mass % of the slag, in [0, 90].</summary>
    public double MetalInSlagMassPercent { get; init; }

    /// <summary>True: take the slag family's typical value instead of <see cref="MetalInSlagMassPercent"/>.</summary>
    public bool MetalInSlagTypical { get; init; }

    /// <summary>Slag in the leaving metal, mass % of the metal, in [0, 50].</summary>
    public double SlagInMetalMassPercent { get; init; }

    /// <summary>Share of every solid charge item that leaves unreacted as mechanical dust, in [0, 0.5].</summary>
    public double MechanicalDustMassFraction { get; init; }

    /// <summary>Elements of which only a share takes part in the equilibrium.</summary>
    public IReadOnlyList<StageEfficiency> StageEfficiencies { get; init; } = [];
}

/// <summary>How near an element comes to equilibrium.</summary>
/// <param name="Element">Element symbol.</param>
/// <param name="Efficiency">Share of the input that takes part, in [0, 1]; the rest stays in the phase it came with. Gases and organic matter always take part.</param>
public sealed record StageEfficiency(string Element, double Efficiency);
