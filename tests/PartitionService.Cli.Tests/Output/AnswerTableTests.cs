using PartitionService.Cli.Output;
using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Tests.Output;

public sealed class AnswerTableTests
{
    [Fact]
    public void Heads_the_page_with_the_state_of_the_vessel()
    {
        var lines = Lines(HandMadeAnswer.Create());

        Assert.Equal("Hollowmere Works, \"trial\", 1", lines[0]);
        Assert.Equal("1573.15 K (1300 degC), 1.00 atm | solvent Cu | slag iron-silicate | catalogue 0123456789ab", lines[1]);
    }

    [Fact]
    public void Shows_traces_nothing_and_all_apart()
    {
        var text = Render(HandMadeAnswer.Create());

        Assert.Matches(@"(?m)^Cu +1000 +98\.500 +1\.500 +<0\.001 +0 +0 ", text);
        Assert.Matches(@"(?m)^Pd +0\.2500 +>99\.999 +<0\.001 +0 +0 +0 .* 250 +ppm +2\.50e-6 +ppm +1\.20e-8$", text);
        Assert.Matches(@"(?m)^Au +0\.5000 +100 +0 +0 +0 +0 .* 500 +ppm +0 +ppm +-$", text);
        Assert.Matches(@"(?m)^Te +0\.1000 +0 +0 +0 +0 +100 +\?{8,20} +- +- +-$", text);
    }

    [Theory]
    [InlineData("Metal        990.0 kg, mol fractions Cu 0.990")]
    [InlineData("Slag         190.0 kg, cation fractions FeO 0.600")]
    [InlineData("Gas          29.10 Nm3, 38.00 kg; by volume N2 97.000 %, Ag <0.001 %; 41.2 g/Nm3 of elements that turn into fume")]
    [InlineData("Dust         0.02000 kg of the charge leave unreacted")]
    [InlineData("Solvent lost 1.500 % of 1000 kg Cu: 12.00 kg dissolved in the slag, 3.000 kg as droplets in the slag, 1.000e-6 kg in")]
    [InlineData("Oxygen       log10 pO2/atm -7.00, -210.8 kJ/mol O2, CO2/CO 22.1, H2O/H2 11.0, 750 ppm O dissolved in the metal, 12.50 kg")]
    [InlineData("             (8.755 Nm3) O2 to remove")]
    [InlineData("Allowances   0.500 % metal droplets in the slag (0.9500 kg, typical value entrainment/iron-silicate); 1.00 % of the")]
    [InlineData("SERIOUS      No datum places tellurium in any phase of this vessel, so that its share is left open and the figures of")]
    [InlineData("             the other elements take no account of it.")]
    [InlineData("Note         Some numbers are recalled.")]
    [InlineData("Zn           Zinc fume; local codes and licensed practice decide. (40.5 g/Nm3 in the gas)")]
    [InlineData("Data         3 rows: 1 computed from seen numbers, 1 recalled, not checked, 1 given by the case; weakest: recalled, not")]
    [InlineData("             checked. All of them: add --data.")]
    public void Has_the_line(string expected) => Assert.Contains(Lines(HandMadeAnswer.Create(), 120), line => line.StartsWith(expected, StringComparison.Ordinal));

    [Fact]
    public void Lists_the_data_on_demand()
    {
        var text = Render(HandMadeAnswer.Create(), 160, showData: true);

        Assert.Matches(@"metal/Cu/Pb#1 +1\.300 +0\.250 +1 +ln gamma0 of Pb in liquid Cu; computed from seen numbers; a-1974", text);
        Assert.Matches(@"oxidation/PbO#1 +-7\.500e4 +- +J/mol +Gibbs energy; recalled, not checked; 12 K outside its range", text);
        Assert.Matches(@"slag/iron-silicate/SnO2 +0\.5000 +- +1 +ln gamma; given by the case; own assays", text);
        Assert.DoesNotContain("--data", text, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(100)]
    [InlineData(110)]
    [InlineData(120)]
    public void Fits_the_page(int width) => Assert.All(Lines(HandMadeAnswer.Create(), width, showData: true), line => Assert.InRange(line.Length, 0, width));

    [Fact]
    public void Always_cautions()
    {
        var text = Render(new ChargeAnswer());

        Assert.Contains("local codes and licensed practice decide", text, StringComparison.Ordinal);
        Assert.Contains("no slag allowed", text, StringComparison.Ordinal);
    }

    [Fact]
    public void Is_the_same_under_a_culture_with_decimal_commas() =>
        Assert.Equal(Render(HandMadeAnswer.Create(), showData: true), CommaCulture.Run(() => Render(HandMadeAnswer.Create(), showData: true)));

    [Fact]
    public void Never_steers_the_terminal()
    {
        var answer = HandMadeAnswer.Create();
        answer.Name = "\u001b[31mred";
        answer.Remarks[0].Text = "a\u001b]0;title\u0007b";
        answer.Elements[0].Element = "C\u001bu";
        answer.Cautions[0].Substance = "Z\u001bn";
        answer.SlagFamily = "\u001b[2J";
        answer.DataUsed[0].Key = "\u001b[1m";

        Assert.DoesNotContain(Render(answer, showData: true), letter => char.IsControl(letter) && letter is not ('\r' or '\n'));
    }

    private static string[] Lines(ChargeAnswer answer, int width = 110, bool showData = false) => Render(answer, width, showData).Split(Environment.NewLine);

    private static string Render(ChargeAnswer answer, int width = 110, bool showData = false)
    {
        using var output = new StringWriter();
        AnswerTable.Write(output, answer, new Page(width, SplitBar.Letters, showData));
        return output.ToString();
    }
}
