using System.CommandLine;
using PartitionService.Cli.Output;
using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Commands;

/// <summary>Converts the activity of a dilute solute between reference states.</summary>
internal static class ConvertCommand
{
    private static readonly Dictionary<string, ReferenceState> States = new(StringComparer.Ordinal)
    {
        ["raoultian"] = ReferenceState.Raoultian,
        ["henrian-mole-fraction"] = ReferenceState.HenrianMoleFraction,
        ["henrian-one-mass-percent"] = ReferenceState.HenrianOneMassPercent,
    };

    /// <summary>Makes the command.</summary>
    /// <param name="terminal">Where it writes.</param>
    /// <returns>The command.</returns>
    public static Command Create(Terminal terminal)
    {
        var solvent = Symbol("--solvent", "Element symbol of the liquid metal.");
        var solute = Symbol("--solute", "Element symbol of the dissolved element.");
        var temperature = RequiredNumber("--temperature", "Temperature in kelvin, from 500 to 2500.", "KELVIN");
        var activity = RequiredNumber("--activity", "Activity in the reference state --from, above 0.", "NUMBER");
        var from = State("--from", "Reference state of the activity.");
        var to = State("--to", "Reference state to convert to.");
        var lnGamma0 = new Option<double?>("--ln-gamma0")
        {
            Description = "ln gamma0 of the solute (natural logarithm, mole fraction, Raoultian). Unset: the catalogue's.",
            HelpName = "NUMBER",
            CustomParser = result => CommonOptions.Number(result, _ => true, ""),
        };
        var service = new ServiceOptions();
        var command = new Command("convert", "Converts the activity of a dilute solute between reference states.")
        {
            solvent, solute, temperature, activity, from, to, lnGamma0,
        };
        service.AddTo(command);
        command.SetAction(async (parsed, cancellation) =>
        {
            var request = new ConvertActivityCoefficientRequest
            {
                Solvent = parsed.GetRequiredValue(solvent),
                Solute = parsed.GetRequiredValue(solute),
                TemperatureKelvin = parsed.GetRequiredValue(temperature),
                Activity = parsed.GetRequiredValue(activity),
                From = States[parsed.GetRequiredValue(from)],
                To = States[parsed.GetRequiredValue(to)],
            };
            if (parsed.GetValue(lnGamma0) is { } given)
                request.LnGamma0 = given;
            var connection = await service.OpenAsync(parsed, cancellation).ConfigureAwait(false);
            await using var _ = connection.ConfigureAwait(false);
            var response = await connection.Client.ConvertActivityCoefficientAsync(request, cancellation).ConfigureAwait(false);
            var listing = ConversionListing.Of(request, response);
            var text = ListingText.Render(listing, service.FormatOf(parsed), terminal, service.FileOf(parsed));
            await OutputFile.WriteAsync(text, service.FileOf(parsed), terminal, cancellation).ConfigureAwait(false);
            return ExitCode.Success;
        });
        return command;
    }

    private static Option<string> Symbol(string name, string description) =>
        new(name) { Description = description, Required = true, HelpName = "ELEMENT" };

    private static Option<double> RequiredNumber(string name, string description, string helpName) => new(name)
    {
        Description = description,
        HelpName = helpName,
        Required = true,
        CustomParser = result => CommonOptions.Number(result, _ => true, ""),
    };

    private static Option<string> State(string name, string description)
    {
        var option = new Option<string>(name) { Description = description, Required = true };
        option.AcceptOnlyFromAmong([.. States.Keys]);
        return option;
    }
}
