using PartitionService.Core.Equilibrium;
using Wire = PartitionService.Contracts.V1;

namespace PartitionService.Server.Mapping;

/// <summary>Derivatives as they are asked for and as they are sent.</summary>
internal static class DerivativeMapping
{
    /// <summary>What to compute; nothing besides the answer where the request is unset.</summary>
    public static SolveOptions ToOptions(Wire.DerivativeRequest? request) => request is null
        ? SolveOptions.None
        : new SolveOptions
        {
            Derivatives = new DerivativeSelection
            {
                Temperature = request.Temperature,
                Pressure = request.Pressure,
                Oxygen = request.Oxygen,
                Inputs = request.Inputs,
                Data = request.Data,
            },
        };

    /// <summary>Maps a report.</summary>
    public static Wire.DerivativeReport ToWire(DerivativeReport report)
    {
        var sent = new Wire.DerivativeReport();
        sent.Outputs.AddRange(report.Outputs.Select(output => new Wire.DerivativeOutput
        {
            Kind = EnumMapping.ToWire(output.Kind),
            Element = output.Element,
        }));
        sent.Columns.AddRange(report.Columns.Select(ToWire));
        return sent;
    }

    private static Wire.DerivativeColumn ToWire(DerivativeColumn column)
    {
        var sent = new Wire.DerivativeColumn
        {
            Kind = EnumMapping.ToWire(column.Kind),
            Name = column.Name,
            Unit = column.Unit,
            Value = column.Value,
            IsDefined = column.IsDefined,
        };
        if (column.Index >= 0)
            sent.ItemIndex = column.Index;
        sent.Derivatives.AddRange(column.Values);
        return sent;
    }
}
