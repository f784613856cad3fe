using PartitionService.Cli.CaseFiles;
using PartitionService.Client.Errors;

namespace PartitionService.Cli.Commands;

/// <summary>The service refused a case that came from a file.</summary>
/// <param name="file">The file.</param>
/// <param name="refusal">What the service said.</param>
internal sealed class RefusedCaseException(CaseFile file, InvalidCaseException refusal) : Exception(refusal.Message, refusal)
{
    /// <summary>One line per violation, with file, line, column and key.</summary>
    public IReadOnlyList<string> Lines { get; } = refusal.Violations.Count == 0
        ? [$"{file.Name}: {refusal.Message}"]
        : [.. refusal.Violations
            .Select(violation => file.Places.Translate(violation.Path, violation.Description))
            .OrderBy(error => error.Line)
            .Select(error => error.Describe(file.Name))];
}
