namespace PartitionService.Core.Thermodynamics;

/// <summary>Conversions between the Raoultian and the two Henrian reference states of a solute, in the dilute limit.</summary>
/// <remarks>
/// <para>
/// At infinite dilution of solute i in solvent s, with mole fraction x and mass % w, one solution has three activities:
/// Raoultian a_R = gamma0 x, Henrian on mole fraction a_HM = x, Henrian on mass % a_H% = w, with x = w M_s/(100 M_i).
/// All three are proportional to each other, so that a ratio of activities is the same in each of them.
/// </para>
/// <para>
/// Pure functions of positive finite numbers; atomic masses in g/mol. Nothing is checked here: NaN in gives NaN out, and a
/// result may exceed the composition range, because the dilute limit is a tangent and not a solution.
/// </para>
/// </remarks>
public static class ReferenceStateConversion
{
    /// <summary>Mole fraction from mass %, exact for a binary: x = (w/M_i)/(w/M_i + (100 - w)/M_s).</summary>
    /// <param name="massPercent">Mass % of the solute, in [0, 100].</param>
    /// <param name="soluteMassGramPerMol">M_i.</param>
    /// <param name="solventMassGramPerMol">M_s.</param>
    /// <returns>Mole fraction of the solute, in [0, 1].</returns>
    public static double MoleFractionFromMassPercent(double massPercent, double soluteMassGramPerMol, double solventMassGramPerMol)
    {
        var solute = massPercent / soluteMassGramPerMol;
        return solute / (solute + ((100 - massPercent) / solventMassGramPerMol));
    }

    /// <summary>Mass % from mole fraction, exact for a binary: w = 100 x M_i/(x M_i + (1 - x) M_s).</summary>
    /// <param name="moleFraction">Mole fraction of the solute, in [0, 1].</param>
    /// <param name="soluteMassGramPerMol">M_i.</param>
    /// <param name="solventMassGramPerMol">M_s.</param>
    /// <returns>Mass % of the solute, in [0, 100].</returns>
    public static double MassPercentFromMoleFraction(double moleFraction, double soluteMassGramPerMol, double solventMassGramPerMol)
    {
        var solute = moleFraction * soluteMassGramPerMol;
        return 100 * solute / (solute + ((1 - moleFraction) * solventMassGramPerMol));
    }

    /// <summary>Mass % per mole fraction in the dilute limit: w/x = 100 M_i/M_s.</summary>
    /// <param name="soluteMassGramPerMol">M_i.</param>
    /// <param name="solventMassGramPerMol">M_s.</param>
    public static double DiluteMassPercentPerMoleFraction(double soluteMassGramPerMol, double solventMassGramPerMol) =>
        100 * soluteMassGramPerMol / solventMassGramPerMol;

    /// <summary>Raoultian activity from mole fraction: a_R = gamma0 x.</summary>
    /// <param name="moleFraction">Mole fraction x, equal to the Henrian activity on mole fraction.</param>
    /// <param name="lnGamma0">Natural logarithm of gamma0.</param>
    public static double RaoultianFromMoleFraction(double moleFraction, double lnGamma0) => moleFraction * Math.Exp(lnGamma0);

    /// <summary>Mole fraction in the dilute limit from Raoultian activity: x = a_R/gamma0.</summary>
    /// <param name="activity">Raoultian activity.</param>
    /// <param name="lnGamma0">Natural logarithm of gamma0.</param>
    public static double MoleFractionFromRaoultian(double activity, double lnGamma0) => activity * Math.Exp(-lnGamma0);

    /// <summary>Gibbs energy of the change pure substance = 1 mass % Henrian solution: dG = RT ln(gamma0 M_s/(100 M_i)).</summary>
    /// <param name="temperatureKelvin">Temperature in kelvin.</param>
    /// <param name="lnGamma0">Natural logarithm of gamma0, referred to that pure substance.</param>
    /// <param name="soluteMassGramPerMol">M_i.</param>
    /// <param name="solventMassGramPerMol">M_s.</param>
    /// <returns>J per mol of solute atoms; negative where the element dissolves readily.</returns>
    public static double GibbsEnergyToOneMassPercent(
        double temperatureKelvin, double lnGamma0, double soluteMassGramPerMol, double solventMassGramPerMol) =>
        PhysicalConstants.GasConstant
        * temperatureKelvin
        * (lnGamma0 - Math.Log(DiluteMassPercentPerMoleFraction(soluteMassGramPerMol, solventMassGramPerMol)));
}
