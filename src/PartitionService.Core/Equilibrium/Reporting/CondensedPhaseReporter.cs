using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium.Assembly;

namespace PartitionService.Core.Equilibrium.Reporting;

/// <summary>Reports the metal and the slag.</summary>
internal static class CondensedPhaseReporter
{
    /// <summary>The report; null where the phase holds nothing.</summary>
    public static PhaseReport? Report(
        PhaseKind phase, ElementLedger leaving, EquilibriumState state, IReadOnlyDictionary<string, Element> elements)
    {
        var mass = leaving.MassKg(elements);
        return mass > 0
            ? new PhaseReport(mass, state.Amount(phase), Contents(leaving, elements), Species(phase, state, elements))
            : null;
    }

    /// <summary>Elements of a ledger, descending mass.</summary>
    public static IReadOnlyList<ElementContent> Contents(ElementLedger ledger, IReadOnlyDictionary<string, Element> elements)
    {
        var total = ledger.MassKg(elements);
        return
        [
            .. ledger.Elements
                .Select(e => (Element: e, Mass: ledger[e] * elements[e].AtomicMassGramPerMol / 1000))
                .Where(content => content.Mass != 0)
                .OrderByDescending(content => content.Mass)
                .ThenBy(content => content.Element, StringComparer.Ordinal)
                .Select(content => new ElementContent(content.Element, content.Mass, 100 * content.Mass / total)),
        ];
    }

    private static List<SpeciesContent> Species(
        PhaseKind phase, EquilibriumState state, IReadOnlyDictionary<string, Element> elements)
    {
        var contents = new List<SpeciesContent>();
        if (state.Amount(phase) <= 0)
        {
            return contents;
        }

        foreach (var s in state.SpeciesOf(phase))
        {
            var record = state.Assembled.Species[s];
            if (record.Name == AssembledCase.InertName)
            {
                contents.Add(new SpeciesContent(
                    record.Name, state.MoleFraction[s], state.SpeciesAmount(s), 0, null, null, ""));
                continue;
            }

            var amount = state.SpeciesAmount(s);
            var mass = record.Atoms.Sum(atom => atom.Value * elements[atom.Key].AtomicMassGramPerMol) * amount / 1000;
            double? gamma = record.LnGamma is null ? null
                : phase == PhaseKind.Metal ? Math.Exp(-state.Assembled.Problem.LnK[s])
                : Math.Exp(record.LnGamma.Value + record.LnK - state.Assembled.Problem.LnK[s]);
            contents.Add(new SpeciesContent(
                record.Name, state.MoleFraction[s], amount, mass, gamma * state.MoleFraction[s], gamma, record.StandardState));
        }

        return [.. contents.OrderByDescending(c => c.MoleFraction).ThenBy(c => c.Species, StringComparer.Ordinal)];
    }
}
