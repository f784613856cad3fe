using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium.Assembly;

namespace PartitionService.Core.Equilibrium.Derivatives;

/// <summary>Response of an equilibrium whose constants depend on its own composition.</summary>
/// <remarks>
/// With y the quantities that constants depend on, Y their response to constants and J the response of the constants to y, a direct
/// change gives v = y + Y J v: one dense system for all quantities, factored once. The constants then change by J v on top of the
/// direct change.
/// </remarks>
internal sealed class CompositionFeedback
{
    private readonly EquilibriumResponse response;
    private readonly MetalFeedback metal;
    private readonly SlagFeedback slag;
    private readonly DissolvedOxygenFeedback? dissolved;
    private readonly CompositionFunctional[] functionals;
    private readonly DenseFactor? factor;
    private readonly double[] direct;
    private readonly double[] values;

    /// <summary>Factors the feedback of a solution.</summary>
    public CompositionFeedback(
        VesselAssembly assembly,
        EquilibriumResponse response,
        ThermochemicalCatalogue catalogue,
        double temperatureKelvin,
        double? dissolvedOxygenMassFraction)
    {
        this.response = response;
        metal = new MetalFeedback(assembly.Assembled, response);
        slag = new SlagFeedback(assembly, response, catalogue, temperatureKelvin);
        dissolved = dissolvedOxygenMassFraction is { } stated
            ? new DissolvedOxygenFeedback(assembly.Assembled, response, catalogue.Elements, stated)
            : null;
        functionals = [.. metal.Functionals, .. slag.Terms.Select(term => term.Functional)];
        functionals = dissolved is null ? functionals : [.. functionals, dissolved.Functional];
        direct = new double[functionals.Length];
        values = new double[functionals.Length];
        factor = functionals.Length == 0 ? null : Factor(assembly.Assembled);
        IsRegular = response.IsRegular && (functionals.Length == 0 || factor is not null);
    }

    /// <summary>False where the solution does not determine its amounts, so that there are no derivatives.</summary>
    public bool IsRegular { get; }

    /// <summary>Finds the response to a direct change, which receives the changes of the constants that follow.</summary>
    public void Solve(Perturbation change)
    {
        response.Solve(change);
        if (factor is null)
        {
            return;
        }

        Evaluate(change, direct);
        factor.Solve(direct, values);
        Apply(values, change);
        response.Solve(change);
    }

    /// <summary>Adds the direct change of the constants with one interaction parameter; false where the slot is none.</summary>
    public bool AddInteraction(string slot, Perturbation change) => metal.AddParameter(slot, change);

    /// <summary>Adds the direct change with temperature of the constants that the species' records leave out, per kelvin.</summary>
    public void AddTemperature(Perturbation change)
    {
        metal.AddTemperature(change);
        foreach (var term in slag.Terms)
        {
            change.AddLnK(term.Species, term.PerKelvin);
        }
    }

    /// <summary>Adds the direct change with amounts of the inert part of the slag, mol.</summary>
    public void AddInert(ElementLedger inert, Perturbation change)
    {
        foreach (var term in slag.Terms)
        {
            change.AddLnK(term.Species, inert.Elements.Sum(e => inert[e] * term.PerInertMol.GetValueOrDefault(e)));
        }
    }

    /// <summary>Change of a constant per change of ln of its capacity formula.</summary>
    public double PerFormula(int species) => slag.Terms.FirstOrDefault(term => term.Species == species)?.PerFormula ?? 1;

    /// <summary>Adds the direct change with the stated dissolved oxygen, per mass ppm.</summary>
    public void AddDissolvedOxygen(Perturbation change) => dissolved?.AddMassPpm(change);

    private void Evaluate(Perturbation change, double[] target)
    {
        for (var k = 0; k < functionals.Length; k++)
        {
            target[k] = functionals[k].Value(response, change);
        }
    }

    private void Apply(double[] change, Perturbation target)
    {
        metal.Apply(change, target);
        var at = metal.Functionals.Length;
        foreach (var term in slag.Terms)
        {
            target.AddLnK(term.Species, change[at++]);
        }

        dissolved?.Apply(change[^1], target);
    }

    private DenseFactor? Factor(AssembledCase assembled)
    {
        var size = functionals.Length;
        var matrix = new double[size * size];
        var change = new Perturbation(assembled.Problem);
        for (var column = 0; column < size; column++)
        {
            change.Clear();
            Array.Clear(values);
            values[column] = 1;
            Apply(values, change);
            response.Solve(change);
            for (var row = 0; row < size; row++)
            {
                matrix[(row * size) + column] = (row == column ? 1 : 0) - functionals[row].Value(response, change);
            }
        }

        return DenseFactor.Of(matrix, size);
    }
}
