using PartitionService.Core.Equilibrium;
using PartitionService.IndependentSolution.Physics;

namespace PartitionService.IndependentSolution;

/// <summary>The conditions of the minimum, checked on the answer as it is reported: mu of every species is the sum of its elements' potentials.</summary>
/// <remarks>
/// Potentials are the reported activities; standard energies and excess are this project's own. Energies of slag species that follow the
/// composition are those of the independent solution at its own composition.
/// </remarks>
internal sealed class PotentialCheck
{
    private readonly VesselAnswer answer;
    private readonly VesselSolution own;
    private readonly Dictionary<string, double> lnActivity;

    public PotentialCheck(string name, VesselAnswer answer)
    {
        this.answer = answer;
        own = Answers.Independent(name);
        lnActivity = answer.Elements.Where(e => e.Activity is not null).ToDictionary(e => e.Element, e => Math.Log(e.Activity!.Value));
        if (answer.Redox.Log10OxygenPressureAtm is { } log10)
        {
            lnActivity["O"] = log10 * Math.Log(10) / 2;
        }
    }

    /// <summary>ln x reported less ln x from the potentials.</summary>
    public IEnumerable<(Phase Phase, string Species, double Difference)> Differences()
    {
        var excess = Excess();
        foreach (var (phase, name, _, lnFraction) in Answers.Listed(answer))
        {
            if (name != Species.Inert)
            {
                var species = own.Problem.Species.Single(s => s.Phase.ToString() == phase && s.Name == name);
                yield return (species.Phase, name, lnFraction - Ideal(species) + excess.GetValueOrDefault(species));
            }
        }
    }

    /// <summary>Sums of the mole fractions that absent phases would have, the metal left out: its excess has no composition to stand on.</summary>
    public IEnumerable<(Phase Phase, double Sum)> AbsentPhases()
    {
        var present = Answers.Listed(answer).Select(s => s.Phase).ToHashSet();
        return own.Problem.Phases.Where(p => p != Phase.Metal && !present.Contains(p.ToString()))
            .Select(p => (p, own.Problem.Species.Where(s => s.Phase == p).Sum(s => Math.Exp(Ideal(s)))));
    }

    private double Ideal(Species species) => species.Atoms.Sum(a => a.Value * lnActivity[a.Key]) - species.Energy;

    private Dictionary<Species, double> Excess()
    {
        Species[] metal = [.. own.Problem.Metal.Select(s => own.Problem.Species[s])];
        var reported = answer.Metal?.Species.ToDictionary(s => s.Species, s => s.AmountMol) ?? [];
        var potentials = own.Problem.Excess.Potentials([.. metal.Select(s => reported.GetValueOrDefault(s.Name, 1e-300))]);
        return metal.Select((s, i) => (s, potentials[i])).ToDictionary(p => p.s, p => p.Item2);
    }
}
