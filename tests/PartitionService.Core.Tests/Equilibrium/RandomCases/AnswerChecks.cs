using System.Globalization;
using System.Text.Json;
using PartitionService.Core.Equilibrium;

namespace PartitionService.Core.Tests.Equilibrium.RandomCases;

/// <summary>What must hold in every answer, whatever the case.</summary>
internal static class AnswerChecks
{
    /// <summary>The first thing that does not hold, in words; null where everything does.</summary>
    public static string? FirstFault(VesselAnswer answer)
    {
        try
        {
            // The writer refuses every number that is not finite, wherever in the answer it stands.
            JsonSerializer.Serialize(Stream.Null, answer);
        }
        catch (ArgumentException exception)
        {
            return $"a number is not finite: {exception.Message}";
        }

        return Balance(answer) ?? Fractions(answer) ?? Sums(answer);
    }

    private static string? Balance(VesselAnswer answer) =>
        answer.Solution.LargestBalanceError <= 1e-10
            ? null
            : string.Create(CultureInfo.InvariantCulture, $"balance error {answer.Solution.LargestBalanceError:E2}");

    private static string? Fractions(VesselAnswer answer)
    {
        foreach (var row in answer.Elements)
        {
            double[] shares =
            [
                row.MetalFraction, row.SlagFraction, row.GasFraction, row.MechanicalDustFraction, row.UnburntCarbonFraction,
                row.UnplacedFraction,
            ];
            if (shares.Any(share => share is < 0 or > 1 + 1e-12) || Math.Abs(shares.Sum() - 1) > 1e-12)
            {
                return string.Create(CultureInfo.InvariantCulture, $"shares of {row.Element}: {string.Join(' ', shares)}");
            }
        }

        return null;
    }

    private static string? Sums(VesselAnswer answer)
    {
        foreach (var phase in new[] { answer.Metal, answer.Slag })
        {
            if (phase is { Species.Count: > 0 } && Math.Abs(phase.Species.Sum(s => s.MoleFraction) - 1) > 1e-9)
            {
                return string.Create(CultureInfo.InvariantCulture, $"mole fractions add up to {phase.Species.Sum(s => s.MoleFraction):R}");
            }
        }

        // Species below the reporting limit are left out of the list of the gas.
        return answer.Gas is { } gas && Math.Abs(gas.Species.Sum(s => s.VolumeFraction) - 1) > 1e-9
            ? string.Create(CultureInfo.InvariantCulture, $"volume fractions add up to {gas.Species.Sum(s => s.VolumeFraction):R}")
            : null;
    }
}
