using PartitionService.Contracts.V1;

namespace PartitionService.Client.Cases;

/// <summary>States a vessel in a few readable lines.</summary>
/// <remarks>
/// Not safe for use by several threads at once. Numbers must be finite; their ranges are checked by the service, which lists
/// every violation. <see cref="Build"/> may be called again after further statements; each call gives a message of its own.
/// </remarks>
public sealed class VesselCaseBuilder
{
    private readonly VesselCase draft = new();

    private VesselCaseBuilder()
    {
    }

    /// <summary>Starts a case.</summary>
    /// <param name="name">Free label, at most 100 characters, returned with the answer.</param>
    /// <returns>A builder without any statement.</returns>
    public static VesselCaseBuilder Named(string name)
    {
        ArgumentNullException.ThrowIfNull(name);
        return new VesselCaseBuilder { draft = { Name = name } };
    }

    /// <summary>Sets the temperature of the vessel. Required.</summary>
    /// <param name="kelvin">Temperature in kelvin, in [500, 2500].</param>
    /// <returns>This builder.</returns>
    public VesselCaseBuilder At(double kelvin)
    {
        draft.TemperatureKelvin = Finite(kelvin, nameof(kelvin));
        return this;
    }

    /// <summary>Sets the total pressure. Unset: 1 atm.</summary>
    /// <param name="atm">Pressure in atm (101325 Pa), in [1e-6, 100].</param>
    /// <returns>This builder.</returns>
    public VesselCaseBuilder UnderPressure(double atm)
    {
        draft.PressureAtm = Finite(atm, nameof(atm));
        return this;
    }

    /// <summary>Charges a mass of a substance; charging a formula again adds to it.</summary>
    /// <param name="formula">Chemical formula, for example <c>Cu</c>, <c>PbO</c> or <c>air</c>.</param>
    /// <param name="kg">Mass in kg, 0 or in [1e-27, 1e9].</param>
    /// <returns>This builder.</returns>
    public VesselCaseBuilder Charge(string formula, double kg)
    {
        ArgumentNullException.ThrowIfNull(formula);
        draft.Charge.Add(new ChargeItem { Formula = formula, MassKg = Finite(kg, nameof(kg)) });
        return this;
    }

    /// <summary>Blows in a volume of a gas.</summary>
    /// <param name="formula">Formula of a gas, for example <c>O2</c> or <c>CH4</c>, or <c>air</c>.</param>
    /// <param name="normalCubicMetres">Volume in normal cubic metres (0 degC, 1 atm, ideal), 0 or in [1e-27, 1e9].</param>
    /// <returns>This builder.</returns>
    public VesselCaseBuilder Blow(string formula, double normalCubicMetres)
    {
        ArgumentNullException.ThrowIfNull(formula);
        var volume = Finite(normalCubicMetres, nameof(normalCubicMetres));
        draft.Charge.Add(new ChargeItem { Formula = formula, VolumeNormalCubicMetre = volume });
        return this;
    }

    /// <summary>Names the solvent metal. Unset: the metal with the largest amount charged in metallic form.</summary>
    /// <param name="element">Element symbol that the catalogue lists as solvent.</param>
    /// <returns>This builder.</returns>
    public VesselCaseBuilder Solvent(string element)
    {
        ArgumentNullException.ThrowIfNull(element);
        draft.Metal = new MetalBath { Solvent = element };
        return this;
    }

    /// <summary>Allows a slag. Unset: no slag may form.</summary>
    /// <param name="family">Name of a slag family that the catalogue lists, for example <c>iron-silicate</c>.</param>
    /// <returns>This builder.</returns>
    public VesselCaseBuilder UnderSlag(string family)
    {
        ArgumentNullException.ThrowIfNull(family);
        draft.Slag = new SlagBath { Family = family };
        return this;
    }

    /// <summary>Allows a gas. Unset: nothing boils off.</summary>
    /// <returns>This builder.</returns>
    public VesselCaseBuilder WithGas()
    {
        draft.Gas = new GasAtmosphere();
        return this;
    }

    /// <summary>States oxygen by its partial pressure.</summary>
    /// <param name="log10Atm">log10 of the oxygen partial pressure in atm, in [-40, 2].</param>
    /// <returns>This builder.</returns>
    /// <exception cref="InvalidOperationException">Oxygen was stated before.</exception>
    public VesselCaseBuilder OxygenPressure(double log10Atm) =>
        StateOxygen(new OxygenStatement { Log10Po2Atm = Finite(log10Atm, nameof(log10Atm)) });

