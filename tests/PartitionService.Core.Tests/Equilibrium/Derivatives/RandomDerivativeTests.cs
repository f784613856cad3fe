using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;
using Xunit.Abstractions;

namespace PartitionService.Core.Tests.Equilibrium.Derivatives;

public sealed class RandomDerivativeTests(ITestOutputHelper output)
{
    private static readonly EquilibriumSolver Solver = new(CatalogueLoader.LoadEmbedded());

    private static readonly (string Solvent, string Family, double Low, double High)[] Baths =
    [
        ("Cu", "iron-silicate", 1480, 1600), ("Cu", "calcium-ferrite", 1480, 1600), ("Cu", "ferrous-calcium-silicate", 1480, 1600),
        ("Pb", "lead-smelting", 1300, 1500), ("Fe", "basic-steelmaking", 1825, 1950), ("Fe", "lime-silica-alumina", 1800, 1950),
        ("Ag", "soda-alkali", 1300, 1500), ("Sn", "lime-silica-alumina", 1350, 1600),
    ];

    private static readonly string[] Traces = ["Sn", "Pb", "Zn", "Ni", "As", "Sb", "Bi", "Ag", "Te", "Se", "Co", "In", "Mn", "Cr", "Fe", "Cu"];

    private static readonly string[] Matrix = ["FeO", "CaO", "SiO2", "Al2O3", "MgO"];

    public static TheoryData<int> Seeds => [.. Enumerable.Range(1, 16)];

    [Theory]
    [MemberData(nameof(Seeds))]
    public void Random_vessels_agree_with_central_differences(int seed)
    {
        var vesselCase = Draw(new Random(seed));
        var report = CentralDifference.Solve(vesselCase, DerivativeSelection.All with { Data = false }).Derivatives!;
        var comparison = new DerivativeComparison();
        foreach (var column in report.Columns.Where(column => column.Kind != DerivativeParameterKind.OxygenInput))
        {
            var (at, step) = ParameterMoves.Of(vesselCase, column);
            comparison.Add(report, column, CentralDifference.Of(at, step, report.Outputs));
        }

        comparison.Check(2 * report.Outputs.Count, output);
    }

    /// <summary>The first vessel of a random sequence that has an answer: some ask for more than can be.</summary>
    private static VesselCase Draw(Random random)
    {
        while (true)
        {
            var vesselCase = Vessel(random);
            if (Solver.Solve(vesselCase) is SolveOutcome.Solved)
            {
                return vesselCase;
            }
        }
    }

    private static VesselCase Vessel(Random random)
    {
        var (solvent, family, low, high) = Baths[random.Next(Baths.Length)];
        var charge = new List<ChargeItem> { new(solvent, 500 + (500 * random.NextDouble())) };
        charge.AddRange(Traces.Where(e => e != solvent && random.NextDouble() < 0.6).Select(e => new ChargeItem(e, 10 * Math.Pow(random.NextDouble(), 3))));
        charge.AddRange(Matrix.Select(oxide => new ChargeItem(oxide, 10 + (90 * random.NextDouble()))));
        charge.Add(new ChargeItem("FeS", random.NextDouble()));
        charge.Add(new ChargeItem("N2", 5 + (50 * random.NextDouble()), ChargeUnit.NormalCubicMetre));
        charge.Add(new ChargeItem("C", 2 * random.NextDouble()));
        OxygenStatement[] statements =
        [
            new OxygenStatement.Closed(),
            new OxygenStatement.Pressure(solvent == "Fe" ? -10 + random.NextDouble() : -9 + (2 * random.NextDouble())),
            new OxygenStatement.CarbonDioxideToMonoxide(solvent == "Fe" ? 0.05 : 1 + random.NextDouble()),
            new OxygenStatement.WaterToHydrogen(solvent == "Fe" ? 0.1 : 1 + random.NextDouble()),
        ];
        return new VesselCase
        {
            TemperatureKelvin = low + ((high - low) * random.NextDouble()),
            PressureAtm = 0.5 + random.NextDouble(),
            Solvent = solvent,
            SlagFamily = family,
            GasAllowed = random.NextDouble() < 0.8,
            Charge = charge,
            Oxygen = statements[random.Next(statements.Length)],
            Allowances = random.NextDouble() < 0.5
                ? PracticeAllowances.None
                : new PracticeAllowances
                {
                    MetalInSlagMassPercent = 5 * random.NextDouble(),
                    SlagInMetalMassPercent = random.NextDouble(),
                    MechanicalDustMassFraction = 0.05 * random.NextDouble(),
                },
        };
    }
}
