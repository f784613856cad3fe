using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium.Assembly;

namespace PartitionService.Core.Equilibrium.Derivatives;

/// <summary>Differentiates a solved case.</summary>
internal static class DerivativeBuilder
{
    private static readonly (PhaseKind Phase, DerivativeOutputKind Kind)[] Amounts =
    [
        (PhaseKind.Metal, DerivativeOutputKind.MetalAmount),
        (PhaseKind.Slag, DerivativeOutputKind.SlagAmount),
        (PhaseKind.Gas, DerivativeOutputKind.GasAmount),
    ];

    /// <summary>The report.</summary>
    /// <param name="vesselCase">The case.</param>
    /// <param name="catalogue">The catalogue.</param>
    /// <param name="assembly">The assembled case.</param>
    /// <param name="state">The converged solution.</param>
    /// <param name="answer">The answer, whose elements and data it is about.</param>
    /// <param name="selection">Groups of parameters.</param>
    public static DerivativeReport Build(
        VesselCase vesselCase,
        ThermochemicalCatalogue catalogue,
        VesselAssembly assembly,
        EquilibriumState state,
        VesselAnswer answer,
        DerivativeSelection selection)
    {
        var assembled = assembly.Assembled;
        var response = new EquilibriumResponse(state);
        double? dissolved = vesselCase.Oxygen is OxygenStatement.Dissolved statement ? 1e-6 * statement.MassPpm : null;
        var feedback = new CompositionFeedback(assembly, response, catalogue, vesselCase.TemperatureKelvin, dissolved);
        string[] symbols = [.. answer.Elements.Select(element => element.Element)];
        var streams = new StreamResponse(assembly, response.Held, symbols, vesselCase.Allowances, catalogue.Elements);
        var outputs = Outputs(symbols, assembled.OxygenLink >= 0);
        var change = new Perturbation(assembled.Problem);
        var columns = new List<DerivativeColumn>();
        foreach (var parameter in new ParameterList(vesselCase, assembly, feedback, catalogue.Elements).Select(selection, answer.DataUsed))
        {
            var values = new double[outputs.Count];
            var defined = feedback.IsRegular && parameter.Perturb is not null;
            if (defined)
            {
                change.Clear();
                parameter.Perturb!(change);
                feedback.Solve(change);
                response.FindHolding(change);
                streams.Write(response.Holding, parameter.Account, values);
                WriteTotals(assembled, response, values.AsSpan(3 * symbols.Length));
            }

            columns.Add(new DerivativeColumn(
                parameter.Kind, parameter.Name, parameter.Index, parameter.Unit, parameter.Value, defined, values));
        }

        return new DerivativeReport(outputs, columns);
    }

    private static List<DerivativeOutput> Outputs(string[] symbols, bool hasOxygen)
    {
        var outputs = new List<DerivativeOutput>();
        foreach (var symbol in symbols)
        {
            outputs.Add(new DerivativeOutput(DerivativeOutputKind.MetalFraction, symbol));
            outputs.Add(new DerivativeOutput(DerivativeOutputKind.SlagFraction, symbol));
            outputs.Add(new DerivativeOutput(DerivativeOutputKind.GasFraction, symbol));
        }

        outputs.AddRange(Amounts.Select(amount => new DerivativeOutput(amount.Kind, "")));
        if (hasOxygen)
        {
            outputs.Add(new DerivativeOutput(DerivativeOutputKind.Log10OxygenPressure, ""));
        }

        return outputs;
    }

    private static void WriteTotals(AssembledCase assembled, EquilibriumResponse response, Span<double> target)
    {
        for (var k = 0; k < Amounts.Length; k++)
        {
            var phase = Array.IndexOf(assembled.Phases, Amounts[k].Phase);
            target[k] = phase < 0 ? 0 : response.PhaseAmount[phase] * response.Step[assembled.Links.Length + phase];
        }

        if (assembled.OxygenLink >= 0)
        {
            target[Amounts.Length] = Thermodynamics.OxygenPotential.ToLog10(response.Step[assembled.OxygenLink]);
        }
    }
}
