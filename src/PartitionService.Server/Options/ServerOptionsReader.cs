using System.ComponentModel;
using System.ComponentModel.DataAnnotations;
using System.Reflection;
using Microsoft.Extensions.Options;

namespace PartitionService.Server.Options;

/// <summary>Reads the settings once, before anything listens, so that a bad setting stops the start and not a later call.</summary>
/// <remarks>Reads by hand because the framework's binder stops at the first fault and doesn't know what is allowed.</remarks>
internal static class ServerOptionsReader
{
    private static readonly Dictionary<string, PropertyInfo> Settings = typeof(ServerOptions)
        .GetProperties(BindingFlags.Public | BindingFlags.Instance)
        .ToDictionary(p => p.Name, StringComparer.OrdinalIgnoreCase);

    /// <summary>Reads the section, lets the host change it and checks the result.</summary>
    /// <exception cref="OptionsValidationException">One message per bad setting, with name, value and what is allowed.</exception>
    public static ServerOptions Read(IConfiguration configuration, Action<ServerOptions>? configure)
    {
        var options = new ServerOptions();
        List<string> failures = [.. configuration.GetSection(ServerOptions.Section).GetChildren().Select(s => Set(options, s)).OfType<string>()];
        configure?.Invoke(options);
        failures.AddRange(Check(options));
        return failures.Count == 0
            ? options
            : throw new OptionsValidationException(ServerOptions.Section, typeof(ServerOptions), failures);
    }

    /// <summary>Checks every setting; one message per bad one.</summary>
    public static IEnumerable<string> Check(ServerOptions options)
    {
        var results = new List<ValidationResult>();
        Validator.TryValidateObject(options, new ValidationContext(options), results, validateAllProperties: true);
        return results.Select(r => r.ErrorMessage!);
    }

    private static string? Set(ServerOptions options, IConfigurationSection sent)
    {
        if (!Settings.TryGetValue(sent.Key, out var setting))
            return $"{ServerOptions.Section}:{sent.Key} is no setting; known are {string.Join(", ", Settings.Keys.Order(StringComparer.Ordinal))}.";
        try
        {
            var converter = TypeDescriptor.GetConverter(setting.PropertyType);
            setting.SetValue(options, converter.ConvertFromInvariantString(sent.Value ?? ""));
            return null;
        }
        catch (Exception unreadable) when (unreadable is ArgumentException or FormatException)
        {
            var allowed = setting.GetCustomAttribute<SettingAttribute>()!.Allowed;
            return SettingAttribute.Message(setting.Name, sent.Value, allowed);
        }
    }
}
