using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium.Assembly;

namespace PartitionService.Core.Equilibrium.Reporting;

/// <summary>Remarks about the data: missing, assumed, recalled, flagged, extrapolated, overridden.</summary>
internal static class DatumRemarks
{
    /// <summary>Flags that are explained by other remarks or need none.</summary>
    private static readonly HashSet<string> QuietFlags = new(StringComparer.Ordinal)
    {
        "assumed", "assumed-gamma0", "supercooled-liquid-oxide", "oxidation-row-extrapolated", "t-extrapolated-input", "traces-only",
    };

    /// <summary>Ranges are stated to whole kelvins; a distance below one is no extrapolation.</summary>
    private const double NegligibleExtrapolationKelvin = 1;

    /// <summary>Odds that must remain after a shift of two standard deviations for an assumed number to leave the destination untouched.</summary>
    private const double RobustOdds = 100;

    /// <summary>All remarks about data.</summary>
    public static IEnumerable<Remark> All(ReportContext context, HashSet<string> relevant) =>
        Missing(context).Concat(Used(context, relevant)).Concat(Memory(context, relevant)).Concat(UnusedOverrides(context));

    private static IEnumerable<Remark> Missing(ReportContext context)
    {
        var state = context.State;
        foreach (var element in context.Assembly.Account.Reacting.Elements.Where(e => context.Assembly.Account.Reacting[e] > 0))
        {
            if (state.LnActivity(element) is null)
            {
                yield return Missing(
                    element, "", Severity.Serious, $"The catalogue has no datum for {element} in any phase present; it is left unplaced.");
                continue;
            }

            bool Holds(PhaseKind phase) => state.SpeciesOf(phase).Any(s => state.Assembled.Species[s].Atoms.ContainsKey(element));
            if (context.HasMetal && !Holds(PhaseKind.Metal) && element is not ("Cl" or "Br" or "Ar" or "F" or "I"))
            {
                yield return Missing(
                    element,
                    MetalSpecies.Slot(context.Assembly.Solvent, element),
                    element is "N" or "H" or "C" ? Severity.Note : Severity.Warning,
                    $"The catalogue has no datum for {element} in liquid {context.Assembly.Solvent}; it is treated as insoluble in the metal.");
            }

            if (context.HasSlag && !Holds(PhaseKind.Slag) && element is not ("Cl" or "Br" or "Ar" or "N" or "H" or "C" or "F" or "I")
                && !(context.Assembly.Account.Inert[element] > 0))
            {
                yield return Missing(
                    element,
                    $"slag/{context.Case.SlagFamily}/{element}",
                    Severity.Warning,
                    $"The catalogue has no datum for {element} in {context.Case.SlagFamily} slag; it is treated as insoluble in the slag.");
            }
        }
    }

    private static Remark Missing(string element, string subject, Severity severity, string text) =>
        new(RemarkCode.DatumMissing, severity, element, subject, text, []);

    private static IEnumerable<Remark> Used(ReportContext context, HashSet<string> relevant)
    {
        foreach (var (slot, uses) in context.Assembly.Ledger.Uses)
        {
            foreach (var use in uses)
            {
                if (use.Overridden)
                {
                    yield return new Remark(
                        RemarkCode.DatumOverridden,
                        Severity.Note,
                        ElementOf(context, slot),
                        slot,
                        $"{use.Quantity} was set to {RemarkRules.Short(use.Value)} by the caller ({use.SourceIds[0]}).",
                        [new RemarkNumber("value", use.Value, use.Unit)]);
                    continue;
                }

                if (!relevant.Contains(slot))
                {
                    continue;
                }

                if (use.ExtrapolatedKelvin > NegligibleExtrapolationKelvin)
                {
                    yield return new Remark(
                        RemarkCode.ExtrapolatedInTemperature,
                        use.ExtrapolatedKelvin > 250 && !LeavesDestination(context, slot, use) ? Severity.Warning : Severity.Note,
                        ElementOf(context, slot),
                        slot,
                        $"{use.Quantity} is used {RemarkRules.Short(use.ExtrapolatedKelvin)} K outside its range.",
                        [new RemarkNumber("distance", use.ExtrapolatedKelvin, "K")]);
                }

                if (use.Access == Access.Assumed)
                {
                    yield return new Remark(
                        RemarkCode.DatumAssumed,
                        LeavesDestination(context, slot, use) ? Severity.Note : Severity.Warning,
                        ElementOf(context, slot),
                        slot,
                        $"{use.Quantity} is assumed so that the direction is right; do not use the figure.",
                        use.Sigma is { } sigma ? [new RemarkNumber("sigma", sigma, use.Unit)] : []);
                }

                var flags = use.Flags.Where(flag => !QuietFlags.Contains(flag)).ToArray();
                if (flags.Length > 0)
                {
                    yield return new Remark(
                        RemarkCode.DatumFlagged,
                        Severity.Note,
                        ElementOf(context, slot),
                        slot,
                        $"{use.Quantity}: {string.Join(", ", flags.Select(Explain))}.",
                        []);
                }
            }
        }
    }

