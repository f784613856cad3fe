using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;

namespace PartitionService.Core.Tests.Equilibrium;

/// <summary>Small real vessels that tests change by <c>with</c>, and the three ways in which a solve can end.</summary>
internal static class Vessels
{
    public static ThermochemicalCatalogue Catalogue { get; } = CatalogueLoader.LoadEmbedded();

    /// <summary>Copper with a little lead and tin under an iron silicate slag and nitrogen at 1573 K and log10 pO2 = -8.</summary>
    public static VesselCase BlackCopper { get; } = new()
    {
        Name = "black copper",
        TemperatureKelvin = 1573,
        Solvent = "Cu",
        SlagFamily = "iron-silicate",
        GasAllowed = true,
        Oxygen = new OxygenStatement.Pressure(-8),
        Charge =
        [
            new("Cu", 1000), new("Pb", 10), new("Sn", 5), new("FeO", 300), new("SiO2", 150),
            new("N2", 50, ChargeUnit.NormalCubicMetre),
        ],
    };

    /// <summary>Iron with phosphorus, manganese and sulfur under a basic slag with ore, end of blow at 1873 K.</summary>
    public static VesselCase Steel { get; } = new()
    {
        Name = "steel",
        TemperatureKelvin = 1873,
        Solvent = "Fe",
        SlagFamily = "basic-steelmaking",
        Oxygen = new OxygenStatement.Dissolved(600),
        Charge =
        [
            new("Fe", 1000), new("P", 0.5), new("Mn", 1), new("S", 0.2), new("CaO", 45), new("SiO2", 14), new("FeO", 24), new("MgO", 9),
        ],
    };

    /// <summary>Lead alone, without slag and gas.</summary>
    public static VesselCase Lead { get; } = new()
    {
        TemperatureKelvin = 1000,
        Solvent = "Pb",
        Oxygen = new OxygenStatement.Closed(),
        Charge = [new("Pb", 100), new("Ag", 0.1)],
    };

    /// <summary>The vessel with more in it.</summary>
    public static VesselCase Plus(this VesselCase vessel, params ChargeItem[] items) =>
        vessel with { Charge = [.. vessel.Charge, .. items] };

    public static VesselAnswer Answer(VesselCase vessel)
    {
        var outcome = new EquilibriumSolver(Catalogue).Solve(vessel, CancellationToken.None);
        Assert.True(outcome is SolveOutcome.Solved, Describe(outcome));
        return ((SolveOutcome.Solved)outcome).Answer;
    }

    public static SolveOutcome.Failed Failure(VesselCase vessel) =>
        Assert.IsType<SolveOutcome.Failed>(new EquilibriumSolver(Catalogue).Solve(vessel, CancellationToken.None));

    public static IReadOnlyList<CaseViolation> Violations(VesselCase vessel) => CaseValidation.Validate(vessel, Catalogue);

    public static ElementDistribution Row(this VesselAnswer answer, string element) => answer.Elements.Single(e => e.Element == element);

    /// <summary>Mass % of an element in a phase; zero where absent.</summary>
    public static double MassPercent(this PhaseReport phase, string element) =>
        phase.Elements.SingleOrDefault(e => e.Element == element)?.MassPercent ?? 0;

    public static IEnumerable<Remark> Remarks(this VesselAnswer answer, RemarkCode code) => answer.Remarks.Where(r => r.Code == code);

    private static string Describe(SolveOutcome outcome) => outcome switch
    {
        SolveOutcome.Invalid invalid => string.Join("; ", invalid.Violations.Select(v => v.Message)),
        SolveOutcome.Failed failed => $"{failed.Reason}: {failed.Message}",
        _ => "",
    };
}
