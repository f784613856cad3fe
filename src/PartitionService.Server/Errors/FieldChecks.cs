using System.Globalization;
using PartitionService.Core.Equilibrium;

namespace PartitionService.Server.Errors;

/// <summary>Checks of fields outside a vessel; each adds a violation with value and allowed range.</summary>
internal static class FieldChecks
{
    /// <summary>Lowest temperature of a request in kelvin.</summary>
    public const double MinimumTemperatureKelvin = 500;

    /// <summary>Highest temperature of a request in kelvin.</summary>
    public const double MaximumTemperatureKelvin = 2500;

    /// <summary>A number between two ends, both inclusive; NaN is refused.</summary>
    public static void Range(
        ICollection<CaseViolation> violations, string field, double value, double minimum, double maximum, string unit)
    {
        if (!(value >= minimum && value <= maximum))
            violations.Add(new CaseViolation(field, Text(value), $"allowed is [{Text(minimum)}, {Text(maximum)}]{(unit.Length > 0 ? " " + unit : "")}"));
    }

    /// <summary>A temperature in kelvin.</summary>
    public static void Temperature(ICollection<CaseViolation> violations, double value) =>
        Range(violations, "temperature_kelvin", value, MinimumTemperatureKelvin, MaximumTemperatureKelvin, "K");

    /// <summary>A text of limited length.</summary>
    public static void Length(ICollection<CaseViolation> violations, string field, string value, int maximum)
    {
        if (value.Length > maximum)
            violations.Add(new CaseViolation(field, value, string.Create(CultureInfo.InvariantCulture, $"allowed are at most {maximum} characters")));
    }

    /// <summary>A word from a list.</summary>
    public static void OneOf(ICollection<CaseViolation> violations, string field, string value, IReadOnlyCollection<string> allowed, string what)
    {
        if (value.Length == 0)
            violations.Add(new CaseViolation(field, "", $"required: {what}"));
        else if (!allowed.Contains(value))
            violations.Add(new CaseViolation(field, value, $"allowed is {what}"));
    }

    /// <summary>Refuses the request where anything was found.</summary>
    /// <exception cref="ServiceException">At least one violation.</exception>
    public static void ThrowIfAny(List<CaseViolation> violations)
    {
        if (violations.Count > 0)
            throw ServiceErrors.InvalidFields(violations);
    }

    private static string Text(double value) => value.ToString("R", CultureInfo.InvariantCulture);
}
