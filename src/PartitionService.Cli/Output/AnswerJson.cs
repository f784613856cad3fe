using Google.Protobuf;

namespace PartitionService.Cli.Output;

/// <summary>Writes messages of the contract in the proto3 JSON mapping.</summary>
internal static class AnswerJson
{
    private static readonly JsonFormatter Formatter = new(JsonFormatter.Settings.Default.WithIndentation());

    /// <summary>Writes one message.</summary>
    /// <param name="output">Takes the text.</param>
    /// <param name="message">The message.</param>
    public static void Write(TextWriter output, IMessage message) => output.WriteLine(Formatter.Format(message));
}
