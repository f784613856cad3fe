using PartitionService.Core.Equilibrium.Solvers;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Packs species and amounts into the solver's arrays.</summary>
/// <param name="amounts">Amount of each element that takes part, mol.</param>
/// <param name="inertCations">Inert mono-cations of the slag, mol.</param>
/// <param name="oxygenPotential">1/2 ln pO2 where it is fixed; null with a closed balance.</param>
internal sealed class ProblemBuilder(IReadOnlyDictionary<string, double> amounts, double inertCations, double? oxygenPotential)
{
    /// <summary>Builds the case.</summary>
    /// <param name="species">All species whose elements take part.</param>
    /// <param name="phases">Phases that may form, metal first.</param>
    /// <param name="solvent">Solvent.</param>
    /// <param name="guess">Rough amounts of the phases, mol, same order.</param>
    /// <param name="interactions">Pairs of metal species with an interaction parameter.</param>
    /// <param name="epsilon">Interaction parameter of a pair; called only for pairs of which both are in the metal.</param>
    public AssembledCase Build(
        IReadOnlyList<SpeciesRecord> species,
        PhaseKind[] phases,
        string solvent,
        double[] guess,
        IEnumerable<InteractionIndex.Pair> interactions,
        Func<InteractionIndex.Pair, InteractionTerm> epsilon)
    {
        var placed = Placeable(species, phases);
        var unplaced = amounts.Keys.Where(e => !placed.Contains(e)).ToArray();
        var used = species.Where(s => Array.IndexOf(phases, s.Phase) >= 0 && s.Atoms.Keys.All(placed.Contains)).ToList();
        var links = LinkComponents.Symbols.Where(placed.Contains).ToArray();
        var carried = placed.Where(e => !LinkComponents.Contains(e)).Order(StringComparer.Ordinal).ToList();
        if (inertCations > 0 && Array.IndexOf(phases, PhaseKind.Slag) >= 0)
        {
            carried.Add(AssembledCase.InertName);
            used.Add(new SpeciesRecord(
                AssembledCase.InertName,
                PhaseKind.Slag,
                AssembledCase.InertName,
                new Dictionary<string, double>(StringComparer.Ordinal) { [AssembledCase.InertName] = 1 },
                0,
                null,
                "",
                []));
        }

        // A phase that nothing can enter would leave an empty row in the system.
        guess = [.. guess.Where((_, index) => used.Exists(s => s.Phase == phases[index]))];
        phases = [.. phases.Where(phase => used.Exists(s => s.Phase == phase))];
        var byElement = used.Where(s => s.Carried is not null).ToLookup(s => s.Carried!, StringComparer.Ordinal);
        var ordered = carried.SelectMany(e => byElement[e].OrderBy(s => s.Atoms[e])).Concat(used.Where(s => s.Carried is null)).ToArray();
        var solutes = Enumerable.Range(0, ordered.Length)
            .Where(s => ordered[s].Phase == PhaseKind.Metal && ordered[s].Name != solvent).ToArray();
        var oxygen = Array.IndexOf(links, "O");
        var pairs = Pairs(ordered, solutes, interactions, epsilon);
        return new AssembledCase
        {
            Problem = Pack(ordered, carried, links, phases, guess, oxygen),
            Species = ordered,
            Carried = [.. carried],
            Links = links,
            Phases = phases,
            OxygenLink = oxygen,
            MetalSolutes = solutes,
            SolventSpecies = Array.FindIndex(ordered, s => s.Phase == PhaseKind.Metal && s.Name == solvent),
            Interactions = new InteractionModel(
                [.. pairs.Where(pair => pair.Term.Epsilon != 0).Select(pair => (pair.First, pair.Second, pair.Term.Epsilon))]),
            InteractionTerms = pairs,
            Unplaced = unplaced,
        };
    }