    /// <summary>True where the element goes nearly all to one phase even if the assumed number is two standard deviations off.</summary>
    private static bool LeavesDestination(ReportContext context, string slot, DatumUse use)
    {
        var symbol = ElementOf(context, slot);
        var row = context.Elements.FirstOrDefault(e => e.Element == symbol);
        if (row is null || use.Sigma is not { } sigma || use.Unit != "1")
        {
            return false;
        }

        var largest = Math.Max(row.SlagFraction, Math.Max(row.MetalFraction, row.GasFraction));
        var elsewhere = 1 - largest - row.MechanicalDustFraction;
        return largest > RobustOdds * Math.Exp(2 * sigma) * elsewhere;
    }

    private static IEnumerable<Remark> Memory(ReportContext context, HashSet<string> relevant)
    {
        var recalled = context.Assembly.Ledger.Uses
            .Where(entry => relevant.Contains(entry.Key))
            .SelectMany(entry => entry.Value.Where(use => use.Access == Access.Memory).Select(_ => entry.Key))
            .ToArray();
        if (recalled.Length > 0)
        {
            var elements = recalled.Select(slot => ElementOf(context, slot)).Where(e => e.Length > 0).Distinct().Order(StringComparer.Ordinal);
            yield return new Remark(
                RemarkCode.FromMemory,
                Severity.Note,
                "",
                "",
                $"{recalled.Length} of the data that matter are recalled values, not checked against their source: {string.Join(", ", elements)}.",
                [new RemarkNumber("count", recalled.Length, "1")]);
        }
    }

    private static IEnumerable<Remark> UnusedOverrides(ReportContext context)
    {
        foreach (var item in context.Case.Overrides.Where(o => !context.Assembly.Ledger.Uses.ContainsKey(o.Slot)))
        {
            yield return new Remark(
                RemarkCode.DatumOverridden,
                Severity.Warning,
                "",
                item.Slot,
                $"The override of {item.Slot} was not used: nothing in this case asks for it.",
                [new RemarkNumber("value", item.Value, "1")]);
        }
    }

    private static string Explain(string flag) => flag switch
    {
        "transferred-from-other-slag" => "measured in another kind of slag",
        "recalled-K-mismatch-possible" => "literature value that may belong to another equilibrium constant",
        "calibrated-on-recalled-L" => "fitted to recalled partition ratios",
        "calibrated-partly-on-recalled-L" => "fitted partly to recalled partition ratios",
        "anchored-to-iron-silicate" => "literature value moved with the iron silicate row",
        "partition-formula-first" => "a published partition formula should be preferred",
        "hypothetical-state" => "hypothetical state",
        _ => flag.Replace('-', ' '),
    };

    private static string ElementOf(ReportContext context, string slot)
    {
        var parts = slot.Split('/');
        switch (parts[0])
        {
            case "metal":
                return parts[2];
            case "interaction":
                return "";
            default:
                var formula = parts[^1];
                return context.Elements.Select(e => e.Element)
                    .Where(e => formula.StartsWith(e, StringComparison.Ordinal))
                    .OrderByDescending(e => e.Length)
                    .FirstOrDefault("");
        }
    }
}
