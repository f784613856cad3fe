using PartitionService.Core.Equilibrium;
using static PartitionService.IndependentSolution.Vessel;

namespace PartitionService.IndependentSolution;

/// <summary>The cases by name: every feature of the physics at least once, the usual practice of each solvent.</summary>
internal static class Cases
{
    private const string Copper = "Cu 1000; Pb 8; Sn 5; Ni 6; Zn 4; Sb 1; As 1; Bi 0.2; Ag 0.5; Fe 3; Co 0.3; Se 0.2; Te 0.1";
    private const string Fayalite = "SiO2 60; FeO 100; Fe2O3 12; CaO 4; Al2O3 5; MgO 2";
    private const string Steel = "Fe 1000; Mn 3; Si 1; P 0.4; S 0.2; Cr 2; Ni 1; Cu 3; Sn 0.3; V 0.5; Ti 0.3";
    private const string SteelSlag = "CaO 46; SiO2 14; FeO 24; MgO 9; MnO 4; Al2O3 2";
    private const string Lead = "Pb 1000; Sb 6; As 2; Sn 1; Bi 0.5; Ag 1; Cu 0.4; Te 0.1";
    private const string Salt = "NaCl 65; KCl 28; MgCl2 3";

    /// <summary>All cases.</summary>
    public static IReadOnlyDictionary<string, VesselCase> All { get; } = new Dictionary<string, VesselCase>(StringComparer.Ordinal)
    {
        ["copper alone, no slag, no gas"] = Of(1523, "Cu 1000; Pb 8; Ni 6; Ag 0.5; Sb 1", null, false, Log10(-8)),
        ["copper alone, closed"] = Of(1523, "Cu 1000; Pb 8; Ni 6; O2 0.5", null, true, Closed),
        ["copper and slag, no gas"] = Of(1523, $"{Copper}; {Fayalite}", "iron-silicate", false, Log10(-8)),
        ["copper, slag, gas at fixed pressure of oxygen"] =
            Of(1523, $"{Copper}; {Fayalite}; N2 80 Nm3", "iron-silicate", true, Log10(-7)),
        ["copper, slag, gas, closed with air"] = Of(1523, $"{Copper}; {Fayalite}; air 60 Nm3", "iron-silicate", true, Closed),
        ["copper, slag, no gas, closed with its own oxide"] =
            Of(1523, "Cu 1000; Pb 8; Sn 5; Ni 6; Ag 0.5; Fe 3; Cu2O 20; SiO2 40; FeO 60; CaO 4", "iron-silicate", false, Closed),
        ["copper and gas without slag"] = Of(1573, "Cu 1000; Pb 8; Zn 6; As 1; Bi 0.2; Ag 0.5; N2 200 Nm3", null, true, Log10(-9)),
        ["copper, CO2/CO of a controlling gas"] =
            Of(1573, $"{Copper}; {Fayalite}; N2 30 Nm3", "iron-silicate", true, new OxygenStatement.CarbonDioxideToMonoxide(3)),
        ["copper, H2O/H2 of a controlling gas"] =
            Of(1473, $"{Copper}; {Fayalite}; H2 5 Nm3", "iron-silicate", true, new OxygenStatement.WaterToHydrogen(0.2)),
        ["copper, Fe/FeO pair"] = Of(1523, $"{Copper}; {Fayalite}", "iron-silicate", false, new OxygenStatement.MetalOxidePair("FeO", 0.4)),
        ["copper, Cu/Cu2O pair"] =
            Of(1500, "Cu 1000; Pb 4; Ni 3; Sn 1; SiO2 20; Fe2O3 20; CaO 5", "cu2o-refining", false, new OxygenStatement.MetalOxidePair("Cu2O", 0.3)),
        ["copper, 300 ppm of dissolved oxygen"] =
            Of(1473, "Cu 1000; Pb 2; Ni 1; Ag 0.5; Sn 0.1", null, false, new OxygenStatement.Dissolved(300)),
        ["copper and slag, 2000 ppm of dissolved oxygen"] =
            Of(1523, "Cu 1000; Pb 4; Ni 3; Sn 1; Sb 0.5; SiO2 20; Fe2O3 20; CaO 5", "cu2o-refining", false, new OxygenStatement.Dissolved(2000)),
        ["calcium ferrite with slopes on lime"] =
            Of(1523, "Cu 1000; Pb 8; As 2; Sb 2; Bi 0.3; Fe2O3 60; FeO 18; CaO 22; N2 20 Nm3", "calcium-ferrite", true, Log10(-5.5)),
        ["ferrous calcium silicate with sulfide"] =
            Of(1573, "Cu 1000; Pb 8; S 1; Fe 2; FeO 50; SiO2 30; CaO 20; N2 20 Nm3", "ferrous-calcium-silicate", true, Log10(-9)),
        ["sulfur dioxide over copper"] = Of(1500, "Cu 1000; Pb 5; S 3; As 1; N2 50 Nm3", null, true, Log10(-5.5)),
        ["sulfides of many metals in the gas"] = Of(1500, "Cu 1000; Sn 5; Pb 5; Ge 0.2; S 8; N2 50 Nm3", null, true, Log10(-10)),
        ["polyatomic vapours of As, Sb, Te over copper"] =
            Of(1550, "Cu 1000; As 20; Sb 10; Te 3; Se 1; Bi 2; N2 300 Nm3", null, true, Log10(-10)),
        ["polyatomic vapours over lead"] = Of(1300, "Pb 1000; As 30; Sb 20; Te 2; Bi 5; N2 200 Nm3", null, true, Log10(-14), 0.05),
        ["phosphorus vapour over iron"] = Of(1873, "Fe 1000; P 8; Mn 2; N2 100 Nm3", null, true, Log10(-14), 0.01),
        ["organic waste burns over copper"] =
            Of(1523, $"{Copper}; {Fayalite}; C8H8 4; C2H3Cl 2; air 80 Nm3", "iron-silicate", true, Closed),
        ["brominated waste over copper"] =
            Of(1523, "Cu 1000; Pb 10; Sn 5; Sb 2; Zn 3; SiO2 40; FeO 60; C15H12Br4O2 6; CH2 3; air 60 Nm3", "iron-silicate", true, Closed),
        ["carbon and hydrogen at a fixed potential"] =
            Of(1573, $"{Copper}; {Fayalite}; C 4; CH2 2; N2 20 Nm3", "iron-silicate", true, Log10(-9)),
        ["unburnt carbon under copper, closed"] = Of(1500, "Cu 1000; Pb 5; Zn 3; C 20; air 40 Nm3", null, true, Closed),
        ["unburnt carbon with slag, closed"] =
            Of(1573, "Cu 1000; Pb 5; Ni 3; Ag 0.5; SiO2 40; CaO 30; C 20; air 40 Nm3", "ferrous-calcium-silicate", true, Closed),
        ["carbon dissolves in iron, gas"] = Of(1873, "Fe 1000; C 5; Si 2; Mn 3; Cr 5; Ar 50 Nm3", null, true, new OxygenStatement.Dissolved(20)),
        ["graphite saturates iron"] = Of(1850, "Fe 1000; C 90; Mn 1; Ar 5 Nm3", null, true, Log10(-16)),
        ["chromium in two valences"] =
            Of(1573, "Cu 1000; Cr 2; Ni 3; SiO2 30; FeO 60; N2 10 Nm3", "iron-silicate", true, Log10(-9)),
        ["tin in two valences"] = Of(1523, "Cu 1000; Sn 30; Pb 5; SiO2 30; FeO 60", "iron-silicate", false, Log10(-9.5)),
        ["iron in two valences up to high oxygen"] =
            Of(1523, "Cu 1000; Fe 10; Fe2O3 60; CaO 20; Ag 0.3", "calcium-ferrite", false, Log10(-4.5)),
        ["calcium ferrite, closed without gas"] =
            Of(1523, "Cu 1000; Pb 4; Ni 2; Fe2O3 70; CaO 20; Cu2O 10", "calcium-ferrite", false, Closed),
        ["many elements in copper under slag"] = Of(
            1550,
            "Cu 1000; Ag 0.3; Al 0.2; As 1; Au 0.02; Be 0.01; Bi 0.2; Cd 0.1; Co 0.5; Cr 0.3; Fe 5; Ga 0.05; Ge 0.05; In 0.1; Mn 0.5; Ni 5; Pb 10; Pd 0.01; Sb 2; Se 0.1; Si 0.1; Sn 6; Te 0.05; Ti 0.1; Zn 10; SiO2 60; FeO 90; CaO 5; N2 60 Nm3",
            "iron-silicate",
            true,
            Log10(-8)),
        ["lead smelting slag with slope on basicity"] =
            Of(1473, "Pb 500; Sb 3; Cu 2; Zn 10; Ag 1; FeO 40; SiO2 25; CaO 18; ZnO 15; Al2O3 5; N2 40 Nm3", "lead-smelting", true, Log10(-10)),
        ["lead softening under litharge"] = Of(1100, $"{Lead}; PbO 60", "lead-oxide", false, Log10(-9)),
        ["lead softening, closed with air"] = Of(1123, $"{Lead}; air 6 Nm3", "lead-oxide", true, Closed),
        ["lead under soda"] = Of(900, "Pb 1000; Sb 5; As 2; Sn 2; Na2O 20; SiO2 5", "soda-alkali", false, Log10(-15)),
        ["lead, dissolved oxygen"] = Of(1000, "Pb 1000; Bi 0.5; Ag 1; Sn 0.0001", null, false, new OxygenStatement.Dissolved(10)),
        ["steel under basic slag, phosphorus by formula"] =
            Of(1873, $"{Steel}; {SteelSlag}; Ar 20 Nm3", "basic-steelmaking", true, Log10(-9)),
        ["steel under basic slag, closed"] =
            Of(1900, "Fe 1000; Mn 3; P 0.4; Cr 2; Cu 3; CaO 46; SiO2 14; FeO 34; MgO 9; MnO 4; Ar 20 Nm3", "basic-steelmaking", true, Closed),
        ["steel under basic slag, dissolved oxygen"] =
            Of(1873, $"{Steel}; {SteelSlag}", "basic-steelmaking", false, new OxygenStatement.Dissolved(500)),
        ["steel ladle: sulfur to the slag"] =
            Of(1873, "Fe 1000; S 0.3; Mn 5; Si 3; Cr 1; CaO 12; Al2O3 6; SiO2 1; MgO 1", "ladle-lime-alumina", false, Log10(-13)),
        ["blast furnace slag and sulfur"] =
            Of(1750, "Fe 1000; C 40; S 0.5; Si 5; Mn 4; CaO 100; SiO2 90; Al2O3 35; MgO 20; N2 100 Nm3", "lime-silica-alumina", true, Log10(-15)),
        ["iron in vacuum"] = Of(1873, "Fe 1000; Mn 5; Cu 3; Sn 1; Pb 0.1; Zn 0.1; Ar 1 Nm3", null, true, Log10(-12), 1e-4),
        ["iron with nitrogen and hydrogen"] = Of(1873, "Fe 1000; N2 20 Nm3; H2 5 Nm3; Mn 1", null, true, Log10(-13)),
        ["tin under a reducing gas"] = Of(1500, "Sn 1000; Pb 5; Cu 3; As 1; Sb 2; Bi 1; N2 50 Nm3", null, true, Log10(-12)),
        ["tin and ferrous calcium silicate"] =
            Of(1500, "Sn 500; Pb 5; Cu 3; Fe 2; SiO2 30; FeO 40; CaO 20", "ferrous-calcium-silicate", false, Log10(-10.5)),
        ["tin, dissolved oxygen"] = Of(1200, "Sn 1000; Pb 5; Bi 1", null, false, new OxygenStatement.Dissolved(1)),
        ["aluminium under chloride salt"] =
            Of(1050, $"Al 1000; Mg 5; Cu 10; Fe 3; Zn 4; Ca 0.2; Li 0.05; Sr 0.1; {Salt}", "chloride-salt", false, Closed),
        ["aluminium, salt and gas"] = Of(1100, $"Al 1000; Mg 5; Zn 4; Na 0.1; Ca 0.2; {Salt}; Ar 20 Nm3", "chloride-salt", true, Log10(-40)),
        ["aluminium, salt with fluoride that stays inert"] =
            Of(1050, $"Al 1000; Mg 5; Cu 10; Zn 4; {Salt}; CaF2 4", "chloride-salt", false, Closed),
        ["aluminium blown with chlorine"] = Of(1023, "Al 1000; Mg 3; Na 0.05; Ca 0.05; Cl2 4 Nm3; Ar 10 Nm3", null, true, Log10(-40)),
        ["aluminium with hydrogen"] = Of(1000, "Al 1000; Si 70; Cu 30; H2 0.5 Nm3; Ar 5 Nm3", null, true, Log10(-40)),
        ["zinc melt boils partly away"] = Of(1150, "Zn 1000; Pb 10; Cd 3; Fe 0.1; Ar 50 Nm3", null, true, Log10(-25)),
        ["zinc melt, gas does not form"] = Of(800, "Zn 1000; Pb 5; Cd 3; Sn 2", null, true, Log10(-30)),
        ["silver cupelled"] = Of(1300, "Ag 100; Pb 20; Cu 2; Bi 1; Te 0.2; Sb 0.3; PbO 5; air 10 Nm3", "lead-oxide", true, Log10(-2)),
        ["silver under air"] = Of(1350, "Ag 100; Cu 1; Pb 1; Au 5; air 20 Nm3", null, true, Log10(-1)),
        ["gas allowed but too cool to form"] = Of(1400, "Cu 1000; Ag 2; Ni 3", null, true, Log10(-9)),
        ["slag allowed but does not form"] = Of(1473, "Cu 1000; Ag 2; Pb 0.01; Ni 0.1", "cu2o-refining", false, Log10(-9)),
        ["slag and gas allowed, neither forms"] = Of(1473, "Cu 1000; Ag 2; Ni 0.1; Pd 0.01", "cu2o-refining", true, Log10(-9)),
        ["little air, no slag yet"] = Of(1473, "Cu 1000; Ag 2; Ni 0.1; air 0.01 Nm3", "cu2o-refining", true, Closed),
        ["ten atmospheres"] = Of(1523, $"{Copper}; {Fayalite}; N2 80 Nm3", "iron-silicate", true, Log10(-7), 10),
        ["a hundredth of an atmosphere"] = Of(1523, $"{Copper}; {Fayalite}; N2 8 Nm3", "iron-silicate", true, Log10(-8), 0.01),
        ["strong deoxidisers in iron beyond first order"] =
            Of(1873, "Fe 1000; Al 0.5; Ca 0.02; Ti 0.3; Ce 0.05; Mg 0.05", null, false, new OxygenStatement.Dissolved(5)),
        ["chlorides leave copper with the gas"] =
            Of(1473, "Cu 1000; Pb 10; Zn 5; Sn 3; Ag 1; Fe 1; NaCl 2; HCl 5 Nm3; N2 40 Nm3", null, true, Log10(-10)),
        ["bismuth solvent with oxygen"] = Of(1000, "Bi 1000; Pb 5; Ag 1; Sn 0.001; N2 5 Nm3", null, true, new OxygenStatement.Dissolved(5)),
    };
}
