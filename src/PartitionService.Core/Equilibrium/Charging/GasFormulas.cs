using System.Collections.Frozen;

namespace PartitionService.Core.Equilibrium.Charging;

/// <summary>Formulas that are charged as gases and may be given in normal cubic metres.</summary>
internal static class GasFormulas
{
    /// <summary>The word for dry air.</summary>
    public const string Air = "air";

    /// <summary>Gases at ordinary temperature that furnaces are fed with; steam counts as a gas of its formula.</summary>
    private static readonly FrozenSet<string> Gases = new[]
    {
        "O2", "N2", "Ar", "H2", "CO", "CO2", "CH4", "C2H2", "C2H4", "C2H6", "C3H6", "C3H8", "C4H10", "H2O", "Cl2", "HCl", "HBr",
        "SO2", "H2S", "NH3",
    }.ToFrozenSet(StringComparer.Ordinal);

    /// <summary>
    /// Atoms in one mol of dry air: 78.09 % N2, 20.95 % O2, 0.93 % Ar, 0.03 % CO2 by volume (CRC Handbook of Chemistry and
    /// Physics, from memory).
    /// </summary>
    public static IReadOnlyDictionary<string, double> AirAtoms { get; } = new Dictionary<string, double>(StringComparer.Ordinal)
    {
        ["N"] = 2 * 0.7809,
        ["O"] = 2 * (0.2095 + 0.0003),
        ["Ar"] = 0.0093,
        ["C"] = 0.0003,
    };

    /// <summary>True where the formula may be given as a gas volume.</summary>
    public static bool Contains(string formula) => formula == Air || Gases.Contains(formula);

    /// <summary>The gases as text, for error messages.</summary>
    public static string Listing { get; } = string.Join(", ", Gases.Append(Air).Order(StringComparer.Ordinal));
}
