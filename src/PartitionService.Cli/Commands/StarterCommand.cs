using System.CommandLine;

namespace PartitionService.Cli.Commands;

/// <summary>Writes a case file with explanations to start from.</summary>
internal static class StarterCommand
{
    private const string DefaultFile = "starter-case.yaml";

    /// <summary>Makes the command.</summary>
    /// <param name="terminal">Where it writes.</param>
    /// <returns>The command.</returns>
    public static Command Create(Terminal terminal)
    {
        var file = new Argument<string>("FILE")
        {
            Description = "File to write, or - for standard output.",
            DefaultValueFactory = _ => DefaultFile,
        };
        var replace = new Option<bool>("--replace") { Description = "Replace the file where it exists." };
        var command = new Command("starter", "Writes a case file with explanations to start from.") { file, replace };
        command.SetAction(async (parsed, cancellation) =>
        {
            var path = parsed.GetRequiredValue(file);
            var text = await ReadTextAsync(cancellation).ConfigureAwait(false);
            if (path == "-")
            {
                await OutputFile.WriteAsync(text, null, terminal, cancellation).ConfigureAwait(false);
                return ExitCode.Success;
            }

            if (!parsed.GetValue(replace) && (File.Exists(path) || Directory.Exists(path)))
                throw new OutputFileException($"{path}: The file exists and was left as it is. Name another, or add --replace.");
            await OutputFile.WriteAsync(text, path, terminal, cancellation).ConfigureAwait(false);
            var next = $"Wrote {path}. Next: partition solve {path}";
            await terminal.Output.WriteLineAsync(next.AsMemory(), cancellation).ConfigureAwait(false);
            return ExitCode.Success;
        });
        return command;
    }

    private static async Task<string> ReadTextAsync(CancellationToken cancellation)
    {
        await using var stream = typeof(StarterCommand).Assembly.GetManifestResourceStream("starter.yaml")!;
        using var reader = new StreamReader(stream);
        return await reader.ReadToEndAsync(cancellation).ConfigureAwait(false);
    }
}
