using PartitionService.Core.Equilibrium;
using PartitionService.Core.Equilibrium.Assembly;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Tests.Equilibrium.Assembly;

/// <summary>At the answer the slag constants belong to the answer's own slag.</summary>
public sealed class SlagIterationTests
{
    [Fact]
    public void Phosphorus_ratio_equals_the_formula_at_the_answers_own_slag()
    {
        var answer = Vessels.Answer(Vessels.Steel);
        var slag = Oxides(answer);
        var iron = (slag["FeO"] * 55.845 / 71.844) + (slag["Fe2O3"] * 2 * 55.845 / 159.687);
        var formula = PhosphorusPartition.Log10(slag, iron, 1873);
        Assert.Equal(formula, answer.DataUsed.Single(use => use.Key.StartsWith(PhosphorusPartition.Slot, StringComparison.Ordinal)).Value, 6);

        // The mole ratio is turned into the mass ratio with the cations of the whole oxides. The slag also holds sulfide, which is in the
        // reported slag mass but in no whole oxide: that is at most its mass share.
        var sulfide = answer.Slag!.MassPercent("S") / 100;
        Assert.Equal(Math.Pow(10, formula), answer.Row("P").PartitionRatioSlagToMetal!.Value, Math.Pow(10, formula) * sulfide * 2);
    }

    [Fact]
    public void Sulfide_capacity_holds_at_the_answers_own_slag()
    {
        var answer = Vessels.Answer(Vessels.Steel);
        var slag = Oxides(answer);
        var massPercent = answer.Slag!.MassPercent("S");
        var actual = massPercent * Math.Pow(10, 0.5 * (answer.Redox.Log10OxygenPressureAtm!.Value - answer.Redox.Log10SulfurPressureAtm!.Value));
        var expected = SulfideCapacity.Log10(slag.OpticalBasicity(Vessels.Catalogue)!.Value, 1873);
        Assert.Equal(expected, Math.Log10(actual), massPercent / 100 * 2);
    }

    /// <summary>More lime drives lead out of the slag: gamma of PbO rises by exp(1.66) per unit of CaO/SiO2 inside the window.</summary>
    [Fact]
    public void Lead_oxide_coefficient_follows_the_slags_own_basicity()
    {
        foreach (var lime in new[] { 10, 20 })
        {
            var answer = Vessels.Answer(new VesselCase
            {
                TemperatureKelvin = 1523,
                Solvent = "Pb",
                SlagFamily = "lead-smelting",
                Oxygen = new OxygenStatement.Pressure(-10),
                Charge = [new("Pb", 100), new("FeO", 34), new("SiO2", 24), new("CaO", lime), new("ZnO", 14)],
            });
            var slag = Oxides(answer);
            var species = answer.Slag!.Species.Single(s => s.Species == "PbO");
            Assert.Equal(-1.062 + (1.66 * ((slag["CaO"] / slag["SiO2"]) - 0.5)), Math.Log(species.ActivityCoefficient!.Value), 8);
            Assert.Equal(species.ActivityCoefficient.Value * species.MoleFraction, species.Activity!.Value, 12);
        }
    }

    [Fact]
    public void Families_without_such_constants_have_nothing_to_iterate()
    {
        var salt = Ledgers.Assemble(new()
        {
            TemperatureKelvin = 1000,
            Solvent = "Al",
            SlagFamily = "chloride-salt",
            Oxygen = new OxygenStatement.Closed(),
            Charge = [new("Al", 100), new("NaCl", 10)],
        });
        Assert.True(new SlagIteration(salt, Vessels.Catalogue.Elements).IsEmpty);
        Assert.False(new SlagIteration(Ledgers.Assemble(Vessels.Steel), Vessels.Catalogue.Elements).IsEmpty);
    }

    private static SlagComposition Oxides(VesselAnswer answer) => WholeOxides.Composition(
        answer.Slag!.Species.Where(s => s.Species != "S")
            .Select(s => (s.Species == "FeO1.5" ? s.Species : Core.Catalogue.ChemicalFormula.Parse(s.Species).Atoms.Keys.First(), s.AmountMol)),
        Vessels.Catalogue.Elements)!;
}
