using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;

namespace PartitionService.Core.Tests.Equilibrium.Assembly;

public sealed class DatumLedgerTests
{
    [Fact]
    public void Only_preferred_rows_are_selected()
    {
        var rows = Vessels.Catalogue.Slot<InfiniteDilutionDatum>("metal/Cu/Pb").ToArray();
        Assert.True(rows.Length > 1 && rows.Count(r => r.Preferred) == 1);
        Assert.True(Ledgers.At(1573).Select<InfiniteDilutionDatum>("metal/Cu/Pb")!.Preferred);
    }

    /// <summary>Liquid PbO from liquid Pb stands in three rows: 1000 to 1166, 1166 to 1580 and 1580 to 2000 K.</summary>
    [Theory]
    [InlineData(600, 1000)]
    [InlineData(1100, 1000)]
    [InlineData(1300, 1166)]
    [InlineData(1700, 1580)]
    [InlineData(2400, 1580)]
    public void The_row_nearest_in_temperature_is_selected(double temperature, double lowerEnd) =>
        Assert.Equal(
            lowerEnd,
            Ledgers.At(temperature)
                .Select<OxidationDatum>("oxidation/PbO", o => o.OxideState == StandardState.Liquid)!.MinimumTemperatureKelvin);

    [Fact]
    public void Nothing_is_selected_where_no_row_fits()
    {
        Assert.Null(Ledgers.At(1573).Select<OxidationDatum>("oxidation/PbO", _ => false));
        Assert.Null(Ledgers.At(1573).Select<OxidationDatum>("oxidation/XxO"));
    }

    [Fact]
    public void A_taken_row_is_remembered_once_with_its_distance_in_temperature()
    {
        var ledger = Ledgers.At(1673);
        var row = ledger.Select<InfiniteDilutionDatum>("metal/Cu/Pb")!;
        ledger.Take(row.Slot, row, "ln gamma0", 1.2, "1", 0.25);
        ledger.Take(row.Slot, row, "ln gamma0", 1.2, "1", 0.25);
        var use = Assert.Single(ledger.Uses["metal/Cu/Pb"]);
        Assert.Equal((row.Key, 1.2, 0.25, row.Access, false), (use.Key, use.Value, use.Sigma, use.Access, use.Overridden));
        Assert.Equal(1673 - row.MaximumTemperatureKelvin, use.ExtrapolatedKelvin);
    }

    [Fact]
    public void Two_rows_of_one_slot_are_both_remembered()
    {
        var ledger = Ledgers.At(1300);
        var liquid = ledger.Select<OxidationDatum>("oxidation/FeO", o => o is { OxideState: StandardState.Liquid })!;
        var solid = ledger.Select<OxidationDatum>("oxidation/FeO", o => o is { OxideState: StandardState.Solid })!;
        ledger.Take("oxidation/FeO", liquid, "a", 1, "J/mol", 1);
        ledger.Take("oxidation/FeO", solid, "b", 2, "J/mol", 1);
        Assert.Equal(2, ledger.Uses["oxidation/FeO"].Count);
    }

    [Fact]
    public void An_override_replaces_sigma_access_and_source()
    {
        var ledger = Ledgers.At(1573, new DatumOverride("metal/Cu/Pb", OverrideKind.LnGamma, 1.7, "own assay"));
        Assert.Equal(1.7, ledger.Override("metal/Cu/Pb"));
        Assert.Null(ledger.Override("metal/Cu/Sn"));
        var row = ledger.Select<InfiniteDilutionDatum>("metal/Cu/Pb")!;
        ledger.Take("metal/Cu/Pb", row, "ln gamma0", 1.7, "1", null);
        var use = Assert.Single(ledger.Uses["metal/Cu/Pb"]);
        Assert.True(use.Overridden);
        Assert.Equal(row.Key, use.Key);
        Assert.Equal(["own assay"], use.SourceIds);
        Assert.Null(use.Access);
        Assert.Null(use.Sigma);
    }

    [Fact]
    public void An_override_of_a_missing_row_carries_the_slot_as_key()
    {
        var ledger = Ledgers.At(1573, new DatumOverride("metal/Pb/W", OverrideKind.LnGamma, 3));
        ledger.Take("metal/Pb/W", null, "ln gamma0", 3, "1", null);
        Assert.Equal("metal/Pb/W", Assert.Single(ledger.Uses["metal/Pb/W"]).Key);
    }

    [Fact]
    public void Oxides_of_overrides_are_listed_by_family()
    {
        var ledger = Ledgers.At(
            1573,
            new DatumOverride("slag/iron-silicate/PbO", OverrideKind.LnGamma, 0),
            new DatumOverride("slag/lead-oxide/ZnO", OverrideKind.LnGamma, 0));
        Assert.Equal(["PbO"], ledger.OverriddenOxides("iron-silicate"));
    }

    [Fact]
    public void Adjust_replaces_a_value_but_never_the_callers()
    {
        var ledger = Ledgers.At(1573, new DatumOverride("metal/Cu/Sn", OverrideKind.LnGamma, -2));
        foreach (var slot in new[] { "metal/Cu/Pb", "metal/Cu/Sn" })
        {
            ledger.Take(slot, ledger.Select<InfiniteDilutionDatum>(slot), "ln gamma0", -2, "1", 0.1);
            ledger.Adjust(slot, 9);
        }

        ledger.Adjust("metal/Cu/Ag", 9);
        Assert.Equal(9, ledger.Uses["metal/Cu/Pb"][0].Value);
        Assert.Equal(-2, ledger.Uses["metal/Cu/Sn"][0].Value);
        Assert.DoesNotContain("metal/Cu/Ag", ledger.Uses.Keys);
    }
}
