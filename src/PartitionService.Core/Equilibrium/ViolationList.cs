using System.Globalization;

namespace PartitionService.Core.Equilibrium;

/// <summary>Collects violations; the one place that words ranges.</summary>
internal sealed class ViolationList
{
    private readonly List<CaseViolation> violations = [];

    /// <summary>What was found.</summary>
    public IReadOnlyList<CaseViolation> Violations => violations;

    /// <summary>A number as invariant text that reads back to the same number.</summary>
    public static string Text(double value) => value.ToString("R", CultureInfo.InvariantCulture);

    /// <summary>Adds a violation.</summary>
    public void Add(string field, string value, string allowed) => violations.Add(new CaseViolation(field, value, allowed));

    /// <summary>Adds a violation where a number is not finite or out of an inclusive range.</summary>
    public void Range(string field, double value, double minimum, double maximum)
    {
        if (!(value >= minimum && value <= maximum))
        {
            Add(field, Text(value), $"must be a number in [{Text(minimum)}, {Text(maximum)}]");
        }
    }

    /// <summary>Adds a violation where a quantity of the charge is neither 0 nor in its range.</summary>
    public void Quantity(string field, double value)
    {
        if (value != 0 && !(value >= CaseLimits.MinimumQuantity && value <= CaseLimits.MaximumQuantity))
        {
            Add(field, Text(value), $"must be 0 or a number in [{Text(CaseLimits.MinimumQuantity)}, {Text(CaseLimits.MaximumQuantity)}]");
        }
    }

    /// <summary>Adds a violation where a text is too long.</summary>
    public void Length(string field, string value, int maximum)
    {
        if (value.Length > maximum)
        {
            Add(field, $"{Text(value.Length)} characters long", $"must have at most {Text(maximum)} characters");
        }
    }
}
