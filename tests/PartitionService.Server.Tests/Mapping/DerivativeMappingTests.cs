using PartitionService.Core.Equilibrium;
using PartitionService.Server.Mapping;
using Wire = PartitionService.Contracts.V1;

namespace PartitionService.Server.Tests.Mapping;

public sealed class DerivativeMappingTests
{
    [Fact]
    public void Nothing_is_asked_for_where_the_request_is_unset() => Assert.Null(DerivativeMapping.ToOptions(null).Derivatives);

    /// <summary>One group at a time, so that a mix-up shows.</summary>
    [Fact]
    public void Every_group_is_asked_for_by_its_own_name()
    {
        Assert.Equal(new DerivativeSelection(), Selection(new Wire.DerivativeRequest()));
        Assert.Equal(new DerivativeSelection { Temperature = true }, Selection(new Wire.DerivativeRequest { Temperature = true }));
        Assert.Equal(new DerivativeSelection { Pressure = true }, Selection(new Wire.DerivativeRequest { Pressure = true }));
        Assert.Equal(new DerivativeSelection { Oxygen = true }, Selection(new Wire.DerivativeRequest { Oxygen = true }));
        Assert.Equal(new DerivativeSelection { Inputs = true }, Selection(new Wire.DerivativeRequest { Inputs = true }));
        Assert.Equal(new DerivativeSelection { Data = true }, Selection(new Wire.DerivativeRequest { Data = true }));
    }

    [Fact]
    public void Report_keeps_its_order_and_only_charge_items_have_a_position()
    {
        var sent = DerivativeMapping.ToWire(new DerivativeReport(
            [new(DerivativeOutputKind.SlagFraction, "Sn"), new(DerivativeOutputKind.Log10OxygenPressure, "")],
            [
                new(DerivativeParameterKind.Temperature, "", -1, "K", 1500, true, [0.1, 0.2]),
                new(DerivativeParameterKind.ChargeQuantity, "air", 0, "Nm3", 12, false, [0.3, 0.4]),
            ]));
        Assert.Equal(
            [(Wire.DerivativeOutputKind.SlagFraction, "Sn"), (Wire.DerivativeOutputKind.Log10OxygenPressure, "")],
            sent.Outputs.Select(output => (output.Kind, output.Element)));
        Assert.Equal([false, true], sent.Columns.Select(column => column.HasItemIndex));
        Assert.Equal([true, false], sent.Columns.Select(column => column.IsDefined));
        Assert.Equal(["K", "Nm3"], sent.Columns.Select(column => column.Unit));
        Assert.Equal(["", "air"], sent.Columns.Select(column => column.Name));
        Assert.Equal([1500.0, 12], sent.Columns.Select(column => column.Value));
        Assert.Equal([0.1, 0.2, 0.3, 0.4], sent.Columns.SelectMany(column => column.Derivatives));
    }

    private static DerivativeSelection? Selection(Wire.DerivativeRequest request) => DerivativeMapping.ToOptions(request).Derivatives;
}
