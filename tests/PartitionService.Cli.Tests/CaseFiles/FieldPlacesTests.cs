using PartitionService.Cli.CaseFiles;

namespace PartitionService.Cli.Tests.CaseFiles;

public sealed class FieldPlacesTests
{
    private const string Text =
        """
        temperature_celsius: 20
        charge:
          - {formula: Cu, mass_kg: 1}
          - formula: Pb
            mass_kg: -1
        slag: {family: fog}
        oxygen: {metal_oxide_pair: {oxide: FeO}}
        """;

    [Theory]
    [InlineData("vessel_case.temperature_kelvin", "x.yaml:1:22: temperature_celsius: is bad")]
    [InlineData("vessel_case.charge[1].mass_kg", "x.yaml:5:14: charge, item 2, mass_kg: is bad")]
    [InlineData("vessel_case.charge[1]", "x.yaml:4:5: charge, item 2: is bad")]
    [InlineData("vessel_case.charge", "x.yaml:3:3: charge: is bad")]
    [InlineData("vessel_case.slag.family", "x.yaml:6:16: slag, family: is bad")]
    [InlineData("vessel_case.oxygen.metal_oxide_pair.oxide", "x.yaml:7:36: oxygen, metal_oxide_pair, oxide: is bad")]
    public void Points_at_the_line_of_the_field(string path, string expected) => Assert.Equal(expected, Translate(path));

    [Theory]
    [InlineData("vessel_case.oxygen.metal_oxide_pair.oxide_activity", "x.yaml:7:28: oxygen, metal_oxide_pair: oxide_activity: is bad")]
    [InlineData("vessel_case.charge[7].formula", "x.yaml:3:3: charge: [7].formula: is bad")]
    [InlineData("vessel_case.pressure_atm", "x.yaml:1:1: pressure_atm: is bad")]
    [InlineData("something_else", "x.yaml: something_else: is bad")]
    public void Falls_back_to_what_is_around_a_field_that_the_file_lacks(string path, string expected) => Assert.Equal(expected, Translate(path));

    private static string Translate(string path) => CaseFileReader.Read("x.yaml", Text).Places.Translate(path, "is bad").Describe("x.yaml");
}
