using System.CommandLine;
using PartitionService.Cli.Hosting;

namespace PartitionService.Cli.Commands;

/// <summary>The options of every command that asks the service: where it is, how long to wait, in which form and where to write.</summary>
internal sealed class ServiceOptions
{
    private readonly Option<Uri?> address = CommonOptions.Address();
    private readonly Option<double> timeout = CommonOptions.Timeout();
    private readonly Option<string> format = CommonOptions.Format();
    private readonly Option<string?> output = CommonOptions.Output();

    /// <summary>Adds the options to a command.</summary>
    /// <param name="command">The command.</param>
    public void AddTo(Command command)
    {
        foreach (var option in (Option[])[address, timeout, format, output])
            command.Add(option);
    }

    /// <summary>Opens the connection that the options ask for.</summary>
    /// <param name="parsed">The command line.</param>
    /// <param name="cancellation">Stops the start of a service in this process.</param>
    /// <returns>The connection.</returns>
    public Task<ServiceConnection> OpenAsync(ParseResult parsed, CancellationToken cancellation) =>
        ServiceConnection.OpenAsync(parsed.GetValue(address), TimeSpan.FromSeconds(parsed.GetValue(timeout)), cancellation);

    /// <summary>Form of the result: table, csv or json.</summary>
    /// <param name="parsed">The command line.</param>
    /// <returns>The word.</returns>
    public string FormatOf(ParseResult parsed) => parsed.GetRequiredValue(format);

    /// <summary>Path of the file for the result; null: the standard output.</summary>
    /// <param name="parsed">The command line.</param>
    /// <returns>The path.</returns>
    public string? FileOf(ParseResult parsed) => parsed.GetValue(output);
}
