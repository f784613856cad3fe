namespace PartitionService.Server.Log;

/// <summary>Log events of the life of the server. Ids are stable; a retired id is not used again.</summary>
internal static partial class ServerLog
{
    /// <summary>The server listens.</summary>
    [LoggerMessage(
        EventId = 1001,
        EventName = "Listening",
        Level = LogLevel.Information,
        Message = "Listening on {Address}, catalogue {CatalogueDigest}, reflection {Reflection}")]
    public static partial void Listening(ILogger logger, Uri address, string catalogueDigest, bool reflection);

    /// <summary>The server stops and reports itself as not ready.</summary>
    [LoggerMessage(EventId = 1002, EventName = "Stopping", Level = LogLevel.Information, Message = "Stopping; readiness is withdrawn")]
    public static partial void Stopping(ILogger logger);

    /// <summary>A fault of the service.</summary>
    [LoggerMessage(
        EventId = 1003,
        EventName = "UnexpectedException",
        Level = LogLevel.Error,
        Message = "Unexpected exception in request {RequestId}: {ExceptionTrace}")]
    public static partial void UnexpectedException(ILogger logger, string requestId, string exceptionTrace);
}
