using PartitionService.Core.Equilibrium;
using PartitionService.Core.Equilibrium.Assembly;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Tests.Equilibrium.Assembly;

public sealed class GasSpeciesTests
{
    [Fact]
    public void Only_species_of_present_elements_are_made()
    {
        var names = Create(["Pb", "O"], 1573, 1).Select(s => s.Name).ToArray();
        Assert.Contains("Pb", names);
        Assert.Contains("PbO", names);
        Assert.Contains("O2", names);
        Assert.DoesNotContain("PbS", names);
        Assert.DoesNotContain("CO", names);
    }

    [Fact]
    public void Constant_is_the_gibbs_energy_less_the_pressure()
    {
        var energy = Vessels.Catalogue.GasSpecies.Single(g => g.Species == "Pb").GibbsEnergy(1573);
        var lead = Create(["Pb"], 1573, 0.01).Single(s => s.Name == "Pb");
        Assert.Equal((-energy / (PhysicalConstants.GasConstant * 1573)) - Math.Log(0.01), lead.LnK, 12);
        Assert.Equal("Pb", lead.Carried);
    }

    [Fact]
    public void Molecules_carry_their_atoms()
    {
        var dimer = Create(["Pb", "O"], 1573, 1).Single(s => s.Name == "Pb2O2");
        Assert.Equal(2, dimer.Atoms["Pb"]);
        Assert.Equal(2, dimer.Atoms["O"]);
        Assert.Equal("Pb", dimer.Carried);
        Assert.Null(Create(["O"], 1573, 1).Single(s => s.Name == "O2").Carried);
    }

    [Fact]
    public void An_override_replaces_the_energy()
    {
        var ledger = Ledgers.At(1573, new DatumOverride("gas/Pb", OverrideKind.GibbsEnergy, 1000));
        var lead = GasSpecies.Create(["Pb"], 1573, 1, Vessels.Catalogue, ledger).Single(s => s.Name == "Pb");
        Assert.Equal(-1000 / (PhysicalConstants.GasConstant * 1573), lead.LnK, 12);
    }

    private static IEnumerable<SpeciesRecord> Create(HashSet<string> present, double temperature, double pressure) =>
        GasSpecies.Create(present, temperature, pressure, Vessels.Catalogue, Ledgers.At(temperature));
}
