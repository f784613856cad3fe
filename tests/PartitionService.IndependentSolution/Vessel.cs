using System.Globalization;
using PartitionService.Core.Equilibrium;

namespace PartitionService.IndependentSolution;

/// <summary>Short notation for cases.</summary>
internal static class Vessel
{
    public static OxygenStatement Closed { get; } = new OxygenStatement.Closed();

    /// <summary>A vessel from text such as <c>"Cu 100; SiO2 3; N2 40 Nm3"</c>; the first item's formula is the solvent.</summary>
    public static VesselCase Of(
        double temperature, string charge, string? slag, bool gas, OxygenStatement oxygen, double pressure = 1)
    {
        var items = charge.Split(';', StringSplitOptions.TrimEntries).Select(Item).ToArray();
        return new VesselCase
        {
            TemperatureKelvin = temperature,
            PressureAtm = pressure,
            Charge = items,
            Solvent = items[0].Formula,
            SlagFamily = slag,
            GasAllowed = gas,
            Oxygen = oxygen,
        };
    }

    public static OxygenStatement Log10(double pressure) => new OxygenStatement.Pressure(pressure);

    private static ChargeItem Item(string text)
    {
        var words = text.Split(' ', StringSplitOptions.RemoveEmptyEntries);
        return new ChargeItem(
            words[0],
            double.Parse(words[1], CultureInfo.InvariantCulture),
            words.Length > 2 ? ChargeUnit.NormalCubicMetre : ChargeUnit.Kilogram);
    }
}
