using System.Diagnostics;
using System.Globalization;
using Google.Protobuf;
using Grpc.Core;
using Microsoft.AspNetCore.Http.Features;
using PartitionService.Server.Errors;
using PartitionService.Server.Log;

namespace PartitionService.Server.Calls;

/// <summary>Gives every call an id, answers it in a header and logs one event when the call ends.</summary>
/// <remarks>
/// Sits around the framework and not among its interceptors: those don't see calls that end before the message is read,
/// for example one that is too large or names an unknown method.
/// </remarks>
internal sealed class CallMiddleware(RequestDelegate next, ILogger<CallMiddleware> logger)
{
    private const string StatusHeader = "grpc-status";
    private const string MessageHeader = "grpc-message";
    private const string DetailsHeader = "grpc-status-details-bin";

    /// <summary>Runs one call.</summary>
    public async Task InvokeAsync(HttpContext http)
    {
        var record = CallRecord.Start(http);
        http.Response.Headers[RequestId.Header] = record.RequestId;
        var start = Stopwatch.GetTimestamp();
        try
        {
            await next(http);
        }
        finally
        {
            // An early refusal consists of headers alone, which leave only after this method: they can still be added to.
            if (!http.Response.HasStarted)
                ExplainEarlyRefusal(http, record);
            Log(http, record, Stopwatch.GetElapsedTime(start));
        }
    }

    /// <summary>Adds the reason to a refusal that the framework makes before any handler runs.</summary>
    private static void ExplainEarlyRefusal(HttpContext http, CallRecord record)
    {
        var headers = http.Response.Headers;
        var method = MethodName(http);
        if (record.Status is not null
            || headers.ContainsKey(DetailsHeader)
            || !method.StartsWith(ServiceMethods.Prefix, StringComparison.Ordinal)
            || !int.TryParse(headers[StatusHeader], NumberStyles.None, CultureInfo.InvariantCulture, out var status))
        {
            return;
        }

        // Whatever else fails inside the service has a status of its own by now: this is a message that could not be read.
        var error = (StatusCode)status switch
        {
            StatusCode.ResourceExhausted => ServiceErrors.MessageTooLarge(Uri.UnescapeDataString(headers[MessageHeader].ToString())),
            StatusCode.Unknown or StatusCode.Internal => ServiceErrors.UnreadableMessage(method),
            _ => null,
        };
        if (error is null)
            return;
        record.Status = error.Status;
        record.Reason = ServiceErrors.ReasonName(error.Reason);
        headers[StatusHeader] = ((int)error.Status).ToString(CultureInfo.InvariantCulture);
        headers[MessageHeader] = Uri.EscapeDataString(error.Message);
        headers[DetailsHeader] = ServiceErrors.ToStatus(error, record.RequestId).ToByteString().ToBase64();
    }

    private void Log(HttpContext http, CallRecord record, TimeSpan duration)
    {
        var method = MethodName(http);
        var status = StatusOf(http, record);
        var milliseconds = Math.Round(duration.TotalMilliseconds, 3);
        if (!method.StartsWith(ServiceMethods.Prefix, StringComparison.Ordinal))
            CallLog.InfrastructureEnded(logger, method, record.RequestId, status, milliseconds);
        else if (status is StatusCode.Internal or StatusCode.Unknown)
            CallLog.Failed(logger, method, record.RequestId, status, record.Reason, milliseconds, record.ElementCount, record.Iterations);
        else
            CallLog.Ended(logger, method, record.RequestId, status, record.Reason, milliseconds, record.ElementCount, record.Iterations);
    }

    /// <summary>Only names of methods that exist are logged: any other path is text from outside.</summary>
    private static string MethodName(HttpContext http) =>
        http.GetEndpoint()?.Metadata.GetMetadata<Grpc.AspNetCore.Server.GrpcMethodMetadata>()?.Method.FullName ?? "unknown";

    private static StatusCode StatusOf(HttpContext http, CallRecord record)
    {
        if (record.Status is { } chosen)
            return chosen;
        var trailers = http.Features.Get<IHttpResponseTrailersFeature>()?.Trailers;
        var text = http.Response.Headers[StatusHeader].FirstOrDefault() ?? trailers?[StatusHeader].FirstOrDefault();
        if (int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out var number))
            return (StatusCode)number;
        return http.RequestAborted.IsCancellationRequested ? StatusCode.Cancelled : StatusCode.Unknown;
    }
}
