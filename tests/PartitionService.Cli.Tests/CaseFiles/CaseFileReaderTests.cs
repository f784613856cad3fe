using System.Text;
using PartitionService.Cli.CaseFiles;
using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Tests.CaseFiles;

public sealed class CaseFileReaderTests
{
    private const string Everything =
        """
        name: Furnace 2
        temperature_celsius: 1300
        pressure_atm: 0.9
        charge:
          - {formula: Cu, mass_kg: 1000}
          - formula: air
            volume_normal_cubic_metre: 3e1
        metal: {solvent: Cu}
        slag: {family: iron-silicate}
        gas: {}
        oxygen: {metal_oxide_pair: {oxide: FeO, oxide_activity: 0.3, metal_activity: 0.9}}
        allowances:
          metal_in_slag: {mass_percent: 2}
          slag_in_metal_mass_percent: 0.1
          mechanical_dust_mass_fraction: 0.01
          stage_efficiencies: [{element: Sn, efficiency: 0.8}]
        overrides:
          - {slot: metal/Cu/Pb, ln_gamma: 1.1, source: "own assays"}
          - {slot: oxidation/PbO, gibbs_energy_joule_per_mol: -75e3}
          - {slot: interaction/Cu/O/Sn, epsilon: -4.5}
        """;

    [Fact]
    public void Reads_every_key()
    {
        var expected = new VesselCase
        {
            Name = "Furnace 2",
            TemperatureKelvin = 1573.15,
            PressureAtm = 0.9,
            Charge = { new ChargeItem { Formula = "Cu", MassKg = 1000 }, new ChargeItem { Formula = "air", VolumeNormalCubicMetre = 30 } },
            Metal = new MetalBath { Solvent = "Cu" },
            Slag = new SlagBath { Family = "iron-silicate" },
            Gas = new GasAtmosphere(),
            Oxygen = new OxygenStatement { MetalOxidePair = new MetalOxidePair { Oxide = "FeO", OxideActivity = 0.3, MetalActivity = 0.9 } },
            Allowances = new PracticeAllowances
            {
                MetalInSlag = new EntrainedMetal { MassPercent = 2 },
                SlagInMetalMassPercent = 0.1,
                MechanicalDustMassFraction = 0.01,
                StageEfficiencies = { new StageEfficiency { Element = "Sn", Efficiency = 0.8 } },
            },
            Overrides =
            {
                new DatumOverride { Slot = "metal/Cu/Pb", LnGamma = 1.1, Source = "own assays" },
                new DatumOverride { Slot = "oxidation/PbO", GibbsEnergyJoulePerMol = -75000 },
                new DatumOverride { Slot = "interaction/Cu/O/Sn", Epsilon = -4.5 },
            },
        };

        Assert.Equal(expected, CaseFileReader.Read("x.yaml", Everything).Case);
    }

    [Fact]
    public void Reads_the_same_under_a_culture_with_decimal_commas() =>
        Assert.Equal(1573.15, CommaCulture.Run(() => CaseFileReader.Read("x.yaml", Everything).Case.TemperatureKelvin));

    [Fact]
    public void Reads_every_statement_about_oxygen()
    {
        Assert.Equal(new OxygenStatement { Log10Po2Atm = -7 }, Oxygen("{log10_po2_atm: -7}"));
        Assert.Equal(new OxygenStatement { Co2ToCoRatio = 3 }, Oxygen("{co2_to_co_ratio: 3}"));
        Assert.Equal(new OxygenStatement { H2OToH2Ratio = 2 }, Oxygen("{h2o_to_h2_ratio: 2}"));
        Assert.Equal(new OxygenStatement { DissolvedOxygenMassPpm = 600 }, Oxygen("{dissolved_oxygen_mass_ppm: 600}"));
        Assert.Equal(new OxygenStatement { ClosedBalance = new ClosedOxygenBalance() }, Oxygen("{closed_balance: {}}"));
        Assert.Equal(new OxygenStatement { ClosedBalance = new ClosedOxygenBalance() }, Oxygen("closed_balance"));
    }

