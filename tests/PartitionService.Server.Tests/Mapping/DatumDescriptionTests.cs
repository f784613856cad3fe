using PartitionService.Core.Catalogue;
using PartitionService.Server.Mapping;

namespace PartitionService.Server.Tests.Mapping;

public sealed class DatumDescriptionTests
{
    private static readonly ThermochemicalCatalogue Catalogue = CatalogueLoader.LoadEmbedded();

    [Fact]
    public void Every_row_of_the_catalogue_is_described_with_finite_numbers() => Assert.All(Catalogue.Data, datum =>
    {
        var description = DatumDescription.Of(datum);
        Assert.NotEmpty(description.Words);
        Assert.NotEmpty(description.Formula);
        Assert.NotEmpty(description.Unit);
        Assert.True(description.Sigma is null or > 0, datum.Key);
        if (description.Value is { } value)
            Assert.True(double.IsFinite(value(DatumMapping.ValueTemperature(datum, null))), datum.Key);
        Assert.All(description.Elements, element => Assert.True(ElementSymbols.Contains(element), $"{datum.Key}: {element}"));
    });

    [Fact]
    public void Every_kind_of_row_occurs_and_every_kind_of_the_contract_has_one()
    {
        var kinds = Catalogue.Data.Select(d => DatumDescription.Of(d).Kind).Distinct().Order();
        Assert.Equal(Enum.GetValues<Contracts.V1.DatumKind>().Where(k => k != Contracts.V1.DatumKind.Unspecified).Order(), kinds);
    }

    [Fact]
    public void Solute_reads_as_a_metallurgist_says_it()
    {
        var row = Dilution("Cu", "Pb", StandardState.Liquid, 0, 2046);
        var description = DatumDescription.Of(row);
        Assert.Equal("ln gamma0 of Pb in liquid Cu, referred to pure liquid", description.Words);
        Assert.Equal("ln gamma0 = 0 + 2046/T", description.Formula);
        Assert.Equal(2046 / 1473.0, description.Value!(1473), 12);
    }

    [Theory]
    [InlineData(1.5, -200, "1.5 - 200/T")]
    [InlineData(-1.5, 0, "-1.5")]
    [InlineData(0, 0, "0")]
    public void Terms_carry_their_signs(double constant, double inverse, string expected) =>
        Assert.Equal(expected, FormulaText.InverseTemperature(constant, inverse));

    [Theory]
    [InlineData(-186572, 71.583, 0, "-186572 + 71.583 T")]
    [InlineData(-186572, -71.583, 0, "-186572 - 71.583 T")]
    [InlineData(1, 2, -3.5, "1 + 2 T - 3.5 T ln T")]
    [InlineData(0, 0, 0, "0")]
    public void Gibbs_energies_are_written_out(double constant, double linear, double logarithmic, string expected) =>
        Assert.Equal(expected, FormulaText.GibbsEnergy(constant, linear, logarithmic));

    [Fact]
    public void Oxidation_names_both_states()
    {
        var row = Catalogue.Slot<OxidationDatum>("oxidation/AgO0.5").First(r => r.OxideState == StandardState.Solid);
        var description = DatumDescription.Of(row);
        Assert.Equal("Gibbs energy of oxidation of Ag (pure liquid) to AgO0.5 (pure solid), per mol of Ag", description.Words);
        Assert.Equal("dG = -17746 + 31.432 T J/mol", description.Formula);
        Assert.Equal("J/mol", description.Unit);
    }

    [Fact]
    public void Composition_term_of_a_slag_row_is_shown()
    {
        var row = Catalogue.Data.OfType<SlagActivityDatum>().First(d => d.Variable is not null && d.Slope != 0);
        Assert.Matches(@"ln(\(K/| )gamma\)? = .+ [+-] [0-9.E-]+ \(.+ [+-] [0-9.]+\)$", DatumDescription.Of(row).Formula);
    }

    private static InfiniteDilutionDatum Dilution(string solvent, string solute, StandardState state, double constant, double inverse) => new()
    {
        Slot = $"metal/{solvent}/{solute}",
        Key = $"metal/{solvent}/{solute}#1",
        MinimumTemperatureKelvin = 1373,
        MaximumTemperatureKelvin = 1573,
        Preferred = true,
        PreferredReason = "",
        Access = Access.Read,
        SourceIds = ["x"],
        Flags = [],
        Note = "",
        Solvent = solvent,
        Solute = solute,
        SoluteState = state,
        Constant = constant,
        InverseTemperatureKelvin = inverse,
        SigmaLnGamma = 0.2,
    };
}
