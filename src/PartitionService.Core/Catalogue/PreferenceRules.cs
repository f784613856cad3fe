using System.Globalization;

namespace PartitionService.Core.Catalogue;

/// <summary>There is exactly one way to know which row counts: the preferred one, in its temperature range.</summary>
internal static class PreferenceRules
{
    /// <summary>Runs every check; the first fault is thrown.</summary>
    public static void Check(CatalogueDraft draft)
    {
        foreach (var slot in draft.Data.GroupBy(d => d.Value.Slot, StringComparer.Ordinal))
        {
            Located<Datum>[] rows = [.. slot];
            Located<Datum>[] preferred = [.. rows.Where(r => r.Value.Preferred)];
            switch (rows[0].Value)
            {
                case GasSpeciesDatum or SlagActivityDatum or ChlorideDatum or EntrainmentDatum:
                    RequireOne(rows, preferred);
                    break;
                case CapacityDatum when rows.Length > 1:
                    throw rows[1].Refuse($"slot {slot.Key} stands twice, a formula id must be unique");
                case OpticalBasicityDatum:
                    CheckOpticalBasicities(rows, preferred);
                    break;
                case OxidationDatum:
                    CheckOxidation(rows, preferred);
                    break;
                case InfiniteDilutionDatum or SolubilityLimitDatum:
                    RequireAny(rows, preferred);
                    RefuseOverlap(preferred);
                    break;
                case InteractionDatum:
                    RefuseOverlap(preferred);
                    break;
            }
        }
    }

    private static void RequireOne(Located<Datum>[] rows, Located<Datum>[] preferred)
    {
        RequireAny(rows, preferred);
        if (preferred.Length > 1)
            throw preferred[1].Refuse($"slot {rows[0].Value.Slot} has {preferred.Length} preferred rows, exactly one is allowed");
    }

    private static void RequireAny(Located<Datum>[] rows, Located<Datum>[] preferred)
    {
        if (preferred.Length == 0)
            throw rows[0].Refuse($"slot {rows[0].Value.Slot} has no preferred row");
    }

    private static void CheckOpticalBasicities(Located<Datum>[] rows, Located<Datum>[] preferred)
    {
        if (preferred.Length > 1)
            throw preferred[1].Refuse($"slot {rows[0].Value.Slot} has {preferred.Length} preferred rows, at most one is allowed");
        if (preferred.FirstOrDefault(r => ((OpticalBasicityDatum)r.Value).Set != "mills") is { } other)
            throw other.Refuse("only a row of the set 'mills' may be preferred");
        var repeated = rows.GroupBy(r => ((OpticalBasicityDatum)r.Value).Set, StringComparer.Ordinal).FirstOrDefault(g => g.Skip(1).Any());
        if (repeated is not null)
            throw repeated.ElementAt(1).Refuse($"slot {rows[0].Value.Slot} has set '{repeated.Key}' twice");
    }

    private static void CheckOxidation(Located<Datum>[] rows, Located<Datum>[] preferred)
    {
        RequireAny(rows, preferred);
        foreach (var states in preferred.GroupBy(r => (((OxidationDatum)r.Value).MetalState, ((OxidationDatum)r.Value).OxideState)))
            RefuseOverlap([.. states]);
    }

    /// <summary>Preferred rows of one quantity may follow one another in temperature and touch, but not overlap.</summary>
    private static void RefuseOverlap(Located<Datum>[] preferred)
    {
        var ordered = preferred.OrderBy(r => r.Value.MinimumTemperatureKelvin).ThenBy(r => r.Value.MaximumTemperatureKelvin).ToArray();
        foreach (var (lower, upper) in ordered.Zip(ordered.Skip(1)))
        {
            var overlap = lower.Value.MaximumTemperatureKelvin > upper.Value.MinimumTemperatureKelvin
                || lower.Value.MinimumTemperatureKelvin == upper.Value.MinimumTemperatureKelvin;
            if (overlap)
            {
                throw upper.Refuse(string.Create(
                    CultureInfo.InvariantCulture,
                    $"slot {upper.Value.Slot}: preferred rows overlap in temperature, "
                    + $"line {lower.Line} ends at {lower.Value.MaximumTemperatureKelvin} K"));
            }
        }
    }
}
