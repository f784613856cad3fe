using System.Text;

namespace PartitionService.Cli.Commands;

/// <summary>Writes a finished text to a file or to the standard output.</summary>
internal static class OutputFile
{
    /// <summary>Writes the text.</summary>
    /// <param name="text">The text; complete, so that a failure before leaves an old file untouched.</param>
    /// <param name="file">Path of the file, replaced where it exists; null: the standard output.</param>
    /// <param name="terminal">The standard output.</param>
    /// <param name="cancellation">Stops writing.</param>
    /// <exception cref="OutputFileException">The file cannot be written.</exception>
    public static async Task WriteAsync(string text, string? file, Terminal terminal, CancellationToken cancellation)
    {
        if (file is null)
        {
            await terminal.Output.WriteAsync(text.AsMemory(), cancellation).ConfigureAwait(false);
            return;
        }

        try
        {
            await File.WriteAllTextAsync(file, text, new UTF8Encoding(false), cancellation).ConfigureAwait(false);
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            throw new OutputFileException($"{file}: The file cannot be written: {fault.Message}");
        }
    }
}

/// <summary>A file cannot be written.</summary>
/// <param name="message">File and reason.</param>
internal sealed class OutputFileException(string message) : Exception(message);
