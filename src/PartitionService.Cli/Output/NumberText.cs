using System.Globalization;

namespace PartitionService.Cli.Output;

/// <summary>Writes numbers for reading: decimal point everywhere, three digits that count, and never a zero for a trace.</summary>
internal static class NumberText
{
    /// <summary>What stands where there is no number.</summary>
    public const string None = "-";

    private const double PpmPerPercent = 1e4;

    /// <summary>Writes a share in % with three decimals.</summary>
    /// <param name="fraction">Share, in [0, 1].</param>
    /// <returns>"0" and "100" only for exactly none and all.</returns>
    public static string Percent(double fraction)
    {
        var percent = 100 * fraction;
        return percent switch
        {
            0 => "0",
            > 0 and < 0.001 => "<0.001",
            // Fractions are sums of floating-point numbers: less than 1e-12 away from all is all.
            > 100 - 1e-10 and < 100 + 1e-10 => "100",
            > 99.999 and < 100 => ">99.999",
            _ => percent.ToString("F3", CultureInfo.InvariantCulture),
        };
    }

    /// <summary>Writes a content in the unit that suits it.</summary>
    /// <param name="massPpm">Content in mass ppm; null: no such phase.</param>
    /// <returns>Number and unit; % from 0.1 % upwards.</returns>
    public static (string Number, string Unit) Content(double? massPpm) =>
        massPpm switch
        {
            null => (None, ""),
            >= 0.1 * PpmPerPercent => (Significant(massPpm.Value / PpmPerPercent), "%"),
            _ => (Significant(massPpm.Value), "ppm"),
        };

    /// <summary>Writes a number with a given count of digits that count; far from 1 with a power of ten.</summary>
    /// <param name="value">The number.</param>
    /// <param name="digits">Digits that count, in [1, 15].</param>
    /// <param name="largestPlain">From here on a power of ten is written.</param>
    /// <param name="smallestPlain">Below this a power of ten is written.</param>
    /// <returns>The number; a power of ten as in 1.23e-5.</returns>
    public static string Significant(double value, int digits = 3, double largestPlain = 1e4, double smallestPlain = 1e-3)
    {
        if (value == 0)
            return "0";
        if (!double.IsFinite(value))
            return value.ToString(CultureInfo.InvariantCulture);
        // Round first: 9.996 has three digits as 10.0, not as 10.00.
        var scientific = value.ToString("E" + (digits - 1), CultureInfo.InvariantCulture);
        var mark = scientific.IndexOf('E', StringComparison.Ordinal);
        var exponent = int.Parse(scientific.AsSpan(mark + 1), NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture);
        var rounded = Math.Abs(double.Parse(scientific, CultureInfo.InvariantCulture));
        if (rounded >= largestPlain || rounded < smallestPlain)
            return string.Create(CultureInfo.InvariantCulture, $"{scientific[..mark]}e{exponent}");
        return value.ToString("F" + Math.Max(0, digits - 1 - exponent), CultureInfo.InvariantCulture);
    }

    /// <summary>Writes a mass, a volume or an amount with four digits that count.</summary>
    /// <param name="value">The number.</param>
    /// <returns>The number, without a power of ten from 0.001 up to ten million.</returns>
    public static string Quantity(double value) => Significant(value, 4, 1e7);

    /// <summary>Writes a number with a fixed count of decimals.</summary>
    /// <param name="value">The number.</param>
    /// <param name="decimals">Decimals.</param>
    /// <returns>The number.</returns>
    public static string Fixed(double value, int decimals) => value.ToString("F" + decimals, CultureInfo.InvariantCulture);
}
