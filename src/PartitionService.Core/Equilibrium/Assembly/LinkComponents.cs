namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Components that occur together with others: oxygen, sulfur, chlorine, bromine, hydrogen.</summary>
internal static class LinkComponents
{
    /// <summary>The linking components in the order of the solver.</summary>
    public static readonly string[] Symbols = ["O", "S", "Cl", "Br", "H"];

    /// <summary>True for a linking component.</summary>
    public static bool Contains(string element) => Array.IndexOf(Symbols, element) >= 0;
}
