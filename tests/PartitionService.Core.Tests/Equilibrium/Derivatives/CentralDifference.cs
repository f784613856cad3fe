using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;

namespace PartitionService.Core.Tests.Equilibrium.Derivatives;

/// <summary>Central differences of full solves with the step halved twice, so that each says how good it is.</summary>
internal static class CentralDifference
{
    private static readonly EquilibriumSolver Solver = new(CatalogueLoader.LoadEmbedded());

    /// <summary>A solved case with the derivatives asked for.</summary>
    public static VesselAnswer Solve(VesselCase vesselCase, DerivativeSelection? selection = null)
    {
        var outcome = Solver.Solve(vesselCase, new SolveOptions { Derivatives = selection });
        return Assert.IsType<SolveOutcome.Solved>(outcome).Answer;
    }

    /// <summary>Values of the outputs of a report.</summary>
    public static double[] Outputs(VesselAnswer answer, IReadOnlyList<DerivativeOutput> outputs)
    {
        var elements = answer.Elements.ToDictionary(e => e.Element, StringComparer.Ordinal);
        return [.. outputs.Select(output => output.Kind switch
        {
            DerivativeOutputKind.MetalFraction => elements[output.Element].MetalFraction,
            DerivativeOutputKind.SlagFraction => elements[output.Element].SlagFraction,
            DerivativeOutputKind.GasFraction => elements[output.Element].GasFraction,
            DerivativeOutputKind.MetalAmount => Amount(answer.Metal, answer.Allowances?.MetalInSlagKg),
            DerivativeOutputKind.SlagAmount => Amount(answer.Slag, answer.Allowances?.SlagInMetalKg),
            DerivativeOutputKind.GasAmount => answer.Gas?.AmountMol ?? 0,
            _ => answer.Redox.Log10OxygenPressureAtm!.Value,
        })];
    }

    /// <summary>Equilibrium amount, mol; NaN where all of the phase leaves with another, because the answer does not say it then.</summary>
    private static double Amount(PhaseReport? phase, double? carriedOverKg) =>
        phase?.AmountMol ?? (carriedOverKg > 0 ? double.NaN : 0);

    /// <summary>Difference quotients of every output.</summary>
    /// <param name="at">The case with the parameter moved by an amount.</param>
    /// <param name="step">Largest step.</param>
    /// <param name="outputs">Outputs.</param>
    public static Estimate[] Of(Func<double, VesselCase> at, double step, IReadOnlyList<DerivativeOutput> outputs)
    {
        var levels = new double[3][];
        var largest = new double[outputs.Count];
        for (var level = 0; level < levels.Length; level++)
        {
            var h = step / Math.Pow(2, level);
            var high = Outputs(Solve(at(h)), outputs);
            var low = Outputs(Solve(at(-h)), outputs);
            levels[level] = [.. high.Zip(low, (a, b) => (a - b) / (2 * h))];
            for (var o = 0; o < largest.Length; o++)
            {
                largest[o] = Math.Max(largest[o], Math.Max(Math.Abs(high[o]), Math.Abs(low[o])));
            }
        }

        return [.. Enumerable.Range(0, outputs.Count).Select(o =>
        {
            var coarse = ((4 * levels[1][o]) - levels[0][o]) / 3;
            var fine = ((4 * levels[2][o]) - levels[1][o]) / 3;

            // The solver stops at 1e-12 in ln gamma; at the smallest step that is this much of a quotient.
            var noise = 1e-11 * largest[o] / step;
            return new Estimate(((16 * fine) - coarse) / 15, Math.Abs(fine - coarse) + noise, largest[o]);
        })];
    }

    /// <summary>A difference quotient.</summary>
    /// <param name="Value">Extrapolated value.</param>
    /// <param name="Error">Its own error estimate, rounding included.</param>
    /// <param name="Largest">Largest magnitude of the output.</param>
    public readonly record struct Estimate(double Value, double Error, double Largest);
}
