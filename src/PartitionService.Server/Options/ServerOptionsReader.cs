using System.ComponentModel.DataAnnotations;
using Microsoft.Extensions.Options;

namespace PartitionService.Server.Options;

/// <summary>Reads the settings once, before anything listens, so that a bad setting stops the start and not a later call.</summary>
internal static class ServerOptionsReader
{
    /// <summary>Reads the section, lets the host change it and checks the result.</summary>
    /// <exception cref="OptionsValidationException">One message per bad setting, with name, value and what is allowed.</exception>
    public static ServerOptions Read(IConfiguration configuration, Action<ServerOptions>? configure)
    {
        var options = new ServerOptions();
        try
        {
            configuration.GetSection(ServerOptions.Section).Bind(options, binder => binder.ErrorOnUnknownConfiguration = true);
        }
        catch (InvalidOperationException unreadable)
        {
            // The binder names setting and value in its own message and the reason in the inner one.
            var reason = unreadable.InnerException is { } inner ? $" {inner.Message}" : "";
            throw new OptionsValidationException(ServerOptions.Section, typeof(ServerOptions), [unreadable.Message + reason]);
        }

        configure?.Invoke(options);
        Check(options);
        return options;
    }

    /// <summary>Checks every setting and lists all that are bad.</summary>
    /// <exception cref="OptionsValidationException">At least one setting is bad.</exception>
    public static void Check(ServerOptions options)
    {
        var results = new List<ValidationResult>();
        if (!Validator.TryValidateObject(options, new ValidationContext(options), results, validateAllProperties: true))
            throw new OptionsValidationException(ServerOptions.Section, typeof(ServerOptions), results.Select(r => r.ErrorMessage!));
    }
}