    [Theory]
    [InlineData("gas: allowed", true)]
    [InlineData("gas: {}", true)]
    [InlineData("gas: none", false)]
    [InlineData("", false)]
    public void Reads_whether_a_gas_may_form(string line, bool expected) =>
        Assert.Equal(expected, CaseFileReader.Read("x.yaml", Minimal() + line).Case.Gas is not null);

    [Fact]
    public void Reads_both_words_for_typical_droplets()
    {
        var typical = new EntrainedMetal { FamilyTypical = true };

        Assert.Equal(typical, CaseFileReader.Read("x", Minimal() + "allowances: {metal_in_slag: typical}").Case.Allowances.MetalInSlag);
        Assert.Equal(typical, CaseFileReader.Read("x", Minimal() + "allowances: {metal_in_slag: {family_typical: true}}").Case.Allowances.MetalInSlag);
    }

    [Fact]
    public void Nitric_oxide_is_not_a_refusal() =>
        Assert.Equal("NO", CaseFileReader.Read("x", Minimal("- {formula: NO, mass_kg: 1}")).Case.Charge.Single().Formula);

    [Theory]
    [InlineData("temprature_kelvin: 1", "4:1: Unknown key \"temprature_kelvin\"; did you mean \"temperature_kelvin\"?")]
    [InlineData("colour: red", "4:1: Unknown key \"colour\"; known keys: name, temperature_kelvin, temperature_celsius, pressure_atm, charge, metal, slag, gas, oxygen, allowances, overrides.")]
    [InlineData("temperature_celsius: 1300", "4:1: temperature_celsius: Only one of these keys may stand here: temperature_kelvin, temperature_celsius.")]
    [InlineData("oxygen: {closed_balance: {}}", "4:1: oxygen: The key stands twice; it was given on line 3 before.")]
    [InlineData("pressure_atm: 1,5", "4:15: pressure_atm: \"1,5\" is not a number; write the decimal mark as a point and leave out group marks, for example 1.5.")]
    [InlineData("pressure_atm: .nan", "4:15: pressure_atm: \".nan\" is not a finite number.")]
    [InlineData("pressure_atm: NaN", "4:15: pressure_atm: \"NaN\" is not a finite number.")]
    [InlineData("pressure_atm: -.inf", "4:15: pressure_atm: \"-.inf\" is not a finite number.")]
    [InlineData("pressure_atm: 1e999", "4:15: pressure_atm: \"1e999\" is not a finite number.")]
    [InlineData("pressure_atm: high", "4:15: pressure_atm: \"high\" is not a number.")]
    [InlineData("pressure_atm: \"1\"", "4:15: pressure_atm: \"1\" is text; write the number without quotation marks.")]
    [InlineData("pressure_atm: [1]", "4:15: pressure_atm: A single value is expected here.")]
    [InlineData("pressure_atm:", "4:1: pressure_atm: A value is missing.")]
    [InlineData("metal: Cu", "4:8: metal: Keys with values are expected here: solvent.")]
    [InlineData("slag: {}", "4:7: slag: The key \"family\" is missing.")]
    [InlineData("slag: {famly: x}", "4:8: slag: Unknown key \"famly\"; did you mean \"family\"?|4:7: slag: The key \"family\" is missing.")]
    [InlineData("gas: {volume: 1}", "4:7: gas: Unknown key \"volume\"; no keys are known here, write {}.")]
    [InlineData("gas: maybe", "4:6: gas: This takes no numbers; write {} as its value.")]
    [InlineData("name: \"a\\nb\"", "4:7: name: The text must be one line without control characters.")]
    [InlineData("name: \"\\e[31mred\"", "4:7: name: The text must be one line without control characters.")]
    [InlineData("allowances: {metal_in_slag: {}}", "4:29: allowances, metal_in_slag: One of these keys is missing: mass_percent, family_typical.")]
    [InlineData("allowances: {metal_in_slag: {family_typical: yes}}", "4:46: allowances, metal_in_slag, family_typical: \"yes\" is neither true nor false.")]
    [InlineData("allowances: {stage_efficiencies: [{element: Sn}]}", "4:35: allowances, stage_efficiencies, item 1: The key \"efficiency\" is missing.")]
    [InlineData("overrides: {slot: x}", "4:12: overrides: A list is expected here, each item after a dash.")]
    [InlineData("overrides: [{slot: metal/Cu/Pb}]", "4:13: overrides, item 1: One of these keys is missing: ln_gamma, gibbs_energy_joule_per_mol, epsilon.")]
    [InlineData("overrides: [{ln_gamma: 1, epsilon: 2, slot: x}]", "4:27: overrides, item 1, epsilon: Only one of these keys may stand here: ln_gamma, epsilon.")]
    public void Names_line_column_and_key(string line, string expected) =>
        Assert.Equal(expected.Split('|').Order(), Errors(Minimal() + line).Order());

