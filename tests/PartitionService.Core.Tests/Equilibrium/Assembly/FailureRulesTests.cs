using PartitionService.Core.Equilibrium;

namespace PartitionService.Core.Tests.Equilibrium.Assembly;

/// <summary>Every typed failure by a real case, each beside the change that its message asks for.</summary>
public sealed class FailureRulesTests
{
    [Fact]
    public void More_oxygen_than_the_elements_can_bind_has_no_home()
    {
        var vessel = Vessels.BlackCopper with
        {
            GasAllowed = false,
            Oxygen = new OxygenStatement.Closed(),
            Charge = [new("Cu", 1), new("O2", 100)],
        };
        var failure = Vessels.Failure(vessel);
        Assert.Equal(SolveFailure.OxygenHasNoHome, failure.Reason);
        Assert.Equal(["O"], failure.Elements);

        // 100 kg of O2 are 6250 mol of atoms; 1 kg of Cu binds 0.5 x 15.74 = 7.868 mol as Cu2O.
        Assert.Contains("6250 mol of oxygen", failure.Message, StringComparison.Ordinal);
        Assert.Contains("bind only 7.868 mol", failure.Message, StringComparison.Ordinal);
        Assert.True(Vessels.Answer(vessel with { Oxygen = new OxygenStatement.Pressure(-8) }).Redox.OxygenToSupplyKg < -99);
    }

    [Fact]
    public void A_potential_at_which_the_metal_fills_with_oxygen_has_no_home_without_slag()
    {
        var vessel = Vessels.BlackCopper with { SlagFamily = null, GasAllowed = false, Charge = [new("Cu", 10)] };
        var failure = Vessels.Failure(vessel with { Oxygen = new OxygenStatement.Pressure(1) });
        Assert.Equal(SolveFailure.OxygenHasNoHome, failure.Reason);
        Assert.Contains("log10 pO2 = 1", failure.Message, StringComparison.Ordinal);
        Assert.NotNull(Vessels.Answer(vessel).Metal);
    }

    /// <summary>Regression: just below that potential the interaction of oxygen with itself fills the metal, which was called a matter of pressure.</summary>
    [Fact]
    public void A_metal_without_limit_was_blamed_on_the_pressure()
    {
        var failure = Vessels.Failure(
            Vessels.BlackCopper with
            {
                SlagFamily = null,
                GasAllowed = false,
                Charge = [new("Cu", 10)],
                Oxygen = new OxygenStatement.Pressure(-1),
            });
        Assert.Equal(SolveFailure.OxygenHasNoHome, failure.Reason);
        Assert.DoesNotContain("pressure", failure.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void An_oxygen_pressure_above_the_total_pressure_is_exceeded()
    {
        var vessel = Vessels.BlackCopper with { Oxygen = new OxygenStatement.Pressure(1) };
        var failure = Vessels.Failure(vessel);
        Assert.Equal(SolveFailure.PressureExceeded, failure.Reason);
        Assert.Contains("higher pressure", failure.Message, StringComparison.Ordinal);
        Assert.NotNull(Vessels.Answer(vessel with { PressureAtm = 100 }).Gas);
    }

    [Fact]
    public void A_charge_without_metal_has_no_solvent()
    {
        var vessel = Vessels.BlackCopper with { Solvent = null, Charge = [new("FeO", 100), new("SiO2", 50)] };
        Assert.Equal(SolveFailure.NoSolvent, Vessels.Failure(vessel).Reason);
    }

    [Fact]
    public void Dissolved_oxygen_needs_a_datum()
    {
        var vessel = new VesselCase
        {
            TemperatureKelvin = 1750,
            Solvent = "Si",
            Oxygen = new OxygenStatement.Dissolved(1),
            Charge = [new("Si", 10)],
        };
        var failure = Vessels.Failure(vessel);
        Assert.Equal(SolveFailure.DissolvedOxygenNotReachable, failure.Reason);
        Assert.Equal(["O", "Si"], failure.Elements);
        Assert.NotNull(Vessels.Answer(vessel with { Overrides = [new("metal/Si/O", OverrideKind.LnGamma, -10)] }).Metal);
    }

    /// <summary>Regression: steel cannot hold 4 mass % of oxygen, all iron goes to the slag; the answer had no metal and no failure.</summary>
    [Fact]
    public void Dissolved_oxygen_was_answered_without_a_metal_to_hold_it()
    {
        var failure = Vessels.Failure(Vessels.Steel with { Oxygen = new OxygenStatement.Dissolved(40000) });
        Assert.Equal(SolveFailure.DissolvedOxygenNotReachable, failure.Reason);
        Assert.Equal(["O", "Fe"], failure.Elements);
    }

    /// <summary>Chlorine over lead without slag or gas has nothing to sit in.</summary>
    [Fact]
    public void An_element_that_no_phase_holds_is_left_unplaced_and_not_a_failure()
    {
        var answer = Vessels.Answer(Vessels.Lead.Plus(new ChargeItem("Cl2", 1)));
        Assert.Equal(1, answer.Row("Cl").UnplacedFraction);
    }

    [Fact]
    public void A_cancelled_solve_throws()
    {
        using var source = new CancellationTokenSource();
        source.Cancel();
        Assert.Throws<OperationCanceledException>(() => new EquilibriumSolver(Vessels.Catalogue).Solve(Vessels.BlackCopper, source.Token));
    }
}
