namespace PartitionService.Core.Equilibrium.Derivatives;

/// <summary>Differential of a quantity of the solution that a constant depends on.</summary>
internal sealed class CompositionFunctional
{
    /// <summary>Weight of d ln x of each species.</summary>
    public required (int Species, double Weight)[] LnFractions { get; init; }

    /// <summary>Index of a phase in the border and weight of d ln of its amount.</summary>
    public (int Step, double Weight)? LnAmount { get; init; }

    /// <summary>Weight of d ln K of each species, taken at its final value.</summary>
    public (int Species, double Weight)[] LnConstants { get; init; } = [];

    /// <summary>Index of a link and weight of its potential.</summary>
    public (int Link, double Weight)[] Potentials { get; init; } = [];

    /// <summary>Value for a solved response.</summary>
    public double Value(EquilibriumResponse response, Perturbation change)
    {
        var sum = 0.0;
        foreach (var (species, weight) in LnFractions)
        {
            sum += weight * response.LnFraction(species, change);
        }

        foreach (var (species, weight) in LnConstants)
        {
            sum += weight * change.LnK[species];
        }

        foreach (var (link, weight) in Potentials)
        {
            sum += weight * response.Step[link];
        }

        return sum + (LnAmount is { } amount ? amount.Weight * response.Step[amount.Step] : 0);
    }
}
