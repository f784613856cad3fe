using PartitionService.Core.Equilibrium.Solvers;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Says which condition of a valid case cannot hold.</summary>
internal static class FailureRules
{
    /// <summary>Conditions that can be seen before the iteration.</summary>
    public static SolveOutcome.Failed? Before(VesselAssembly assembly)
    {
        var assembled = assembly.Assembled;
        if (assembly.FixedOxygen is not null || assembled.OxygenLink < 0 || Array.IndexOf(assembled.Phases, PhaseKind.Gas) >= 0)
        {
            return null;
        }

        // Without a gas only oxides hold oxygen; what the metal dissolves beyond them would be no metal any more.
        var capacity = 0.0;
        for (var element = 0; element < assembled.Carried.Length; element++)
        {
            var most = assembled.Species
                .Where(s => s.Carried == assembled.Carried[element])
                .Select(s => s.Atoms.GetValueOrDefault("O") / Math.Max(1, s.Atoms[s.Carried!]))
                .DefaultIfEmpty(0).Max();
            capacity += most * assembled.Problem.ElementAmount[element];
        }

        var oxygen = assembled.Problem.LinkAmount[assembled.OxygenLink];
        var dissolves = assembled.Species.Any(s => s is { Phase: PhaseKind.Metal, Name: "O" });
        return oxygen > capacity && (capacity > 0 || !dissolves)
            ? new SolveOutcome.Failed(
                SolveFailure.OxygenHasNoHome,
                FormattableString.Invariant(
                    $"The charge brings {oxygen:G4} mol of oxygen, but the elements present can bind only {capacity:G4} mol and no gas may form. Allow a gas, charge less oxygen, or state the oxygen potential."),
                ["O"])
            : null;
    }

    /// <summary>Mole fraction of dissolved oxygen beyond which a metal is none any more; oxygen saturates every metal far below.</summary>
    private const double MostDissolvedOxygen = 0.3;

    /// <summary>
    /// True where a closed oxygen balance gave a "metal" that is largely oxygen, or did not converge on the way there: Henry's law for
    /// dissolved oxygen has no limit of its own, so a metal that all should be oxidised can swallow the excess instead.
    /// </summary>
    public static bool IsOverblown(VesselAssembly assembly, EquilibriumState state)
    {
        if (assembly.FixedOxygen is not null || assembly.Assembled.OxygenLink < 0)
        {
            return false;
        }

        var dissolved = Array.FindIndex(assembly.Assembled.Species, s => s is { Phase: PhaseKind.Metal, Name: "O" });
        return dissolved >= 0
            && (state.Result.Stop == SaddleSolver.Stop.NotConverged
                || (state.Amount(PhaseKind.Metal) > 0 && state.MoleFraction[dissolved] > MostDissolvedOxygen));
    }

