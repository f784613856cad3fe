using PartitionService.Core.Equilibrium.Assembly;

namespace PartitionService.Core.Equilibrium.Reporting;

/// <summary>Remarks about phases: absent, consumed, inert, unburnt, allowances.</summary>
internal static class PhaseRemarks
{
    private static readonly string[] Nobles = ["Ag", "Au", "Pt", "Pd", "Rh", "Ir", "Ru"];

    /// <summary>All remarks about phases.</summary>
    public static IEnumerable<Remark> All(ReportContext context) =>
        Absent(context).Concat(Carbon(context)).Concat(Inert(context)).Concat(Boiling(context)).Concat(Entrainment(context));

    private static IEnumerable<Remark> Absent(ReportContext context)
    {
        if (!context.HasMetal)
        {
            yield return new Remark(
                RemarkCode.MetalConsumed,
                Severity.Serious,
                context.Assembly.Solvent,
                "metal",
                "No metal is left at this oxygen potential: the solvent goes to the other phases and every solute with it.",
                []);
        }

        foreach (var phase in new[] { PhaseKind.Slag, PhaseKind.Gas })
        {
            if (!context.State.Allows(phase) || context.State.Amount(phase) > 0)
            {
                continue;
            }

            var sum = context.State.SpeciesOf(phase).Sum(s => context.State.MoleFraction[s]);
            var name = phase == PhaseKind.Slag ? "slag" : "gas";
            yield return new Remark(
                RemarkCode.PhaseAbsent,
                Severity.Note,
                "",
                name,
                phase == PhaseKind.Slag
                    ? $"No slag forms: its constituents would add up to a mole fraction of only {RemarkRules.Short(sum)}."
                    : $"No gas forms: the equilibrium pressures add up to only {RemarkRules.Short(sum * context.Case.PressureAtm)} atm.",
                [new RemarkNumber("mole_fraction_sum", sum, "1")]);
        }
    }

    private static IEnumerable<Remark> Carbon(ReportContext context)
    {
        var carbon = context.State.Amount(PhaseKind.Carbon);
        if (carbon > 0)
        {
            var kilogram = carbon * context.Catalogue.Elements["C"].AtomicMassGramPerMol / 1000;
            yield return new Remark(
                RemarkCode.UnburntCarbon,
                Severity.Warning,
                "C",
                "carbon",
                $"{RemarkRules.Short(kilogram)} kg of solid carbon stays unburnt for want of oxygen.",
                [new RemarkNumber("mass", kilogram, "kg")]);
        }
    }

    private static IEnumerable<Remark> Inert(ReportContext context)
    {
        foreach (var element in context.Assembly.Account.Inert.Elements.Where(e => !LinkComponents.Contains(e)))
        {
            var kilogram = context.Streams.MassKg(context.Assembly.Account.Inert, element);
            yield return new Remark(
                RemarkCode.CarriedAsInert,
                Severity.Note,
                element,
                context.Case.SlagFamily ?? "",
                $"{element} charged as oxide or salt stays in the slag as an inert part: the catalogue has no activity coefficient for it there.",
                [new RemarkNumber("mass", kilogram, "kg")]);
        }
    }

    private static IEnumerable<Remark> Boiling(ReportContext context)
    {
        if (context.State.Allows(PhaseKind.Gas))
        {
            yield break;
        }

        foreach (var element in context.Elements.Select(e => e.Element))
        {
            var pressure = VapourPressure(context, element);
            if (pressure > 0.1 * context.Case.PressureAtm)
            {
                yield return new Remark(
                    RemarkCode.NoGasToBoilInto,
                    Severity.Warning,
                    element,
                    "gas",
                    $"{element} has a vapour pressure of {RemarkRules.Short(pressure)} atm over the metal but no gas may form; allow a gas to see it leave.",
                    [new RemarkNumber("vapour_pressure", pressure, "atm")]);
            }
            else if (context.Assembly.Assembled.Unplaced.Contains(element) is false
                && context.Streams.Unplaced[element] > 0 && element is "N" or "Ar" or "H")
            {
                yield return new Remark(
                    RemarkCode.NoGasToBoilInto, Severity.Warning, element, "gas", $"{element} was blown in but no gas may form; it is left unplaced.", []);
            }
        }
    }

    private static double VapourPressure(ReportContext context, string element)
    {
        if (LinkComponents.Contains(element) || context.State.LnActivity(element) is not { } lnActivity)
        {
            return 0;
        }

        var thermal = Thermodynamics.PhysicalConstants.GasConstant * context.Case.TemperatureKelvin;
        return context.Catalogue.GasSpecies
            .Where(row => row.Atoms.Count == 1 && row.Atoms.ContainsKey(element))
            .Sum(row => Math.Exp((row.Atoms[element] * lnActivity) - (row.GibbsEnergy(context.Case.TemperatureKelvin) / thermal)));
    }

    private static IEnumerable<Remark> Entrainment(ReportContext context)
    {
        if (context.Streams.EntrainmentLimited)
        {
            yield return new Remark(
                RemarkCode.AllowanceLimited,
                Severity.Warning,
                "",
                "entrainment",
                "The entrainment asked for exceeds what there is of metal or slag; it was limited.",
                [
                    new RemarkNumber("metal_in_slag", context.Streams.MetalInSlagKg, "kg"),
                    new RemarkNumber("slag_in_metal", context.Streams.SlagInMetalKg, "kg"),
                ]);
        }

        if (context.Streams.MetalInSlagMassPercent > 0 || !context.HasSlag || !context.HasMetal
            || context.Assembly.Family?.TypicalEntrainedMetalMassPercent is not { } typical)
        {
            yield break;
        }

        foreach (var row in context.Elements.Where(e => Array.IndexOf(Nobles, e.Element) >= 0 && e.MetalFraction > 0.5))
        {
            var slagMass = context.Streams.Slag.MassKg(context.Catalogue.Elements);
            var metalMass = context.Streams.Metal.MassKg(context.Catalogue.Elements);
            var carried = typical / (100 - typical) * slagMass / metalMass;
            if (carried > row.SlagFraction)
            {
                yield return new Remark(
                    RemarkCode.EntrainmentIgnored,
                    Severity.Warning,
                    row.Element,
                    context.Assembly.Family.EntrainmentSlot,
                    $"The slag loss of {row.Element} counts dissolved metal only; droplets at the family's typical {RemarkRules.Short(typical)} mass % would carry {RemarkRules.Short(100 * carried)} % of it. Set allowances.metal_in_slag.",
                    [new RemarkNumber("typical_metal_in_slag", typical, "mass %"), new RemarkNumber("carried_fraction", carried, "1")]);
            }
        }
    }
}
