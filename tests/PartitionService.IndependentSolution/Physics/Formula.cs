using System.Globalization;
using System.Text.RegularExpressions;

namespace PartitionService.IndependentSolution.Physics;

/// <summary>Atoms of a plain chemical formula, brackets not needed here.</summary>
internal static partial class Formula
{
    /// <summary>Atoms per formula unit.</summary>
    public static Dictionary<string, double> Atoms(string text)
    {
        var atoms = new Dictionary<string, double>(StringComparer.Ordinal);
        var read = 0;
        foreach (Match match in Symbol().Matches(text))
        {
            var count = match.Groups[2].Length == 0 ? 1 : double.Parse(match.Groups[2].Value, CultureInfo.InvariantCulture);
            atoms[match.Groups[1].Value] = atoms.GetValueOrDefault(match.Groups[1].Value) + count;
            read += match.Length;
        }

        return read == text.Length && read > 0 ? atoms : throw new FormatException(text);
    }

    [GeneratedRegex(@"([A-Z][a-z]?)(\d*\.?\d*)")]
    private static partial Regex Symbol();
}
