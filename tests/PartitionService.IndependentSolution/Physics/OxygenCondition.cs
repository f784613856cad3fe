using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;

namespace PartitionService.IndependentSolution.Physics;

/// <summary>Own reading of the statement about oxygen: a potential, a dissolved mass fraction, or neither (closed balance).</summary>
/// <param name="HalfLnPressure">1/2 ln pO2 where it is stated outright.</param>
/// <param name="MassFraction">Oxygen of the metal where that is stated.</param>
internal sealed record OxygenCondition(double? HalfLnPressure, double? MassFraction)
{
    public static OxygenCondition Read(OxygenStatement statement, Rows rows) => statement switch
    {
        OxygenStatement.Pressure pressure => new(pressure.Log10PressureAtm * Math.Log(10) / 2, null),

        // CO + 1/2 O2 = CO2 and H2 + 1/2 O2 = H2O.
        OxygenStatement.CarbonDioxideToMonoxide gas =>
            new(Math.Log(gas.Ratio) + rows.Gas("CO2")!.Value - rows.Gas("CO")!.Value, null),
        OxygenStatement.WaterToHydrogen gas => new(Math.Log(gas.Ratio) + rows.Gas("H2O")!.Value, null),
        OxygenStatement.MetalOxidePair pair => new(Pair(pair, rows), null),
        OxygenStatement.Dissolved dissolved => new(null, dissolved.MassPpm * 1e-6),
        _ => new(null, null),
    };

    /// <summary>Both sides in their stable states: of the oxide the one of lowest Gibbs energy, of the metal solid below its melting point.</summary>
    private static double Pair(OxygenStatement.MetalOxidePair pair, Rows rows)
    {
        var atoms = Formula.Atoms(pair.Oxide);
        var metal = atoms.Keys.Single(e => e != "O");
        var nu = atoms["O"] / atoms[metal];
        var state = rows.Temperature < rows.Catalogue.Elements[metal].MeltingPointKelvin ? StandardState.Solid : StandardState.Liquid;
        var energies = new List<double>();
        foreach (var oxideState in new[] { StandardState.Solid, StandardState.Liquid })
        {
            bool Fits(OxidationDatum o) =>
                o.Element == metal && Math.Abs(o.OxygenPerMetal - nu) < 0.001 && o.OxideState == oxideState;
            var row = rows.Nearest<OxidationDatum>(o => Fits(o) && o.MetalState == state) ?? rows.Nearest<OxidationDatum>(Fits);
            if (row is not null)
            {
                energies.Add(
                    ((row.EnthalpyJoulePerMol + (row.SlopeJoulePerMolKelvin * rows.Temperature)) / rows.Thermal)
                    + rows.Shift(metal, row.MetalState)!.Value);
            }
        }

        var lnLiquidActivity = Math.Log(pair.MetalActivity) + rows.Shift(metal, state)!.Value;
        return (energies.Min() + Math.Log(pair.OxideActivity) - lnLiquidActivity) / nu;
    }
}
