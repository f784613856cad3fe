using System.Globalization;
using CsCheck;
using PartitionService.Core.Catalogue;

namespace PartitionService.Core.Tests.Catalogue;

public sealed class ChemicalFormulaTests
{
    [Theory]
    [InlineData("Cu", "Cu:1")]
    [InlineData("As4O6", "As:4;O:6")]
    [InlineData("AsO1.5", "As:1;O:1.5")]
    [InlineData("FeO1.056", "Fe:1;O:1.056")]
    [InlineData("Al2(SO4)3", "Al:2;S:3;O:12")]
    [InlineData("Ca5(PO4)3F", "Ca:5;P:3;O:12;F:1")]
    [InlineData("K4[Fe(CN)6]", "K:4;Fe:1;C:6;N:6")]
    [InlineData("CO", "C:1;O:1")]
    [InlineData("Co", "Co:1")]
    [InlineData("CaOSiO2", "Ca:1;O:3;Si:1")]
    [InlineData("((((((H))))))2", "H:2")]
    public void Counts_the_atoms_in_order_of_appearance(string text, string expected)
    {
        var formula = ChemicalFormula.Parse(text);
        var counts = formula.Atoms.Select(a => string.Create(CultureInfo.InvariantCulture, $"{a.Key}:{a.Value}"));
        Assert.Equal(expected, string.Join(';', counts));
    }

    [Theory]
    [InlineData("", "position 1: the formula is empty")]
    [InlineData("Xx2", "position 1: 'Xx' is not an element symbol")]
    [InlineData("CuXx", "position 3: 'Xx' is not an element symbol")]
    [InlineData("cu", "position 1: 'c' cannot start an element symbol or a group")]
    [InlineData("2Cu", "position 1: '2' cannot start an element symbol or a group")]
    [InlineData("CuO0", "position 4: count 0 is outside 0 (excluded) to 1000")]
    [InlineData("CuO0.0", "position 4: count 0.0 is outside 0 (excluded) to 1000")]
    [InlineData("Cu1001", "position 3: count 1001 is outside 0 (excluded) to 1000")]
    [InlineData("(Cu600)2", "position 1: Cu adds up to more than 1000 or to nothing")]
    [InlineData("Cu1.2.3", "position 3: '1.2.3' is not a count")]
    [InlineData("Cu.5", "position 3: '.5' is not a count")]
    [InlineData("Cu1.", "position 3: '1.' is not a count")]
    [InlineData("(Cu", "position 1: the bracket opened here is not closed by ')'")]
    [InlineData("(Cu]", "position 4: ']' stands where ')' is expected")]
    [InlineData("Cu)", "position 3: ')' closes no bracket")]
    [InlineData("Cu()", "position 4: the brackets hold nothing")]
    [InlineData("(((((((H)))))))", "position 7: more than 6 nested brackets")]
    [InlineData("Cu SO4", "position 3: ' ' cannot start an element symbol or a group")]
    [InlineData("Cu+2", "position 3: '+' cannot start an element symbol or a group")]
    [InlineData("CuSO4*5H2O", "position 6: '*' cannot start an element symbol or a group")]
    public void Says_where_and_why_a_text_is_no_formula(string text, string expected)
    {
        Assert.False(ChemicalFormula.TryParse(text, out var formula, out var error));
        Assert.Null(formula);
        Assert.Equal(expected, error);
    }

    [Fact]
    public void Refuses_null_and_overlong_text()
    {
        Assert.False(ChemicalFormula.TryParse(null, out _, out _));
        Assert.True(ChemicalFormula.TryParse(new string('H', 100), out _, out _));
        Assert.False(ChemicalFormula.TryParse(new string('H', 101), out _, out var error));
        Assert.Equal("position 101: the formula has 101 characters, at most 100 are accepted", error);
    }

    [Fact]
    public void Throwing_form_repeats_text_position_and_reason()
    {
        var refusal = Assert.Throws<FormatException>(() => ChemicalFormula.Parse("Qq"));
        Assert.Equal("'Qq': position 1: 'Qq' is not an element symbol", refusal.Message);
    }

    [Fact]
    public void There_are_118_different_symbols() => Assert.Equal(118, ElementSymbols.InOrder.Distinct().Count());

    [Fact]
    public void Molar_mass_adds_up_the_atomic_masses_and_names_a_missing_element()
    {
        // Masses as round numbers on purpose: the sum is what is tested.
        Dictionary<string, Element> elements = new() { ["Al"] = Mass("Al", 27), ["O"] = Mass("O", 16), ["S"] = Mass("S", 32) };
        Assert.Equal((2 * 27) + (3 * 32) + (12 * 16), ChemicalFormula.Parse("Al2(SO4)3").MolarMass(elements));
        var refusal = Assert.Throws<KeyNotFoundException>(() => ChemicalFormula.Parse("CuO").MolarMass(elements));
        Assert.Contains("Cu", refusal.Message, StringComparison.Ordinal);

        static Element Mass(string symbol, double mass) => new(symbol, mass, 1, 1, 1, 1, Access.Read, ["none"], "");
    }

    [Fact]
    public void What_is_written_from_counts_is_read_back()
    {
        var symbol = Gen.Int[0, ElementSymbols.InOrder.Count - 1].Select(i => ElementSymbols.InOrder[i]);
        var entry = Gen.Select(symbol, Gen.Int[1, 99_999].Select(i => i / 1000.0));
        entry.Array[1, 8].Where(a => a.Select(e => e.Item1).Distinct().Count() == a.Length).Sample(entries =>
        {
            var text = string.Concat(entries.Select(e => string.Create(CultureInfo.InvariantCulture, $"{e.Item1}{e.Item2}")));
            var formula = ChemicalFormula.Parse(text);
            Assert.Equal(entries.Select(e => (e.Item1, e.Item2)), formula.Atoms.Select(a => (a.Key, a.Value)));
            Assert.Equal(text, formula.ToString());
        });
    }

    [Fact]
    public void Random_text_never_throws() =>
        Gen.Char["CuOHx()[]0123. "].Array[0, 30].Sample(characters =>
            ChemicalFormula.TryParse(new string(characters), out _, out var error) == (error.Length == 0));
}
