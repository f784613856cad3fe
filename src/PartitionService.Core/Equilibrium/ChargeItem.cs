namespace PartitionService.Core.Equilibrium;

/// <summary>One constituent of the charge.</summary>
/// <param name="Formula">Chemical formula, or <c>air</c>.</param>
/// <param name="Quantity">How much; kg or normal cubic metres, at least 0.</param>
/// <param name="Unit">Unit of <paramref name="Quantity"/>.</param>
public sealed record ChargeItem(string Formula, double Quantity, ChargeUnit Unit = ChargeUnit.Kilogram);

/// <summary>Unit of a charge item.</summary>
public enum ChargeUnit
{
    /// <summary>Mass in kg.</summary>
    Kilogram,

    /// <summary>Gas volume in cubic metres at 0 degC and 1 atm, ideal.</summary>
    NormalCubicMetre,

    /// <summary>The quantity was not stated; always a violation.</summary>
    Unstated,
}
