namespace PartitionService.Core.Catalogue;

/// <summary>Checks between rows and between tables. Whatever is refused here would give a wrong answer silently later.</summary>
internal static class CatalogueValidation
{
    /// <summary>Runs every check; the first fault is thrown.</summary>
    public static void Check(CatalogueDraft draft)
    {
        CheckSources(draft);
        CheckElements(draft);
        CheckFamilies(draft);
        CheckStandardStates(draft);
        PreferenceRules.Check(draft);
    }

    private static void CheckSources(CatalogueDraft draft)
    {
        foreach (var row in draft.Data)
            CheckIds(row, row.Value.SourceIds);
        foreach (var row in draft.Elements)
            CheckIds(row, row.Value.SourceIds);
        foreach (var row in draft.Families)
            CheckIds(row, row.Value.SourceIds);
        foreach (var row in draft.Components)
            CheckIds(row, row.Value.SourceIds);

        void CheckIds<T>(Located<T> row, IReadOnlyList<string> ids)
        {
            if (ids.FirstOrDefault(id => !draft.Sources.ContainsKey(id)) is { } unknown)
                throw row.Refuse($"source id '{unknown}' is not in sources.csv");
        }
    }

    private static void CheckElements(CatalogueDraft draft)
    {
        var known = draft.Elements.Select(e => e.Value.Symbol).ToHashSet(StringComparer.Ordinal);
        foreach (var row in draft.Data)
            Check(row, SymbolsOf(row.Value));
        foreach (var row in draft.Components)
            Check(row, row.Value.Formula.Atoms.Keys);

        void Check<T>(Located<T> row, IEnumerable<string> symbols)
        {
            if (symbols.FirstOrDefault(s => !known.Contains(s)) is { } unknown)
                throw row.Refuse($"element '{unknown}' is not in elements.csv");
        }
    }

    private static IEnumerable<string> SymbolsOf(Datum datum) => datum switch
    {
        OxidationDatum d => [d.Element, "O"],
        ChlorideDatum d => [d.Element, "Cl"],
        GasSpeciesDatum d => d.Atoms.Keys,
        InfiniteDilutionDatum d => [d.Solvent, d.Solute],
        InteractionDatum d => [d.Solvent, d.First, d.Second],
        SlagActivityDatum d => [d.Element],
        SolubilityLimitDatum d => [d.Solvent, .. d.Exponents.Keys],
        _ => [],
    };

    private static void CheckFamilies(CatalogueDraft draft)
    {
        var families = draft.Families.Select(f => f.Value.Name).ToHashSet(StringComparer.Ordinal);
        var formulas = draft.OfKind<CapacityDatum>().Select(c => c.Datum.Id).ToHashSet(StringComparer.Ordinal);
        foreach (var row in draft.Components)
        {
            if (!families.Contains(row.Value.Family))
                throw row.Refuse($"slag family '{row.Value.Family}' is not in slag_families.csv");
        }

        foreach (var (datum, row) in draft.OfKind<SlagActivityDatum>())
        {
            if (!families.Contains(datum.Family))
                throw row.Refuse($"slag family '{datum.Family}' is not in slag_families.csv");
        }

        foreach (var row in draft.Families)
        {
            if (row.Value.CapacityFormulas.FirstOrDefault(f => !formulas.Contains(f)) is { } unknown)
                throw row.Refuse($"capacity formula '{unknown}' is not in capacities.csv");
        }
    }

    private static void CheckStandardStates(CatalogueDraft draft)
    {
        var states = draft.OfKind<OxidationDatum>().Where(d => d.Datum.Preferred).Select(d => (d.Datum.Oxide, d.Datum.OxideState))
            .Concat(draft.OfKind<ChlorideDatum>().Where(d => d.Datum.Preferred).Select(d => (d.Datum.Chloride, d.Datum.ChlorideState)))
            .ToHashSet();
        foreach (var (datum, row) in draft.OfKind<SlagActivityDatum>())
        {
            if (datum.OxideState == StandardState.ProductOnly)
                continue;
            if (!states.Contains((datum.Oxide, datum.OxideState)))
                throw row.Refuse($"{datum.Oxide} ({datum.OxideState}) has no row of that state in oxidation.csv or chlorides.csv");
            if (datum.MetalState != StandardState.Liquid)
                throw row.Refuse("metal_state must be liquid, except in a product-only row");
        }
    }
}
