namespace PartitionService.Cli;

/// <summary>Where the tool writes.</summary>
/// <param name="Output">Takes results.</param>
/// <param name="Error">Takes errors.</param>
/// <param name="IsTerminal">True: results are read on a terminal of a known width.</param>
internal sealed record Terminal(TextWriter Output, TextWriter Error, bool IsTerminal)
{
    /// <summary>The streams of the process.</summary>
    public static Terminal Standard => new(Console.Out, Console.Error, !Console.IsOutputRedirected);
}
