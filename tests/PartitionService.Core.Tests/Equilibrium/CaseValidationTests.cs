using PartitionService.Core.Equilibrium;

namespace PartitionService.Core.Tests.Equilibrium;

/// <summary>Every rule about a case alone: one thing is made wrong in a valid case, and exactly that is reported.</summary>
public sealed class CaseValidationTests
{
    private static readonly string Solvents = string.Join(", ", Vessels.Catalogue.Solvents);
    private static readonly string Families = string.Join(", ", Vessels.Catalogue.SlagFamilies.Keys);

    private static readonly Dictionary<string, (VesselCase Vessel, CaseViolation Expected)> Rules = new()
    {
        ["name too long"] = (
            Valid with { Name = new string('n', 101) },
            new("name", "101 characters long", "must have at most 100 characters")),
        ["temperature not a number"] = (
            Valid with { TemperatureKelvin = double.NaN }, new("temperature_kelvin", "NaN", "must be a number in [500, 2500]")),
        ["temperature infinite"] = (
            Valid with { TemperatureKelvin = double.PositiveInfinity },
            new("temperature_kelvin", "Infinity", "must be a number in [500, 2500]")),
        ["temperature in degrees"] = (
            Valid with { TemperatureKelvin = 25 }, new("temperature_kelvin", "25", "must be a number in [500, 2500]")),
        ["pressure zero"] = (Valid with { PressureAtm = 0 }, new("pressure_atm", "0", "must be a number in [1E-06, 100]")),
        ["pressure not a number"] = (
            Valid with { PressureAtm = double.NaN }, new("pressure_atm", "NaN", "must be a number in [1E-06, 100]")),
        ["charge empty"] = (Valid with { Charge = [] }, new("charge", "0", "must hold 1 to 200 items")),
        ["charge too long"] = (
            Valid with { Charge = [.. Enumerable.Repeat(new ChargeItem("Cu", 1), 201)] }, new("charge", "201", "must hold 1 to 200 items")),
        ["charge of zeros"] = (
            Valid with { Charge = [new("Cu", 0), new("Pb", 0)] }, new("charge", "0", "must hold at least one quantity above 0")),
        ["unknown element"] = (
            Valid.Plus(new ChargeItem("HeO", 1)), new("charge[6].formula", "HeO", "holds He, which the catalogue does not know")),
        ["empty formula"] = (
            Valid.Plus(new ChargeItem("", 1)),
            new(
                "charge[6].formula",
                "",
                "must be a chemical formula such as Cu, PbO or Fe2SiO4, or \"air\" (position 1: the formula is empty)")),
        ["mass negative"] = (Valid.Plus(new ChargeItem("Zn", -1)), new("charge[6].mass_kg", "-1", "must be a number in [0, 1000000000]")),
        ["mass not a number"] = (
            Valid.Plus(new ChargeItem("Zn", double.NaN)), new("charge[6].mass_kg", "NaN", "must be a number in [0, 1000000000]")),
        ["mass infinite"] = (
            Valid.Plus(new ChargeItem("Zn", double.PositiveInfinity)),
            new("charge[6].mass_kg", "Infinity", "must be a number in [0, 1000000000]")),
        ["volume negative"] = (
            Valid.Plus(new ChargeItem("O2", -2, ChargeUnit.NormalCubicMetre)),
            new("charge[6].volume_normal_cubic_metre", "-2", "must be a number in [0, 1000000000]")),
        ["volume of a solid"] = (
            Valid.Plus(new ChargeItem("PbO", 3, ChargeUnit.NormalCubicMetre)),
            new(
                "charge[6].volume_normal_cubic_metre",
                "3",
                "is only for gases (Ar, C2H2, C2H4, C2H6, C3H6, C3H8, C4H10, CH4, CO, CO2, Cl2, H2, H2O, H2S, HBr, HCl, N2, NH3, O2, SO2, air); give PbO in mass_kg")),
        ["quantity unstated"] = (
            Valid.Plus(new ChargeItem("Zn", 1, ChargeUnit.Unstated)), new("charge[6]", "", "needs mass_kg or volume_normal_cubic_metre")),
        ["unknown solvent"] = (Valid with { Solvent = "Cs" }, new("metal.solvent", "Cs", $"must be one of {Solvents}, or unset")),
        ["unknown family"] = (Valid with { SlagFamily = "glass" }, new("slag.family", "glass", $"must be one of {Families}")),
        ["oxygen unstated"] = (
            Valid with { Oxygen = new OxygenStatement.Unstated() },
            new(
                "oxygen",
                "",
                "needs exactly one of log10_po2_atm, co2_to_co_ratio, h2o_to_h2_ratio, metal_oxide_pair, dissolved_oxygen_mass_ppm, closed_balance")),
        ["pO2 too high"] = (
            Valid with { Oxygen = new OxygenStatement.Pressure(2.5) }, new("oxygen.log10_po2_atm", "2.5", "must be a number in [-40, 2]")),
        ["pO2 not a number"] = (
            Valid with { Oxygen = new OxygenStatement.Pressure(double.NaN) },
            new("oxygen.log10_po2_atm", "NaN", "must be a number in [-40, 2]")),
        ["CO2/CO zero"] = (
            Valid with { Oxygen = new OxygenStatement.CarbonDioxideToMonoxide(0) },
            new("oxygen.co2_to_co_ratio", "0", "must be a number in [1E-12, 1000000000000]")),
        ["H2O/H2 infinite"] = (
            Valid with { Oxygen = new OxygenStatement.WaterToHydrogen(double.PositiveInfinity) },
            new("oxygen.h2o_to_h2_ratio", "Infinity", "must be a number in [1E-12, 1000000000000]")),
        ["dissolved oxygen zero"] = (
            Valid with { Oxygen = new OxygenStatement.Dissolved(0) },
            new("oxygen.dissolved_oxygen_mass_ppm", "0", "must be a number in [1E-06, 50000]")),
        ["pair of a sulfide"] = (
            Valid with { Oxygen = new OxygenStatement.MetalOxidePair("FeS") },
            new("oxygen.metal_oxide_pair.oxide", "FeS", "must be an oxide of one metal that the catalogue has, such as FeO or Cu2O")),
        ["oxide activity above 1"] = (
            Valid with { Oxygen = new OxygenStatement.MetalOxidePair("FeO", 1.1) },
            new("oxygen.metal_oxide_pair.oxide_activity", "1.1", "must be a number in [1E-12, 1]")),
        ["metal activity zero"] = (
            Valid with { Oxygen = new OxygenStatement.MetalOxidePair("FeO", 1, 0) },
            new("oxygen.metal_oxide_pair.metal_activity", "0", "must be a number in [1E-12, 1]")),
        ["droplets above 90 %"] = (
            Valid with { Allowances = new() { MetalInSlagMassPercent = 91 } },
            new("allowances.metal_in_slag.mass_percent", "91", "must be a number in [0, 90]")),
        ["slag in metal not a number"] = (
            Valid with { Allowances = new() { SlagInMetalMassPercent = double.NaN } },
            new("allowances.slag_in_metal_mass_percent", "NaN", "must be a number in [0, 50]")),
        ["dust negative"] = (
            Valid with { Allowances = new() { MechanicalDustMassFraction = -0.1 } },
            new("allowances.mechanical_dust_mass_fraction", "-0.1", "must be a number in [0, 0.5]")),
        ["typical droplets without slag"] = (
            Valid with { SlagFamily = null, Allowances = new() { MetalInSlagTypical = true } },
            new("allowances.metal_in_slag.family_typical", "true", "needs a slag family")),
        ["typical droplets unknown"] = (
            Valid with { SlagFamily = "soda-alkali", Allowances = new() { MetalInSlagTypical = true } },
            new("allowances.metal_in_slag.family_typical", "true", "has no value for soda-alkali in the catalogue; give mass_percent")),
        ["efficiency of oxygen"] = (
            Valid with { Allowances = new() { StageEfficiencies = [new("O", 0.5)] } },
            new("allowances.stage_efficiencies[0].element", "O", "must not be O: oxygen follows the other elements")),
        ["efficiency of an unknown element"] = (
            Valid with { Allowances = new() { StageEfficiencies = [new("Zn", 1), new("Xx", 0.5)] } },
            new("allowances.stage_efficiencies[1].element", "Xx", "must be the symbol of an element that the catalogue knows")),
        ["efficiency twice"] = (
            Valid with { Allowances = new() { StageEfficiencies = [new("Zn", 1), new("Zn", 0.5)] } },
            new("allowances.stage_efficiencies[1].element", "Zn", "must not stand twice")),
        ["efficiency above 1"] = (
            Valid with { Allowances = new() { StageEfficiencies = [new("Zn", 1.5)] } },
            new("allowances.stage_efficiencies[0].efficiency", "1.5", "must be a number in [0, 1]")),
    };