    /// <summary>Failures of the iteration; null where it converged to a sensible state.</summary>
    /// <param name="assembly">The case.</param>
    /// <param name="state">The solution.</param>
    /// <param name="oxygenOfMetalStated">True where the statement is the oxygen dissolved in the metal.</param>
    public static SolveOutcome.Failed? After(VesselAssembly assembly, EquilibriumState state, bool oxygenOfMetalStated)
    {
        if (state.Result.Stop == SaddleSolver.Stop.Converged && assembly.Family is null && IsOverblown(assembly, state))
        {
            return new SolveOutcome.Failed(
                SolveFailure.OxygenHasNoHome,
                $"The charge brings more oxygen than liquid {assembly.Solvent} can dissolve, and no slag may form to take up its oxide. Allow a slag, charge less oxygen, or state the oxygen potential.",
                ["O", assembly.Solvent]);
        }

        switch (state.Result.Stop)
        {
            case SaddleSolver.Stop.Converged:
                return oxygenOfMetalStated && !(state.Amount(PhaseKind.Metal) > 0)
                    ? new SolveOutcome.Failed(
                        SolveFailure.DissolvedOxygenNotReachable,
                        $"No metal is left to hold the stated dissolved oxygen: before it holds that much, all {assembly.Solvent} goes to the other phases. State less dissolved oxygen.",
                        ["O", assembly.Solvent])
                    : SulfideWithoutOxide(assembly, state);
            case SaddleSolver.Stop.PotentialUnbounded:
                var link = assembly.Assembled.Links[Math.Max(0, state.Result.Culprit)];
                var tooMuch = state.LinkPotential[Math.Max(0, state.Result.Culprit)] > 0;
                return link == "O" && tooMuch
                    ? new SolveOutcome.Failed(
                        SolveFailure.OxygenHasNoHome,
                        "The charge brings more oxygen than the phases present can hold. Allow a gas, charge less oxygen, or state the oxygen potential.",
                        ["O"])
                    : new SolveOutcome.Failed(
                        SolveFailure.ElementHasNoHome,
                        tooMuch
                            ? $"The phases present cannot hold the {link} of the charge. Allow a gas or charge less of it."
                            : $"Some elements can only be held together with {link}, and the charge brings too little of it. Charge more {link} or state its potential.",
                        [link]);
            case SaddleSolver.Stop.AmountUnbounded:
                var phase = assembly.Assembled.Phases[Math.Max(0, state.Result.Culprit)];
                if (phase != PhaseKind.Gas)
                {
                    return new SolveOutcome.Failed(
                        SolveFailure.OxygenHasNoHome,
                        $"At the stated oxygen potential the {phase.ToString().ToLowerInvariant()} alone would take up oxygen without limit. State a lower oxygen potential.",
                        ["O"]);
                }

                return new SolveOutcome.Failed(
                    SolveFailure.PressureExceeded,
                    "The stated oxygen potential would take an unlimited amount of gas. State a lower oxygen potential or a higher pressure.",
                    ["O"]);
            default:
                return HoldsTooMuchSulfur(state)
                    ? new SolveOutcome.Failed(
                        SolveFailure.ElementHasNoHome,
                        "The slag would have to hold more sulfur than a sulfide capacity describes; in practice a matte would form, which the model lacks. Charge less sulfur or allow a gas.",
                        ["S"])
                    : NotConverged(assembly, oxygenOfMetalStated);
        }
    }

    /// <summary>
    /// A stated oxygen content of the metal is sought, not set: a metal that its own oxygen consumes leaves the search without an end, which
    /// is a matter of the statement and not of the service.
    /// </summary>
    private static SolveOutcome.Failed NotConverged(VesselAssembly assembly, bool oxygenOfMetalStated) => oxygenOfMetalStated
        ? new SolveOutcome.Failed(
            SolveFailure.DissolvedOxygenNotReachable,
            $"The search for a state in which liquid {assembly.Solvent} holds the stated dissolved oxygen came to no end. State another content, or the oxygen in another way.",
            ["O", assembly.Solvent])
        : new SolveOutcome.Failed(SolveFailure.NotConverged, "The iteration did not converge. Please report the case.", []);

    /// <summary>
    /// Sulfur enters a slag in place of oxygen. Where next to no oxide is left, the capacity asks for more sulfur than there is oxygen to
    /// replace: no slag is that.
    /// </summary>
    private static SolveOutcome.Failed? SulfideWithoutOxide(VesselAssembly assembly, EquilibriumState state)
    {
        const double rounding = 1e-9;
        var oxygen = state.Elements(PhaseKind.Slag)["O"] + assembly.Account.Inert["O"];
        return oxygen >= -rounding * state.Amount(PhaseKind.Slag)
            ? null
            : new SolveOutcome.Failed(
                SolveFailure.ElementHasNoHome,
                FormattableString.Invariant(
                    $"At log10 pO2 = {OxygenPotential.ToLog10(state.LnActivity("O")!.Value):0.##} so little oxide is left that the slag would hold more sulfur than it has oxygen to replace. State a higher oxygen potential, charge less sulfur, or leave the slag out."),
                ["S"]);
    }

    /// <summary>True where sulfide has displaced a tenth of the slag or the sulfur pressure is beyond any vessel's.</summary>
    private static bool HoldsTooMuchSulfur(EquilibriumState state)
    {
        const double largestSulfide = 0.1;
        const double largestLnActivity = 5;
        var sulfide = Array.FindIndex(state.Assembled.Species, s => s is { Phase: PhaseKind.Slag, Name: "S" });
        return sulfide >= 0 && (state.MoleFraction[sulfide] > largestSulfide || state.LnActivity("S") > largestLnActivity);
    }
}
