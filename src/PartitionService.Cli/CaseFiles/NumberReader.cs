using System.Globalization;

namespace PartitionService.Cli.CaseFiles;

/// <summary>Reads numbers the same way in every country.</summary>
internal static class NumberReader
{
    private const NumberStyles Style = NumberStyles.AllowLeadingSign | NumberStyles.AllowDecimalPoint | NumberStyles.AllowExponent;

    /// <summary>Reads a finite number with a decimal point and no group marks.</summary>
    /// <param name="text">The text.</param>
    /// <param name="value">The number.</param>
    /// <param name="fault">What is wrong with the text; empty where nothing is.</param>
    /// <returns>True where it is a number.</returns>
    public static bool TryRead(string text, out double value, out string fault)
    {
        fault = "";
        var isNumber = double.TryParse(text, Style, CultureInfo.InvariantCulture, out value);
        if (isNumber && double.IsFinite(value))
            return true;
        fault = (isNumber, text) switch
        {
            (true, _) => $"{Quoted.Of(text)} is not a finite number.",
            (_, ".nan" or ".NaN" or ".NAN" or ".inf" or "-.inf" or "+.inf" or ".Inf" or "-.Inf" or ".INF" or "-.INF") =>
                $"{Quoted.Of(text)} is not a finite number.",
            _ when text.Contains(',') =>
                $"{Quoted.Of(text)} is not a number; write the decimal mark as a point and leave out group marks, for example 1.5.",
            _ => $"{Quoted.Of(text)} is not a number.",
        };
        return false;
    }
}
