using System.Collections.Concurrent;
using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;

namespace PartitionService.IndependentSolution;

/// <summary>Both solutions of a case, each found once.</summary>
internal static class Answers
{
    private static readonly EquilibriumSolver Solver = new(CatalogueLoader.LoadEmbedded());
    private static readonly ConcurrentDictionary<string, VesselAnswer> Known = new(StringComparer.Ordinal);
    private static readonly ConcurrentDictionary<string, VesselSolution> Own = new(StringComparer.Ordinal);

    public static ThermochemicalCatalogue Catalogue => Solver.Catalogue;

    /// <summary>The service's answer.</summary>
    public static VesselAnswer Service(string name) => Known.GetOrAdd(name, key => Solver.Solve(Cases.All[key]) switch
    {
        SolveOutcome.Solved solved => solved.Answer,
        SolveOutcome.Failed failed => throw new InvalidOperationException($"{key}: {failed.Reason}, {failed.Message}"),
        SolveOutcome.Invalid invalid => throw new InvalidOperationException($"{key}: {invalid.Violations[0].Message}"),
        _ => throw new InvalidOperationException(key),
    });

    /// <summary>The independent solution.</summary>
    public static VesselSolution Independent(string name) =>
        Own.GetOrAdd(name, key => new VesselSolution(Cases.All[key], Catalogue));

    /// <summary>Amounts in the service's answer: (phase, species, mol, ln mole fraction).</summary>
    public static IEnumerable<(string Phase, string Species, double Mol, double LnFraction)> Listed(VesselAnswer answer)
    {
        foreach (var s in answer.Metal?.Species ?? [])
        {
            yield return ("Metal", s.Species, s.AmountMol, Math.Log(s.MoleFraction));
        }

        foreach (var s in answer.Slag?.Species ?? [])
        {
            yield return ("Slag", s.Species, s.AmountMol, Math.Log(s.MoleFraction));
        }

        foreach (var s in answer.Gas?.Species ?? [])
        {
            yield return ("Gas", s.Species, s.AmountMol, Math.Log(s.VolumeFraction));
        }

        if (answer.UnburntCarbonKg > 0)
        {
            yield return ("Carbon", "C", answer.UnburntCarbonKg * 1000 / Catalogue.Elements["C"].AtomicMassGramPerMol, 0);
        }
    }
}
