namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>One species of the equilibrium with its constant, before the numbers go into the solver's arrays.</summary>
/// <param name="Name">Formula.</param>
/// <param name="Phase">Phase.</param>
/// <param name="Carried">Carried element; null for species of linking components alone.</param>
/// <param name="Atoms">Atoms by element; sulfide in slag holds -1 oxygen, because it replaces an oxide ion.</param>
/// <param name="LnK">ln of the mole fraction at unit activities of all components.</param>
/// <param name="LnGamma">ln of the activity coefficient on <paramref name="StandardState"/>; null where no activity is defined.</param>
/// <param name="StandardState">Standard state in words; empty where no activity is defined.</param>
/// <param name="Slots">Slots of the data that entered.</param>
internal sealed record SpeciesRecord(
    string Name,
    PhaseKind Phase,
    string? Carried,
    IReadOnlyDictionary<string, double> Atoms,
    double LnK,
    double? LnGamma,
    string StandardState,
    IReadOnlyList<string> Slots)
{
    /// <summary>Derivative of ln K with respect to temperature at fixed composition, per kelvin; an overridden number does not vary.</summary>
    public double LnKPerKelvin { get; init; }

    /// <summary>True where the slag datum is ln(K/gamma) itself and so enters ln K with a plus sign.</summary>
    public bool HasProductDatum { get; init; }
}
