using PartitionService.Core.Equilibrium.Assembly;

namespace PartitionService.Core.Equilibrium.Reporting;

/// <summary>Data whose weakness is worth a remark.</summary>
internal static class RelevantSlots
{
    /// <summary>Share of its element above which a gas or slag species matters.</summary>
    private const double SmallestShare = 1e-3;

    /// <summary>
    /// Slots of metal solutes and slag species in present phases (they make the partition ratio whatever their share), of gas species that
    /// hold more than a thousandth of their element, and of interaction terms that move a coefficient by more than 5 %.
    /// </summary>
    public static HashSet<string> Find(ReportContext context)
    {
        var state = context.State;
        var relevant = new HashSet<string>(StringComparer.Ordinal);
        for (var s = 0; s < state.Assembled.Species.Length; s++)
        {
            var record = state.Assembled.Species[s];
            if (!(state.Amount(record.Phase) > 0))
            {
                continue;
            }

            var main = record.Carried ?? record.Name;
            var total = context.Assembly.Account.Reacting[main];
            var share = total > 0 ? state.SpeciesAmount(s) * record.Atoms.GetValueOrDefault(main, 1) / total : 1;
            var valence = record.Phase == PhaseKind.Slag && share < SmallestShare && IsSecondValence(context, s);
            if ((record.Phase != PhaseKind.Gas && !valence) || share >= SmallestShare)
            {
                relevant.UnionWith(record.Slots);
            }
        }

        AddInteractions(context, relevant);
        return relevant;
    }

    /// <summary>True where another slag species of the element holds a hundred times more.</summary>
    private static bool IsSecondValence(ReportContext context, int species)
    {
        var state = context.State;
        var record = state.Assembled.Species[species];
        return state.SpeciesOf(PhaseKind.Slag).Any(other =>
            state.Assembled.Species[other].Carried == record.Carried && record.Carried is not null
            && state.MoleFraction[other] > 100 * state.MoleFraction[species]);
    }

    private static void AddInteractions(ReportContext context, HashSet<string> relevant)
    {
        var state = context.State;
        var fraction = state.Assembled.MetalSolutes.ToDictionary(
            s => state.Assembled.Species[s].Name, s => state.MoleFraction[s], StringComparer.Ordinal);
        foreach (var (slot, uses) in context.Assembly.Ledger.Uses)
        {
            var parts = slot.Split('/');
            if (parts[0] == "interaction" && context.HasMetal
                && Math.Abs(uses[0].Value) * Math.Max(fraction.GetValueOrDefault(parts[2]), fraction.GetValueOrDefault(parts[3])) > 0.05)
            {
                relevant.Add(slot);
            }
        }
    }
}
