using PartitionService.Core.Equilibrium.Solvers;

namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Solution of an assembled case, copied out of the workspace.</summary>
internal sealed class EquilibriumState
{
    /// <summary>Copies the solution.</summary>
    public EquilibriumState(
        AssembledCase assembled,
        SolverWorkspace work,
        SaddleSolver.Result result,
        int iterations,
        int passes,
        bool barrier,
        double solventLnGamma)
    {
        Assembled = assembled;
        Result = result;
        Iterations = iterations;
        ActivityPasses = passes;
        UsedBarrier = barrier;
        SolventLnGamma = solventLnGamma;
        var problem = assembled.Problem;
        MoleFraction = work.MoleFraction[..problem.SpeciesCount];
        PhaseAmount = [.. work.PhaseAmount.Take(problem.PhaseCount).Select((amount, p) => work.Present[p] ? amount : 0)];
        LinkPotential = work.Link[..problem.LinkCount];
        ElementPotential = [.. Enumerable.Range(0, problem.ElementCount).Select(i => work.Reference[i] + Math.Log(work.Relative[i]))];
    }

    /// <summary>The case.</summary>
    public AssembledCase Assembled { get; }

    /// <summary>Why the solve ended.</summary>
    public SaddleSolver.Result Result { get; }

    /// <summary>Newton steps of all passes.</summary>
    public int Iterations { get; }

    /// <summary>Passes over activity coefficients.</summary>
    public int ActivityPasses { get; }

    /// <summary>True where the barrier method ran.</summary>
    public bool UsedBarrier { get; }

    /// <summary>ln gamma of the solvent.</summary>
    public double SolventLnGamma { get; }

    /// <summary>Mole fraction of each species; of an absent phase: what it would hold, summing to less than 1.</summary>
    public double[] MoleFraction { get; }

    /// <summary>Amount of each phase in mol; zero where absent.</summary>
    public double[] PhaseAmount { get; }

    /// <summary>ln activity of each linking component.</summary>
    public double[] LinkPotential { get; }

    /// <summary>ln activity of each carried element.</summary>
    public double[] ElementPotential { get; }

    /// <summary>Amount of a phase in mol; zero where it is absent or not allowed.</summary>
    public double Amount(PhaseKind phase)
    {
        var index = Array.IndexOf(Assembled.Phases, phase);
        return index < 0 ? 0 : PhaseAmount[index];
    }

    /// <summary>True where the phase may form.</summary>
    public bool Allows(PhaseKind phase) => Array.IndexOf(Assembled.Phases, phase) >= 0;

    /// <summary>ln activity of an element; null where it is not in the equilibrium.</summary>
    public double? LnActivity(string element)
    {
        var link = Array.IndexOf(Assembled.Links, element);
        if (link >= 0)
        {
            return LinkPotential[link];
        }

        var carried = Array.IndexOf(Assembled.Carried, element);
        return carried < 0 ? null : ElementPotential[carried];
    }

    /// <summary>Indices of the species of a phase.</summary>
    public IEnumerable<int> SpeciesOf(PhaseKind phase) =>
        Enumerable.Range(0, Assembled.Species.Length).Where(s => Assembled.Species[s].Phase == phase);

    /// <summary>Amount of a species in mol.</summary>
    public double SpeciesAmount(int species) => PhaseAmount[Assembled.Problem.Phase[species]] * MoleFraction[species];

    /// <summary>Elements of a phase in mol, the inert part of the slag left out.</summary>
    public ElementLedger Elements(PhaseKind phase)
    {
        var ledger = new ElementLedger();
        foreach (var s in SpeciesOf(phase))
        {
            var amount = SpeciesAmount(s);
            foreach (var (element, atoms) in Assembled.Species[s].Atoms)
            {
                if (element != AssembledCase.InertName)
                {
                    ledger.Add(element, atoms * amount);
                }
            }
        }

        return ledger;
    }
}
