using PartitionService.Core.Equilibrium;

namespace PartitionService.Core.Tests.Equilibrium.Derivatives;

/// <summary>Vessels of the common processes, with every statement about oxygen, absent phases, allowances and overrides.</summary>
public static class DerivativeCases
{
    private static readonly Dictionary<string, Func<VesselCase>> Cases = new(StringComparer.Ordinal)
    {
        ["black copper, fixed potential"] = () => BlackCopper(new OxygenStatement.Pressure(-8.2)),
        ["black copper, closed"] = () => BlackCopper(new OxygenStatement.Closed()),
        ["black copper, CO2 to CO"] = () => BlackCopper(new OxygenStatement.CarbonDioxideToMonoxide(3)),
        ["black copper, H2O to H2"] = () => BlackCopper(new OxygenStatement.WaterToHydrogen(1.7)),
        ["black copper, pair"] = () => BlackCopper(new OxygenStatement.MetalOxidePair("FeO", 0.3, 0.2)),
        ["black copper, dissolved oxygen"] = () => BlackCopper(new OxygenStatement.Dissolved(900)),
        ["black copper, overrides"] = () => BlackCopper(new OxygenStatement.Closed()) with
        {
            Overrides =
            [
                new("metal/Cu/Pb", OverrideKind.LnGamma, 1.6),
                new("slag/iron-silicate/SnO2", OverrideKind.LnGamma, 0.9),
                new("oxidation/NiO", OverrideKind.GibbsEnergy, -120000),
                new("gas/Zn", OverrideKind.GibbsEnergy, -30000),
                new("interaction/Cu/Pb/Sn", OverrideKind.Epsilon, 3),
            ],
        },
        ["black copper, allowances"] = () => BlackCopper(new OxygenStatement.Closed()) with
        {
            Allowances = new PracticeAllowances
            {
                MetalInSlagTypical = true,
                SlagInMetalMassPercent = 0.4,
                MechanicalDustMassFraction = 0.02,
                StageEfficiencies = [new("Sn", 0.7), new("Si", 0.9), new("S", 0.8)],
            },
        },
        ["black copper, entrainment without room"] = () => BlackCopper(new OxygenStatement.Pressure(-8.2)) with
        {
            Allowances = new PracticeAllowances { MetalInSlagMassPercent = 85, SlagInMetalMassPercent = 10 },
        },
        ["black copper, no gas"] = () => BlackCopper(new OxygenStatement.Pressure(-8.2)) with { GasAllowed = false },
        ["converter, metal consumed"] = () => BlackCopper(new OxygenStatement.Pressure(-2)) with { Solvent = "Cu" },
        ["steel, closed, sulfur and phosphorus"] = () => Steel(new OxygenStatement.Closed(), "basic-steelmaking", true),
        ["steel, fixed potential, no gas"] = () => Steel(new OxygenStatement.Pressure(-9), "basic-steelmaking", false),
        ["steel, dissolved oxygen"] = () => Steel(new OxygenStatement.Dissolved(300), "basic-steelmaking", true),
        ["steel, ladle, pair"] = () => Steel(new OxygenStatement.MetalOxidePair("AlO1.5", 0.1, 1e-4), "ladle-lime-alumina", false),
        ["steel, phosphorus by its slag row"] = () => Steel(new OxygenStatement.Pressure(-9), "basic-steelmaking", true) with
        {
            Solvent = "Cu",
            TemperatureKelvin = 1860,
            Charge =
            [
                new("Cu", 900), new("Fe", 40), new("P", 1), new("FeO", 20), new("CaO", 50), new("SiO2", 18), new("MgO", 5), new("MnO", 4),
                new("S", 0.2),
            ],
        },
        ["steel, slag full of sulfide"] = () => Steel(new OxygenStatement.Pressure(-12), "ladle-lime-alumina", false) with
        {
            Charge =
            [
                new("Fe", 1000), new("Mn", 4), new("Cr", 1), new("FeS", 60), new("CaO", 60), new("Al2O3", 30), new("SiO2", 8),
                new("MgO", 5), new("CaF2", 4),
            ],
        },
        ["iron saturated with carbon"] = () => Steel(new OxygenStatement.Closed(), "lime-silica-alumina", true) with
        {
            TemperatureKelvin = 1823,
            Charge =
            [
                new("Fe", 1000), new("C", 80), new("Si", 4), new("Mn", 4), new("Cu", 2), new("Sn", 0.3), new("FeS", 2), new("CaO", 60),
                new("SiO2", 50), new("Al2O3", 20), new("MgO", 8), new("O2", 5),
            ],
        },
        ["copper blown into the slag, closed"] = () => BlackCopper(new OxygenStatement.Closed()) with
        {
            Solvent = "Cu",
            Charge =
            [
                new("Cu", 20), new("Ni", 2), new("Sn", 1), new("FeO", 250), new("SiO2", 130), new("CaO", 20), new("O2", 60),
                new("N2", 30, ChargeUnit.NormalCubicMetre),
            ],
        },
        ["lead softening, gas never forms"] = () => new VesselCase
        {
            TemperatureKelvin = 1023,
            Solvent = "Pb",
            SlagFamily = "lead-oxide",
            GasAllowed = true,
            Oxygen = new OxygenStatement.Closed(),
            Charge = [new("Pb", 1000), new("Sb", 6), new("As", 2), new("Sn", 3), new("Cu", 1), new("Ag", 1.5), new("Bi", 1), new("O2", 3)],
        },
        ["aluminium, chloride salt and pair"] = () => new VesselCase
        {
            TemperatureKelvin = 1033,
            Solvent = "Al",
            SlagFamily = "chloride-salt",
            Oxygen = new OxygenStatement.MetalOxidePair("Al2O3", 0.6),
            Charge = [new("Al", 1000), new("Mg", 12), new("Na", 0.5), new("Zn", 4), new("NaCl", 70), new("KCl", 30), new("CaF2", 2)],
        },
        ["copper fire refining"] = () => new VesselCase
        {
            TemperatureKelvin = 1473,
            SlagFamily = "cu2o-refining",
            GasAllowed = true,
            Oxygen = new OxygenStatement.Closed(),
            Charge =
            [
                new("Cu", 1000), new("Pb", 3), new("Sn", 1), new("As", 1), new("Sb", 1), new("Ni", 3), new("Bi", 0.3), new("Ag", 0.4),
                new("S", 0.2), new("SiO2", 10), new("CaO", 4), new("O2", 2), new("air", 60, ChargeUnit.NormalCubicMetre),
            ],
        },
        ["tin alone, slag never forms"] = () => new VesselCase
        {
            TemperatureKelvin = 1300,
            SlagFamily = "iron-silicate",
            GasAllowed = true,
            Oxygen = new OxygenStatement.Pressure(-17),
            Charge = [new("Sn", 100), new("Pb", 2), new("Bi", 0.5), new("N2", 20, ChargeUnit.NormalCubicMetre)],
        },
        ["silver with unburnt carbon"] = () => new VesselCase
        {
            TemperatureKelvin = 1400,
            SlagFamily = "soda-alkali",
            GasAllowed = true,
            Oxygen = new OxygenStatement.Closed(),
            Charge = [new("Ag", 100), new("Pb", 4), new("Zn", 1), new("Na2CO3", 20), new("SiO2", 15), new("C", 10), new("O2", 1)],
        },
    };

