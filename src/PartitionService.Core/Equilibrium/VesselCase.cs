namespace PartitionService.Core.Equilibrium;

/// <summary>One vessel: what goes in, at what temperature and pressure, which phases may form, one statement about oxygen.</summary>
/// <remarks>Immutable. CaseValidation lists everything that is wrong with a case before it is solved.</remarks>
public sealed record VesselCase
{
    /// <summary>Free label, at most 100 characters.</summary>
    public string Name { get; init; } = "";

    /// <summary>Temperature in kelvin, in [500, 2500].</summary>
    public required double TemperatureKelvin { get; init; }

    /// <summary>Total pressure in atm, in [1e-6, 100].</summary>
    public double PressureAtm { get; init; } = 1;

    /// <summary>Everything that goes in, 1 to 200 items.</summary>
    public required IReadOnlyList<ChargeItem> Charge { get; init; }

    /// <summary>Solvent metal; null: the metallic element with the largest amount charged in metallic form.</summary>
    public string? Solvent { get; init; }

    /// <summary>Slag family; null: no slag may form.</summary>
    public string? SlagFamily { get; init; }

    /// <summary>True where a gas may form.</summary>
    public bool GasAllowed { get; init; }

    /// <summary>The statement about oxygen.</summary>
    public required OxygenStatement Oxygen { get; init; }

    /// <summary>Allowances for plant practice; all off by default.</summary>
    public PracticeAllowances Allowances { get; init; } = PracticeAllowances.None;

    /// <summary>Numbers that replace catalogue data in this case.</summary>
    public IReadOnlyList<DatumOverride> Overrides { get; init; } = [];
}