    /// <summary>States oxygen by the CO2/CO ratio of a controlling gas.</summary>
    /// <param name="ratio">Volume ratio, in [1e-12, 1e12].</param>
    /// <returns>This builder.</returns>
    /// <exception cref="InvalidOperationException">Oxygen was stated before.</exception>
    public VesselCaseBuilder CarbonDioxideToMonoxide(double ratio) =>
        StateOxygen(new OxygenStatement { Co2ToCoRatio = Finite(ratio, nameof(ratio)) });

    /// <summary>States oxygen by the H2O/H2 ratio of a controlling gas.</summary>
    /// <param name="ratio">Volume ratio, in [1e-12, 1e12].</param>
    /// <returns>This builder.</returns>
    /// <exception cref="InvalidOperationException">Oxygen was stated before.</exception>
    public VesselCaseBuilder SteamToHydrogen(double ratio) =>
        StateOxygen(new OxygenStatement { H2OToH2Ratio = Finite(ratio, nameof(ratio)) });

    /// <summary>States oxygen by a metal in equilibrium with its oxide.</summary>
    /// <param name="oxide">Oxide, for example <c>FeO</c> or <c>Al2O3</c>.</param>
    /// <param name="oxideActivity">Activity of the oxide, in [1e-12, 1], pure oxide in its stable state; null: 1.</param>
    /// <param name="metalActivity">Activity of the metal, in [1e-12, 1], pure metal in its stable state; null: 1.</param>
    /// <returns>This builder.</returns>
    /// <exception cref="InvalidOperationException">Oxygen was stated before.</exception>
    public VesselCaseBuilder OxygenFromPair(string oxide, double? oxideActivity = null, double? metalActivity = null)
    {
        ArgumentNullException.ThrowIfNull(oxide);
        var pair = new MetalOxidePair { Oxide = oxide };
        if (oxideActivity is { } ofOxide)
            pair.OxideActivity = Finite(ofOxide, nameof(oxideActivity));
        if (metalActivity is { } ofMetal)
            pair.MetalActivity = Finite(ofMetal, nameof(metalActivity));
        return StateOxygen(new OxygenStatement { MetalOxidePair = pair });
    }

    /// <summary>States oxygen by what is dissolved in the metal.</summary>
    /// <param name="massPpm">Dissolved oxygen in mass ppm, in [1e-6, 50000].</param>
    /// <returns>This builder.</returns>
    /// <exception cref="InvalidOperationException">Oxygen was stated before.</exception>
    public VesselCaseBuilder DissolvedOxygen(double massPpm) =>
        StateOxygen(new OxygenStatement { DissolvedOxygenMassPpm = Finite(massPpm, nameof(massPpm)) });

    /// <summary>Accounts for all oxygen that goes in; the oxygen potential follows from the charge.</summary>
    /// <returns>This builder.</returns>
    /// <exception cref="InvalidOperationException">Oxygen was stated before.</exception>
    public VesselCaseBuilder ClosedOxygenBalance() => StateOxygen(new OxygenStatement { ClosedBalance = new ClosedOxygenBalance() });

    /// <summary>Lets the slag carry metal droplets.</summary>
    /// <param name="massPercent">Droplets in mass % of the leaving slag, in [0, 90].</param>
    /// <returns>This builder.</returns>
    public VesselCaseBuilder EntrainMetal(double massPercent)
    {
        Allowances.MetalInSlag = new EntrainedMetal { MassPercent = Finite(massPercent, nameof(massPercent)) };
        return this;
    }

    /// <summary>Lets the slag carry the metal droplets that are typical of its family.</summary>
    /// <returns>This builder.</returns>
    public VesselCaseBuilder EntrainTypicalMetal()
    {
        Allowances.MetalInSlag = new EntrainedMetal { FamilyTypical = true };
        return this;
    }

    /// <summary>Lets the metal carry slag.</summary>
    /// <param name="massPercent">Slag in mass % of the leaving metal, in [0, 50].</param>
    /// <returns>This builder.</returns>
    public VesselCaseBuilder EntrainSlag(double massPercent)
    {
        Allowances.SlagInMetalMassPercent = Finite(massPercent, nameof(massPercent));
        return this;
    }

    /// <summary>Lets a share of every solid charge item leave unreacted as mechanical dust.</summary>
    /// <param name="massFraction">Mass fraction, in [0, 0.5].</param>
    /// <returns>This builder.</returns>
    public VesselCaseBuilder LoseToDust(double massFraction)
    {
        Allowances.MechanicalDustMassFraction = Finite(massFraction, nameof(massFraction));
        return this;
    }

