using CsCheck;
using PartitionService.Core.Equilibrium;
using PartitionService.Core.Equilibrium.Assembly;
using PartitionService.Core.Equilibrium.Charging;

namespace PartitionService.Core.Tests.Equilibrium.Assembly;

public sealed class ChargeAccountTests
{
    private const double Exact = 1e-9;

    [Fact]
    public void Without_allowances_everything_reacts()
    {
        var account = Split([new("Cu", 63.546), new("PbO", 223.199)], new());
        Assert.Equal(1000, account.Reacting["Cu"], Exact);
        Assert.Equal(1000, account.Reacting["O"], Exact);
        Assert.Empty(account.Dust.Elements);
        Assert.All(account.Bypass.Values, ledger => Assert.Empty(ledger.Elements));
    }

    [Fact]
    public void Dust_takes_its_share_of_solids_and_nothing_of_gases()
    {
        var account = Split(
            [new("Cu", 63.546), new("PbO", 223.199), new("O2", 1, ChargeUnit.NormalCubicMetre)], new() { MechanicalDustMassFraction = 0.1 });
        Assert.Equal(100, account.Dust["Cu"], Exact);
        Assert.Equal(100, account.Dust["O"], Exact);
        Assert.Equal(900, account.Reacting["Cu"], Exact);
        Assert.Equal(900 + (2 / 0.02241396954), account.Reacting["O"], 1e-6);
    }

    [Fact]
    public void Metal_that_stays_out_stays_with_the_metal()
    {
        var account = Split([new("Zn", 65.38)], new() { StageEfficiencies = [new("Zn", 0.3)] });
        Assert.Equal(300, account.Reacting["Zn"], Exact);
        Assert.Equal(700, account.Bypass[ChargeOrigin.Metal]["Zn"], Exact);
    }

    [Fact]
    public void Oxide_that_stays_out_takes_its_oxygen_along()
    {
        var account = Split([new("PbO", 223.199), new("ZnO", 81.379)], new() { StageEfficiencies = [new("Pb", 0.25)] });
        Assert.Equal(250, account.Reacting["Pb"], Exact);
        Assert.Equal(750, account.Bypass[ChargeOrigin.Slag]["Pb"], Exact);
        Assert.Equal(750, account.Bypass[ChargeOrigin.Slag]["O"], Exact);
        Assert.Equal(250 + 1000, account.Reacting["O"], Exact);
    }

    /// <summary>Fe2SiO4: silicon takes 2 of the 4 oxygens (SiO2), iron the other 2 (FeO), by the usual oxides.</summary>
    [Fact]
    public void Oxygen_of_a_mixed_oxide_follows_the_usual_oxides()
    {
        var account = Split([new("Fe2SiO4", 203.771)], new() { StageEfficiencies = [new("Si", 0)] });
        Assert.Equal(1000, account.Bypass[ChargeOrigin.Slag]["Si"], 0.01);
        Assert.Equal(2000, account.Bypass[ChargeOrigin.Slag]["O"], 0.02);
        Assert.Equal(2000, account.Reacting["O"], 0.02);
        Assert.Equal(2000, account.Reacting["Fe"], 0.02);
    }

    [Fact]
    public void Sulfur_has_an_efficiency_of_its_own()
    {
        var account = Split([new("FeS", 87.905)], new() { StageEfficiencies = [new("S", 0.4)] });
        Assert.Equal(1000, account.Reacting["Fe"], 0.1);
        Assert.Equal(400, account.Reacting["S"], 0.1);
        Assert.Equal(600, account.Bypass[ChargeOrigin.Metal]["S"], 0.1);
    }

    [Fact]
    public void Gases_always_take_part()
    {
        var account = Split([new("SO2", 64.058)], new() { StageEfficiencies = [new("S", 0.5)] });
        Assert.Empty(account.Bypass[ChargeOrigin.Gas].Elements);
        Assert.Equal(1000, account.Reacting["S"], 0.1);
        Assert.Equal(2000, account.Reacting["O"], 0.1);
    }

    [Fact]
    public void Oxides_that_the_family_has_no_datum_for_are_an_inert_part_of_the_slag()
    {
        var account = Split([new("K2O", 94.195), new("PbO", 223.199)], new(), e => e != "K");
        Assert.Equal(2000, account.Inert["K"], 0.1);
        Assert.Equal(1000, account.Inert["O"], 0.1);
        Assert.Equal(2000, account.InertCations, 0.1);
        Assert.Equal(0, account.Reacting["K"]);
        Assert.Equal(1000, account.Reacting["O"], Exact);
    }

