namespace PartitionService.Core.Catalogue;

/// <summary>Gibbs energy of oxidation of one mole of metal atoms, M(ref) + (nu/2) O2(g, 1 atm) = MO_nu.</summary>
/// <remarks>Slot: <c>oxidation/{oxide}</c>. Delta G = A + B T in J per mol of metal atoms.</remarks>
public sealed record OxidationDatum : Datum
{
    /// <summary>Element that is oxidised.</summary>
    public required string Element { get; init; }

    /// <summary>Mononuclear oxide, for example <c>AsO1.5</c>.</summary>
    public required string Oxide { get; init; }

    /// <summary>Oxygen atoms per metal atom (nu), read off the oxide's name.</summary>
    public required double OxygenPerMetal { get; init; }

    /// <summary>State of the metal on the left side: liquid, solid, monatomic gas or half diatomic gas.</summary>
    public required StandardState MetalState { get; init; }

    /// <summary>State of the oxide: liquid (supercooled counts as liquid) or solid.</summary>
    public required StandardState OxideState { get; init; }

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
