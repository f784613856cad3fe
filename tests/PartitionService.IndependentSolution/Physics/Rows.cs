using PartitionService.Core.Catalogue;

namespace PartitionService.IndependentSolution.Physics;

/// <summary>Looks up rows of the catalogue, the only thing that this solution shares with the service.</summary>
internal sealed class Rows(ThermochemicalCatalogue catalogue, double temperature)
{
    /// <summary>Molar gas constant, J/(mol K).</summary>
    public const double GasConstant = 8.31446261815324;

    /// <summary>All rows.</summary>
    public ThermochemicalCatalogue Catalogue { get; } = catalogue;

    /// <summary>Temperature in kelvin.</summary>
    public double Temperature { get; } = temperature;

    /// <summary>RT in J/mol.</summary>
    public double Thermal { get; } = GasConstant * temperature;

    /// <summary>Atomic mass, g/mol.</summary>
    public double Mass(string element) => Catalogue.Elements[element].AtomicMassGramPerMol;

    /// <summary>Molar mass of a formula, g/mol.</summary>
    public double FormulaMass(string formula) => Formula.Atoms(formula).Sum(atom => atom.Value * Mass(atom.Key));

    /// <summary>Preferred rows of one kind that a condition takes.</summary>
    public IEnumerable<T> All<T>(Func<T, bool> condition)
        where T : Datum => Catalogue.Data.OfType<T>().Where(row => row.Preferred && condition(row));

    /// <summary>The preferred row nearest in temperature; null where there is none.</summary>
    public T? Nearest<T>(Func<T, bool> condition)
        where T : Datum => All(condition).MinBy(OutOfRange);

    /// <summary>(mu of a standard state - mu of the component's reference)/RT; null where the catalogue lacks what it takes.</summary>
    /// <remarks>Reference: liquid metal, graphite, half a mole of the diatomic gas of O, S, Cl, Br, H, N at 1 atm.</remarks>
    public double? Shift(string element, StandardState state)
    {
        var row = Catalogue.Elements[element];
        var gaseous = element is "O" or "S" or "Cl" or "Br" or "H" or "N";
        return state switch
        {
            StandardState.Liquid => 0,
            StandardState.Graphite when element == "C" => 0,
            StandardState.HalfDiatomicGas when gaseous => 0,

            // Melting costs Delta H (1 - T/T_m), so the solid lies below the liquid by that.
            StandardState.Solid => -row.EnthalpyOfFusionJoulePerMol * (1 - (Temperature / row.MeltingPointKelvin)) / Thermal,
            StandardState.MonatomicGas => Gas(element),
            StandardState.HalfDiatomicGas => Gas(element + "2") / 2,
            _ => null,
        };
    }

    /// <summary>Gibbs energy of formation of a gas species over RT; null where it is unknown.</summary>
    public double? Gas(string species) =>
        Nearest<GasSpeciesDatum>(row => row.Species == species) is { } row
            ? (row.ConstantJoulePerMol
                + (row.LinearJoulePerMolKelvin * Temperature)
                + (row.LogarithmicJoulePerMolKelvin * Temperature * Math.Log(Temperature))) / Thermal
            : null;

    private double OutOfRange(Datum row) => Temperature < row.MinimumTemperatureKelvin
        ? row.MinimumTemperatureKelvin - Temperature
        : Temperature > row.MaximumTemperatureKelvin ? Temperature - row.MaximumTemperatureKelvin : 0;
}
