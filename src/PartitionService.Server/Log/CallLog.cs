using Grpc.Core;

namespace PartitionService.Server.Log;

/// <summary>Log events of calls, one per call. Ids are stable; a retired id is not used again.</summary>
/// <remarks>No event carries anything of a request but its id.</remarks>
internal static partial class CallLog
{
    private const string Text =
        "{Method} {RequestId} {StatusCode} {Reason} in {DurationMilliseconds} ms, {ElementCount} elements, {Iterations} iterations";

    /// <summary>A call of the service ended, well or with an error of the caller.</summary>
    [LoggerMessage(EventId = 2001, EventName = "CallEnded", Level = LogLevel.Information, Message = Text)]
    public static partial void Ended(
        ILogger logger,
        string method,
        string requestId,
        StatusCode statusCode,
        string reason,
        double durationMilliseconds,
        int elementCount,
        int iterations);

    /// <summary>A call ended with a fault of the service.</summary>
    [LoggerMessage(EventId = 2002, EventName = "CallFailed", Level = LogLevel.Error, Message = Text)]
    public static partial void Failed(
        ILogger logger,
        string method,
        string requestId,
        StatusCode statusCode,
        string reason,
        double durationMilliseconds,
        int elementCount,
        int iterations);

    /// <summary>A call of health or reflection ended; at debug level because probes are many.</summary>
    [LoggerMessage(
        EventId = 2003,
        EventName = "InfrastructureCallEnded",
        Level = LogLevel.Debug,
        Message = "{Method} {RequestId} {StatusCode} in {DurationMilliseconds} ms")]
    public static partial void InfrastructureEnded(
        ILogger logger, string method, string requestId, StatusCode statusCode, double durationMilliseconds);
}
