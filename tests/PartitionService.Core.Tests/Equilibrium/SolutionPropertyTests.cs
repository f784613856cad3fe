using System.Text.Json;
using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;
using PartitionService.Core.Tests.Equilibrium.RandomCases;

namespace PartitionService.Core.Tests.Equilibrium;

public sealed class SolutionPropertyTests
{
    private static readonly EquilibriumSolver Solver = new(CatalogueLoader.LoadEmbedded());

    [Fact]
    public void Order_of_the_charge_changes_no_bit_of_the_answer() => Parallel.For(0, 400, seed =>
    {
        var vesselCase = RandomCase.Create(seed);
        var shuffled = vesselCase.Charge.ToArray();
        new Random(seed).Shuffle(shuffled);
        Assert.Equal(Text(Solver.Solve(vesselCase)), Text(Solver.Solve(vesselCase with { Charge = shuffled })));
    });

    [Theory]
    [InlineData("Pb")]
    [InlineData("Ni")]
    [InlineData("Bi")]
    public void A_trace_in_copper_obeys_Henry_and_copper_Raoult(string solute)
    {
        var row = Solver.Catalogue.Slot<InfiniteDilutionDatum>($"metal/Cu/{solute}").Where(r => r.Preferred)
            .MinBy(r => r.DistanceKelvin(1500))!;
        var answer = Solve(null, false, new OxygenStatement.Pressure(-20), ("Cu", 1000), (solute, 1e-6));
        var species = answer.Metal!.Species.ToDictionary(s => s.Species);
        Assert.Equal(StandardState.Liquid, row.SoluteState);
        Assert.Equal(row.LnGamma(1500), Math.Log(species[solute].ActivityCoefficient!.Value), 6);
        Assert.Equal(species["Cu"].MoleFraction, species["Cu"].Activity!.Value, 9);
    }

    /// <summary>At the threshold of a phase the amounts on both sides differ by what the step is worth, no more.</summary>
    [Fact]
    public void Slag_appears_without_a_jump_as_oxygen_rises()
    {
        VesselAnswer At(double log10) => Solve(
            "cu2o-refining", false, new OxygenStatement.Pressure(log10), ("Cu", 1000), ("Sn", 2), ("Fe", 1), ("Ni", 3), ("Ag", 1));
        AssertContinuous(At, -14, -6, answer => answer.Slag);
    }

    [Fact]
    public void Slag_appears_without_a_jump_as_air_is_added()
    {
        VesselAnswer At(double kilogram) => Solve(
            "cu2o-refining", true, new OxygenStatement.Closed(), ("Cu", 1000), ("Sn", 2), ("Ni", 3), ("Ag", 1), ("O2", kilogram));
        AssertContinuous(At, 1e-5, 40, answer => answer.Slag);
    }

    [Fact]
    public void Oxygen_held_and_shares_to_the_slag_rise_with_the_oxygen_potential()
    {
        // With the interactions set to zero and a slag without slopes the coefficients are constant.
        (string, double)[] charge = [("Bi", 1000), ("Pb", 5), ("Cu", 2), ("Ag", 1), ("SiO2", 3)];
        DatumOverride[] ideal =
        [
            .. Solve("lead-oxide", false, new OxygenStatement.Pressure(-10), charge).DataUsed
                .Where(use => use.Key.StartsWith("interaction/", StringComparison.Ordinal))
                .Select(use => new DatumOverride(use.Key.Split('#')[0], OverrideKind.Epsilon, 0)),
        ];
        double held = double.NegativeInfinity, copper = -1, lead = -1, firstLead = 0;
        for (var log10 = -22.0; log10 <= -8; log10 += 0.1)
        {
            var answer = Solve("lead-oxide", false, new OxygenStatement.Pressure(log10), charge, ideal);
            Assert.InRange(answer.Solution.ActivityPasses, 0, 0);
            var share = answer.Elements.ToDictionary(e => e.Element, e => e.SlagFraction);
            Assert.True(answer.Redox.OxygenToSupplyKg >= held, $"oxygen at {log10}");
            Assert.True(share["Cu"] >= copper && share["Pb"] >= lead, $"shares at {log10}");
            firstLead = firstLead > 0 ? firstLead : share["Pb"];
            (held, copper, lead) = (answer.Redox.OxygenToSupplyKg, share["Cu"], share["Pb"]);
        }

        // Lead dissolves as PbO, so fourteen decades of pO2 are worth seven of its share while it is small.
        Assert.Equal(7, Math.Log10(lead / firstLead), 0.2);
    }

    private static void AssertContinuous(Func<double, VesselAnswer> at, double low, double high, Func<VesselAnswer, PhaseReport?> phase)
    {
        Assert.Null(phase(at(low)));
        Assert.NotNull(phase(at(high)));
        for (var halving = 0; halving < 45; halving++)
        {
            var middle = 0.5 * (low + high);
            (low, high) = phase(at(middle)) is null ? (middle, high) : (low, middle);
        }

        var step = 1e-8 * Math.Abs(high);
        var (before, after) = (at(low - step), at(high + step));
        Assert.Null(phase(before));
        Assert.InRange(phase(after)!.AmountMol / before.Metal!.AmountMol, 0, 1e-6);
        foreach (var species in before.Metal.Species.Where(s => s.AmountMol > 1e-9))
        {
            var other = after.Metal!.Species.Single(s => s.Species == species.Species);
            Assert.Equal(1, other.AmountMol / species.AmountMol, 1e-3);
        }
    }

    private static VesselAnswer Solve(
        string? family, bool gas, OxygenStatement oxygen, params (string Formula, double Kilogram)[] charge) =>
        Solve(family, gas, oxygen, charge, []);

    private static VesselAnswer Solve(
        string? family,
        bool gas,
        OxygenStatement oxygen,
        (string Formula, double Kilogram)[] charge,
        IReadOnlyList<DatumOverride> overrides) =>
        Assert.IsType<SolveOutcome.Solved>(Solver.Solve(new VesselCase
        {
            TemperatureKelvin = 1500,
            Charge = [.. charge.Select(c => new ChargeItem(c.Formula, c.Kilogram))],
            Solvent = charge[0].Formula,
            SlagFamily = family,
            GasAllowed = gas,
            Oxygen = oxygen,
            Overrides = overrides,
        })).Answer;

    private static string Text(SolveOutcome outcome) => outcome switch
    {
        SolveOutcome.Solved solved => JsonSerializer.Serialize(solved.Answer),
        SolveOutcome.Failed failed => $"{failed.Reason}: {failed.Message}",
        _ => throw new InvalidOperationException("random cases are valid"),
    };
}
