using System.Globalization;
using Google.Rpc;
using PartitionService.Core.Equilibrium;

namespace PartitionService.Server.Errors;

/// <summary>Field violations in the words and within the size that a reply can carry.</summary>
internal static class FieldViolations
{
    /// <summary>Largest BadRequest in bytes.</summary>
    /// <remarks>
    /// Error details travel in one header, base64: 40 KiB become 54 KiB, below the 64 KiB that common clients accept for all headers.
    /// A larger reply would hide the status itself.
    /// </remarks>
    public const int MaximumBytes = 40 * 1024;

    /// <summary>Reason of a violation where a required field is missing.</summary>
    public const string Required = "REQUIRED";

    /// <summary>Reason of a violation where a value is not allowed.</summary>
    public const string NotAllowed = "NOT_ALLOWED";

    private const int MaximumValueLength = 60;

    /// <summary>One sentence for the status message; the fields are in the details.</summary>
    public static string Summary(IReadOnlyList<CaseViolation> violations)
    {
        var first = Shown(violations[0]).Message;
        return violations.Count == 1
            ? first
            : string.Create(CultureInfo.InvariantCulture, $"{violations.Count} fields are not valid; the first: {first}");
    }

    /// <summary>All violations; where they do not fit, the last entry says how many were left out.</summary>
    public static BadRequest ToBadRequest(IReadOnlyList<CaseViolation> violations)
    {
        const int roomForLast = 256;
        var request = new BadRequest();
        var bytes = 0;
        foreach (var violation in violations)
        {
            var shown = Shown(violation);
            var entry = new BadRequest.Types.FieldViolation
            {
                Field = shown.Field,
                Description = shown.Message,
                Reason = shown.Value.Length == 0 ? Required : NotAllowed,
            };
            // Tag and length of the entry take at most four bytes at these sizes.
            bytes += entry.CalculateSize() + 4;
            if (bytes > MaximumBytes - roomForLast)
            {
                var left = violations.Count - request.FieldViolations.Count;
                request.FieldViolations.Add(new BadRequest.Types.FieldViolation
                {
                    Field = shown.Field,
                    Description = string.Create(
                        CultureInfo.InvariantCulture, $"{left} further violations from this field on do not fit into the reply; mend those listed first"),
                    Reason = "LEFT_OUT",
                });
                break;
            }

            request.FieldViolations.Add(entry);
        }

        return request;
    }

    /// <summary>Text from the caller, cut where it is long.</summary>
    public static string Shorten(string text)
    {
        if (text.Length <= MaximumValueLength)
            return text;
        // Half a surrogate pair is no valid UTF-8.
        var length = char.IsHighSurrogate(text[MaximumValueLength - 1]) ? MaximumValueLength - 1 : MaximumValueLength;
        return text[..length] + "...";
    }

    private static CaseViolation Shown(CaseViolation violation) =>
        violation with { Value = VisibleText.Of(Shorten(violation.Value)), Allowed = VisibleText.Of(violation.Allowed) };
}