    [Theory]
    [InlineData("- {formula: Cu}", "2:4: charge, item 1: One of these keys is missing: mass_kg, volume_normal_cubic_metre.")]
    [InlineData("- {mass_kg: 1}", "2:4: charge, item 1: The key \"formula\" is missing.")]
    [InlineData("- {formula: Cu, mass_kg: 1, volume_normal_cubic_metre: 1}", "2:30: charge, item 1, volume_normal_cubic_metre: Only one of these keys may stand here: mass_kg, volume_normal_cubic_metre.")]
    [InlineData("- {formula: Cu, mass_kg: 1}\n - Pb", "3:4: charge, item 2: Keys with values are expected here: formula, mass_kg, volume_normal_cubic_metre.")]
    public void Names_the_item_of_the_charge(string items, string expected) => Assert.Equal([expected], Errors(Minimal(items)));

    [Theory]
    [InlineData("closed_balanse", "3:9: oxygen: Keys with values are expected here: log10_po2_atm, co2_to_co_ratio, h2o_to_h2_ratio, metal_oxide_pair, dissolved_oxygen_mass_ppm, closed_balance.")]
    [InlineData("{}", "3:9: oxygen: One of these keys is missing: log10_po2_atm, co2_to_co_ratio, h2o_to_h2_ratio, metal_oxide_pair, dissolved_oxygen_mass_ppm, closed_balance.")]
    [InlineData("{log10_po2_atm: -7, co2_to_co_ratio: 3}", "3:29: oxygen, co2_to_co_ratio: Only one of these keys may stand here: log10_po2_atm, co2_to_co_ratio.")]
    [InlineData("{metal_oxide_pair: {oxide_activity: 1}}", "3:28: oxygen, metal_oxide_pair: The key \"oxide\" is missing.")]
    [InlineData("{closed_balance: true}", "3:26: oxygen, closed_balance: This takes no numbers; write {} as its value.")]
    public void Names_what_is_wrong_with_oxygen(string oxygen, string expected) =>
        Assert.Equal([expected], Errors($"temperature_kelvin: 1500\ncharge: [{{formula: Cu, mass_kg: 1}}]\noxygen: {oxygen}\n"));

    [Fact]
    public void Lists_every_error_in_the_order_of_the_file()
    {
        string[] expected =
        [
            "1:1: The key \"oxygen\" is missing.",
            "1:1: One of these keys is missing: temperature_kelvin, temperature_celsius.",
            "1:1: Unknown key \"nam\"; did you mean \"name\"?",
            "3:30: charge, item 1, mass_kg: \"x\" is not a number.",
            "4:4: charge, item 2: One of these keys is missing: mass_kg, volume_normal_cubic_metre.",
        ];

        Assert.Equal(expected.Order(), Errors("nam: x\ncharge:\n - {formula: Cu,    mass_kg: x}\n - {formula: Pb}\n").Order());
        Assert.Equal([1, 1, 1, 3, 4], Faults("nam: x\ncharge:\n - {formula: Cu,    mass_kg: x}\n - {formula: Pb}\n").Select(error => error.Line));
    }

    [Theory]
    [InlineData("", "1:1: The file holds no case.")]
    [InlineData("# only a comment\n", "1:1: The file holds no case.")]
    [InlineData("just words", "1:1: Keys with values are expected here: name, temperature_kelvin, temperature_celsius, pressure_atm, charge, metal, slag, gas, oxygen, allowances, overrides.")]
    [InlineData("name: &a x\n", "1:7: Anchors (&name) are not allowed; write the value where it is used.")]
    [InlineData("name: *a\n", "1:7: References (*name) are not allowed; write the value itself.")]
    [InlineData("name: !!binary x\n", "1:7: Type tags (!name) are not allowed; write the plain value.")]
    [InlineData("name: x\n---\nname: y\n", "2:1: A file holds one case; a second document starts here.")]
    [InlineData("? [a, b]\n: c\n", "1:3: A key must be a single word.")]
    public void Refuses_what_is_no_case_file(string text, string expected) => Assert.Equal([expected], Errors(text));

