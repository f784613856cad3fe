using Google.Rpc;
using Grpc.Core;
using PartitionService.Contracts.V1;

namespace PartitionService.Client.Errors;

/// <summary>Turns a failed call into the exception that tells the caller what to do.</summary>
internal static class PartitionErrorDecoder
{
    /// <summary>Domain of the service's own reasons; reasons of other domains, such as a proxy's, are not ours to read.</summary>
    internal const string Domain = "partition.v1";

    /// <summary>Metadata key of ErrorInfo with the elements a failure is about, separated by commas.</summary>
    internal const string ElementsKey = "elements";

    /// <summary>Metadata key of ErrorInfo with the request id, where no RequestInfo was sent.</summary>
    internal const string RequestIdKey = "request_id";

    internal static PartitionException Decode(RpcException failure)
    {
        var details = ReadDetails(failure);
        var info = details?.GetDetail<ErrorInfo>();
        if (info is not null && info.Domain != Domain)
            info = null;
        var message = details is { Message.Length: > 0 } ? details.Message : failure.Status.Detail;
        var fault = new ServiceFault(failure.StatusCode, ReadReason(info), message, ReadRequestId(details, info));
        return (fault.Reason, fault.StatusCode) switch
        {
            (ErrorReason.UnknownDatum, _) => new UnknownDatumException(fault, failure),
            (ErrorReason.InvalidCase, _) or (ErrorReason.Unspecified, StatusCode.InvalidArgument) =>
                new InvalidCaseException(fault, ReadViolations(details), failure),
            (_, StatusCode.FailedPrecondition) => new UnsolvableCaseException(fault, ReadElements(info), failure),
            (_, StatusCode.Unavailable) => new PartitionUnavailableException(fault, failure),
            (_, StatusCode.DeadlineExceeded or StatusCode.Cancelled) => new PartitionTimeoutException(fault, failure),
            _ => new PartitionException(fault, failure),
        };
    }

    private static Google.Rpc.Status? ReadDetails(RpcException failure)
    {
        try
        {
            return failure.GetRpcStatus();
        }
        catch (Google.Protobuf.InvalidProtocolBufferException)
        {
            // A proxy may garble the trailer; the gRPC status alone still tells what happened.
            return null;
        }
    }

    /// <summary>Finds the reason by its name in the contract; the names of the generated code may change with the generator.</summary>
    private static ErrorReason ReadReason(ErrorInfo? info)
    {
        var names = ErrorReflection.Descriptor.EnumTypes.Single(type => type.Name == nameof(ErrorReason));
        return names.FindValueByName("ERROR_REASON_" + info?.Reason) is { } value ? (ErrorReason)value.Number : ErrorReason.Unspecified;
    }

    private static string ReadRequestId(Google.Rpc.Status? details, ErrorInfo? info)
    {
        if (details?.GetDetail<RequestInfo>() is { RequestId.Length: > 0 } request)
            return request.RequestId;
        return info is not null && info.Metadata.TryGetValue(RequestIdKey, out var id) ? id : "";
    }

    private static List<FieldViolation> ReadViolations(Google.Rpc.Status? details) =>
        details?.GetDetail<BadRequest>() is { } bad
            ? [.. bad.FieldViolations.Select(violation => new FieldViolation(violation.Field, violation.Description))]
            : [];

    private static string[] ReadElements(ErrorInfo? info) =>
        info is not null && info.Metadata.TryGetValue(ElementsKey, out var elements)
            ? elements.Split(',', StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries)
            : [];
}
