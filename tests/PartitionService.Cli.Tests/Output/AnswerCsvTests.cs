using CsvHelper;
using PartitionService.Cli.Output;

namespace PartitionService.Cli.Tests.Output;

public sealed class AnswerCsvTests
{
    [Fact]
    public void Has_the_documented_columns_and_line_ends()
    {
        var text = Render();

        Assert.StartsWith("case,section,subject,quantity,value,unit,text\r\n\"Hollowmere Works, \"\"trial\"\", 1\",vessel,", text, StringComparison.Ordinal);
        Assert.EndsWith("\r\n", text, StringComparison.Ordinal);
        Assert.Equal(text.Count(letter => letter == '\n'), text.Split("\r\n").Length - 1);
    }

    [Theory]
    [InlineData("vessel", "", "temperature_kelvin", "1573.15", "K")]
    [InlineData("element", "Cu", "slag_fraction", "0.014999999", "1")]
    [InlineData("element", "Pd", "partition_ratio_slag_to_metal", "1.2E-08", "1")]
    [InlineData("element", "Pd", "slag_mass_ppm", "2.5E-06", "mass ppm")]
    [InlineData("element", "Au", "slag_mass_ppm", "0", "mass ppm")]
    [InlineData("metal", "", "mass_kg", "990", "kg")]
    [InlineData("metal", "Cu", "mass_percent", "98.5", "mass %")]
    [InlineData("metal_species", "Cu", "activity", "0.98", "1")]
    [InlineData("slag_species", "FeO", "mole_fraction", "0.6", "1")]
    [InlineData("gas", "", "dust_forming_load_gram_per_normal_cubic_metre", "41.2", "g/Nm3")]
    [InlineData("gas_species", "N2", "partial_pressure_atm", "0.97", "atm")]
    [InlineData("redox", "", "log10_po2_atm", "-7", "log10 atm")]
    [InlineData("redox", "", "oxygen_to_supply_normal_cubic_metre", "-8.755", "Nm3")]
    [InlineData("solvent_loss", "Cu", "loss_fraction", "0.015", "1")]
    [InlineData("allowance", "Sn", "efficiency", "0.8", "1")]
    [InlineData("caution", "Zn", "load_gram_per_normal_cubic_metre", "40.5", "g/Nm3")]
    [InlineData("datum", "metal/Cu/Pb#1", "sigma", "0.25", "1")]
    public void Has_the_record(string section, string subject, string quantity, string value, string unit) =>
        Assert.Contains(Records(Render()), record => record.Skip(1).Take(5).SequenceEqual([section, subject, quantity, value, unit]));

    [Fact]
    public void Unset_quantities_have_no_record() =>
        Assert.DoesNotContain(Records(Render()), record => record[2] == "Au" && record[3] == "partition_ratio_slag_to_metal");

    [Fact]
    public void Remarks_keep_their_words()
    {
        var remark = Assert.Single(Records(Render()), record => record[3] == "datum-missing");

        Assert.StartsWith("SERIOUS: No datum places tellurium in any phase", remark[6], StringComparison.Ordinal);
        Assert.Equal("Te", remark[2]);
    }

    [Fact]
    public void Is_the_same_under_a_culture_with_decimal_commas() => Assert.Equal(Render(), CommaCulture.Run(Render));

    private static string Render()
    {
        using var output = new StringWriter();
        AnswerCsv.Write(output, HandMadeAnswer.Create());
        return output.ToString();
    }

    private static List<string[]> Records(string text)
    {
        using var reader = CsvReader.FromText(text, new CsvReaderOptions { Separator = ',', MalformedData = CsvMalformedDataHandling.Throw });
        reader.ReadHeader();
        var records = new List<string[]>();
        while (reader.Read())
            records.Add([.. Enumerable.Range(0, reader.FieldCount).Select(reader.GetString)]);
        Assert.All(records, record => Assert.Equal(7, record.Length));
        return records;
    }
}
