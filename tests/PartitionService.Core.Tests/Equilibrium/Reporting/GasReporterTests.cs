using PartitionService.Core.Equilibrium;

namespace PartitionService.Core.Tests.Equilibrium.Reporting;

public sealed class GasReporterTests
{
    private static readonly VesselAnswer Answer = Vessels.Answer(Vessels.BlackCopper.Plus(new("Zn", 5), new("C", 3)) with { PressureAtm = 0.5 });

    private static GasReport Gas => Answer.Gas!;

    [Fact]
    public void Fractions_add_up_to_one_and_pressures_to_the_total()
    {
        Assert.Equal(1, Gas.Species.Sum(s => s.VolumeFraction), 9);
        Assert.Equal(0.5, Gas.Species.Sum(s => s.PartialPressureAtm), 9);
        Assert.Equal(Gas.AmountMol, Gas.Species.Sum(s => s.AmountMol), 1e-9 * Gas.AmountMol);
    }

    /// <summary>22.41397 L/mol at 0 degC and 1 atm.</summary>
    [Fact]
    public void Volume_is_the_normal_volume_of_the_amount() =>
        Assert.Equal(Gas.AmountMol * 0.02241396954, Gas.VolumeNormalCubicMetre, 1e-6);

    /// <summary>CO: 28.010 g/mol over the normal volume of the whole gas.</summary>
    [Fact]
    public void Load_is_gram_of_the_species_over_the_normal_volume()
    {
        var carbonMonoxide = Gas.Species.Single(s => s.Species == "CO");
        Assert.Equal(carbonMonoxide.VolumeFraction * 28.010 / 0.02241396954, carbonMonoxide.LoadGramPerNormalCubicMetre, 1e-3);
    }

    [Fact]
    public void Dust_forming_load_counts_metals_and_no_permanent_gas()
    {
        string[] permanent = ["O", "N", "C", "H", "S", "Ar"];
        var metals = Gas.Elements.Where(e => !permanent.Contains(e.Element)).Sum(e => e.MassKg);
        Assert.True(metals > 0);
        Assert.Equal(1000 * metals / Gas.VolumeNormalCubicMetre, Gas.DustFormingLoadGramPerNormalCubicMetre, 9);
    }

    [Fact]
    public void Species_stand_by_falling_fraction_and_none_is_negligible()
    {
        Assert.Equal(Gas.Species.OrderByDescending(s => s.VolumeFraction), Gas.Species);
        Assert.All(Gas.Species, s => Assert.True(s.VolumeFraction >= 1e-12));
    }

    [Fact]
    public void Masses_of_the_elements_are_the_mass_of_the_gas()
    {
        Assert.Equal(Gas.MassKg, Gas.Elements.Sum(e => e.MassKg), 9);
        Assert.Equal(100, Gas.Elements.Sum(e => e.MassPercent), 9);
    }
}
