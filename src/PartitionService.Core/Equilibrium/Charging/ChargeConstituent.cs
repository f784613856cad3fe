namespace PartitionService.Core.Equilibrium.Charging;

/// <summary>One charge item resolved into atoms.</summary>
/// <param name="Formula">Formula as it was written.</param>
/// <param name="Origin">The phase that it comes with.</param>
/// <param name="Atoms">Amount of each element in mol.</param>
/// <param name="CountPerFormula">Atoms per formula unit.</param>
/// <param name="MassKg">Mass in kg.</param>
internal sealed record ChargeConstituent(
    string Formula,
    ChargeOrigin Origin,
    IReadOnlyDictionary<string, double> Atoms,
    IReadOnlyDictionary<string, double> CountPerFormula,
    double MassKg);
