using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;
using PartitionService.PublishedChecks.Rows;

namespace PartitionService.PublishedChecks.Cases;

/// <summary>Turns a setup into a vessel and solves it; keeps every answer for the checks on closure.</summary>
internal sealed class Furnace
{
    /// <summary>Mass of a trace element, kg, where the setup states none: 10 ppm of the usual metal.</summary>
    private const double TraceKg = 0.01;

    /// <summary>log10 pO2 of a metal that is kept free of oxygen.</summary>
    private const string NoOxygen = "log:-25";

    private readonly EquilibriumSolver solver = new(CatalogueLoader.LoadEmbedded());

    private readonly List<VesselAnswer> answers = [];

    /// <summary>The product's catalogue.</summary>
    public ThermochemicalCatalogue Catalogue => solver.Catalogue;

    /// <summary>Every answer so far.</summary>
    public IReadOnlyList<VesselAnswer> Answers => answers;

    /// <summary>Atomic mass in g/mol.</summary>
    public double AtomicMass(string element) => Catalogue.Elements[element].AtomicMassGramPerMol;

    /// <summary>Solves the vessel of a setup with some solutes at the stated or trace level.</summary>
    /// <exception cref="InvalidOperationException">The vessel has no solution; the message says why.</exception>
    public VesselAnswer Solve(Setup setup, params IReadOnlyList<string> solutes)
    {
        var vessel = new VesselCase
        {
            TemperatureKelvin = setup.Number("temperature_kelvin"),
            PressureAtm = setup.Number("pressure_pascal", 101325) / 101325,
            Solvent = setup["solvent"],
            SlagFamily = setup.Has("family") ? setup["family"] : null,
            GasAllowed = setup.Has("gas") || setup.Has("pressure_pascal"),
            Oxygen = Oxygen(setup),
            Charge = [.. Charge(setup, solutes)],
            Allowances = new PracticeAllowances { MetalInSlagTypical = setup.Has("metal_in_slag") },
        };
        return Solve(vessel);
    }

    /// <summary>Solves a vessel.</summary>
    /// <exception cref="InvalidOperationException">The vessel has no solution; the message says why.</exception>
    public VesselAnswer Solve(VesselCase vessel)
    {
        switch (solver.Solve(vessel))
        {
            case SolveOutcome.Solved solved:
                answers.Add(solved.Answer);
                return solved.Answer;
            case SolveOutcome.Invalid invalid:
                throw new InvalidOperationException(string.Join("; ", invalid.Violations));
            case SolveOutcome.Failed failed:
                throw new InvalidOperationException($"{failed.Reason}: {failed.Message}");
            default:
                throw new InvalidOperationException("unknown outcome");
        }
    }

    private IEnumerable<ChargeItem> Charge(Setup setup, IReadOnlyList<string> solutes)
    {
        var solvent = setup["solvent"];
        var metalKg = setup.Number("metal_kg", 1000);
        var metal = setup.Has("metal") ? setup.Amounts("metal") : [(solvent, 1.0)];
        foreach (var (formula, share) in metal)
        {
            yield return new ChargeItem(formula, metalKg * share / metal.Sum(part => part.Amount));
        }

        var carbon = setup.Has("carbon_saturated")
            ? SaturationMassPercent(setup.Number("temperature_kelvin")) / 100
            : setup.Number("carbon_mass_percent", 0) / 100;
        if (carbon > 0)
        {
            yield return new ChargeItem("C", metalKg * carbon / (1 - carbon));
        }

        if (setup.Has("sulfur_mass_percent"))
        {
            yield return new ChargeItem("S", metalKg * setup.Number("sulfur_mass_percent") / 100);
        }

        foreach (var solute in solutes.Where(solute => solute != solvent && solute != "O").Distinct())
        {
            yield return new ChargeItem(solute, SoluteKg(setup, solute, metalKg));
        }

        foreach (var item in SlagCharge(setup).Concat(setup.Amounts("gas")
            .Select(gas => new ChargeItem(gas.Formula, gas.Amount, ChargeUnit.NormalCubicMetre))))
        {
            yield return item;
        }
    }

    /// <summary>
    /// Carbon of iron under graphite, [%C] = 1.34 + 2.54e-3 t with t in degC: Neumann, Schenck and Patterson, Giesserei 47 (1960) 25,
    /// from memory. Rows about carbon-saturated iron are set up at the published content, not at the product's own saturation.
    /// </summary>
    private static double SaturationMassPercent(double temperatureKelvin) => 1.34 + (2.54e-3 * (temperatureKelvin - 273.15));

    private IEnumerable<ChargeItem> SlagCharge(Setup setup)
    {
        if (!setup.Has("family"))
        {
            return [];
        }

        var composition = setup.Has("slag")
            ? setup.Amounts("slag")
            : [.. Catalogue.SlagFamilies[setup["family"]].Components.Select(c => (c.Formula, c.TypicalMassPercent))];
        var whole = composition.Sum(part => part.Item2);
        return composition.Where(part => part.Item2 > 0)
            .Select(part => new ChargeItem(part.Item1, setup.Number("slag_kg", 1000) * part.Item2 / whole));
    }

    private double SoluteKg(Setup setup, string solute, double metalKg)
    {
        if (setup.Has("solute_mass_percent"))
        {
            var share = setup.Number("solute_mass_percent") / 100;
            return metalKg * share / (1 - share);
        }

        if (setup.Has("solute_mole_fraction"))
        {
            var fraction = setup.Number("solute_mole_fraction");
            return metalKg * fraction / (1 - fraction) * AtomicMass(solute) / AtomicMass(setup["solvent"]);
        }

        return setup.Number("solute_kg", TraceKg);
    }

    private static OxygenStatement Oxygen(Setup setup)
    {
        var words = (setup.Has("oxygen") ? setup["oxygen"] : NoOxygen).Split(':');
        double Word(int index, double usual) => words.Length > index
            ? double.Parse(words[index], System.Globalization.CultureInfo.InvariantCulture)
            : usual;
        return words[0] switch
        {
            "log" => new OxygenStatement.Pressure(Word(1, 0)),
            "pair" => new OxygenStatement.MetalOxidePair(words[1], Word(2, 1), Word(3, 1)),
            "closed" => new OxygenStatement.Closed(),
            _ => throw new InvalidDataException($"unknown statement about oxygen: {words[0]}"),
        };
    }
}
