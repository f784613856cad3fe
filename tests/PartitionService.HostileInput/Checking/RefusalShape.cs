using System.Text.RegularExpressions;
using Google.Protobuf;
using Google.Rpc;
using Grpc.Core;
using PartitionService.Contracts.V1;

namespace PartitionService.HostileInput.Checking;

/// <summary>Holds every refusal to what a stranger needs: which field, what stood there, what may stand there.</summary>
public static partial class RefusalShape
{
    /// <summary>Room for all details in the headers of common clients, base64.</summary>
    private const int LargestDetails = 60 * 1024;

    private static readonly string[] Reasons =
        [.. ErrorReflection.Descriptor.EnumTypes[0].Values.Select(value => value.Name["ERROR_REASON_".Length..])];

    /// <summary>What is wrong with a refusal; null where nothing is.</summary>
    /// <param name="code">Status code of the call.</param>
    /// <param name="refusal">Details; null: none came.</param>
    /// <param name="request">The request that was refused; null where it could not be read.</param>
    public static string? FindFault(StatusCode code, Google.Rpc.Status? refusal, IMessage? request)
    {
        if (refusal is null)
            return $"{code} without details";
        if (refusal.Code != (int)code)
            return $"details say {refusal.Code}, the call says {code}";
        if (refusal.CalculateSize() * 4 / 3 > LargestDetails)
            return $"details of {refusal.CalculateSize()} bytes";
        var info = refusal.GetDetail<ErrorInfo>();
        if (info is not { Domain: "partition.v1" } || !Reasons.Contains(info.Reason) || info.Metadata["request_id"].Length == 0)
            return $"no usable ErrorInfo: {info}";
        if (FaultOfText(refusal.Message) is { } fault)
            return $"message: {fault}";
        if (code != StatusCode.InvalidArgument || request is null)
            return null;
        return refusal.GetDetail<BadRequest>() is { FieldViolations.Count: > 0 } bad
            ? bad.FieldViolations.Select(violation => FaultOf(violation, request)).FirstOrDefault(found => found is not null)
            : "INVALID_ARGUMENT names no field";
    }

    private static string? FaultOf(BadRequest.Types.FieldViolation violation, IMessage request)
    {
        if (FieldPath.FindFault(violation.Field, request.Descriptor) is { } path)
            return $"{violation}: {path}";
        if (FaultOfText(violation.Description) is { } text)
            return $"{violation.Field}: {text}";
        switch (violation.Reason)
        {
            case "LEFT_OUT":
                return null;
            case "REQUIRED" or "NOT_ALLOWED" when !Allowed().IsMatch(violation.Description):
                return $"says not what is allowed: {violation.Description}";
            case "REQUIRED":
                return null;
            case "NOT_ALLOWED":
                return violation.Description.StartsWith(violation.Field + " is ", StringComparison.Ordinal)
                    ? null
                    : $"names not the value: {violation.Description}";
            default:
                return $"unknown reason {violation.Reason}";
        }
    }

    private static string? FaultOfText(string text)
    {
        if (text.Length < 15 || !text.Contains(' ', StringComparison.Ordinal))
            return $"too short to help: '{text}'";
        if (text.Length > 1500)
            return $"too long to read, {text.Length} characters";
        var hidden = text.FirstOrDefault(letter => char.IsControl(letter) || Invisible.Contains(letter));
        if (hidden != default || text.Contains('\0', StringComparison.Ordinal))
            return FormattableString.Invariant($"holds the invisible U+{(int)hidden:X4}");
        return text.Contains('\uFFFD', StringComparison.Ordinal) ? $"holds half a character: {text}" : null;
    }

    /// <summary>Characters that turn or hide text: whoever reads a log must see what stands there.</summary>
    private const string Invisible = "\u200B\u200E\u200F\u202A\u202B\u202C\u202D\u202E\u2066\u2067\u2068\u2069\uFEFF";

    [GeneratedRegex(@"must (be|hold|have|start|not)|needs|required: |is only for|has no value")]
    private static partial Regex Allowed();
}
