using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium.Assembly;

namespace PartitionService.Core.Equilibrium.Reporting;

/// <summary>Remarks about compositions outside the range of the laws and the data.</summary>
internal static class CompositionRemarks
{
    /// <summary>Mole fraction up to which Henry's law is taken to hold where the source gives no limit (common practice: a few mol %).</summary>
    private const double DefaultHenrianLimit = 0.05;

    /// <summary>All remarks about compositions.</summary>
    public static IEnumerable<Remark> All(ReportContext context) =>
        (context.HasMetal ? Metal(context) : []).Concat(Slag(context));

    private static IEnumerable<Remark> Metal(ReportContext context)
    {
        var assembled = context.State.Assembled;
        var solvent = context.State.MoleFraction[assembled.SolventSpecies];
        if (solvent < 0.9)
        {
            yield return new Remark(
                RemarkCode.ConcentratedMetal,
                solvent < 0.5 ? Severity.Serious : solvent < 0.8 ? Severity.Warning : Severity.Note,
                context.Assembly.Solvent,
                "metal",
                $"The metal is a mixture: {context.Assembly.Solvent} is taken as solvent at a mole fraction of {RemarkRules.Short(solvent)}.",
                [new RemarkNumber("mole_fraction", solvent, "1")]);
        }

        foreach (var s in assembled.MetalSolutes)
        {
            var name = assembled.Species[s].Name;
            var slot = MetalSpecies.Slot(context.Assembly.Solvent, name);
            var stated = context.Assembly.Ledger.Select<InfiniteDilutionDatum>(slot)?.HenrianLimitMoleFraction;
            var limit = stated ?? DefaultHenrianLimit;
            var fraction = context.State.MoleFraction[s];
            if (fraction > limit)
            {
                yield return new Remark(
                    RemarkCode.BeyondHenrianRange,
                    fraction > 3 * limit ? Severity.Warning : Severity.Note,
                    name,
                    slot,
                    $"{name} reaches a mole fraction of {RemarkRules.Short(fraction)} in the metal; Henry's law holds up to {RemarkRules.Short(limit)} {(stated is null ? "as a rule" : "by its source")}.",
                    [new RemarkNumber("mole_fraction", fraction, "1"), new RemarkNumber("limit", limit, "1")]);
            }
        }

        var fractions = assembled.MetalSolutes.Select(s => Math.Min(1, context.State.MoleFraction[s])).ToArray();
        foreach (var (first, second, strength) in assembled.Interactions.BoundedPairs(fractions))
        {
            // Slots hold the names in ordinal order.
            string[] names = [assembled.Species[assembled.MetalSolutes[first]].Name, assembled.Species[assembled.MetalSolutes[second]].Name];
            Array.Sort(names, StringComparer.Ordinal);
            yield return new Remark(
                RemarkCode.InteractionBounded,
                Severity.Note,
                names[0],
                $"interaction/{context.Assembly.Solvent}/{names[0]}/{names[1]}",
                $"The interaction of {names[0]} and {names[1]} is beyond the range of a first-order parameter (|epsilon x| = {RemarkRules.Short(strength)}); it was bounded.",
                [new RemarkNumber("epsilon_times_x", strength, "1")]);
        }
    }

    private static IEnumerable<Remark> Slag(ReportContext context)
    {
        if (!context.HasSlag || context.Assembly.Terms is not { } terms || context.Assembly.Family is not { } family)
        {
            yield break;
        }

        foreach (var term in terms.All.Where(term => term.Index >= 0 && term.Bounded))
        {
            yield return new Remark(
                RemarkCode.ExtrapolatedInComposition,
                Severity.Note,
                term.Row!.Element,
                term.Slot,
                $"The composition term of {term.Species} in {family.Name} slag was held at the edge of the family's window.",
                term.Variable is { } variable ? [new RemarkNumber("variable", variable, "1")] : []);
        }

        if (terms.OpticalBasicity is { } basicity && basicity is < 0.6 or > 0.85)
        {
            yield return new Remark(
                RemarkCode.ExtrapolatedInComposition,
                Severity.Warning,
                "S",
                Thermodynamics.SulfideCapacity.Slot,
                $"The sulfide capacity is used at an optical basicity of {RemarkRules.Short(basicity)}, fitted in 0.6 to 0.85.",
                [new RemarkNumber("optical_basicity", basicity, "1")]);
        }

        var temperature = context.Case.TemperatureKelvin;
        if (temperature < family.MinimumTemperatureKelvin || temperature > family.MaximumTemperatureKelvin)
        {
            yield return new Remark(
                RemarkCode.SlagOutsideFamily,
                Severity.Warning,
                "",
                family.Name,
                $"{family.Name} slag is usual between {RemarkRules.Short(family.MinimumTemperatureKelvin)} and {RemarkRules.Short(family.MaximumTemperatureKelvin)} K; outside it may be solid or miscible.",
                [new RemarkNumber("temperature", temperature, "K")]);
        }

        foreach (var remark in SlagWindow(context, family))
        {
            yield return remark;
        }
    }

    /// <summary>Compares cations of the leaving slag with the usual window of the family.</summary>
    private static IEnumerable<Remark> SlagWindow(ReportContext context, SlagFamily family)
    {
        var elements = context.Catalogue.Elements;
        var slagMass = context.Streams.EquilibriumSlag.MassKg(elements);
        double Low(string element, Func<SlagComponent, double> bound) => family.Components
            .Select(c => (Component: c, Formula: Thermodynamics.OxideFormulas.Get(c.Formula)))
            .Where(c => c.Formula?.Atoms.ContainsKey(element) == true)
            .Sum(c => bound(c.Component) * c.Formula!.Atoms[element] * elements[element].AtomicMassGramPerMol
                / c.Formula.MolarMass(elements));

        var cations = family.Components
            .SelectMany(c => Thermodynamics.OxideFormulas.Get(c.Formula)?.Atoms.Keys ?? [])
            .Concat(context.Streams.EquilibriumSlag.Elements)
            .Where(e => !LinkComponents.Contains(e) && e != "F").Distinct().Order(StringComparer.Ordinal);
        foreach (var element in cations)
        {
            var actual = 100 * context.Streams.MassKg(context.Streams.EquilibriumSlag, element) / slagMass;
            var low = Low(element, c => c.LowMassPercent);
            var high = Low(element, c => c.HighMassPercent);
            if (actual > 1.2 * high + 3 || actual < 0.8 * low - 1)
            {
                yield return new Remark(
                    RemarkCode.SlagOutsideFamily,
                    actual > 1.5 * high + 6 ? Severity.Warning : Severity.Note,
                    element,
                    family.Name,
                    $"The slag holds {RemarkRules.Short(actual)} mass % {element}; {Usual(element, low, high)} {family.Name}.",
                    [new RemarkNumber("mass_percent", actual, "mass %")]);
            }
        }
    }

    private static string Usual(string element, double low, double high) =>
        high > 0
            ? $"{RemarkRules.Short(low)} to {RemarkRules.Short(high)} mass % are usual for"
            : $"{element} is no usual main constituent of";
}
