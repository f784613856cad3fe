using System.CommandLine;
using System.CommandLine.Invocation;
using System.Runtime.InteropServices;
using PartitionService.Cli.Commands;

namespace PartitionService.Cli;

/// <summary>Runs one command line from start to exit code.</summary>
internal static class Tool
{
    /// <summary>Runs a command line.</summary>
    /// <param name="arguments">The arguments without the name of the tool.</param>
    /// <param name="terminal">Where to write.</param>
    /// <param name="cancellation">Ends the run as Ctrl-C does.</param>
    /// <returns>A value of <see cref="ExitCode"/>.</returns>
    public static async Task<int> RunAsync(string[] arguments, Terminal terminal, CancellationToken cancellation = default)
    {
        // An argument that starts with @ is a file name like any other here, not a list of arguments.
        var parsed = RootCommandFactory.Create(terminal).Parse(arguments, new ParserConfiguration { ResponseFileTokenReplacer = null });
        if (parsed.Action is ParseErrorAction)
        {
            foreach (var error in parsed.Errors)
                await terminal.Error.WriteLineAsync(error.Message).ConfigureAwait(false);
            await terminal.Error.WriteLineAsync("Add --help for the commands and their options.").ConfigureAwait(false);
            return ExitCode.WrongInput;
        }

        var signalCode = ExitCode.Interrupted;
        using var stop = CancellationTokenSource.CreateLinkedTokenSource(cancellation);
        using var interrupt = PosixSignalRegistration.Create(PosixSignal.SIGINT, context => Stop(context, ExitCode.Interrupted));
        using var terminate = PosixSignalRegistration.Create(PosixSignal.SIGTERM, context => Stop(context, ExitCode.Terminated));
        var configuration = new InvocationConfiguration
        {
            Output = terminal.Output,
            Error = terminal.Error,
            EnableDefaultExceptionHandler = false,
            // Signals are handled above, so that the exit code tells which one came.
            ProcessTerminationTimeout = null,
        };
        try
        {
            return await parsed.InvokeAsync(configuration, stop.Token).ConfigureAwait(false);
        }
        catch (OperationCanceledException) when (stop.IsCancellationRequested)
        {
            await terminal.Error.WriteLineAsync("Interrupted; nothing was written.").ConfigureAwait(false);
            return signalCode;
        }
#pragma warning disable CA1031 // The last line of defence: every fault becomes a sentence and an exit code.
        catch (Exception fault)
#pragma warning restore CA1031
        {
            return FailureReport.Write(fault, terminal.Error);
        }

        void Stop(PosixSignalContext context, int code)
        {
            context.Cancel = true;
            signalCode = code;
            stop.Cancel();
        }
    }
}
