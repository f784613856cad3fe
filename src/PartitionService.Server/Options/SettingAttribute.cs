using System.ComponentModel.DataAnnotations;
using System.Globalization;
using System.Net;

namespace PartitionService.Server.Options;

/// <summary>A rule for one setting whose message names the setting, the value and what is allowed.</summary>
[AttributeUsage(AttributeTargets.Property)]
public abstract class SettingAttribute : ValidationAttribute
{
    /// <summary>What is allowed, in words.</summary>
    public abstract string Allowed { get; }

    /// <summary>The message about a bad setting.</summary>
    internal static string Message(string? name, string? value, string allowed) =>
        $"{ServerOptions.Section}:{name} is '{value}'; allowed is {allowed}.";

    /// <inheritdoc/>
    protected override ValidationResult? IsValid(object? value, ValidationContext validationContext)
    {
        ArgumentNullException.ThrowIfNull(validationContext);
        if (IsValid(value))
            return ValidationResult.Success;
        var shown = Convert.ToString(value, CultureInfo.InvariantCulture);
        return new ValidationResult(Message(validationContext.MemberName, shown, Allowed), [validationContext.MemberName!]);
    }
}

/// <summary>A number between two ends, both inclusive; NaN is refused.</summary>
/// <param name="minimum">Lower end.</param>
/// <param name="maximum">Upper end.</param>
/// <param name="unit">Unit of value and ends.</param>
[AttributeUsage(AttributeTargets.Property)]
public sealed class InRangeAttribute(double minimum, double maximum, string unit) : SettingAttribute
{
    /// <summary>Lower end, inclusive.</summary>
    public double Minimum { get; } = minimum;

    /// <summary>Upper end, inclusive.</summary>
    public double Maximum { get; } = maximum;

    /// <summary>Unit of value and ends.</summary>
    public string Unit { get; } = unit;

    /// <inheritdoc/>
    public override string Allowed => string.Create(CultureInfo.InvariantCulture, $"[{Minimum}, {Maximum}] {Unit}");

    /// <inheritdoc/>
    public override bool IsValid(object? value)
    {
        var number = Convert.ToDouble(value, CultureInfo.InvariantCulture);
        return number >= Minimum && number <= Maximum;
    }
}

/// <summary>A port that needs no privilege, or 0 for any free one.</summary>
[AttributeUsage(AttributeTargets.Property)]
public sealed class UnprivilegedPortAttribute : SettingAttribute
{
    /// <inheritdoc/>
    public override string Allowed => "[1025, 65535], or 0 for any free port";

    /// <inheritdoc/>
    public override bool IsValid(object? value) => value is 0 or (> 1024 and <= 65535);
}

/// <summary>An IP address as text.</summary>
[AttributeUsage(AttributeTargets.Property)]
public sealed class IpAddressTextAttribute : SettingAttribute
{
    /// <inheritdoc/>
    public override string Allowed => "an IP address such as 127.0.0.1, 0.0.0.0 or ::1";

    /// <inheritdoc/>
    public override bool IsValid(object? value) => value is string text && IPAddress.TryParse(text, out _);
}

/// <summary>One of the names of an enumeration.</summary>
/// <param name="names">The enumeration.</param>
[AttributeUsage(AttributeTargets.Property)]
public sealed class KnownNameAttribute(Type names) : SettingAttribute
{
    /// <summary>The enumeration.</summary>
    public Type Names { get; } = names;

    /// <inheritdoc/>
    public override string Allowed => string.Join(", ", Enum.GetNames(Names));

    /// <inheritdoc/>
    public override bool IsValid(object? value) => value is not null && Enum.IsDefined(Names, value);
}

/// <summary>Yes, no or unset.</summary>
[AttributeUsage(AttributeTargets.Property)]
public sealed class OptionalSwitchAttribute : SettingAttribute
{
    /// <inheritdoc/>
    public override string Allowed => "true, false or unset";

    /// <inheritdoc/>
    public override bool IsValid(object? value) => value is null or bool;
}