    /// <summary>Names for theories.</summary>
    public static TheoryData<string> Names => [.. Cases.Keys];

    /// <summary>A case by name.</summary>
    public static VesselCase Named(string name) => Cases[name]();

    private static VesselCase BlackCopper(OxygenStatement oxygen) => new()
    {
        TemperatureKelvin = 1561,
        PressureAtm = 1.02,
        SlagFamily = "iron-silicate",
        GasAllowed = true,
        Oxygen = oxygen,
        Charge =
        [
            new("Cu", 800), new("Sn", 25), new("Pb", 20), new("Zn", 22), new("Ni", 12), new("As", 2), new("Sb", 2), new("Ag", 1),
            new("FeS", 6), new("Fe", 30), new("Cu2O", 60), new("FeO", 250), new("SiO2", 130), new("CaO", 25), new("Al2O3", 20),
            new("NaCl", 1), new("O2", 4), new("CH4", 8, ChargeUnit.NormalCubicMetre), new("air", 90, ChargeUnit.NormalCubicMetre),
        ],
    };

    private static VesselCase Steel(OxygenStatement oxygen, string family, bool gas) => new()
    {
        TemperatureKelvin = 1881,
        SlagFamily = family,
        GasAllowed = gas,
        Oxygen = oxygen,
        Charge =
        [
            new("Fe", 1000), new("Cu", 3), new("Sn", 0.3), new("Cr", 4), new("Mn", 5), new("Ni", 2), new("Mo", 0.4), new("P", 0.4),
            new("S", 0.4), new("Al", 0.5), new("Si", 1), new("V", 0.2), new("FeO", 30), new("Fe2O3", 3), new("CaO", 50), new("MgO", 6),
            new("SiO2", 15), new("Al2O3", 4), new("MnO", 4), new("CaF2", 2), new("O2", 0.5),
        ],
    };
}
