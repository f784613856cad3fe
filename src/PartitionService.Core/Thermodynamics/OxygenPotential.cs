namespace PartitionService.Core.Thermodynamics;

/// <summary>Oxygen potentials from gas ratios and metal/oxide pairs, as half the natural logarithm of pO2 in atm.</summary>
public static class OxygenPotential
{
    /// <summary>1/2 ln pO2 in equilibrium with a CO2/CO (or H2O/H2) volume ratio.</summary>
    /// <param name="ratio">Volume ratio of the richer to the poorer oxide, positive.</param>
    /// <param name="richGibbsEnergy">Gibbs energy of formation of CO2 (H2O), J/mol.</param>
    /// <param name="poorGibbsEnergy">Gibbs energy of formation of CO (zero for H2), J/mol.</param>
    /// <param name="temperatureKelvin">Temperature in kelvin.</param>
    /// <remarks>CO + 1/2 O2 = CO2: ln(ratio) = -Delta G/RT + 1/2 ln pO2.</remarks>
    public static double FromRatio(double ratio, double richGibbsEnergy, double poorGibbsEnergy, double temperatureKelvin) =>
        Math.Log(ratio) + ((richGibbsEnergy - poorGibbsEnergy) / (PhysicalConstants.GasConstant * temperatureKelvin));

    /// <summary>Volume ratio in equilibrium with 1/2 ln pO2; the inverse of <see cref="FromRatio"/>.</summary>
    public static double ToRatio(double halfLnPressure, double richGibbsEnergy, double poorGibbsEnergy, double temperatureKelvin) =>
        Math.Exp(halfLnPressure - ((richGibbsEnergy - poorGibbsEnergy) / (PhysicalConstants.GasConstant * temperatureKelvin)));

    /// <summary>1/2 ln pO2 at which a metal and its oxide MO_nu coexist: ln a_oxide = -Delta G/RT + ln a_metal + nu/2 ln pO2.</summary>
    /// <param name="lnOxideActivity">ln of the oxide's activity.</param>
    /// <param name="lnMetalActivity">ln of the metal's activity, same state as the Gibbs energy.</param>
    /// <param name="gibbsEnergy">Gibbs energy of oxidation per mol of metal atoms, J/mol.</param>
    /// <param name="oxygenPerMetal">nu, positive.</param>
    /// <param name="temperatureKelvin">Temperature in kelvin.</param>
    public static double FromPair(
        double lnOxideActivity, double lnMetalActivity, double gibbsEnergy, double oxygenPerMetal, double temperatureKelvin) =>
        (lnOxideActivity - lnMetalActivity + (gibbsEnergy / (PhysicalConstants.GasConstant * temperatureKelvin))) / oxygenPerMetal;

    /// <summary>log10 of pO2 in atm from half its natural logarithm.</summary>
    public static double ToLog10(double halfLnPressure) => 2 * halfLnPressure / Math.Log(10);

    /// <summary>Half the natural logarithm of pO2 from log10 pO2 in atm.</summary>
    public static double FromLog10(double log10Pressure) => 0.5 * log10Pressure * Math.Log(10);
}
