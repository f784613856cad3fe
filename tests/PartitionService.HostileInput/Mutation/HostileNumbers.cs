namespace PartitionService.HostileInput.Mutation;

/// <summary>Numbers that break careless arithmetic, and numbers that a field allows but nobody sends.</summary>
public static class HostileNumbers
{
    private static readonly double[] Bad =
    [
        0, -0.0, -1, 1, double.NaN, double.PositiveInfinity, double.NegativeInfinity, double.Epsilon, -double.Epsilon, 1e-310, 2.3e-308,
        1e-300, 1e300, 1e308, double.MaxValue, double.MinValue, 499.9999999, 500, 2500, 2500.0000001, 1e9, 1.0000001e9, 4294967296, 1e-6,
    ];

    /// <summary>Allowed ranges of the contract; L: spread over decades.</summary>
    private static readonly Dictionary<string, (double Low, double High, bool Decades)> Allowed = new(StringComparer.Ordinal)
    {
        ["temperature_kelvin"] = (500, 2500, false),
        ["pressure_atm"] = (1e-6, 100, true),
        ["mass_kg"] = (1e-9, 1e9, true),
        ["volume_normal_cubic_metre"] = (1e-9, 1e9, true),
        ["log10_po2_atm"] = (-40, 2, false),
        ["co2_to_co_ratio"] = (1e-12, 1e12, true),
        ["h2o_to_h2_ratio"] = (1e-12, 1e12, true),
        ["dissolved_oxygen_mass_ppm"] = (1e-6, 50000, true),
        ["oxide_activity"] = (1e-12, 1, true),
        ["metal_activity"] = (1e-12, 1, true),
        ["slag_in_metal_mass_percent"] = (0, 50, false),
        ["mechanical_dust_mass_fraction"] = (0, 0.5, false),
        ["mass_percent"] = (0, 90, false),
        ["efficiency"] = (0, 1, false),
        ["ln_gamma"] = (-60, 60, false),
        ["ln_gamma0"] = (-60, 60, false),
        ["gibbs_energy_joule_per_mol"] = (-5e6, 5e6, false),
        ["epsilon"] = (-1e6, 1e6, false),
        ["activity"] = (1e-300, 1e30, true),
    };

    /// <summary>A number for a field: hostile, allowed, or a distortion of what stands there.</summary>
    public static double For(string field, double present, Dice dice)
    {
        switch (dice.Throw(10))
        {
            case 0 or 1 or 2:
                return dice.Of(Bad);
            case 3:
                return BitConverter.ToDouble(dice.Bytes(8));
            case 4:
                return present * dice.Decades(1e-12, 1e12);
            case 5:
                return -present;
            default:
                return Within(field, dice);
        }
    }

    /// <summary>A number that the contract allows, its ends more often than chance would have it.</summary>
    public static double Within(string field, Dice dice)
    {
        var (low, high, decades) = Allowed.GetValueOrDefault(field, (0, 1, false));
        return dice.Throw(8) switch
        {
            0 => low,
            1 => high,
            _ => decades ? dice.Decades(low, high) : dice.Between(low, high),
        };
    }
}