    /// <summary>Lets only a part of an element take part in the equilibrium.</summary>
    /// <param name="element">Element symbol.</param>
    /// <param name="efficiency">Share of the input that takes part, in [0, 1].</param>
    /// <returns>This builder.</returns>
    public VesselCaseBuilder ReachOnly(string element, double efficiency)
    {
        ArgumentNullException.ThrowIfNull(element);
        var stage = new StageEfficiency { Element = element, Efficiency = Finite(efficiency, nameof(efficiency)) };
        Allowances.StageEfficiencies.Add(stage);
        return this;
    }

    /// <summary>Replaces an activity coefficient of the catalogue.</summary>
    /// <param name="slot">Slot, for example <c>metal/Cu/Pb</c> or <c>slag/iron-silicate/SnO2</c>.</param>
    /// <param name="lnGamma">Natural logarithm, mole fraction basis, at the temperature of the case, in [-60, 60].</param>
    /// <param name="source">Where the number comes from, at most 200 characters; null: "caller".</param>
    /// <returns>This builder.</returns>
    public VesselCaseBuilder OverrideLnGamma(string slot, double lnGamma, string? source = null) =>
        Override(slot, source, new DatumOverride { LnGamma = Finite(lnGamma, nameof(lnGamma)) });

    /// <summary>Replaces a Gibbs energy of the catalogue.</summary>
    /// <param name="slot">Slot, for example <c>oxidation/PbO</c>, <c>chloride/MgCl2</c> or <c>gas/As4</c>.</param>
    /// <param name="joulePerMol">J/mol at the temperature of the case, in [-5e6, 5e6].</param>
    /// <param name="source">Where the number comes from, at most 200 characters; null: "caller".</param>
    /// <returns>This builder.</returns>
    public VesselCaseBuilder OverrideGibbsEnergy(string slot, double joulePerMol, string? source = null) =>
        Override(slot, source, new DatumOverride { GibbsEnergyJoulePerMol = Finite(joulePerMol, nameof(joulePerMol)) });

    /// <summary>Replaces an interaction parameter of the catalogue.</summary>
    /// <param name="slot">Slot, for example <c>interaction/Cu/O/Sn</c>.</param>
    /// <param name="epsilon">Parameter on mole fractions and natural logarithm, in [-1e6, 1e6].</param>
    /// <param name="source">Where the number comes from, at most 200 characters; null: "caller".</param>
    /// <returns>This builder.</returns>
    public VesselCaseBuilder OverrideInteraction(string slot, double epsilon, string? source = null) =>
        Override(slot, source, new DatumOverride { Epsilon = Finite(epsilon, nameof(epsilon)) });

    /// <summary>Gives the case as stated so far.</summary>
    /// <returns>A message that later statements do not change.</returns>
    /// <exception cref="InvalidOperationException">Temperature, charge or the statement about oxygen is missing.</exception>
    public VesselCase Build()
    {
        var missing = new List<string>();
        if (draft.TemperatureKelvin == 0)
            missing.Add("the temperature (At)");
        if (draft.Charge.Count == 0)
            missing.Add("a charge (Charge or Blow)");
        if (draft.Oxygen is null)
            missing.Add("a statement about oxygen (for example OxygenPressure or ClosedOxygenBalance)");
        if (missing.Count > 0)
            throw new InvalidOperationException($"The case lacks {string.Join(", ", missing)}.");
        return draft.Clone();
    }

    private PracticeAllowances Allowances => draft.Allowances ??= new PracticeAllowances();

    private static double Finite(double value, string parameter) =>
        double.IsFinite(value) ? value : throw new ArgumentOutOfRangeException(parameter, value, "The number must be finite.");

    private VesselCaseBuilder StateOxygen(OxygenStatement statement)
    {
        // The last of two statements would win without a word, and the answer would be for another furnace.
        if (draft.Oxygen is { StatementCase: var stated })
            throw new InvalidOperationException($"Oxygen is stated already, as {stated}; a vessel takes one statement.");
        draft.Oxygen = statement;
        return this;
    }

    private VesselCaseBuilder Override(string slot, string? source, DatumOverride replacement)
    {
        ArgumentNullException.ThrowIfNull(slot);
        replacement.Slot = slot;
        replacement.Source = source ?? "";
        draft.Overrides.Add(replacement);
        return this;
    }
}
