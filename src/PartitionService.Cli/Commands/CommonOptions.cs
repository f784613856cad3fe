using System.CommandLine;
using System.CommandLine.Parsing;
using PartitionService.Cli.CaseFiles;
using PartitionService.Client;

namespace PartitionService.Cli.Commands;

/// <summary>Options that several commands share; each command takes instances of its own.</summary>
internal static class CommonOptions
{
    /// <summary>Words of <see cref="Format"/>.</summary>
    public static IReadOnlyList<string> Formats { get; } = ["table", "csv", "json"];

    /// <summary>Address of a running service.</summary>
    /// <returns>An option; unset: a service inside this process.</returns>
    public static Option<Uri?> Address() => new("--address")
    {
        Description = "Address of a running service, for example http://localhost:5080. "
            + "Unset: the service runs inside this process, on loopback only.",
        HelpName = "URL",
        CustomParser = result =>
        {
            var text = result.Tokens[0].Value;
            if (Uri.TryCreate(text, UriKind.Absolute, out var address) && address.Scheme is "http" or "https")
                return address;
            result.AddError($"--address: \"{text}\" is not an http or https address.");
            return null;
        },
    };

    /// <summary>Seconds to wait for an answer.</summary>
    /// <returns>An option; 30 s by default.</returns>
    public static Option<double> Timeout() => new("--timeout")
    {
        Description = "Longest wait for an answer in seconds, above 0 and at most 3600.",
        HelpName = "SECONDS",
        DefaultValueFactory = _ => 30,
        CustomParser = result => Number(result, IsDeadline, "must be above 0 and at most 3600"),
    };

    /// <summary>Form of the result.</summary>
    /// <returns>An option; a table by default.</returns>
    public static Option<string> Format()
    {
        var option = new Option<string>("--format")
        {
            Description = "table: a page for reading; csv: one number per record; "
                + "json: the message of the contract in the proto3 JSON mapping.",
            DefaultValueFactory = _ => "table",
        };
        option.AcceptOnlyFromAmong([.. Formats]);
        return option;
    }

    /// <summary>File for the result.</summary>
    /// <returns>An option; unset: the standard output.</returns>
    public static Option<string?> Output() => new("--output")
    {
        Description = "File for the result, UTF-8; one that exists is replaced. Unset: standard output.",
        HelpName = "FILE",
    };

    /// <summary>Temperature of catalogue values.</summary>
    /// <returns>An option; unset: the middle of each row's range.</returns>
    public static Option<double?> Temperature() => new("--temperature")
    {
        Description = "Temperature of the values in kelvin, from 500 to 2500. Unset: the middle of each row's range.",
        HelpName = "KELVIN",
        CustomParser = result => Number(result, _ => true, ""),
    };

    /// <summary>Reads a number of the command line the same way in every country.</summary>
    /// <param name="result">The option as written.</param>
    /// <param name="isAllowed">Checks the number.</param>
    /// <param name="limit">What is allowed, in words.</param>
    /// <returns>The number; 0 where it is wrong, and an error is added.</returns>
    public static double Number(ArgumentResult result, Func<double, bool> isAllowed, string limit)
    {
        var option = (result.Parent as OptionResult)?.IdentifierToken?.Value ?? "";
        var text = result.Tokens[0].Value;
        if (!NumberReader.TryRead(text, out var value, out var fault))
            result.AddError($"{option}: {fault}");
        else if (!isAllowed(value))
            result.AddError($"{option}: {text} is out of range; it {limit}.");
        return value;
    }

    private static bool IsDeadline(double seconds) => seconds > 0 && seconds <= PartitionClientOptions.LongestDeadline.TotalSeconds;
}
