using PartitionService.Cli.CaseFiles;
using PartitionService.Cli.Commands;
using PartitionService.Cli.Output;
using PartitionService.Client.Errors;

namespace PartitionService.Cli;

/// <summary>Says what went wrong and what to change, and gives the exit code.</summary>
internal static class FailureReport
{
    /// <summary>Writes a failure.</summary>
    /// <param name="fault">The failure.</param>
    /// <param name="error">Takes the text.</param>
    /// <returns>A value of <see cref="ExitCode"/>.</returns>
    public static int Write(Exception fault, TextWriter error)
    {
        var (code, lines) = Describe(fault);
        foreach (var line in lines)
            error.WriteLine(PlainText.Clean(line));
        if ((fault as PartitionException ?? fault.InnerException) is PartitionException { RequestId.Length: > 0 } known)
            error.WriteLine(PlainText.Clean($"Request id: {known.RequestId}"));
        return code;
    }

    private static (int Code, IEnumerable<string> Lines) Describe(Exception fault) =>
        fault switch
        {
            CaseFileException wrong => (ExitCode.WrongInput, wrong.Message.Split(Environment.NewLine)),
            OutputFileException wrong => (ExitCode.WrongInput, [wrong.Message]),
            RefusedCaseException refused => (ExitCode.InvalidCase, ["The service refuses the case:", .. refused.Lines]),
            InvalidCaseException invalid => (ExitCode.InvalidCase, ["The service refuses the request:", .. Violations(invalid)]),
            UnsolvableCaseException unsolvable =>
                (ExitCode.CannotHold, ["The case cannot hold: " + unsolvable.Message, .. Elements(unsolvable)]),
            UnknownDatumException unknown => (ExitCode.UnknownDatum, [unknown.Message]),
            PartitionUnavailableException unreachable => (ExitCode.Unavailable, ["The service cannot be reached: " + unreachable.Message]),
            PartitionTimeoutException late =>
                (ExitCode.OutOfTime, ["No answer in time: " + late.Message, "Add --timeout with more seconds."]),
            PartitionException other =>
                (ExitCode.Unexpected, [$"The service failed ({other.StatusCode}, {other.Reason}): {other.Message}"]),
            _ => (ExitCode.Unexpected, [$"Unexpected fault, please report it with the case: {fault.GetType().Name}: {fault.Message}"]),
        };

    private static IEnumerable<string> Violations(InvalidCaseException invalid) =>
        invalid.Violations.Count == 0
            ? [invalid.Message]
            : invalid.Violations.Select(violation => $"{violation.Path}: {violation.Description}");

    private static IEnumerable<string> Elements(UnsolvableCaseException unsolvable) =>
        unsolvable.Elements.Count == 0 ? [] : [$"It is about: {string.Join(", ", unsolvable.Elements)}"];
}
