using PartitionService.Core.Equilibrium;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Tests.Equilibrium;

/// <summary>What lies exactly on a limit is valid, just beyond it is not.</summary>
public sealed class CaseLimitsTests
{
    [Theory]
    [InlineData(PhysicalConstants.MinimumTemperatureKelvin, true)]
    [InlineData(PhysicalConstants.MaximumTemperatureKelvin, true)]
    [InlineData(499.999, false)]
    [InlineData(2500.001, false)]
    public void Temperature(double kelvin, bool valid) => AssertValid(valid, Vessels.BlackCopper with { TemperatureKelvin = kelvin });

    [Theory]
    [InlineData(1e-6, true)]
    [InlineData(100, true)]
    [InlineData(0.99e-6, false)]
    [InlineData(100.1, false)]
    public void Pressure(double atm, bool valid) => AssertValid(valid, Vessels.BlackCopper with { PressureAtm = atm });

    [Theory]
    [InlineData(100, true)]
    [InlineData(101, false)]
    public void Name(int length, bool valid) => AssertValid(valid, Vessels.BlackCopper with { Name = new string('x', length) });

    [Theory]
    [InlineData(200, true)]
    [InlineData(201, false)]
    public void Charge_items(int count, bool valid) =>
        AssertValid(valid, Vessels.BlackCopper with { Charge = [.. Enumerable.Repeat(new ChargeItem("Cu", 1), count)] });

    [Theory]
    [InlineData(0, true)]
    [InlineData(1e9, true)]
    [InlineData(1.001e9, false)]
    public void Quantity(double kilogram, bool valid) => AssertValid(valid, Vessels.BlackCopper.Plus(new ChargeItem("Zn", kilogram)));

    [Theory]
    [InlineData(100, true)]
    [InlineData(101, false)]
    public void Overrides(int count, bool valid)
    {
        var slots = Vessels.Catalogue.Data.Select(d => d.Slot).Where(s => s.StartsWith("metal/", StringComparison.Ordinal)).Distinct();
        AssertValid(
            valid,
            Vessels.BlackCopper with { Overrides = [.. slots.Take(count).Select(s => new DatumOverride(s, OverrideKind.LnGamma, 0))] });
    }

    [Fact]
    public void More_stage_efficiencies_than_elements_cannot_all_be_valid() =>
        Assert.True(CaseLimits.StageEfficiencies >= Vessels.Catalogue.Elements.Count);

    private static void AssertValid(bool valid, VesselCase vessel) => Assert.Equal(valid, Vessels.Violations(vessel).Count == 0);
}
