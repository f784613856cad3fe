using PartitionService.Core.Equilibrium.Assembly;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Equilibrium.Derivatives;

/// <summary>Differentials of the metal's activity coefficients with respect to its mole fractions and interaction parameters.</summary>
internal sealed class MetalFeedback
{
    private readonly AssembledCase assembled;
    private readonly int[] metal;
    private readonly double[] fraction;
    private readonly double[] curvature;
    private readonly double[] weights;
    private readonly Dictionary<string, (int First, int Second, InteractionTerm Term)> bySlot = new(StringComparer.Ordinal);

    /// <summary>Prepares the model at a solution.</summary>
    public MetalFeedback(AssembledCase assembled, EquilibriumResponse response)
    {
        this.assembled = assembled;
        var solutes = assembled.SolventSpecies < 0 ? [] : assembled.MetalSolutes;
        metal = assembled.SolventSpecies < 0 ? [] : [.. solutes, assembled.SolventSpecies];
        fraction = [.. solutes.Select(s => Math.Min(response.Fraction(s), 1))];
        curvature = new double[fraction.Length * fraction.Length];
        if (solutes.Length > 0)
        {
            assembled.Interactions.Curvature(fraction, curvature);
            foreach (var entry in assembled.InteractionTerms)
            {
                bySlot[entry.Term.Slot] = entry;
            }
        }

        var size = fraction.Length;
        Active = [.. Enumerable.Range(0, size)
            .Where(a => response.Fraction(solutes[a]) <= 1 && Enumerable.Range(0, size).Any(i => curvature[(i * size) + a] != 0))];
        Functionals = [.. Active.Select(a => new CompositionFunctional { LnFractions = [(solutes[a], 1)] })];
        weights = new double[metal.Length * Active.Length];
        for (var at = 0; at < Active.Length; at++)
        {
            var a = Active[at];
            var solvent = 0.0;
            for (var i = 0; i < size; i++)
            {
                solvent -= fraction[i] * curvature[(i * size) + a];
            }

            for (var i = 0; i < metal.Length; i++)
            {
                weights[(i * Active.Length) + at] = -fraction[a] * (solvent + (i < size ? curvature[(i * size) + a] : 0));
            }
        }
    }

    /// <summary>d ln x of each solute that another coefficient depends on.</summary>
    public CompositionFunctional[] Functionals { get; }

    private int[] Active { get; }

    /// <summary>Adds the change of every metal constant that follows from the functionals' values.</summary>
    public void Apply(ReadOnlySpan<double> values, Perturbation change)
    {
        for (var i = 0; i < metal.Length && Active.Length > 0; i++)
        {
            var row = weights.AsSpan(i * Active.Length, Active.Length);
            var sum = 0.0;
            for (var at = 0; at < row.Length; at++)
            {
                sum += row[at] * values[at];
            }

            change.AddLnK(metal[i], sum);
        }
    }

    /// <summary>Adds the direct change of the constants with one interaction parameter.</summary>
    /// <returns>False where the slot is no interaction parameter of the metal.</returns>
    public bool AddParameter(string slot, Perturbation change)
    {
        if (!bySlot.TryGetValue(slot, out var entry))
        {
            return false;
        }

        var solvent = Add(entry, 1, change);
        AddSolvent(solvent, change);
        return true;
    }

    /// <summary>Adds the direct change of the constants with temperature through the parameters, per kelvin.</summary>
    public void AddTemperature(Perturbation change)
    {
        var solvent = 0.0;
        foreach (var entry in bySlot.Values)
        {
            if (entry.Term.PerKelvin != 0 && entry.Term.Epsilon != 0)
            {
                solvent += Add(entry, entry.Term.PerKelvin, change);
            }
        }

        AddSolvent(solvent, change);
    }

    private double Add((int First, int Second, InteractionTerm Term) entry, double factor, Perturbation change)
    {
        var (i, j, term) = entry;
        var (energy, first, second) = InteractionModel.PerEpsilon(fraction[i], fraction[j], term.Epsilon, i == j);
        change.AddLnK(assembled.MetalSolutes[i], -factor * first);
        change.AddLnK(assembled.MetalSolutes[j], -factor * second);
        return factor * (energy - (fraction[i] * first) - (fraction[j] * second));
    }

    private void AddSolvent(double lnGammaSolvent, Perturbation change)
    {
        foreach (var s in metal)
        {
            change.AddLnK(s, -lnGammaSolvent);
        }
    }
}
