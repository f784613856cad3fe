using System.CommandLine;

namespace PartitionService.Cli.Commands;

/// <summary>Puts the commands together.</summary>
internal static class RootCommandFactory
{
    /// <summary>Makes the root command.</summary>
    /// <param name="terminal">Where the commands write.</param>
    /// <returns>The root command.</returns>
    public static RootCommand Create(Terminal terminal) =>
        new(
            $"""
            Computes how trace elements distribute between liquid metal, slag and gas.

            Results are estimates from equilibrium, not a permit to operate: local codes and licensed practice decide.

            {ExitCode.Help}
            """)
        {
            SolveCommand.Create(terminal),
            CatalogueCommand.Create(terminal),
            ConvertCommand.Create(terminal),
            StarterCommand.Create(terminal),
        };
}
