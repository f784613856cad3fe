using PartitionService.Core.Equilibrium;
using PartitionService.Core.Equilibrium.Assembly;
using PartitionService.Core.Equilibrium.Charging;

namespace PartitionService.Core.Tests.Equilibrium.Assembly;

public sealed class SolventSelectionTests
{
    [Fact]
    public void Stated_solvent_is_taken_even_where_another_metal_is_more() =>
        Assert.Equal("Sn", Choose("Sn", out _, new("Pb", 100), new("Sn", 1)));

    /// <summary>Amounts count, not masses: 100 kg Cu are 1574 mol, 200 kg Pb only 965.</summary>
    [Fact]
    public void Unstated_solvent_is_the_metal_with_the_largest_amount() =>
        Assert.Equal("Cu", Choose(null, out _, new("Cu", 100), new("Pb", 200)));

    [Fact]
    public void Oxides_do_not_make_a_solvent() => Assert.Equal("Pb", Choose(null, out _, new("Pb", 1), new("FeO", 1000)));

    [Fact]
    public void A_stated_solvent_that_is_not_charged_fails()
    {
        Assert.Null(Choose("Cu", out var failure, new ChargeItem("Pb", 1)));
        Assert.Equal(SolveFailure.NoSolvent, failure!.Reason);
        Assert.Equal(["Cu"], failure.Elements);
        Assert.Contains("is not in the charge", failure.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_charge_without_metal_needs_a_statement()
    {
        Assert.Null(Choose(null, out var failure, new ChargeItem("PbO", 1)));
        Assert.Contains("must be stated (metal.solvent)", failure!.Message, StringComparison.Ordinal);
        Assert.Empty(failure.Elements);
    }

    [Fact]
    public void A_main_metal_that_is_no_known_solvent_is_named()
    {
        Assert.Null(Choose(null, out var failure, new("W", 1000), new("Cu", 1)));
        Assert.Equal(["W"], failure!.Elements);
        Assert.Contains("The main metal of the charge, W, is no solvent", failure.Message, StringComparison.Ordinal);
    }

    private static string? Choose(string? stated, out SolveOutcome.Failed? failure, params ChargeItem[] charge)
    {
        var account = ChargeAccount.Split(
            charge.Select(item => ChargeReader.Read(item, Vessels.Catalogue.Elements)), PracticeAllowances.None, true, _ => true, _ => 1);
        return SolventSelection.Choose(stated, account, Vessels.Catalogue, out failure);
    }
}
