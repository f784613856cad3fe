using System.Globalization;

namespace PartitionService.Server.Mapping;

/// <summary>Formulas of rows with their numbers, invariant text.</summary>
internal static class FormulaText
{
    /// <summary>"a + b/T"; the second term is left out where it is zero.</summary>
    public static string InverseTemperature(double constant, double inverseTemperatureKelvin) =>
        inverseTemperatureKelvin == 0
            ? Number(constant)
            : $"{Number(constant)}{Signed(inverseTemperatureKelvin)}/T";

    /// <summary>"A + B T + C T ln T"; terms that are zero are left out, except the first.</summary>
    public static string GibbsEnergy(double constant, double linear, double logarithmic = 0)
    {
        var text = Number(constant);
        if (linear != 0)
            text += $"{Signed(linear)} T";
        return logarithmic == 0 ? text : $"{text}{Signed(logarithmic)} T ln T";
    }

    /// <summary>A number in the shortest form that reads back the same, with up to 10 digits.</summary>
    public static string Number(double value) => value.ToString("G10", CultureInfo.InvariantCulture);

    /// <summary>" + 2" or " - 2".</summary>
    public static string Signed(double value) => (value < 0 ? " - " : " + ") + Number(Math.Abs(value));
}