    [Fact]
    public void Tells_where_the_text_stops_being_yaml() =>
        Assert.StartsWith("2:10: This is not valid YAML: ", Assert.Single(Errors("name: x\ncharge: [}\n")), StringComparison.Ordinal);

    [Theory]
    [InlineData(100_000)]
    [InlineData(20)]
    public void Refuses_deep_nesting(int levels) =>
        Assert.Equal(["1:18: Nested more than 10 levels deep."], Errors("charge: " + new string('[', levels) + new string(']', levels)));

    [Fact]
    public async Task Refuses_large_files()
    {
        using var file = new TemporaryFile(Encoding.UTF8.GetBytes(Minimal() + "#" + new string('x', CaseFileReader.LargestFileBytes)));

        Assert.Equal([$"{file.Path}: The file is larger than 1 MiB, the most that a case file may be."], await FileErrorsAsync(file.Path));
    }

    [Fact]
    public async Task Reads_a_file_of_just_the_largest_size()
    {
        var start = Minimal() + "#";
        using var file = new TemporaryFile(Encoding.UTF8.GetBytes(start.PadRight(CaseFileReader.LargestFileBytes, 'x')));

        Assert.Equal(1500, (await CaseFileReader.ReadFileAsync(file.Path, default)).Case.TemperatureKelvin);
    }

    [Fact]
    public async Task Refuses_text_of_another_encoding()
    {
        using var file = new TemporaryFile([.. Encoding.ASCII.GetBytes("name: "), 0xFC, 0x0A]);

        Assert.Equal([$"{file.Path}: The file is not UTF-8 text."], await FileErrorsAsync(file.Path));
    }

    [Fact]
    public async Task Reads_a_file_with_a_byte_order_mark()
    {
        using var file = new TemporaryFile([.. Encoding.UTF8.Preamble, .. Encoding.UTF8.GetBytes(Minimal())]);

        Assert.Equal(1500, (await CaseFileReader.ReadFileAsync(file.Path, default)).Case.TemperatureKelvin);
    }

    [Fact]
    public async Task Tells_that_there_is_no_such_file() =>
        Assert.Equal(["nowhere.yaml: There is no such file."], await FileErrorsAsync("nowhere.yaml"));

    [Fact]
    public async Task Tells_that_a_directory_is_no_file() =>
        Assert.StartsWith($"{AppContext.BaseDirectory}: The file cannot be read", Assert.Single(await FileErrorsAsync(AppContext.BaseDirectory)), StringComparison.Ordinal);

    private static string Minimal(string items = "- {formula: Cu, mass_kg: 1}") =>
        items.Contains("- {formula: Cu, mass_kg: 1}\n", StringComparison.Ordinal) || items != "- {formula: Cu, mass_kg: 1}"
            ? $"charge:\n {items}\noxygen: closed_balance\ntemperature_kelvin: 1500\n"
            : "temperature_kelvin: 1500\ncharge: [{formula: Cu, mass_kg: 1}]\noxygen: closed_balance\n";

    private static OxygenStatement Oxygen(string text) =>
        CaseFileReader.Read("x", $"temperature_kelvin: 1500\ncharge: [{{formula: Cu, mass_kg: 1}}]\noxygen: {text}\n").Case.Oxygen;

    private static IReadOnlyList<CaseFileError> Faults(string text) => Assert.Throws<CaseFileException>(() => CaseFileReader.Read("x.yaml", text)).Errors;

    private static IEnumerable<string> Errors(string text) => Faults(text).Select(error => error.Describe("x.yaml")["x.yaml:".Length..]);

    private static async Task<IEnumerable<string>> FileErrorsAsync(string path)
    {
        var fault = await Assert.ThrowsAsync<CaseFileException>(() => CaseFileReader.ReadFileAsync(path, default));
        return fault.Errors.Select(error => error.Describe(path));
    }
}
