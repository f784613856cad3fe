namespace PartitionService.Core.Equilibrium;

/// <summary>Limits on the size and the numbers of a case; all ranges are inclusive.</summary>
public static class CaseLimits
{
    /// <summary>Longest name, characters.</summary>
    public const int NameLength = 100;

    /// <summary>Largest number of charge items.</summary>
    public const int ChargeItems = 200;

    /// <summary>Largest number of overrides.</summary>
    public const int Overrides = 100;

    /// <summary>Largest number of stage efficiencies.</summary>
    public const int StageEfficiencies = 100;

    /// <summary>Longest slot of an override, characters.</summary>
    public const int SlotLength = 100;

    /// <summary>Longest source of an override, characters.</summary>
    public const int SourceLength = 200;

    /// <summary>Lowest total pressure in atm.</summary>
    public const double MinimumPressureAtm = 1e-6;

    /// <summary>Highest total pressure in atm.</summary>
    public const double MaximumPressureAtm = 100;

    /// <summary>Smallest quantity of one item beside 0, kg or Nm3: below the mass of one atom, so that less has no meaning.</summary>
    public const double MinimumQuantity = 1e-27;

    /// <summary>Largest quantity of one item, kg or Nm3.</summary>
    public const double MaximumQuantity = 1e9;
}