    public static TheoryData<string> Names => [.. Rules.Keys];

    private static VesselCase Valid => Vessels.BlackCopper;

    [Theory]
    [MemberData(nameof(Names))]
    public void Each_rule_reports_exactly_its_violation(string rule)
    {
        var (vessel, expected) = Rules[rule];
        Assert.Equal([expected], Vessels.Violations(vessel));
    }

    [Fact]
    public void Valid_cases_have_no_violation()
    {
        Assert.Empty(Vessels.Violations(Vessels.BlackCopper));
        Assert.Empty(Vessels.Violations(Vessels.Steel));
        Assert.Empty(Vessels.Violations(Vessels.Lead));
    }

    [Fact]
    public void A_formula_that_cannot_be_read_names_the_position()
    {
        var violation = Assert.Single(Vessels.Violations(Valid.Plus(new ChargeItem("Pb(O", 1))));
        Assert.Equal("charge[6].formula", violation.Field);
        Assert.StartsWith(
            "must be a chemical formula such as Cu, PbO or Fe2SiO4, or \"air\" (position ", violation.Allowed, StringComparison.Ordinal);
    }

    [Fact]
    public void A_formula_that_is_too_long_is_quoted_in_part()
    {
        var violation = Assert.Single(Vessels.Violations(Valid.Plus(new ChargeItem(new string('C', 5000), 1))));
        Assert.Equal(120, violation.Value.Length);
    }

