using System.Globalization;
using PartitionService.Core.Equilibrium;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Server.Errors;

/// <summary>Checks of fields outside a vessel; each adds a violation with value and allowed range.</summary>
internal static class FieldChecks
{
    /// <summary>A number between two ends, both inclusive; NaN is refused.</summary>
    public static void Range(ICollection<CaseViolation> violations, string field, double value, double minimum, double maximum)
    {
        if (!(value >= minimum && value <= maximum))
            violations.Add(new CaseViolation(field, Text(value), $"must be a number in [{Text(minimum)}, {Text(maximum)}]"));
    }

    /// <summary>A temperature in kelvin.</summary>
    public static void Temperature(ICollection<CaseViolation> violations, double value) =>
        Range(violations, "temperature_kelvin", value, PhysicalConstants.MinimumTemperatureKelvin, PhysicalConstants.MaximumTemperatureKelvin);

    /// <summary>A text of limited length.</summary>
    public static void Length(ICollection<CaseViolation> violations, string field, string value, int maximum)
    {
        if (value.Length > maximum)
            violations.Add(new CaseViolation(
                field, Text(value.Length) + " characters long", string.Create(CultureInfo.InvariantCulture, $"must have at most {maximum} characters")));
    }

    /// <summary>A word from a list.</summary>
    public static void OneOf(ICollection<CaseViolation> violations, string field, string value, IReadOnlyCollection<string> allowed, string what)
    {
        if (value.Length == 0)
            violations.Add(new CaseViolation(field, "", $"required: {what}"));
        else if (!allowed.Contains(value))
            violations.Add(new CaseViolation(field, value, $"must be {what}"));
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
