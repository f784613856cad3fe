using System.Globalization;
using Serilog.Events;
using Serilog.Formatting.Compact;

namespace PartitionService.Server.Tests.Support;

/// <summary>Reads log events.</summary>
public static class LogText
{
    /// <summary>Stable id of an event; 0 where it has none.</summary>
    public static int Id(LogEvent logEvent) =>
        logEvent.Properties.TryGetValue("EventId", out var value)
        && value is StructureValue structure
        && structure.Properties.FirstOrDefault(p => p.Name == "Id")?.Value is ScalarValue { Value: int id }
            ? id
            : 0;

    /// <summary>A property as text; empty where it is missing.</summary>
    public static string Of(LogEvent logEvent, string property) =>
        logEvent.Properties.TryGetValue(property, out var value) && value is ScalarValue scalar
            ? Convert.ToString(scalar.Value, CultureInfo.InvariantCulture) ?? ""
            : "";

    /// <summary>The event as the line that is written.</summary>
    public static string Json(LogEvent logEvent)
    {
        using var writer = new StringWriter(CultureInfo.InvariantCulture);
        new CompactJsonFormatter().Format(logEvent, writer);
        return writer.ToString();
    }
}
