using CsCheck;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Tests.Thermodynamics;

public sealed class ReferenceStateConversionTests
{
    private const double Copper = 63.546;
    private const double Iron = 55.845;

    /// <summary>
    /// Copper in liquid iron at 1873 K: gamma0 8.6, dG of the 1 mass % state 33470 - 39.37 T J/mol (Sigworth and Elliott,
    /// Metal Science 8 (1974) 298; from memory, as in the note of the catalogue row). The two published figures are rounded
    /// on their own: gamma0 to two digits is 1 % or 90 J/mol, the linear fit as much again.
    /// </summary>
    [Fact]
    public void Copper_in_iron_agrees_with_the_published_1_mass_percent_energy()
    {
        const double temperature = 1873;
        const double published = 33470 - (39.37 * temperature);
        const double tolerance = 200;

        var computed = ReferenceStateConversion.GibbsEnergyToOneMassPercent(temperature, Math.Log(8.6), Copper, Iron);

        Assert.InRange(computed, published - tolerance, published + tolerance);
    }

    [Fact]
    public void Published_energy_gives_back_the_published_coefficient()
    {
        const double temperature = 1873;
        const double energy = 33470 - (39.37 * temperature);
        var gamma0 = Math.Exp(energy / (PhysicalConstants.GasConstant * temperature)) * 100 * Copper / Iron;
        Assert.InRange(gamma0, 8.5, 8.7);
    }

    /// <summary>By hand: 1 mass % Cu in Fe holds 1/63.546 = 0.0157366317 mol Cu and 99/55.845 = 1.77276390 mol Fe per 100 g.</summary>
    [Fact]
    public void One_mass_percent_is_converted_exactly()
    {
        Assert.Equal(0.0157366317 / (0.0157366317 + 1.77276390), ReferenceStateConversion.MoleFractionFromMassPercent(1, Copper, Iron), 8);
    }

    [Theory]
    [InlineData(0, 0)]
    [InlineData(100, 1)]
    public void Ends_of_the_range_are_pure_metals(double massPercent, double moleFraction)
    {
        Assert.Equal(moleFraction, ReferenceStateConversion.MoleFractionFromMassPercent(massPercent, Copper, Iron), 15);
        Assert.Equal(massPercent, ReferenceStateConversion.MassPercentFromMoleFraction(moleFraction, Copper, Iron), 12);
    }

    [Fact]
    public void Mass_percent_and_mole_fraction_are_inverse() =>
        Gen.Select(Gen.Double[0, 100], Gen.Double[1, 250], Gen.Double[1, 250]).Sample((massPercent, solute, solvent) =>
        {
            var x = ReferenceStateConversion.MoleFractionFromMassPercent(massPercent, solute, solvent);
            var back = ReferenceStateConversion.MassPercentFromMoleFraction(x, solute, solvent);
            Assert.InRange(back, massPercent - 1e-10, massPercent + 1e-10);
        });

    /// <summary>The exact relation differs from its tangent by a relative amount of the order of the mole fraction.</summary>
    [Fact]
    public void Exact_conversion_meets_the_dilute_limit()
    {
        const double x = 1e-9;
        var exact = ReferenceStateConversion.MassPercentFromMoleFraction(x, Copper, Iron) / x;
        var dilute = ReferenceStateConversion.DiluteMassPercentPerMoleFraction(Copper, Iron);
        Assert.InRange(exact / dilute, 1 - 1e-8, 1 + 1e-8);
    }

    [Fact]
    public void Raoultian_activity_and_mole_fraction_are_inverse() =>
        Gen.Select(Gen.Double[1e-12, 1], Gen.Double[-60, 60]).Sample((x, lnGamma0) =>
        {
            var activity = ReferenceStateConversion.RaoultianFromMoleFraction(x, lnGamma0);
            var back = ReferenceStateConversion.MoleFractionFromRaoultian(activity, lnGamma0);
            Assert.InRange(back / x, 1 - 1e-12, 1 + 1e-12);
        });

    /// <summary>With gamma0 = 1 and equal atomic masses the change is only the change of scale, RT ln(1/100).</summary>
    [Fact]
    public void Change_of_scale_alone_is_minus_RT_ln_100()
    {
        var computed = ReferenceStateConversion.GibbsEnergyToOneMassPercent(1000, 0, 50, 50);
        Assert.Equal(-8.31446261815324 * 1000 * Math.Log(100), computed, 8);
    }

    [Fact]
    public void Not_a_number_is_not_hidden()
    {
        Assert.True(double.IsNaN(ReferenceStateConversion.MoleFractionFromMassPercent(double.NaN, Copper, Iron)));
        Assert.True(double.IsNaN(ReferenceStateConversion.GibbsEnergyToOneMassPercent(1873, double.NaN, Copper, Iron)));
    }
}
