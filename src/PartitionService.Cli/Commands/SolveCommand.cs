using System.CommandLine;
using PartitionService.Cli.CaseFiles;
using PartitionService.Cli.Hosting;
using PartitionService.Cli.Output;
using PartitionService.Client.Errors;
using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Commands;

/// <summary>Solves the vessel of a case file.</summary>
internal static class SolveCommand
{
    /// <summary>Makes the command.</summary>
    /// <param name="terminal">Where it writes.</param>
    /// <returns>The command.</returns>
    public static Command Create(Terminal terminal)
    {
        var file = new Argument<string>("FILE") { Description = "Case file, YAML. The command \"starter\" writes one with explanations." };
        var service = new ServiceOptions();
        var data = new Option<bool>("--data")
        {
            Description = "With a table: list every datum that entered the answer, with its sigma and source.",
        };
        var command = new Command("solve", "Solves the vessel of a case file. The exit status is explained by: partition --help")
        {
            file, data,
        };
        service.AddTo(command);
        command.SetAction(async (parsed, cancellation) =>
        {
            // The file is read first: a wrong file must not cost the start of a service.
            var caseFile = await CaseFileReader.ReadFileAsync(parsed.GetRequiredValue(file), cancellation).ConfigureAwait(false);
            var connection = await service.OpenAsync(parsed, cancellation).ConfigureAwait(false);
            await using var _ = connection.ConfigureAwait(false);
            var answer = await SolveAsync(connection, caseFile, cancellation).ConfigureAwait(false);
            // A file is laid out like a pipe: its reader's width is not the terminal's.
            var page = Page.For(terminal.IsTerminal && service.FileOf(parsed) is null, parsed.GetValue(data));
            var text = Render(answer, service.FormatOf(parsed), page);
            await OutputFile.WriteAsync(text, service.FileOf(parsed), terminal, cancellation).ConfigureAwait(false);
            return ExitCode.Success;
        });
        return command;
    }

    private static async Task<ChargeAnswer> SolveAsync(ServiceConnection connection, CaseFile file, CancellationToken cancellation)
    {
        try
        {
            return await connection.Client.SolveAsync(file.Case, cancellation).ConfigureAwait(false);
        }
        catch (InvalidCaseException refusal)
        {
            throw new RefusedCaseException(file, refusal);
        }
    }

    private static string Render(ChargeAnswer answer, string format, Page page)
    {
        using var text = new StringWriter();
        switch (format)
        {
            case "csv":
                AnswerCsv.Write(text, answer);
                break;
            case "json":
                AnswerJson.Write(text, answer);
                break;
            default:
                AnswerTable.Write(text, answer, page);
                break;
        }

        return text.ToString();
    }
}
