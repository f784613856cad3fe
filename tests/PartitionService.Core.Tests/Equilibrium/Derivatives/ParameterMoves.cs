using PartitionService.Core.Equilibrium;

namespace PartitionService.Core.Tests.Equilibrium.Derivatives;

/// <summary>Moves a case along one parameter.</summary>
internal static class ParameterMoves
{
    /// <summary>The case with the parameter moved, and a step that suits it.</summary>
    public static (Func<double, VesselCase> At, double Step) Of(VesselCase vesselCase, DerivativeColumn column)
    {
        switch (column.Kind)
        {
            case DerivativeParameterKind.Temperature:
                return (h => vesselCase with { TemperatureKelvin = vesselCase.TemperatureKelvin + h }, 2);
            case DerivativeParameterKind.Pressure:
                return (h => vesselCase with { PressureAtm = vesselCase.PressureAtm + h }, 0.01 * vesselCase.PressureAtm);
            case DerivativeParameterKind.Log10OxygenPressure:
                return (h => vesselCase with { Oxygen = Moved(vesselCase.Oxygen, h, column.Value) }, 0.02);
            case DerivativeParameterKind.DissolvedOxygen:
                var ppm = ((OxygenStatement.Dissolved)vesselCase.Oxygen).MassPpm;
                return (h => vesselCase with { Oxygen = new OxygenStatement.Dissolved(ppm + h) }, 0.01 * ppm);
            case DerivativeParameterKind.OxygenInput:
                return (h => WithOxygen(vesselCase, h), 0.002 * column.Value);
            case DerivativeParameterKind.ChargeQuantity:
                return (h => WithQuantity(vesselCase, column.Index, h), 0.01 * column.Value);
            default:
                throw new ArgumentOutOfRangeException(nameof(column));
        }
    }

    private static VesselCase WithQuantity(VesselCase vesselCase, int index, double change)
    {
        var charge = vesselCase.Charge.ToArray();
        charge[index] = charge[index] with { Quantity = charge[index].Quantity + change };
        return vesselCase with { Charge = charge };
    }

    /// <summary>Oxygen as a gas where it is added; where it is taken away, from the O2 that the case charges.</summary>
    private static VesselCase WithOxygen(VesselCase vesselCase, double change)
    {
        var index = vesselCase.Charge.ToList().FindIndex(item => item.Formula == "O2");
        return index >= 0
            ? WithQuantity(vesselCase, index, change)
            : throw new InvalidOperationException("a closed case needs some O2 in its charge, so that some can be taken away");
    }

    /// <summary>log10 of the oxide's activity rises by half of this per unit of log10 pO2.</summary>
    private static double OxygenPerMetal(OxygenStatement.MetalOxidePair pair) => pair.Oxide == "FeO" ? 1 : 1.5;

    private static OxygenStatement Moved(OxygenStatement statement, double log10, double value) => statement switch
    {
        OxygenStatement.Pressure => new OxygenStatement.Pressure(value + log10),
        OxygenStatement.CarbonDioxideToMonoxide ratio => new OxygenStatement.CarbonDioxideToMonoxide(ratio.Ratio * Math.Pow(10, log10 / 2)),
        OxygenStatement.WaterToHydrogen ratio => new OxygenStatement.WaterToHydrogen(ratio.Ratio * Math.Pow(10, log10 / 2)),
        OxygenStatement.MetalOxidePair pair => pair with { OxideActivity = pair.OxideActivity * Math.Pow(10, log10 / 2 * OxygenPerMetal(pair)) },
        _ => throw new ArgumentOutOfRangeException(nameof(statement)),
    };
}
