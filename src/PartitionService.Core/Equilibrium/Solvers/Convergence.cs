namespace PartitionService.Core.Equilibrium.Solvers;

/// <summary>Every stopping rule of the equilibrium solvers.</summary>
internal static class Convergence
{
    /// <summary>Largest accepted error of a phase's sum of mole fractions, and of a linking balance relative to its gross amount.</summary>
    public const double Tolerance = 1e-13;

    /// <summary>A step below this in every unknown also ends the iteration: rounding keeps the residual from shrinking further.</summary>
    public const double StepTolerance = 1e-14;

    /// <summary>Newton steps of the fast method before the barrier method takes over.</summary>
    public const int NewtonLimit = 100;

    /// <summary>Excess of a mole fraction sum over 1 at which an absent phase forms.</summary>
    public const double FormationTolerance = 1e-11;

    /// <summary>Share of all atoms below which a shrinking phase is taken away.</summary>
    public const double VanishingShare = 1e-15;

    /// <summary>A component activity beyond exp of this has no bound: the component has no home.</summary>
    public const double UnboundedPotential = 800;

    /// <summary>Largest change of ln gamma between passes that ends the composition loop.</summary>
    public const double ActivityTolerance = 1e-12;

    /// <summary>Passes over composition-dependent activity coefficients before giving up.</summary>
    public const int ActivityPassLimit = 400;
}