    /// <summary>Elements that some usable species holds; removing one may strand another, so repeat until nothing changes.</summary>
    private HashSet<string> Placeable(IReadOnlyList<SpeciesRecord> species, PhaseKind[] phases)
    {
        var placed = new HashSet<string>(amounts.Keys, StringComparer.Ordinal);
        if (oxygenPotential is not null)
        {
            placed.Add("O");
        }

        var usable = species.Where(s => Array.IndexOf(phases, s.Phase) >= 0).ToArray();
        while (true)
        {
            var held = new HashSet<string>(StringComparer.Ordinal);
            foreach (var s in usable)
            {
                if (s.Atoms.Keys.All(placed.Contains))
                {
                    held.UnionWith(s.Atoms.Where(atom => atom.Value > 0).Select(atom => atom.Key));
                }
            }

            if (oxygenPotential is not null)
            {
                held.Add("O");
            }

            if (placed.RemoveWhere(e => !held.Contains(e)) == 0)
            {
                return placed;
            }
        }
    }

    private EquilibriumProblem Pack(
        SpeciesRecord[] ordered, List<string> carried, string[] links, PhaseKind[] phases, double[] guess, int oxygen)
    {
        var padded = (ordered.Length + EquilibriumProblem.Padding - 1) / EquilibriumProblem.Padding * EquilibriumProblem.Padding;
        var lnK = new double[padded];
        Array.Fill(lnK, EquilibriumProblem.LnZero);
        var phase = new int[padded];
        var multiplicity = new int[padded];
        var linkAtoms = links.Select(_ => new double[padded]).ToArray();
        var groups = new int[carried.Count + 2];
        for (var s = 0; s < ordered.Length; s++)
        {
            var record = ordered[s];
            lnK[s] = record.LnK;
            phase[s] = Array.IndexOf(phases, record.Phase);
            multiplicity[s] = record.Carried is null ? 0 : (int)record.Atoms[record.Carried];
            for (var j = 0; j < links.Length; j++)
            {
                linkAtoms[j][s] = record.Atoms.GetValueOrDefault(links[j]);
            }

            var group = record.Carried is null ? carried.Count : carried.IndexOf(record.Carried);
            groups[group + 1] = s + 1;
        }

        for (var group = 1; group < groups.Length; group++)
        {
            groups[group] = Math.Max(groups[group], groups[group - 1]);
        }

        return new EquilibriumProblem
        {
            ElementCount = carried.Count,
            LinkCount = links.Length,
            PhaseCount = phases.Length,
            GroupStart = groups,
            LnK = lnK,
            Phase = phase,
            Multiplicity = multiplicity,
            LinkAtoms = linkAtoms,
            ElementAmount = [.. carried.Select(e => e == AssembledCase.InertName ? inertCations : amounts[e])],
            LinkAmount = [.. links.Select(e => amounts.GetValueOrDefault(e))],
            LinkFixed = [.. links.Select((_, j) => j == oxygen && oxygenPotential is not null)],
            LinkPotential = [.. links.Select((_, j) => j == oxygen ? oxygenPotential ?? 0 : 0)],
            SlagPhase = Array.IndexOf(phases, PhaseKind.Slag),
            CarbonPhase = Array.IndexOf(phases, PhaseKind.Carbon),
            CarbonIsGasified = ordered.Any(s => s is { Phase: PhaseKind.Gas, Carried: "C" }),
            LinkHasLadder = [.. links.Select(link => ordered.Any(s => s.Phase == PhaseKind.Slag && s.Carried is not null && s.Atoms.ContainsKey(link)))],
            PhaseGuess = guess,
        };
    }

    private static List<(int First, int Second, InteractionTerm Term)> Pairs(
        SpeciesRecord[] ordered,
        int[] solutes,
        IEnumerable<InteractionIndex.Pair> interactions,
        Func<InteractionIndex.Pair, InteractionTerm> epsilon)
    {
        var index = new Dictionary<string, int>(StringComparer.Ordinal);
        for (var i = 0; i < solutes.Length; i++)
        {
            index[ordered[solutes[i]].Name] = i;
        }

        var pairs = new List<(int First, int Second, InteractionTerm Term)>();
        foreach (var pair in interactions)
        {
            if (index.TryGetValue(pair.First, out var i) && index.TryGetValue(pair.Second, out var j))
            {
                pairs.Add((i, j, epsilon(pair)));
            }
        }

        return pairs;
    }
}
