using System.CommandLine;
using PartitionService.Cli.Output;
using PartitionService.Client;
using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Commands;

/// <summary>Shows what the service knows, from where and how well.</summary>
internal static class CatalogueCommand
{
    /// <summary>Makes the command.</summary>
    /// <param name="terminal">Where it writes.</param>
    /// <returns>The command with its subcommands.</returns>
    public static Command Create(Terminal terminal) =>
        new("catalogue", "Shows what the service knows, from where and how well.")
        {
            Solvents(terminal), Solutes(terminal), Slags(terminal), Data(terminal), Explain(terminal), Coverage(terminal),
        };

    private static Command Solvents(Terminal terminal)
    {
        var command = new Command("solvents", "Lists the liquid metals that may be a solvent.");
        Listed(command, terminal, async (_, client, stop) =>
            CatalogueListings.OfSolvents(await client.ListSolventsAsync(stop).ToListAsync(stop).ConfigureAwait(false)));
        return command;
    }

    private static Command Solutes(Terminal terminal)
    {
        var solvent = new Argument<string?>("SOLVENT")
        {
            Description = "Element symbol of the solvent. Unset: all solvents.",
            Arity = ArgumentArity.ZeroOrOne,
        };
        var temperature = CommonOptions.Temperature();
        var command = new Command("solutes", "Lists the solutes of a solvent with ln gamma0.") { solvent, temperature };
        Listed(command, terminal, async (parsed, client, stop) =>
        {
            var solutes = client.ListSolutesAsync(parsed.GetValue(solvent), parsed.GetValue(temperature), stop);
            return CatalogueListings.OfSolutes(await solutes.ToListAsync(stop).ConfigureAwait(false));
        });
        return command;
    }

    private static Command Slags(Terminal terminal)
    {
        var command = new Command("slags", "Lists the slag families with their usual composition and the oxides that they know.");
        Listed(command, terminal, async (_, client, stop) =>
            CatalogueListings.OfSlags(await client.ListSlagFamiliesAsync(stop).ToListAsync(stop).ConfigureAwait(false)));
        return command;
    }

    private static Command Data(Terminal terminal)
    {
        var kinds = Enum.GetValues<DatumKind>().Where(kind => kind != DatumKind.Unspecified).ToDictionary(Words.Hyphenated);
        var kind = new Option<string?>("--kind") { Description = "Only rows of this kind." };
        kind.AcceptOnlyFromAmong([.. kinds.Keys]);
        var slot = new Option<string?>("--slot")
        {
            Description = "Only rows whose slot starts with this text, for example metal/Cu/.",
            HelpName = "TEXT",
        };
        var element = new Option<string?>("--element") { Description = "Only rows about this element.", HelpName = "ELEMENT" };
        var all = new Option<bool>("--competing") { Description = "Also the rows that do not count." };
        var temperature = CommonOptions.Temperature();
        var command = new Command("data", "Lists catalogue rows.") { kind, slot, element, all, temperature };
        Listed(command, terminal, async (parsed, client, stop) =>
        {
            var filter = new ListDataRequest
            {
                Kind = parsed.GetValue(kind) is { } word ? kinds[word] : DatumKind.Unspecified,
                SlotPrefix = parsed.GetValue(slot) ?? "",
                Element = parsed.GetValue(element) ?? "",
                IncludeCompeting = parsed.GetValue(all),
            };
            if (parsed.GetValue(temperature) is { } kelvin)
                filter.TemperatureKelvin = kelvin;
            return CatalogueListings.OfData(await client.ListDataAsync(filter, stop).ToListAsync(stop).ConfigureAwait(false));
        });
        return command;
    }

    private static Command Explain(Terminal terminal)
    {
        var slot = new Argument<string>("SLOT") { Description = "Slot or key, for example metal/Cu/Pb or metal/Cu/Pb#2." };
        var temperature = CommonOptions.Temperature();
        var command = new Command("explain", "Explains one datum: every competing row with its sources.") { slot, temperature };
        Listed(command, terminal, async (parsed, client, stop) => CatalogueListings.OfExplanation(
            await client.ExplainDatumAsync(parsed.GetRequiredValue(slot), parsed.GetValue(temperature), stop).ConfigureAwait(false)));
        return command;
    }

    private static Command Coverage(Terminal terminal)
    {
        var tables = Enum.GetValues<CoverageKind>().Where(kind => kind != CoverageKind.Unspecified).ToDictionary(Words.Hyphenated);
        var table = new Option<string?>("--table") { Description = "Only this table. Unset: all tables." };
        table.AcceptOnlyFromAmong([.. tables.Keys]);
        var command = new Command("coverage", "Shows what the catalogue knows and how well, with the gaps.") { table };
        Written(command, terminal, async (parsed, client, stop) =>
        {
            var kind = parsed.GetValue(table) is { } word ? tables[word] : CoverageKind.Unspecified;
            var coverage = await client.GetCoverageAsync(kind, stop).ConfigureAwait(false);
            return (format, file) => CoverageText.Render(coverage, format, terminal, file);
        });
        return command;
    }

    private static void Listed(
        Command command, Terminal terminal, Func<ParseResult, PartitionClient, CancellationToken, Task<Listing>> list) =>
        Written(command, terminal, async (parsed, client, stop) =>
        {
            var listing = await list(parsed, client, stop).ConfigureAwait(false);
            return (format, file) => ListingText.Render(listing, format, terminal, file);
        });

    private static void Written(
        Command command,
        Terminal terminal,
        Func<ParseResult, PartitionClient, CancellationToken, Task<Func<string, string?, string>>> ask)
    {
        var service = new ServiceOptions();
        service.AddTo(command);
        command.SetAction(async (parsed, cancellation) =>
        {
            var connection = await service.OpenAsync(parsed, cancellation).ConfigureAwait(false);
            await using var _ = connection.ConfigureAwait(false);
            var render = await ask(parsed, connection.Client, cancellation).ConfigureAwait(false);
            var text = render(service.FormatOf(parsed), service.FileOf(parsed));
            await OutputFile.WriteAsync(text, service.FileOf(parsed), terminal, cancellation).ConfigureAwait(false);
            return ExitCode.Success;
        });
    }
}
