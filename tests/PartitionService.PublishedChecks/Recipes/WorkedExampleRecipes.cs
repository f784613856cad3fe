using PartitionService.Core.Equilibrium;
using PartitionService.Core.Thermodynamics;
using PartitionService.PublishedChecks.Cases;
using PartitionService.PublishedChecks.Rows;

namespace PartitionService.PublishedChecks.Recipes;

/// <summary>
/// Worked examples, with functions of the product where it has one. Separations are counted stage by stage or integrated in steps,
/// not by the closed formula that the example states.
/// </summary>
/// <param name="furnace">Solves vessels.</param>
internal sealed class WorkedExampleRecipes(Furnace furnace)
{
    /// <summary>Recipes by name.</summary>
    public IReadOnlyDictionary<string, Recipe> All => new Dictionary<string, Func<Example, double>>(StringComparer.Ordinal)
    {
        ["raoult-henry"] = e => e["gamma0"] * e["x"],
        ["mass-mole"] = e => MoleFraction(e["w_pct"], e["M_solute"], e["M_solvent"]),
        ["one-mass-percent"] = OneMassPercent,
        ["gamma0-emf"] = e =>
            Math.Exp(-e["n"] * Constants.FaradayCoulombPerMol * e["E_V"] / Constants.Thermal(e["T"])) / e["x"],
        ["gamma0-vapour"] = e => e["p"] / (e["p0"] * e["x"]),
        ["polyatomic-vapour"] = e => (e["p1"] * e["a"]) + (e["p2"] * e["a"] * e["a"]),
        ["co-co2"] = e => GasRatio(e, e["CO2_over_CO"]),
        ["h2-h2o"] = e => GasRatio(e, e["H2O_over_H2"]),
        ["metal-oxide-po2"] = e => OxygenPotential.ToLog10(OxygenPotential.FromPair(
            Math.Log(e["a_oxide"]), Math.Log(e["a_metal"]), e["A"] + (e["B"] * e["T"]), e["nu"], e["T"])),
        ["single-stage"] = e => Crosscurrent(e["L"], e["slag_ratio"], 1),
        ["crosscurrent"] = e => Crosscurrent(e["L"], e["slag_ratio_total"], (int)e["n"]),
        ["crosscurrent-limit"] = CrosscurrentLimit,
        ["countercurrent-kremser"] = e => Countercurrent(e["E"], (int)e["n"]),
        ["slag-demand"] = e => ((e["w0"] / e["w1"]) - 1) / e["L"],
        ["gas-flushing"] = GasFlushing,
        ["single-gas-contact"] = e => 1 / (1 + (e["k_atm"] * e["N"] / e["P_atm"])),
        ["langmuir"] = e => e["alpha"] * e["p_Pa"] * Math.Sqrt(e["M_kg"] / (2 * Math.PI * Constants.Thermal(e["T"]))),
        ["rayleigh"] = e => Math.Pow(e["solvent_left"], e["beta"]),
        ["mass-transfer-evaporation"] = e => Math.Exp(-e["k_cm_s"] * e["A_over_V"] * e["t"]),
        ["deoxidation"] = Deoxidation,
        ["desulfurisation"] = e =>
            Math.Pow(10, e["logCS"] - (935 / e["T"]) + 1.375 + Math.Log10(e["fS"]) - Math.Log10(e["aO"])),
        ["dephosphorisation"] = e => Math.Pow(10, (22350 / e["T"]) - 16 + (0.08 * e["CaO"]) + (2.5 * Math.Log10(e["TFe"]))),
        ["three-phase-balance"] = ThreePhaseBalance,
        ["collector-metal"] = e => 1 - Crosscurrent(e["L"], e["ratio"], 1),
        ["oxide-partition"] = e => OxidePartition(e, e["log10_pO2"]) * e["M_metal"] / e["M_slag"],
        ["oxide-slope"] = OxideSlope,
        ["epsilon-e"] = e => (230 * e["M_j"] / e["M_1"] * e["e"]) + ((e["M_1"] - e["M_j"]) / e["M_1"]),
        ["regular-temperature"] = e => Math.Pow(e["gamma0"], e["T1"] / e["T2"]),
        ["solubility-gamma"] = e => e["a"] / MoleFraction(e["w"], furnace.AtomicMass("Zn"), furnace.AtomicMass("Pb")),
        ["flowsheet-recycle"] = Recycle,
        ["dilution"] = e => (e["w_scrap"] - e["w_limit"]) / (e["w_scrap"] - e["w_clean"]),
        ["solvent-loss"] = e => 100 * e["w0"] * e["pb_left"] / ((e["w0"] * e["pb_left"]) + ((100 - e["w0"]) * e["cu_left"])),
    }.ToDictionary(pair => $"example-{pair.Key}", pair => AsRecipe(pair.Value), StringComparer.Ordinal);

    private static Recipe AsRecipe(Func<Example, double> figure) => row => [figure(new Example(row.Fields["setup"]))];

    private static double MoleFraction(double massPercent, double soluteMass, double solventMass) =>
        massPercent / soluteMass / ((massPercent / soluteMass) + ((100 - massPercent) / solventMass));

