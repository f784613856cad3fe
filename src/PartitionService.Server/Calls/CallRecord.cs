using Grpc.Core;

namespace PartitionService.Server.Calls;

/// <summary>What is known about one call for its log event; filled while the call runs. Never holds payloads.</summary>
internal sealed class CallRecord(string requestId)
{
    private static readonly object ItemsKey = new();

    /// <summary>Id of the call.</summary>
    public string RequestId { get; } = requestId;

    /// <summary>Stops the work of the call: cancelled, past its deadline, or past the default where none was sent.</summary>
    public CancellationToken Cancellation { get; set; }

    /// <summary>Number of elements in the answer; 0 where there is none.</summary>
    public int ElementCount { get; set; }

    /// <summary>Newton steps of the solution; 0 where nothing was solved.</summary>
    public int Iterations { get; set; }

    /// <summary>Status that the service chose; null where the framework ended the call itself.</summary>
    public StatusCode? Status { get; set; }

    /// <summary>Reason of an error, name of ErrorReason without prefix; empty where there is none.</summary>
    public string Reason { get; set; } = "";

    /// <summary>Attaches a record to a request.</summary>
    public static CallRecord Start(HttpContext http)
    {
        var record = new CallRecord(Calls.RequestId.Choose(http.Request.Headers[Calls.RequestId.Header]));
        http.Items[ItemsKey] = record;
        return record;
    }

    /// <summary>The record of the call.</summary>
    public static CallRecord Of(ServerCallContext context) => (CallRecord)context.GetHttpContext().Items[ItemsKey]!;
}
