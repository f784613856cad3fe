using Grpc.Core;
using PartitionService.Core.Equilibrium;
using PartitionService.Server.Errors;
using PartitionService.Server.Tests.Support;

namespace PartitionService.Server.Tests.Errors;

public sealed class FieldViolationsTests
{
    [Fact]
    public async Task Two_hundred_bad_items_are_all_listed()
    {
        await using var server = await RunningServer.StartAsync();
        var request = WireCases.Request();
        request.VesselCase.Charge.Clear();
        request.VesselCase.Charge.AddRange(Enumerable.Range(0, 200).Select(_ => new Contracts.V1.ChargeItem { Formula = "Cu", MassKg = -1 }));
        var error = await CallError.OfAsync(server.Equilibrium.SolveChargeAsync(request));
        Assert.Equal(StatusCode.InvalidArgument, error.Status);
        Assert.Equal(Enumerable.Range(0, 200).Select(i => $"vessel_case.charge[{i}].mass_kg"), error.Fields.Where(f => f.Contains("mass_kg", StringComparison.Ordinal)));
    }

    /// <summary>The worst case still reaches the caller as a status and not as a broken connection.</summary>
    [Fact]
    public async Task List_that_no_reply_can_carry_ends_with_a_count()
    {
        await using var server = await RunningServer.StartAsync();
        var request = WireCases.Request();
        request.VesselCase.Charge.Clear();
        request.VesselCase.Charge.AddRange(Enumerable.Range(0, 200).Select(i => new Contracts.V1.ChargeItem { Formula = new string('(', 90), MassKg = -i - 1 }));
        request.VesselCase.Overrides.AddRange(Enumerable.Range(0, 100).Select(i => new Contracts.V1.DatumOverride { Slot = "metal/" + new string('x', 90), Source = new string('y', 300) }));
        request.VesselCase.Allowances = new Contracts.V1.PracticeAllowances();
        request.VesselCase.Allowances.StageEfficiencies.AddRange(Enumerable.Range(0, 100).Select(_ => new Contracts.V1.StageEfficiency { Element = "Qq", Efficiency = 7 }));
        var error = await CallError.OfAsync(server.Equilibrium.SolveChargeAsync(request));
        Assert.Equal("INVALID_CASE", error.Reason);
        var last = error.BadRequest!.FieldViolations[^1];
        Assert.Equal("LEFT_OUT", last.Reason);
        Assert.Matches("^[0-9]+ further violations", last.Description);
        Assert.InRange(error.BadRequest.CalculateSize(), FieldViolations.MaximumBytes / 2, FieldViolations.MaximumBytes);
    }

    [Theory]
    [InlineData(60)]
    [InlineData(61)]
    [InlineData(5000)]
    public void Long_values_are_cut(int length)
    {
        var shown = FieldViolations.Shorten(new string('a', length));
        Assert.Equal(length <= 60 ? length : 63, shown.Length);
    }

    [Fact]
    public void Cut_does_not_split_a_character()
    {
        var text = new string('a', 59) + "\U0001D54F" + new string('b', 20);
        Assert.Equal(new string('a', 59) + "...", FieldViolations.Shorten(text));
    }

    [Fact]
    public void Summary_counts_and_names_the_first()
    {
        CaseViolation[] violations = [new("a", "1", "must be 2"), new("b", "", "needs b")];
        Assert.Equal("2 fields are not valid; the first: a is 1; must be 2", FieldViolations.Summary(violations));
        Assert.Equal("b: needs b", FieldViolations.Summary(violations[1..]));
    }
}
