using PartitionService.Core.Equilibrium;

namespace PartitionService.Core.Tests.Equilibrium.Solvers;

public sealed class ReducedNewtonTests
{
    /// <summary>
    /// Regression: with fewer components than allowed phases the amounts' block is singular; the iteration ended without an answer, and
    /// the metal, overshooting, was taken away as the last phase. A lone solvent keeps its metal, and the others are reported as absent.
    /// </summary>
    [Theory]
    [InlineData("Cu", 1573, "iron-silicate", -12)]
    [InlineData("Cu", 1573, "iron-silicate", -20)]
    [InlineData("Pb", 1000, "lead-oxide", -20)]
    [InlineData("Pb", 1000, null, -30)]
    [InlineData("Fe", 1873, "basic-steelmaking", -16)]
    public void A_lone_solvent_under_absent_phases_did_not_converge(string solvent, double temperature, string? family, double log10)
    {
        var answer = Vessels.Answer(new()
        {
            TemperatureKelvin = temperature,
            Solvent = solvent,
            SlagFamily = family,
            GasAllowed = true,
            Oxygen = new OxygenStatement.Pressure(log10),
            Charge = [new(solvent, 100)],
        });
        Assert.Null(answer.Slag);
        Assert.Null(answer.Gas);
        Assert.Equal(1, answer.Row(solvent).MetalFraction, 12);
        Assert.Equal(log10, answer.Redox.Log10OxygenPressureAtm!.Value, 10);
    }

    /// <summary>The same charge at a potential above that of the oxide leaves no metal but slag: the other phase is the one that stays.</summary>
    [Fact]
    public void A_lone_solvent_above_its_oxide_becomes_slag()
    {
        var answer = Vessels.Answer(new()
        {
            TemperatureKelvin = 1000,
            Solvent = "Pb",
            SlagFamily = "lead-oxide",
            GasAllowed = true,
            Oxygen = new OxygenStatement.Pressure(-8),
            Charge = [new("Pb", 100)],
        });
        Assert.Null(answer.Metal);
        Assert.Equal(100 * 223.199 / 207.2, answer.Slag!.MassKg, 6);
        Assert.Contains(answer.Remarks, r => r.Code == RemarkCode.MetalConsumed);
    }
}
