using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium.Solvers;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Moves the slag constants that depend on composition towards the composition of the solution.</summary>
internal sealed class SlagIteration
{
    /// <summary>Lowest mole fraction of oxide ions that sulfide is exchanged for; a slag has far more.</summary>
    public const double LeastOxideIons = 1e-12;

    private readonly AssembledCase assembled;
    private readonly VesselAssembly assembly;
    private readonly SlagTerms terms;
    private readonly IReadOnlyDictionary<string, Element> elements;
    private readonly int slagPhase;
    private readonly (string Element, double Mol)[] inert;

    /// <summary>Prepares the terms of an assembled case.</summary>
    public SlagIteration(VesselAssembly assembly, IReadOnlyDictionary<string, Element> elements)
    {
        this.assembly = assembly;
        this.elements = elements;
        assembled = assembly.Assembled;
        terms = assembly.Terms!;
        slagPhase = Array.IndexOf(assembled.Phases, PhaseKind.Slag);
        inert = [.. assembly.Account.Inert.Elements.Select(e => (e, assembly.Account.Inert[e]))];
        foreach (var term in terms.All)
        {
            term.Index = Array.FindIndex(assembled.Species, s => s.Phase == PhaseKind.Slag && s.Name == term.Species);
        }
    }

    /// <summary>True where nothing depends on the slag's composition.</summary>
    public bool IsEmpty => !terms.All.Any(term => term.Index >= 0);

    /// <summary>Sets the constants at the composition of the charge, or the family's usual one.</summary>
    public void Start()
    {
        var slag = WholeOxides.OfCharge(assembly.Account, elements) ?? SlagComposition.Typical(assembly.Family!);
        var iron = elements[assembly.Solvent].AtomicMassGramPerMol;
        var metal = new SlagTerms.MetalSide(LnGammaPhosphorus(), iron, assembled.OxygenLink >= 0 ? -10 : 0);
        foreach (var term in terms.All.Where(term => term.Index >= 0))
        {
            assembled.Problem.LnK[term.Index] = terms.LnK(term, slag, metal);
        }
    }

    /// <summary>Number of constants; the length of the distances.</summary>
    public int Count => terms.All.Count;

    /// <summary>Measures how far every constant is from the one at the solution's composition.</summary>
    /// <param name="work">The solution.</param>
    /// <param name="distance">Receives target minus present ln K; zero for terms that are not in the case.</param>
    public void Measure(SolverWorkspace work, Span<double> distance)
    {
        var slag = WholeOxides.Composition(Amounts(work), elements) ?? SlagComposition.Typical(assembly.Family!);
        var metal = new SlagTerms.MetalSide(
            LnGammaPhosphorus(), MeanMetalMass(work), assembled.OxygenLink >= 0 ? work.Link[assembled.OxygenLink] : 0);
        for (var i = 0; i < terms.All.Count; i++)
        {
            var term = terms.All[i];
            if (term.Index < 0)
            {
                distance[i] = 0;
                continue;
            }

            var target = terms.LnK(term, slag, metal);
            if (term.Kind == SlagTerms.TermKind.Sulfide)
            {
                target -= LnExchangeShare(work, term.Index, target);
            }

            distance[i] = target - assembled.Problem.LnK[term.Index];
        }
    }

    /// <summary>Moves every constant.</summary>
    public void Move(ReadOnlySpan<double> change)
    {
        for (var i = 0; i < terms.All.Count; i++)
        {
            if (terms.All[i].Index >= 0)
            {
                assembled.Problem.LnK[terms.All[i].Index] += change[i];
            }
        }
    }

    /// <summary>
    /// The capacity is the limit of few sulfide ions. A sulfide ion takes the place of an oxide ion, (O) + 1/2 S2 = (S) + 1/2 O2, so x_S =
    /// K a (1 - x_S/x_O) with x_O the oxide ions that the cations bring: the slag cannot hold more sulfide than that.
    /// </summary>
    private double LnExchangeShare(SolverWorkspace work, int sulfide, double lnK)
    {
        var problem = assembled.Problem;
        var oxygen = work.Present[slagPhase] ? assembly.Account.Inert["O"] / work.PhaseAmount[slagPhase] : 0;
        for (var s = 0; s < assembled.Species.Length; s++)
        {
            if (problem.Phase[s] == slagPhase && s != sulfide)
            {
                oxygen += work.MoleFraction[s] * problem.LinkAtoms[assembled.OxygenLink][s];
            }
        }

        var dilute = lnK - problem.LnK[sulfide] + Math.Log(Math.Max(work.MoleFraction[sulfide], 1e-300));
        return Math.Log(1 + Math.Exp(Math.Min(dilute - Math.Log(Math.Max(oxygen, LeastOxideIons)), 600)));
    }

    private IEnumerable<(string Element, double Mol)> Amounts(SolverWorkspace work)
    {
        var problem = assembled.Problem;
        var scale = work.Present[slagPhase] ? work.PhaseAmount[slagPhase] : 1;
        for (var s = 0; s < assembled.Species.Length; s++)
        {
            if (problem.Phase[s] == slagPhase && assembled.Species[s] is { Carried: { } element } record)
            {
                yield return (record.Name == "FeO1.5" ? record.Name : element, scale * work.MoleFraction[s]);
            }
        }

        if (work.Present[slagPhase])
        {
            foreach (var entry in inert)
            {
                yield return entry;
            }
        }
    }

    private double LnGammaPhosphorus()
    {
        var species = Array.FindIndex(assembled.Species, s => s is { Phase: PhaseKind.Metal, Name: "P" });
        return species < 0 ? 0 : -assembled.Problem.LnK[species];
    }

    private double MeanMetalMass(SolverWorkspace work)
    {
        double mass = 0, sum = 0;
        for (var s = 0; s < assembled.Species.Length; s++)
        {
            if (assembled.Species[s].Phase == PhaseKind.Metal)
            {
                mass += work.MoleFraction[s] * elements[assembled.Species[s].Name].AtomicMassGramPerMol;
                sum += work.MoleFraction[s];
            }
        }

        return sum > 0 ? mass / sum : elements[assembly.Solvent].AtomicMassGramPerMol;
    }
}
