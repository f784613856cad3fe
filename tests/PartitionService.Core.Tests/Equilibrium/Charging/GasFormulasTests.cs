using PartitionService.Core.Equilibrium.Charging;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Tests.Equilibrium.Charging;

public sealed class GasFormulasTests
{
    /// <summary>
    /// Dry air has 28.9644 g/mol (US Standard Atmosphere 1976, from memory); as an ideal gas that is 1.29225 kg/m3 at 0 degC and 1 atm. A
    /// composition to 0.01 % is good for 0.003 g/mol or 0.00014 kg/m3.
    /// </summary>
    [Fact]
    public void Air_has_its_published_density()
    {
        var gramPerMol = GasFormulas.AirAtoms.Sum(atom => atom.Value * Vessels.Catalogue.Elements[atom.Key].AtomicMassGramPerMol);
        Assert.Equal(1.29225, gramPerMol / 1000 / PhysicalConstants.NormalCubicMetrePerMol, 0.00014);
    }

    [Fact]
    public void Air_adds_up_to_one_mol()
    {
        var air = GasFormulas.AirAtoms;
        var oxygenGas = (air["O"] / 2) - air["C"];
        Assert.Equal(1, (air["N"] / 2) + oxygenGas + air["Ar"] + air["C"], 12);
    }

    [Theory]
    [InlineData("air", true)]
    [InlineData("CH4", true)]
    [InlineData("H2O", true)]
    [InlineData("Air", false)]
    [InlineData("OH2", false)]
    [InlineData("PbO", false)]
    public void Gases_are_known_by_their_formula(string formula, bool gas) => Assert.Equal(gas, GasFormulas.Contains(formula));

    [Fact]
    public void Listing_is_sorted_and_holds_air() => Assert.Equal(
        GasFormulas.Listing.Split(", ").Order(StringComparer.Ordinal).ToArray(), GasFormulas.Listing.Split(", "));
}
