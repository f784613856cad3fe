using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;
using PartitionService.Core.Thermodynamics;
using Xunit.Abstractions;

namespace PartitionService.Core.Tests.Equilibrium.Derivatives;

public sealed class DatumDerivativeTests(ITestOutputHelper output)
{
    private const int MostSlots = 45;

    private static readonly ThermochemicalCatalogue Catalogue = CatalogueLoader.LoadEmbedded();

    [Theory]
    [MemberData(nameof(DerivativeCases.Names), MemberType = typeof(DerivativeCases))]
    public void Data_agree_with_central_differences_of_their_overrides(string name)
    {
        var vesselCase = DerivativeCases.Named(name);
        var answer = CentralDifference.Solve(vesselCase, new DerivativeSelection { Data = true });
        var columns = answer.Derivatives!.Columns.Where(column => Kind(column.Name) is not null).ToArray();
        var comparison = new DerivativeComparison();
        var stride = Math.Max(1, (columns.Length + MostSlots - 1) / MostSlots);
        for (var k = 0; k < columns.Length; k += stride)
        {
            var column = columns[k];
            var value = FromReference(column, answer, vesselCase.TemperatureKelvin);
            var moved = CentralDifference.Solve(With(vesselCase, column.Name, value), new DerivativeSelection { Data = true }).Derivatives!;
            var exact = moved.Columns.Single(c => c.Name == column.Name);
            comparison.Add(
                moved, exact, CentralDifference.Of(h => With(vesselCase, column.Name, value + h), Step(column.Name, value), moved.Outputs));
            if (HasNoSlope(column.Name))
            {
                for (var o = 0; o < exact.Values.Count; o++)
                {
                    Assert.True(
                        Math.Abs(exact.Values[o] - column.Values[o]) <= 1e-7 * Math.Abs(column.Values[o]) + 1e-18,
                        $"{answer.Derivatives.Outputs[o]} with {column.Name}: {column.Values[o]}, overridden {exact.Values[o]}");
                }
            }
        }

        comparison.Check(columns.Length / (2 * stride), output);
    }

    [Fact]
    public void Every_datum_of_the_answer_has_a_column_in_its_order()
    {
        var answer = CentralDifference.Solve(
            DerivativeCases.Named("steel, closed, sulfur and phosphorus"), new DerivativeSelection { Data = true });
        Assert.Equal(
            answer.DataUsed.Select(use => use.Key.Split('#')[0]).Distinct(),
            answer.Derivatives!.Columns.Select(column => column.Name));
        Assert.All(answer.Derivatives.Columns, column => Assert.Equal(DerivativeParameterKind.Datum, column.Kind));
        Assert.Contains(answer.Derivatives.Columns, column => column.Name == SulfideCapacity.Slot);
        Assert.Contains(answer.Derivatives.Columns, column => column.Name == PhosphorusPartition.Slot);
    }

    [Fact]
    public void Without_a_gas_a_larger_sulfide_capacity_acts_like_a_larger_activity_coefficient_in_the_metal()
    {
        // Only the quotient of the two holds the sulfur of metal and slag apart, so the two columns are proportional: ln 10.
        var report = CentralDifference.Solve(
            DerivativeCases.Named("steel, fixed potential, no gas"), new DerivativeSelection { Data = true }).Derivatives!;
        var capacity = report.Columns.Single(column => column.Name == SulfideCapacity.Slot).Values;
        var metal = report.Columns.Single(column => column.Name == "metal/Fe/S").Values;
        var sulfur = report.Outputs.ToList().FindIndex(o => o is { Kind: DerivativeOutputKind.SlagFraction, Element: "S" });
        Assert.True(capacity[sulfur] > 1e-4);
        for (var o = 0; o < capacity.Count; o++)
        {
            Assert.Equal(Math.Log(10) * metal[o], capacity[o], 1e-9 * Math.Abs(capacity[o]));
        }
    }

    [Fact]
    public void The_phosphorus_formula_alone_divides_phosphorus_between_steel_and_slag()
    {
        var answer = CentralDifference.Solve(
            DerivativeCases.Named("steel, fixed potential, no gas"), new DerivativeSelection { Data = true });
        var report = answer.Derivatives!;
        var formula = report.Columns.Single(column => column.Name == PhosphorusPartition.Slot).Values;
        var coefficient = report.Columns.Single(column => column.Name == "metal/Fe/P").Values;
        var row = report.Outputs.ToList().FindIndex(o => o is { Kind: DerivativeOutputKind.SlagFraction, Element: "P" });
        var share = answer.Elements.Single(e => e.Element == "P").SlagFraction;
        Assert.Equal(0, coefficient[row], 1e-10);

        // At fixed amounts of the phases the share follows a logistic curve; phosphorus is too dilute to move them much.
        Assert.Equal(1, formula[row] / (Math.Log(10) * share * (1 - share)), 0.02);
    }

    [Fact]
    public void A_parameter_that_an_override_sets_to_zero_still_has_its_derivative()
    {
        var vesselCase = With(DerivativeCases.Named("steel, closed, sulfur and phosphorus"), "interaction/Fe/Cr/S", 0);
        var report = CentralDifference.Solve(vesselCase, new DerivativeSelection { Data = true }).Derivatives!;
        var column = report.Columns.Single(c => c.Name == "interaction/Fe/Cr/S");
        var comparison = new DerivativeComparison();
        comparison.Add(report, column, CentralDifference.Of(h => With(vesselCase, column.Name, h), 0.5, report.Outputs));
        comparison.Check(5, output);
    }

    private static VesselCase With(VesselCase vesselCase, string slot, double value) => vesselCase with
    {
        Overrides = [.. vesselCase.Overrides.Where(o => o.Slot != slot), new DatumOverride(slot, Kind(slot)!.Value, value)],
    };

    private static OverrideKind? Kind(string slot) => slot.Split('/')[0] switch
    {
        "metal" or "slag" => OverrideKind.LnGamma,
        "oxidation" or "chloride" or "gas" => OverrideKind.GibbsEnergy,
        "interaction" => OverrideKind.Epsilon,
        _ => null,
    };

    private static double Step(string slot, double value) => Kind(slot) switch
    {
        OverrideKind.LnGamma => 0.02,
        OverrideKind.GibbsEnergy => 300,
        _ => 0.02 * Math.Max(1, Math.Abs(value)),
    };

    /// <summary>An oxidation override is stated from the liquid metal, whatever the state of its row.</summary>
    private static double FromReference(DerivativeColumn column, VesselAnswer answer, double temperatureKelvin)
    {
        var use = answer.DataUsed.First(u => u.Key.Split('#')[0] == column.Name);
        return !use.Overridden && Catalogue.Slot(column.Name).FirstOrDefault(row => row.Key == use.Key) is OxidationDatum row
            ? column.Value + (PhysicalConstants.GasConstant * temperatureKelvin * StateConversion.LnReferenceOverState(
                Catalogue.Elements[row.Element], row.MetalState, temperatureKelvin, Catalogue)!.Value)
            : column.Value;
    }

    /// <summary>An override replaces a composition slope together with the number, so only the others keep all their derivatives.</summary>
    private static bool HasNoSlope(string slot) =>
        Catalogue.Slot(slot).Count(row => row.Preferred) == 1
        && Catalogue.Slot(slot).Single(row => row.Preferred) is not SlagActivityDatum { Variable: not null };
}