    [Fact]
    public void Fluorides_are_inert_with_their_fluorine()
    {
        var account = Split([new("CaF2", 78.074)], new());
        Assert.Equal(1000, account.Inert["Ca"], 0.1);
        Assert.Equal(2000, account.Inert["F"], 0.1);
        Assert.Equal(1000, account.InertCations, 0.1);
        Assert.DoesNotContain("F", account.Reacting.Elements);
    }

    [Fact]
    public void Without_a_slag_nothing_is_inert()
    {
        var account = Split([new("K2O", 94.195)], new(), _ => false, slagAllowed: false);
        Assert.Empty(account.Inert.Elements);
        Assert.Equal(2000, account.Reacting["K"], 0.1);
    }

    [Fact]
    public void Carbonate_burns_off_its_carbon_even_where_the_metal_is_inert()
    {
        var account = Split([new("K2CO3", 138.205)], new(), _ => false);
        Assert.Equal(1000, account.Reacting["C"], 0.1);
        Assert.Equal(2000, account.Inert["K"], 0.1);

        // K2O CO2: potassium keeps 1 of 3 oxygens by its usual oxide, carbon takes 2.
        Assert.Equal(1000, account.Inert["O"], 0.1);
        Assert.Equal(2000, account.Reacting["O"], 0.1);
    }

    /// <summary>Fe2O3 is all ferric, Fe3O4 two thirds, FeO not at all.</summary>
    [Theory]
    [InlineData("Fe2O3", 1)]
    [InlineData("Fe3O4", 0.6667)]
    [InlineData("FeO", 0)]
    public void Ferric_iron_is_noted(string oxide, double share)
    {
        var account = Split([new(oxide, 100)], new());
        Assert.Equal(share, account.FerricIron / account.SlagCharge["Fe"], 4);
    }

    [Fact]
    public void Origins_are_noted()
    {
        var account = Split([new("Cu", 63.546), new("PbO", 223.199), new("N2", 28.014), new("C", 12.011)], new());
        Assert.Equal(["Cu"], account.Metallic.Elements);
        Assert.Equal(["O", "Pb"], account.SlagCharge.Elements);
        Assert.Equal(["N"], account.GasCharge.Elements);
    }

    /// <summary>Whatever the allowances, every atom that goes in is in exactly one ledger.</summary>
    [Fact]
    public void Every_atom_is_accounted_for()
    {
        string[] formulas = ["Cu", "PbO", "Fe2SiO4", "CaF2", "FeS", "CaCO3", "CH4", "C", "SO2", "Na3AlF6", "NaCl", "K2O", "C2H3Cl"];
        string[] partial = ["Pb", "S", "Cu", "Si", "Ca", "C", "Cl"];
        var gen = Gen.Select(
            Gen.Select(Gen.Int[0, formulas.Length - 1].Select(i => formulas[i]), Gen.Double[0.001, 1000]).Array[1, 12],
            Gen.Double[0, 0.5],
            Gen.Dictionary(Gen.Int[0, 6].Select(i => partial[i]), Gen.Double[0, 1])[0, 5],
            Gen.Bool);
        gen.Sample((charge, dust, efficiencies, slag) =>
        {
            var account = Split(
                [.. charge.Select(c => new ChargeItem(c.Item1, c.Item2))],
                new()
                {
                    MechanicalDustMassFraction = dust,
                    StageEfficiencies = [.. efficiencies.Select(e => new StageEfficiency(e.Key, e.Value))],
                },
                e => e is not ("K" or "Na"),
                slag);
            foreach (var element in account.Input.Elements)
            {
                var placed = account.Reacting[element] + account.Dust[element] + account.Inert[element]
                    + account.Bypass.Values.Sum(ledger => ledger[element]);
                Assert.InRange(placed / account.Input[element], 1 - 1e-12, 1 + 1e-12);
            }
        });
    }

    private static ChargeAccount Split(
        ChargeItem[] charge, PracticeAllowances allowances, Func<string, bool>? hasSlagSpecies = null, bool slagAllowed = true) =>
        ChargeAccount.Split(
            charge.Select(item => ChargeReader.Read(item, Vessels.Catalogue.Elements)),
            allowances,
            slagAllowed,
            hasSlagSpecies ?? (_ => true),
            SlagIndex.For(Vessels.Catalogue).UsualOxygen);
}
