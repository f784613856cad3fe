using PartitionService.Core.Equilibrium;
using Xunit.Abstractions;

namespace PartitionService.Core.Tests.Equilibrium.Derivatives;

public sealed class ConditionDerivativeTests(ITestOutputHelper output)
{
    [Theory]
    [MemberData(nameof(DerivativeCases.Names), MemberType = typeof(DerivativeCases))]
    public void Conditions_and_inputs_agree_with_central_differences(string name)
    {
        var vesselCase = DerivativeCases.Named(name);
        var report = CentralDifference.Solve(
            vesselCase, DerivativeSelection.All with { Data = false }).Derivatives!;
        var comparison = new DerivativeComparison();
        foreach (var column in report.Columns)
        {
            var (at, step) = ParameterMoves.Of(vesselCase, column);
            comparison.Add(report, column, CentralDifference.Of(at, step, report.Outputs));
        }

        comparison.Check(3 * report.Columns.Count, output);
    }

    [Theory]
    [MemberData(nameof(DerivativeCases.Names), MemberType = typeof(DerivativeCases))]
    public void Shares_of_one_element_stay_one_together_when_nothing_else_takes_it(string name)
    {
        var vesselCase = DerivativeCases.Named(name);
        var answer = CentralDifference.Solve(vesselCase, DerivativeSelection.All);
        var report = answer.Derivatives!;
        var full = answer.Elements
            .Where(e => e.MechanicalDustFraction + e.UnburntCarbonFraction + e.UnplacedFraction == 0)
            .Select(e => e.Element).ToHashSet(StringComparer.Ordinal);
        foreach (var column in report.Columns)
        {
            for (var o = 0; o + 2 < report.Outputs.Count && report.Outputs[o].Element.Length > 0; o += 3)
            {
                if (full.Contains(report.Outputs[o].Element))
                {
                    var largest = Math.Max(Math.Abs(column.Values[o]), Math.Max(Math.Abs(column.Values[o + 1]), Math.Abs(column.Values[o + 2])));
                    var size = Math.Max(1, Math.Abs(column.Value));
                    Assert.True(
                        Math.Abs(column.Values[o] + column.Values[o + 1] + column.Values[o + 2]) <= (1e-9 * largest) + (1e-11 / size),
                        $"{report.Outputs[o].Element} with {column.Kind} {column.Name}");
                }
            }
        }
    }

    [Theory]
    [MemberData(nameof(DerivativeCases.Names), MemberType = typeof(DerivativeCases))]
    public void A_larger_charge_of_the_same_make_up_changes_amounts_and_nothing_else(string name)
    {
        var vesselCase = DerivativeCases.Named(name);
        var answer = CentralDifference.Solve(vesselCase, new DerivativeSelection { Inputs = true });
        var report = answer.Derivatives!;
        var values = CentralDifference.Outputs(answer, report.Outputs);
        for (var o = 0; o < report.Outputs.Count; o++)
        {
            var sum = report.Columns.Sum(column => column.Values[o] * column.Value);
            var gross = report.Columns.Sum(column => Math.Abs(column.Values[o] * column.Value));
            if (double.IsNaN(values[o]))
            {
                continue;
            }

            var isAmount = report.Outputs[o].Kind
                is DerivativeOutputKind.MetalAmount or DerivativeOutputKind.SlagAmount or DerivativeOutputKind.GasAmount;
            Assert.True(
                Math.Abs(sum - (isAmount ? values[o] : 0)) <= 1e-8 * (gross + Math.Abs(values[o])),
                $"{report.Outputs[o]}: {sum} of {gross}");
        }
    }

    [Fact]
    public void Nothing_is_computed_unless_asked_for()
    {
        Assert.Null(CentralDifference.Solve(DerivativeCases.Named("copper fire refining")).Derivatives);
        var report = CentralDifference.Solve(
            DerivativeCases.Named("copper fire refining"), new DerivativeSelection { Pressure = true }).Derivatives!;
        Assert.Equal(DerivativeParameterKind.Pressure, Assert.Single(report.Columns).Kind);
    }

    [Fact]
    public void Inputs_come_in_the_order_of_the_charge_and_an_empty_one_that_brings_an_element_has_none()
    {
        var vesselCase = DerivativeCases.Named("copper fire refining");
        vesselCase = vesselCase with { Charge = [new("Te", 0), .. vesselCase.Charge, new("PbO", 0)] };
        var columns = CentralDifference.Solve(vesselCase, new DerivativeSelection { Inputs = true }).Derivatives!.Columns;
        Assert.Equal(vesselCase.Charge.Select(item => item.Formula), columns.Select(column => column.Name));
        Assert.Equal(Enumerable.Range(0, columns.Count), columns.Select(column => column.Index));
        Assert.False(columns[0].IsDefined);
        Assert.All(columns[0].Values, value => Assert.Equal(0, value));
        Assert.True(columns[^1].IsDefined);
        Assert.Contains(columns[^1].Values, value => value != 0);
    }
}