    private static double OneMassPercent(Example e)
    {
        var masses = e["M_solvent"] / (100 * e["M_solute"]);
        return e.Has("gamma0")
            ? Constants.Thermal(e["T"]) * Math.Log(e["gamma0"] * masses)
            : Math.Exp(e["dG"] / Constants.Thermal(e["T"])) / masses;
    }

    private static double GasRatio(Example e, double ratio) =>
        OxygenPotential.ToLog10(OxygenPotential.FromRatio(ratio, e["A"] + (e["B"] * e["T"]), 0, e["T"]));

    /// <summary>Metal meets equal portions of fresh slag one after the other.</summary>
    private static double Crosscurrent(double ratio, double slag, int stages)
    {
        var left = 1.0;
        for (var stage = 0; stage < stages; stage++)
        {
            left /= 1 + (ratio * slag / stages);
        }

        return left;
    }

    /// <summary>2^26 portions, doubled up: the share left after twice as many portions is the square.</summary>
    private static double CrosscurrentLimit(Example e)
    {
        const int doublings = 26;
        var left = 1 / (1 + (e["L"] * e["slag_ratio_total"] / (1 << doublings)));
        for (var doubling = 0; doubling < doublings; doubling++)
        {
            left *= left;
        }

        return left;
    }

    /// <summary>
    /// Metal from stage to stage against clean slag: with metal x after each stage, slag holds E x, and each stage balances
    /// x(k-1) + E x(k+1) = (1 + E) x(k). Counted back from the last stage.
    /// </summary>
    private static double Countercurrent(double extraction, int stages)
    {
        double after = 1, slagIn = 0;
        for (var stage = stages; stage >= 1; stage--)
        {
            var before = after + (extraction * after) - slagIn;
            slagIn = extraction * after;
            after = before;
        }

        return 1 / after;
    }

    /// <summary>Carrier gas in small steps; each step leaves with the metal vapour of the moment (midpoint rule in ln x).</summary>
    private static double GasFlushing(Example e)
    {
        const int steps = 20_000;
        var width = Math.Log(e["x0"] / e["x1"]) / steps;
        var gas = 0.0;
        for (var step = 0; step < steps; step++)
        {
            var x = e["x0"] * Math.Exp(-(step + 0.5) * width);
            gas += (e["P_atm"] - (e["k_atm"] * x)) / e["k_atm"] * width;
        }

        return gas;
    }

    private static double Deoxidation(Example e)
    {
        var constant = Math.Pow(10, (e["A"] / e["T"]) + e["B"]);
        return e.Has("Al") ? Math.Cbrt(constant / (e["Al"] * e["Al"])) : Math.Sqrt(constant / e["Si"]);
    }

    private static double ThreePhaseBalance(Example e)
    {
        var metalMol = e["W_metal"] * 1000 / e["M_solvent"];
        var gasMol = e["V_Nm3"] / e["molar_volume"];
        return 1 / (1 + (e["L"] * e["W_slag"] / e["W_metal"]) + (gasMol * e["k_atm"] / metalMol));
    }

    /// <summary>Material that goes round: what is not in the metal comes back in part, pass after pass.</summary>
    private static double Recycle(Example e)
    {
        double recovered = 0, going = 1;
        while (going > 1e-14)
        {
            recovered += going * e["to_metal"];
            going *= (1 - e["to_metal"]) * e["slag_recovered"];
        }

        return recovered;
    }

    private double OxideSlope(Example e)
    {
        // The slope does not depend on the constants; those of the example before serve.
        var constants = new Example(RowFiles.All.Single(row => row.Recipe == "example-oxide-partition").Fields["setup"]);
        return OxidePartition(constants, constants["log10_pO2"] + e["dlog"]) / OxidePartition(constants, constants["log10_pO2"]);
    }

    /// <summary>Mole fraction in the slag over that in the metal from the product, with the constants of the example in place of its own.</summary>
    private double OxidePartition(Example e, double log10OxygenPressure)
    {
        var slag = furnace.Catalogue.SlagFamilies["iron-silicate"].Components
            .Select(component => new ChargeItem(component.Formula, component.TypicalMassPercent));
        var answer = furnace.Solve(new VesselCase
        {
            TemperatureKelvin = e["T"],
            Solvent = "Cu",
            SlagFamily = "iron-silicate",
            Oxygen = new OxygenStatement.Pressure(log10OxygenPressure),
            Charge = [new ChargeItem("Cu", 100), new ChargeItem("Ni", 1e-5), .. slag],
            Overrides =
            [
                new DatumOverride("metal/Cu/Ni", OverrideKind.LnGamma, Math.Log(e["gamma0"])),
                new DatumOverride("slag/iron-silicate/NiO", OverrideKind.LnGamma, Math.Log(e["gamma_slag"])),
                new DatumOverride("oxidation/NiO", OverrideKind.GibbsEnergy, e["A"] + (e["B"] * e["T"])),
            ],
        });

        // The metal is not quite dilute (iron, oxygen), so the interaction part of the coefficient is divided out.
        var metal = Answer.Species(answer.Metal!, "Ni");
        return Answer.MoleFraction(answer.Slag!, "Ni") / metal.MoleFraction * e["gamma0"] / metal.ActivityCoefficient!.Value;
    }
}
