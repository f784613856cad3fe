namespace PartitionService.Core.Catalogue;

/// <summary>Gibbs energy of formation of a molten chloride, M(l) + (n/2) Cl2(g, 1 atm) = MCl_n(l).</summary>
/// <remarks>Slot: <c>chloride/{chloride}</c>. Delta G = A + B T in J per mol of metal atoms.</remarks>
public sealed record ChlorideDatum : Datum
{
    /// <summary>Element that is chlorinated.</summary>
    public required string Element { get; init; }

    /// <summary>Chloride, for example <c>MgCl2</c>.</summary>
    public required string Chloride { get; init; }

    /// <summary>Chlorine atoms per metal atom.</summary>
    public required double ChlorinePerMetal { get; init; }

    /// <summary>State of the chloride; only liquid rows are used for salts.</summary>
    public required StandardState ChlorideState { get; init; }

    /// <summary>Constant term A in J per mol of metal atoms.</summary>
    public required double EnthalpyJoulePerMol { get; init; }

    /// <summary>Temperature coefficient B in J/(mol K).</summary>
    public required double SlopeJoulePerMolKelvin { get; init; }

    /// <summary>One standard deviation of Delta G in J/mol.</summary>
    public required double SigmaJoulePerMol { get; init; }

    /// <summary>Delta G in J per mol of metal atoms at a temperature in kelvin, extrapolating outside the range.</summary>
    public double GibbsEnergy(double temperatureKelvin) => EnthalpyJoulePerMol + (SlopeJoulePerMolKelvin * temperatureKelvin);

    /// <summary>Derivative of Delta G with respect to temperature in J/(mol K), the same at every temperature.</summary>
    public double GibbsEnergyPerKelvin => SlopeJoulePerMolKelvin;
}
