namespace PartitionService.Core.Equilibrium.Solvers;

/// <summary>The numbers of one equilibrium: components, phases and species at one temperature and pressure.</summary>
/// <remarks>
/// <para>
/// Species s of phase phi has mole fraction ln x_s = LnK_s + m_s lambda_i + sum_j nu_sj lambda_j, where lambda is the
/// natural logarithm of a component's activity (oxygen: 1/2 ln pO2), i its one carried element and j the linking
/// components O, S, Cl, Br, H that occur together with others. Amounts are N_phi x_s, sums of x are 1 in a phase that is present.
/// </para>
/// <para>
/// Species are sorted by carried element and by its atoms; those of linking components alone come last. Arrays of species length are padded with
/// species of mole fraction zero to a multiple of <see cref="Padding"/>, so that every exponential is taken by the same
/// vector code and the result does not depend on the position of a species.
/// </para>
/// </remarks>
internal sealed class EquilibriumProblem
{
    /// <summary>Largest number of phases: metal, slag, gas, solid carbon.</summary>
    public const int MaximumPhases = 4;

    /// <summary>Largest number of linking components: O, S, Cl, Br, H.</summary>
    public const int MaximumLinks = 5;

    /// <summary>Species arrays are padded to a multiple of this.</summary>
    public const int Padding = 8;

    /// <summary>ln x of a padding species, small enough that its exponential is zero.</summary>
    public const double LnZero = -1e4;

    private SpeciesEntry[]? entries;
    private double[]? lnElementAmount;
    private int[]? polyatomicStart;
    private double negligible;

    /// <summary>Number of carried elements, each with a positive amount.</summary>
    public required int ElementCount { get; init; }

    /// <summary>Number of linking components.</summary>
    public required int LinkCount { get; init; }

    /// <summary>Number of phases.</summary>
    public required int PhaseCount { get; init; }

    /// <summary>First species of each carried element; entry <see cref="ElementCount"/> starts the link-only group, the last entry ends it.</summary>
    public required int[] GroupStart { get; init; }

    /// <summary>ln x at unit activities, padded. Metal entries hold -ln gamma and change between passes.</summary>
    public required double[] LnK { get; init; }

    /// <summary>Phase index of each species, padded with 0.</summary>
    public required int[] Phase { get; init; }

    /// <summary>Atoms of the carried element, padded with 0; 0 for link-only species.</summary>
    public required int[] Multiplicity { get; init; }

    /// <summary>Atoms of each linking component, [link][species], padded with 0.</summary>
    public required double[][] LinkAtoms { get; init; }

    /// <summary>Phase, multiplicity and link of each species side by side; made from the columns.</summary>
    public SpeciesEntry[] Entries => entries ??= SpeciesEntry.From(Phase, Multiplicity, LinkAtoms);

    /// <summary>Amount of each carried element in mol, positive.</summary>
    public required double[] ElementAmount { get; init; }

    /// <summary>ln of the amount of each carried element.</summary>
    public double[] LnElementAmount => lnElementAmount ??= [.. ElementAmount.Select(amount => Math.Log(amount))];

    /// <summary>Amount of each linking component in mol; ignored where the potential is fixed.</summary>
    public required double[] LinkAmount { get; init; }

    /// <summary>True where the potential is given instead of the amount.</summary>
    public required bool[] LinkFixed { get; init; }

    /// <summary>Fixed potentials; ignored where the amount is given.</summary>
    public required double[] LinkPotential { get; init; }

    /// <summary>Index of the slag, or -1.</summary>
    public required int SlagPhase { get; init; }

    /// <summary>Index of the solid carbon, or -1.</summary>
    public required int CarbonPhase { get; init; }

    /// <summary>True where carbon has gas species to go to.</summary>
    public required bool CarbonIsGasified { get; init; }

    /// <summary>True for links that compounds in the slag are made of (oxygen, chlorine in a salt): their start is a ladder of stability.</summary>
    public required bool[] LinkHasLadder { get; init; }

    /// <summary>
    /// First species with more than one atom in each element's group, whose species are sorted by atoms; the end of the group where there
    /// is none.
    /// </summary>
    public int[] PolyatomicStart => polyatomicStart ??= FindPolyatomicStart();

    /// <summary>Amounts below this, mol, change no balance: 1e-18 of the smallest component.</summary>
    public double Negligible => negligible > 0 ? negligible : negligible = 1e-18 * SmallestAmount();

    /// <summary>Rough amount of each phase in mol for a cold start, positive.</summary>
    public required double[] PhaseGuess { get; init; }

    /// <summary>Number of species without padding.</summary>
    public int SpeciesCount => GroupStart[^1];

    /// <summary>Length of the padded species arrays.</summary>
    public int PaddedCount => LnK.Length;

    private int[] FindPolyatomicStart()
    {
        var starts = new int[ElementCount];
        for (var element = 0; element < ElementCount; element++)
        {
            var s = GroupStart[element];
            while (s < GroupStart[element + 1] && Multiplicity[s] == 1)
            {
                s++;
            }

            starts[element] = s;
        }

        return starts;
    }

    private double SmallestAmount()
    {
        var smallest = ElementAmount.Min();
        for (var j = 0; j < LinkCount; j++)
        {
            smallest = LinkFixed[j] ? smallest : Math.Min(smallest, LinkAmount[j]);
        }

        return smallest;
    }
}
