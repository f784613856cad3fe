using Google.Protobuf.WellKnownTypes;
using Google.Rpc;
using Grpc.Core;
using PartitionService.Contracts.V1;
using PartitionService.Core.Equilibrium;
using RichStatus = Google.Rpc.Status;

namespace PartitionService.Server.Errors;

/// <summary>Builds every error that the service sends: a google.rpc.Status with one ErrorInfo, and BadRequest for bad fields.</summary>
internal static class ServiceErrors
{
    /// <summary>Domain of every ErrorInfo.</summary>
    public const string Domain = "partition.v1";

    /// <summary>Key of ErrorInfo metadata with the id of the call.</summary>
    public const string RequestIdKey = "request_id";

    /// <summary>Key of ErrorInfo metadata with the elements concerned, comma separated.</summary>
    public const string ElementsKey = "elements";

    /// <summary>INVALID_ARGUMENT with all field violations.</summary>
    public static ServiceException InvalidFields(IReadOnlyList<CaseViolation> violations) =>
        new(StatusCode.InvalidArgument, ErrorReason.InvalidCase, FieldViolations.Summary(violations), violations: violations);

    /// <summary>FAILED_PRECONDITION, or INTERNAL where the solution did not converge.</summary>
    public static ServiceException Failed(SolveOutcome.Failed failed) =>
        new(
            failed.Reason == SolveFailure.NotConverged ? StatusCode.Internal : StatusCode.FailedPrecondition,
            Mapping.FailureMapping.ToReason(failed.Reason),
            failed.Message,
            failed.Elements);

    /// <summary>NOT_FOUND for a slot or key that the catalogue lacks.</summary>
    public static ServiceException UnknownDatum(string slot) =>
        new(StatusCode.NotFound, ErrorReason.UnknownDatum, $"The catalogue has no datum '{VisibleText.Of(FieldViolations.Shorten(slot))}'; ListData lists its slots.");

    /// <summary>INVALID_ARGUMENT for a page token of another list, filter or catalogue.</summary>
    public static ServiceException InvalidPageToken(string token) =>
        new(
            StatusCode.InvalidArgument,
            ErrorReason.InvalidPageToken,
            "page_token was not issued for this list, filter and catalogue; start again with an empty token.",
            violations: [new CaseViolation("page_token", token, "must be the next_page_token of the page before, with the same filter, or empty")]);

    /// <summary>DEADLINE_EXCEEDED.</summary>
    public static ServiceException DeadlineExceeded() =>
        new(StatusCode.DeadlineExceeded, ErrorReason.DeadlineExceeded, "The time for the call ran out before the vessel was solved.");

    /// <summary>CANCELLED.</summary>
    public static ServiceException Cancelled() => new(StatusCode.Cancelled, ErrorReason.Cancelled, "The caller cancelled the call.");

    /// <summary>INTERNAL without any detail but the id of the call.</summary>
    public static ServiceException Internal(string requestId) =>
        new(StatusCode.Internal, ErrorReason.Internal, $"The service failed; please report request id {requestId}.");

    /// <summary>The error as it goes over the wire.</summary>
    public static RichStatus ToStatus(ServiceException error, string requestId)
    {
        var info = new ErrorInfo { Domain = Domain, Reason = ReasonName(error.Reason) };
        info.Metadata[RequestIdKey] = requestId;
        if (error.Elements.Count > 0)
            info.Metadata[ElementsKey] = string.Join(',', error.Elements);
        var status = new RichStatus { Code = (int)error.Status, Message = error.Message };
        status.Details.Add(Any.Pack(info));
        if (error.Violations.Count > 0)
            status.Details.Add(Any.Pack(FieldViolations.ToBadRequest(error.Violations)));
        return status;
    }

    /// <summary>RESOURCE_EXHAUSTED for a message beyond the limit, in the framework's words.</summary>
    public static ServiceException MessageTooLarge(string message) =>
        new(StatusCode.ResourceExhausted, ErrorReason.MessageTooLarge, message);

    /// <summary>INVALID_ARGUMENT for bytes that are no message.</summary>
    public static ServiceException UnreadableMessage(string method) =>
        new(
            StatusCode.InvalidArgument,
            ErrorReason.UnreadableMessage,
            $"The bytes are no request of {method}: they are damaged, cut short, or of another contract.");

    /// <summary>Name of a reason as it is sent: upper case, without the prefix.</summary>
    public static string ReasonName(ErrorReason reason)
    {
        const string prefix = "ERROR_REASON_";
        var value = ErrorReflection.Descriptor.EnumTypes.Single(e => e.Name == nameof(ErrorReason)).FindValueByNumber((int)reason);
        return value.Name[prefix.Length..];
    }
}
