namespace PartitionService.Core.Equilibrium;

/// <summary>Exact first derivatives of an answer, by the implicit function theorem on the converged solution.</summary>
/// <remarks>
/// A phase that is absent stays absent, rows of the catalogue stay chosen and a bounded variable stays bounded: where one of these is
/// about to change the derivative is the one of the side that the solution is on.
/// </remarks>
/// <param name="Outputs">What is differentiated, one row each.</param>
/// <param name="Columns">What it is differentiated with respect to, one column each.</param>
public sealed record DerivativeReport(IReadOnlyList<DerivativeOutput> Outputs, IReadOnlyList<DerivativeColumn> Columns)
{
    /// <summary>Derivative of an output with respect to a parameter.</summary>
    /// <param name="output">Index into <see cref="Outputs"/>.</param>
    /// <param name="parameter">Index into <see cref="Columns"/>.</param>
    public double this[int output, int parameter] => Columns[parameter].Values[output];
}

/// <summary>A quantity that is differentiated.</summary>
/// <param name="Kind">Which.</param>
/// <param name="Element">Element symbol; empty where the quantity is not about one element.</param>
public sealed record DerivativeOutput(DerivativeOutputKind Kind, string Element);

/// <summary>Derivatives with respect to one parameter.</summary>
/// <param name="Kind">Which parameter.</param>
/// <param name="Name">Formula of a charge item, slot of a datum; otherwise empty.</param>
/// <param name="Index">Position of a charge item in the charge, from 0; otherwise -1.</param>
/// <param name="Unit">Unit of the parameter: the derivatives are per this unit.</param>
/// <param name="Value">Value of the parameter.</param>
/// <param name="IsDefined">
/// False where there is no derivative, all values being zero then: an item of zero quantity that alone brings an element, a closed
/// balance without oxygen, a solution that does not determine its amounts.
/// </param>
/// <param name="Values">One derivative per output.</param>
public sealed record DerivativeColumn(
    DerivativeParameterKind Kind,
    string Name,
    int Index,
    string Unit,
    double Value,
    bool IsDefined,
    IReadOnlyList<double> Values);

/// <summary>Kinds of differentiated quantities.</summary>
public enum DerivativeOutputKind
{
    /// <summary>Share of an element that leaves with the metal, allowances included.</summary>
    MetalFraction = 1,

    /// <summary>Share of an element that leaves with the slag, allowances included.</summary>
    SlagFraction,

    /// <summary>Share of an element that leaves with the gas.</summary>
    GasFraction,

    /// <summary>Amount of the equilibrium metal, mol.</summary>
    MetalAmount,

    /// <summary>Amount of the equilibrium slag, mol.</summary>
    SlagAmount,

    /// <summary>Amount of the gas, mol.</summary>
    GasAmount,

    /// <summary>log10 of pO2 in atm.</summary>
    Log10OxygenPressure,
}

/// <summary>Kinds of parameters.</summary>
public enum DerivativeParameterKind
{
    /// <summary>Temperature, kelvin.</summary>
    Temperature = 1,

    /// <summary>Total pressure, atm.</summary>
    Pressure,

    /// <summary>log10 of the pO2 in atm that the statement fixes, whatever its form.</summary>
    Log10OxygenPressure,

    /// <summary>Stated dissolved oxygen, mass ppm of the metal.</summary>
    DissolvedOxygen,

    /// <summary>O2 charged on top, kg, with a closed balance.</summary>
    OxygenInput,

    /// <summary>Quantity of a charge item, kg or normal cubic metre.</summary>
    ChargeQuantity,

    /// <summary>
    /// A datum: ln gamma, J/mol, epsilon or log10 of a capacity. Where several rows of one slot entered, all move together.
    /// </summary>
    Datum,
}
