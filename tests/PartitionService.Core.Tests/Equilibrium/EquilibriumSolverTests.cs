using PartitionService.Core.Equilibrium;

namespace PartitionService.Core.Tests.Equilibrium;

/// <summary>Cases that once ended without an answer or with an absurd one.</summary>
public sealed class EquilibriumSolverTests
{
    /// <summary>With one abundant element two phases compete for it and the amounts' Hessian has rank one; this did not converge.</summary>
    [Theory]
    [InlineData("Cu", "Cu2O", 1000, "cu2o-refining", 1523, -4.5)]
    [InlineData("Cu", "Cu2O", 1000, "cu2o-refining", 1523, -6)]
    [InlineData("Cu", "Cu2O", 0.001, "cu2o-refining", 1523, -6)]
    [InlineData("Cu", "Cu2O", 1000, "iron-silicate", 1523, -6)]
    [InlineData("Ag", "Cu2O", 100, "cu2o-refining", 1523, -6)]
    [InlineData("Pb", "PbO", 100, "lead-oxide", 1200, -12)]
    [InlineData("Fe", "FeO", 100, "basic-steelmaking", 1873, -10)]
    public void A_slag_that_vanishes_at_a_fixed_potential_did_not_converge(
        string metal, string oxide, double oxideKg, string family, double temperatureKelvin, double log10Pressure)
    {
        var answer = Vessels.Answer(new VesselCase
        {
            TemperatureKelvin = temperatureKelvin,
            SlagFamily = family,
            Oxygen = new OxygenStatement.Pressure(log10Pressure),
            Charge = [new(metal, 1000), new(oxide, oxideKg)],
        });
        Assert.Null(answer.Slag);
        Assert.NotNull(answer.Metal);
        Assert.True(answer.Solution.LargestBalanceError < 1e-10);
    }

    /// <summary>Henry's law has no limit of its own, so a closed balance with much oxygen gave a "metal" that was oxygen, or no answer.</summary>
    [Theory]
    [InlineData("iron-silicate", 1)]
    [InlineData("iron-silicate", 100)]
    [InlineData("cu2o-refining", 10)]
    public void Excess_oxygen_was_swallowed_by_the_metal(string family, double oxygenKg)
    {
        var answer = Vessels.Answer(Overblown(oxygenKg) with { SlagFamily = family });
        Assert.Null(answer.Metal);
        Assert.Contains(answer.Remarks, remark => remark.Code == RemarkCode.MetalConsumed);

        // All copper is oxidised; the rest of the oxygen is a gas of about one atmosphere.
        Assert.True(answer.Elements.Single(e => e.Element == "Cu").SlagFraction > 0.9);
        Assert.InRange(answer.Redox.Log10OxygenPressureAtm!.Value, -0.01, 0);
    }

    [Fact]
    public void Excess_oxygen_without_a_slag_has_no_home()
    {
        var failure = Vessels.Failure(Overblown(10) with { SlagFamily = null });
        Assert.Equal(SolveFailure.OxygenHasNoHome, failure.Reason);
        Assert.Contains("Allow a slag", failure.Message, StringComparison.Ordinal);
    }

    /// <summary>Bounding the repulsion of carbon with itself kept iron from ever saturating; first order saturates near 8 mass %.</summary>
    /// <remarks>The measured solubility is 5.4 mass % at 1873 K (Chipman 1972, from memory): first order alone overstates it.</remarks>
    [Fact]
    public void Carbon_never_saturated_iron()
    {
        var answer = Vessels.Answer(new VesselCase
        {
            TemperatureKelvin = 1873,
            Oxygen = new OxygenStatement.Pressure(-16),
            Charge = [new("Fe", 88), new("C", 12)],
        });
        Assert.True(answer.UnburntCarbonKg > 3);
        Assert.InRange(answer.Metal!.Elements.Single(e => e.Element == "C").MassPercent, 5, 8.5);
    }

    private static VesselCase Overblown(double oxygenKg) => new()
    {
        TemperatureKelvin = 1573,
        GasAllowed = true,
        Oxygen = new OxygenStatement.Closed(),
        Charge = [new("Cu", 1), new("O2", oxygenKg)],
    };
}
