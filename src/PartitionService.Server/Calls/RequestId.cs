using System.Text.RegularExpressions;

namespace PartitionService.Server.Calls;

/// <summary>The id under which a call is logged and answered.</summary>
internal static partial class RequestId
{
    /// <summary>Name of the metadata entry that carries the id both ways.</summary>
    public const string Header = "x-request-id";

    /// <summary>The caller's id where it has the accepted form, else a new one of 32 hexadecimal digits.</summary>
    /// <remarks>The form is narrow because the id is written to logs: nothing that could break or forge a line passes.</remarks>
    public static string Choose(string? sent) =>
        sent is not null && Accepted().IsMatch(sent) ? sent : Guid.NewGuid().ToString("N");

    [GeneratedRegex(@"\A[A-Za-z0-9._-]{1,64}\z", RegexOptions.CultureInvariant)]
    private static partial Regex Accepted();
}
