namespace PartitionService.Core.Equilibrium.Solvers;

/// <summary>Buffers of one solve; reused, so that the iterations allocate nothing. Not thread-safe.</summary>
internal sealed class SolverWorkspace
{
    /// <summary>Largest number of border unknowns: linking potentials and phase amounts.</summary>
    public const int MaximumBorder = EquilibriumProblem.MaximumLinks + EquilibriumProblem.MaximumPhases;

    /// <summary>Linking potentials.</summary>
    public double[] Link { get; } = new double[EquilibriumProblem.MaximumLinks];

    /// <summary>Phase amounts in mol.</summary>
    public double[] PhaseAmount { get; } = new double[EquilibriumProblem.MaximumPhases];

    /// <summary>ln of the first guess of the phase amounts.</summary>
    public double[] LnPhaseGuess { get; } = new double[EquilibriumProblem.MaximumPhases];

    /// <summary>Steps of the ladder of a cold start.</summary>
    public OxidationLadder.Step[] LadderSteps { get; private set; } = [];

    /// <summary>Sum of mole fractions in each phase.</summary>
    public double[] PhaseSum { get; } = new double[EquilibriumProblem.MaximumPhases];

    /// <summary>True where the phase is present.</summary>
    public bool[] Present { get; } = new bool[EquilibriumProblem.MaximumPhases];

    /// <summary>Gradient over links, then phases.</summary>
    public double[] Gradient { get; } = new double[MaximumBorder];

    /// <summary>Gross amount that each linking gradient is a difference of, for relative residuals.</summary>
    public double[] LinkGross { get; } = new double[EquilibriumProblem.MaximumLinks];

    /// <summary>Reduced Hessian, row-major with <see cref="MaximumBorder"/> columns, links then phases.</summary>
    public double[] Hessian { get; } = new double[MaximumBorder * MaximumBorder];

    /// <summary>Dense system that is solved.</summary>
    public double[] Matrix { get; } = new double[MaximumBorder * MaximumBorder];

    /// <summary>Right side and step.</summary>
    public double[] Step { get; } = new double[MaximumBorder];

    /// <summary>Unknowns of the dense system as border indices.</summary>
    public int[] Unknown { get; } = new int[MaximumBorder];

    /// <summary>Row of one element in the border.</summary>
    public double[] Row { get; } = new double[MaximumBorder];

    /// <summary>ln x at the reference activities, padded.</summary>
    public double[] Shifted { get; private set; } = [];

    /// <summary>Mole fractions, padded.</summary>
    public double[] MoleFraction { get; private set; } = [];

    /// <summary>Reference ln activity of each carried element.</summary>
    public double[] Reference { get; private set; } = [];

    /// <summary>Activity of each carried element relative to the reference.</summary>
    public double[] Relative { get; private set; } = [];

    /// <summary>Makes room for a problem.</summary>
    public void Reserve(EquilibriumProblem problem)
    {
        if (Shifted.Length < problem.PaddedCount)
        {
            Shifted = new double[problem.PaddedCount];
            MoleFraction = new double[problem.PaddedCount];
        }

        if (Reference.Length < problem.ElementCount)
        {
            Reference = new double[problem.ElementCount];
            Relative = new double[problem.ElementCount];
            LadderSteps = new OxidationLadder.Step[OxidationLadder.Capacity(problem.ElementCount)];
        }
    }
}
