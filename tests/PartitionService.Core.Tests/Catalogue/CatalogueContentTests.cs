using PartitionService.Core.Catalogue;

namespace PartitionService.Core.Tests.Catalogue;

public sealed class CatalogueContentTests
{
    private static readonly ThermochemicalCatalogue Catalogue = CatalogueLoader.LoadEmbedded();

    [Fact]
    public void Every_table_has_a_sensible_number_of_rows()
    {
        Assert.InRange(Catalogue.Elements.Count, 70, 118);
        Assert.InRange(Catalogue.SlagFamilies.Count, 9, 30);
        Assert.InRange(Count<OxidationDatum>(), 250, 500);
        Assert.InRange(Count<ChlorideDatum>(), 8, 60);
        Assert.InRange(Count<GasSpeciesDatum>(), 400, 800);
        Assert.InRange(Count<InfiniteDilutionDatum>(), 350, 800);
        Assert.InRange(Count<InteractionDatum>(), 500, 1500);
        Assert.InRange(Count<SlagActivityDatum>(), 400, 1000);
        Assert.InRange(Count<CapacityDatum>(), 10, 60);
        Assert.InRange(Count<OpticalBasicityDatum>(), 60, 200);
        Assert.InRange(Count<SolubilityLimitDatum>(), 20, 200);
        Assert.InRange(Count<EntrainmentDatum>(), 15, 60);

        static int Count<T>() => Catalogue.Data.Count(d => d is T);
    }

    [Fact]
    public void Every_source_is_used()
    {
        var used = Catalogue.Data.SelectMany(d => d.SourceIds)
            .Concat(Catalogue.Elements.Values.SelectMany(e => e.SourceIds))
            .Concat(Catalogue.SlagFamilies.Values.SelectMany(f => f.SourceIds))
            .ToHashSet();
        Assert.Empty(Catalogue.Sources.Keys.Except(used));
        Assert.Empty(used.Except(Catalogue.Sources.Keys));
    }

    [Fact]
    public void Locators_are_empty_a_doi_or_an_address() =>
        Assert.All(Catalogue.Sources.Values, s => Assert.Matches("^$|^10\\.\\d{4,9}/\\S+$|^https?://\\S+$", s.Locator));

    [Fact]
    public void Keys_are_the_slot_and_the_position_in_it()
    {
        foreach (var slot in Catalogue.Data.GroupBy(d => d.Slot))
            Assert.Equal(slot.Index().Select(d => $"{slot.Key}#{d.Index + 1}"), slot.Select(d => d.Key));
        Assert.Equal("metal/Cu/Pb", Catalogue.Find("metal/Cu/Pb#1")?.Slot);
        Assert.Null(Catalogue.Find("metal/Cu/Pb#99"));
    }

    [Fact]
    public void Gas_species_are_listed_once_and_the_reference_gases_have_zero_energy()
    {
        Assert.Equal(Catalogue.GasSpecies.Count, Catalogue.GasSpecies.Select(g => g.Species).Distinct().Count());
        foreach (var gas in new[] { "O2", "S2", "Cl2", "Br2", "H2", "N2", "Ar" })
            Assert.Equal(0, Catalogue.GasSpecies.Single(g => g.Species == gas).GibbsEnergy(1573));
    }

    [Fact]
    public void Each_datum_carries_trust_range_and_sigma()
    {
        Assert.All(Catalogue.Data, d =>
        {
            Assert.NotEmpty(d.SourceIds);
            Assert.True(d.MinimumTemperatureKelvin > 0 && d.MaximumTemperatureKelvin >= d.MinimumTemperatureKelvin);
            Assert.Equal(d.Flags.Contains("assumed"), d.Access == Access.Assumed);
        });
    }

    [Fact]
    public void Solvents_hold_the_metals_of_the_trade() =>
        Assert.Superset(new HashSet<string> { "Cu", "Fe", "Pb", "Sn", "Al", "Zn", "Ag", "Bi" }, Catalogue.Solvents.ToHashSet());

    [Theory]
    [InlineData("iron-silicate", 0.5)]
    [InlineData("cu2o-refining", 10)]
    public void Families_take_the_typical_entrainment_of_their_process(string family, double massPercent) =>
        Assert.Equal(massPercent, Catalogue.SlagFamilies[family].TypicalEntrainedMetalMassPercent);

    [Fact]
    public void Family_without_entrainment_says_so()
    {
        Assert.Null(Catalogue.SlagFamilies["soda-alkali"].TypicalEntrainedMetalMassPercent);
        Assert.Equal("", Catalogue.SlagFamilies["soda-alkali"].EntrainmentSlot);
    }

    [Fact]
    public void Mono_cations_per_100_gram_agree_with_the_typical_composition()
    {
        foreach (var family in Catalogue.SlagFamilies.Values.Where(f => f.Name != "chloride-salt"))
        {
            var cations = family.Components.Sum(c =>
            {
                var formula = ChemicalFormula.Parse(c.Formula);
                var perFormula = formula.Atoms.Where(a => a.Key is not ("O" or "F" or "Cl")).Sum(a => a.Value);
                return c.TypicalMassPercent / formula.MolarMass(Catalogue.Elements) * perFormula;
            });
            var total = family.Components.Sum(c => c.TypicalMassPercent);
            Assert.InRange(cations / total * 100 / family.MonoCationMolPer100Gram, 0.95, 1.05);
        }
    }

    [Fact]
    public void Ferric_rows_reproduce_the_typical_composition_of_iron_silicate()
    {
        // 57 % FeO and 7 % Fe2O3 at 1573 K and log10 pO2 = -8 are what the assumed row was built from.
        const double T = 1573, RT = 8.314462618 * T;
        var lnRatio = LnContent("FeO1.5", 1.5) - LnContent("FeO", 1);
        var expected = Math.Log(7 * 2 / 159.687 / (57 / 71.844));
        Assert.Equal(expected, lnRatio, 0.01);

        static double LnContent(string oxide, double nu)
        {
            var slag = Catalogue.Slot<SlagActivityDatum>($"slag/iron-silicate/{oxide}").Single(d => d.Preferred);
            var line = Catalogue.Slot<OxidationDatum>($"oxidation/{oxide}")
                .Where(d => d.Preferred && d.MetalState == StandardState.Liquid && d.OxideState == slag.OxideState)
                .MinBy(d => d.DistanceKelvin(T))!;
            return (-line.GibbsEnergy(T) / RT) - slag.LnGamma(T) + (nu / 2 * -8 * Math.Log(10));
        }
    }
}