    [Fact]
    public void Too_many_efficiencies_are_counted_and_only_the_first_hundred_read()
    {
        var efficiencies = Enumerable.Repeat(new StageEfficiency("Zn", 1), 101).ToArray();
        var violations = Vessels.Violations(Valid with { Allowances = new() { StageEfficiencies = efficiencies } });
        Assert.Contains(new CaseViolation("allowances.stage_efficiencies", "101", "must hold at most 100 entries"), violations);
        Assert.Equal(1 + 99, violations.Count);
    }

    [Fact]
    public void All_violations_are_reported_at_once_in_the_order_of_the_fields()
    {
        var wrong = new VesselCase
        {
            TemperatureKelvin = double.NaN,
            PressureAtm = -1,
            Charge = [new("Xx", -1), new("Cu", 1, ChargeUnit.Unstated)],
            Solvent = "Xx",
            SlagFamily = "glass",
            Oxygen = new OxygenStatement.MetalOxidePair("FeS", 2, -1),
            Allowances = new() { MechanicalDustMassFraction = 1, StageEfficiencies = [new("O", 2)] },
            Overrides = [new("metal/Cu/Pb", OverrideKind.LnGamma, double.NaN)],
        };
        Assert.Equal(
            [
                "temperature_kelvin",
                "pressure_atm",
                "charge[0].formula",
                "charge[0].mass_kg",
                "charge[1]",
                "charge",
                "metal.solvent",
                "slag.family",
                "oxygen.metal_oxide_pair.oxide",
                "oxygen.metal_oxide_pair.oxide_activity",
                "oxygen.metal_oxide_pair.metal_activity",
                "allowances.mechanical_dust_mass_fraction",
                "allowances.stage_efficiencies[0].element",
                "allowances.stage_efficiencies[0].efficiency",
                "overrides[0].ln_gamma",
            ],
            Vessels.Violations(wrong).Select(v => v.Field));
    }

    [Fact]
    public void An_invalid_case_is_not_solved()
    {
        var outcome = new EquilibriumSolver(Vessels.Catalogue).Solve(Valid with { PressureAtm = 0 });
        Assert.Equal("pressure_atm", Assert.Single(Assert.IsType<SolveOutcome.Invalid>(outcome).Violations).Field);
    }
}
