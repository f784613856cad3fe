namespace PartitionService.Core.Equilibrium.Solvers;

/// <summary>What the accumulation needs of one species, side by side in memory.</summary>
internal readonly record struct SpeciesEntry
{
    /// <summary>No linking component.</summary>
    public const int NoLink = -1;

    /// <summary>More than one linking component: look in the columns.</summary>
    public const int SeveralLinks = -2;

    /// <summary>Phase index.</summary>
    public required int Phase { get; init; }

    /// <summary>Atoms of the carried element; 0 for link-only species.</summary>
    public required int Multiplicity { get; init; }

    /// <summary>Index of the only linking component, <see cref="NoLink"/> or <see cref="SeveralLinks"/>.</summary>
    public required int Link { get; init; }

    /// <summary>Atoms of the only linking component.</summary>
    public required double LinkAtoms { get; init; }

    /// <summary>Entries of all species.</summary>
    public static SpeciesEntry[] From(int[] phase, int[] multiplicity, double[][] linkAtoms)
    {
        var entries = new SpeciesEntry[phase.Length];
        for (var s = 0; s < phase.Length; s++)
        {
            var link = NoLink;
            for (var j = 0; j < linkAtoms.Length; j++)
            {
                if (linkAtoms[j][s] != 0)
                {
                    link = link == NoLink ? j : SeveralLinks;
                }
            }

            entries[s] = new SpeciesEntry
            {
                Phase = phase[s],
                Multiplicity = multiplicity[s],
                Link = link,
                LinkAtoms = link >= 0 ? linkAtoms[link][s] : 0,
            };
        }

        return entries;
    }
}
