using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium.Assembly;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Equilibrium.Reporting;

/// <summary>Reports the gas.</summary>
internal static class GasReporter
{
    /// <summary>Species below this volume fraction are left out of the report.</summary>
    public const double SmallestVolumeFraction = 1e-12;

    /// <summary>Elements that stay gaseous when the gas cools to filter temperature; all others form fume or dust.</summary>
    private static readonly HashSet<string> Permanent = new(StringComparer.Ordinal)
    {
        "O", "N", "H", "C", "Ar", "S", "Cl", "Br", "F", "I",
    };

    /// <summary>The report; null where no gas formed.</summary>
    public static GasReport? Report(
        EquilibriumState state, VesselStreams streams, double pressureAtm, IReadOnlyDictionary<string, Element> elements)
    {
        var amount = state.Amount(PhaseKind.Gas);
        if (!(amount > 0))
        {
            return null;
        }

        var volume = amount * PhysicalConstants.NormalCubicMetrePerMol;
        var species = new List<GasSpeciesContent>();
        foreach (var s in state.SpeciesOf(PhaseKind.Gas))
        {
            if (state.MoleFraction[s] >= SmallestVolumeFraction)
            {
                var record = state.Assembled.Species[s];
                var molarMass = record.Atoms.Sum(atom => atom.Value * elements[atom.Key].AtomicMassGramPerMol);
                species.Add(new GasSpeciesContent(
                    record.Name,
                    state.MoleFraction[s],
                    state.MoleFraction[s] * pressureAtm,
                    state.SpeciesAmount(s),
                    state.SpeciesAmount(s) * molarMass / volume));
            }
        }

        var dust = streams.Gas.Elements.Where(e => !Permanent.Contains(e)).Sum(e => 1000 * streams.MassKg(streams.Gas, e));
        return new GasReport(
            amount,
            streams.Gas.MassKg(elements),
            volume,
            [.. species.OrderByDescending(c => c.VolumeFraction).ThenBy(c => c.Species, StringComparer.Ordinal)],
            CondensedPhaseReporter.Contents(streams.Gas, elements),
            dust / volume);
    }
}
