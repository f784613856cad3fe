using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium.Assembly;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Tests.Equilibrium.Assembly;

public sealed class SlagTermsTests
{
    private const string Slot = "slag/lead-smelting/PbO";
    private static readonly SlagFamily Family = Vessels.Catalogue.SlagFamilies["lead-smelting"];

    /// <summary>The row states ln gamma(PbO) = -1.062 + 1.66 (CaO/SiO2 - 0.5); the family's window holds 0.3125 to 1.389.</summary>
    [Theory]
    [InlineData(0.5, -1.062, false)]
    [InlineData(1.0, -1.062 + (1.66 * 0.5), false)]
    [InlineData(0.1, -1.062 + (1.66 * ((10.0 / 32) - 0.5)), true)]
    [InlineData(9.0, -1.062 + (1.66 * ((25.0 / 18) - 0.5)), true)]
    public void Slope_of_lead_oxide_with_basicity(double ratio, double lnGamma, bool bounded)
    {
        var terms = Terms(out var term);
        var lnK = terms.LnK(term, Slag(("CaO", 20 * ratio), ("SiO2", 20), ("FeO", 40)), default);
        Assert.Equal(lnGamma, term.DatumValue, 10);
        Assert.Equal(7 - (lnGamma + 1.062), lnK, 10);
        Assert.Equal(bounded, term.Bounded);
        Assert.Equal(ratio, term.Variable!.Value, 12);
    }

    [Fact]
    public void Without_silica_the_ratio_is_taken_at_the_upper_edge()
    {
        var terms = Terms(out var term);
        terms.LnK(term, Slag(("CaO", 20), ("FeO", 80)), default);
        Assert.Null(term.Variable);
        Assert.True(term.Bounded);
        Assert.Equal(-1.062 + (1.66 * ((25.0 / 18) - 0.5)), term.DatumValue, 10);
    }

    /// <summary>mass % S = C_S (pS2/pO2)^(1/2); with x = mass %/(32.06 n) the constant is ln C_S - ln(32.06 n).</summary>
    [Fact]
    public void Sulfide_follows_the_capacity()
    {
        var terms = new SlagTerms(Vessels.Catalogue.SlagFamilies["ladle-lime-alumina"], 1873, Vessels.Catalogue);
        var term = new SlagTerms.Term(SlagTerms.TermKind.Sulfide, "S", SulfideCapacity.Slot, 0, null);
        var slag = Slag(("CaO", 55), ("Al2O3", 45));
        var lnK = terms.LnK(term, slag, default);
        var massPercent = Math.Exp(lnK) * Vessels.Catalogue.Elements["S"].AtomicMassGramPerMol
            * slag.MonoCationMolPer100Gram(Vessels.Catalogue.Elements);
        Assert.Equal(SulfideCapacity.Log10(slag.OpticalBasicity(Vessels.Catalogue)!.Value, 1873), Math.Log10(massPercent), 10);
        Assert.Equal(slag.OpticalBasicity(Vessels.Catalogue), terms.OpticalBasicity);
    }

    private static SlagTerms Terms(out SlagTerms.Term term)
    {
        term = new SlagTerms.Term(
            SlagTerms.TermKind.Slope, "PbO", Slot, 7, Vessels.Catalogue.Slot<SlagActivityDatum>(Slot).Single(r => r.Preferred));
        return new SlagTerms(Family, 1523, Vessels.Catalogue);
    }

    private static SlagComposition Slag(params (string Oxide, double MassPercent)[] oxides) =>
        new(oxides.ToDictionary(o => o.Oxide, o => o.MassPercent), false);
}
