using PartitionService.Core.Catalogue;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Equilibrium.Reporting;

/// <summary>Remarks about pure substances that would precipitate: activities above 1 and solubility limits.</summary>
internal static class SaturationRemarks
{
    /// <summary>Activities within this of 1 count as saturation itself.</summary>
    private const double Margin = 1e-6;

    /// <summary>All remarks about saturation.</summary>
    public static IEnumerable<Remark> All(ReportContext context) =>
        Metals(context).Concat(Oxides(context)).Concat(context.HasMetal ? Solubilities(context) : []);

    private static IEnumerable<Remark> Metals(ReportContext context)
    {
        var temperature = context.Case.TemperatureKelvin;
        foreach (var row in context.Elements)
        {
            var element = context.Catalogue.Elements[row.Element];
            if (row.Activity is not { } activity || StateConversion.HasDiatomicReference(row.Element) || row.Element is "C" or "Ar"
                || row.Element == context.Assembly.Solvent)
            {
                continue;
            }

            var solid = temperature < element.MeltingPointKelvin;
            if (solid && StateConversion.LnReferenceOverState(element, StandardState.Solid, temperature, context.Catalogue) is { } ratio)
            {
                activity *= Math.Exp(-ratio);
            }

            // Above the boiling point the vapour, not a liquid, is the stable pure substance; the gas phase deals with it.
            if (activity > 1 + Margin && (solid || temperature < element.BoilingPointKelvin))
            {
                yield return new Remark(
                    RemarkCode.ActivityAboveOne,
                    Severity.Warning,
                    row.Element,
                    "metal",
                    $"The activity of {row.Element} is {RemarkRules.Short(activity)}: {(solid ? "solid" : "a second liquid rich in")} {row.Element} would separate, which the model does not form.",
                    [new RemarkNumber("activity", activity, "1")]);
            }
        }
    }

    /// <summary>Pure oxides of every element at the solution's potentials, whether or not the slag holds them.</summary>
    private static IEnumerable<Remark> Oxides(ReportContext context)
    {
        if (context.State.LnActivity("O") is not { } oxygen)
        {
            yield break;
        }

        var temperature = context.Case.TemperatureKelvin;
        var thermal = PhysicalConstants.GasConstant * temperature;
        var highest = new Dictionary<string, (OxidationDatum Row, double LnActivity)>(StringComparer.Ordinal);
        foreach (var (element, slot) in Assembly.SlagIndex.For(context.Catalogue).OxidationSlots)
        {
            if (context.State.LnActivity(element) is not { } lnMetal)
            {
                continue;
            }

            foreach (var state in new[] { StandardState.Solid, StandardState.Liquid })
            {
                var row = context.Assembly.Ledger.Select<OxidationDatum>(
                        slot, o => o.OxideState == state && o.MetalState == StandardState.Liquid)
                    ?? context.Assembly.Ledger.Select<OxidationDatum>(slot, o => o.OxideState == state);
                if (row is null || !row.Covers(temperature)
                    || StateConversion.LnReferenceOverState(
                        context.Catalogue.Elements[row.Element], row.MetalState, temperature, context.Catalogue) is not { } ratio)
                {
                    continue;
                }

                var lnActivity = (-row.GibbsEnergy(temperature) / thermal) - ratio + lnMetal + (row.OxygenPerMetal * oxygen);
                if (!highest.TryGetValue(row.Element, out var known) || lnActivity > known.LnActivity)
                {
                    highest[row.Element] = (row, lnActivity);
                }
            }
        }

        foreach (var (oxidised, (row, lnActivity)) in highest.OrderBy(h => h.Key, StringComparer.Ordinal))
        {
            if (lnActivity > Margin)
            {
                var activity = Math.Exp(lnActivity);
                yield return new Remark(
                    RemarkCode.ActivityAboveOne,
                    Severity.Warning,
                    oxidised,
                    row.Oxide,
                    $"The activity of {(row.OxideState == StandardState.Solid ? "solid" : "liquid")} {row.Oxide} is {RemarkRules.Short(activity)}: it would separate as a phase of its own, which the model does not form.",
                    [new RemarkNumber("activity", activity, "1")]);
            }
        }
    }

    private static IEnumerable<Remark> Solubilities(ReportContext context)
    {
        var metal = context.Streams.EquilibriumMetal;
        var mass = metal.MassKg(context.Catalogue.Elements);
        foreach (var row in context.Catalogue.Data.OfType<SolubilityLimitDatum>())
        {
            if (!row.Preferred || row.Solvent != context.Assembly.Solvent || !row.Covers(context.Case.TemperatureKelvin)
                || row.Exponents.Keys.Any(e => !(metal[e] > 0)))
            {
                continue;
            }

            var actual = row.Exponents.Sum(e => e.Value * Math.Log10(100 * context.Streams.MassKg(metal, e.Key) / mass));
            var limit = row.Log10Limit(context.Case.TemperatureKelvin);
            if (actual > limit)
            {
                yield return new Remark(
                    RemarkCode.SolubilityExceeded,
                    Severity.Warning,
                    row.Exponents.Keys.First(),
                    row.Slot,
                    $"The solubility limit of {string.Join(" with ", row.Exponents.Keys)} in liquid {row.Solvent} is exceeded ({RemarkRules.Short(Math.Pow(10, actual - limit))} times): {row.PrecipitatingPhase} would precipitate.",
                    [new RemarkNumber("log10_product", actual, "1"), new RemarkNumber("log10_limit", limit, "1")]);
            }
        }
    }
}
