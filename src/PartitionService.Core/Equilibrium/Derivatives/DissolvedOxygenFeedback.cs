using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium.Assembly;

namespace PartitionService.Core.Equilibrium.Derivatives;

/// <summary>Differential of the oxygen potential that a stated dissolved oxygen stands for: ln x_O + ln gamma_O.</summary>
/// <remarks>x = w M/(M_O - w (M_O - M)) with w the mass fraction and M the mean mass of the metal without its oxygen.</remarks>
internal sealed class DissolvedOxygenFeedback
{
    private readonly int link;
    private readonly double perMassPpm;

    /// <summary>Prepares the statement at a solution.</summary>
    public DissolvedOxygenFeedback(
        AssembledCase assembled, EquilibriumResponse response, IReadOnlyDictionary<string, Element> elements, double massFraction)
    {
        link = assembled.OxygenLink;
        var metal = Enumerable.Range(0, assembled.Species.Length)
            .Where(s => assembled.Species[s].Phase == PhaseKind.Metal).ToArray();
        var oxygen = Array.Find(metal, s => assembled.Species[s].Name == "O");
        int[] others = [.. metal.Where(s => s != oxygen)];
        double Weight(int s) => elements[assembled.Species[s].Name].AtomicMassGramPerMol;
        var sum = others.Sum(response.Fraction);
        var mean = others.Sum(s => response.Fraction(s) * Weight(s)) / sum;
        var oxygenMass = elements["O"].AtomicMassGramPerMol;
        var below = oxygenMass - (massFraction * (oxygenMass - mean));
        var perMean = (1 / mean) - (massFraction / below);
        perMassPpm = 1e-6 * ((1 / massFraction) + ((oxygenMass - mean) / below));
        Functional = new CompositionFunctional
        {
            LnFractions = [.. others.Select(s => (s, perMean * response.Fraction(s) * (Weight(s) - mean) / sum))],
            LnConstants = [(oxygen, -1)],
        };
    }

    /// <summary>Differential of the potential with respect to the solution.</summary>
    public CompositionFunctional Functional { get; }

    /// <summary>Changes the potential.</summary>
    public void Apply(double potential, Perturbation change) => change.Link[link] += potential;

    /// <summary>Adds the direct change of the potential with the stated oxygen, per mass ppm.</summary>
    public void AddMassPpm(Perturbation change) => change.Link[link] += perMassPpm;
}
