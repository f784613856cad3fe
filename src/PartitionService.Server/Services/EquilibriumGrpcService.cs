using Grpc.Core;
using PartitionService.Contracts.V1;
using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;
using PartitionService.Server.Calls;
using PartitionService.Server.Errors;
using PartitionService.Server.Hosting;
using PartitionService.Server.Mapping;

namespace PartitionService.Server.Services;

/// <summary>Equilibrium of one vessel.</summary>
internal sealed class EquilibriumGrpcService(VesselSolve solve, ThermochemicalCatalogue catalogue, SolutionGate gate)
    : EquilibriumService.EquilibriumServiceBase
{
    private const string CaseField = "vessel_case";

    /// <inheritdoc/>
    public override async Task<SolveChargeResponse> SolveCharge(SolveChargeRequest request, ServerCallContext context)
    {
        if (request.VesselCase is null)
            throw ServiceErrors.InvalidFields([new CaseViolation(CaseField, "", "required: the vessel to solve")]);
        var shape = new List<CaseViolation>();
        var vesselCase = CaseMapping.ToCase(request.VesselCase, shape);
        if (shape.Count > 0)
            throw Refuse(shape, CaseValidation.Validate(vesselCase, catalogue));

        var options = DerivativeMapping.ToOptions(request.Derivatives);
        var record = CallRecord.Of(context);
        switch (await gate.RunAsync(token => solve(vesselCase, options, token), record.Cancellation))
        {
            case SolveOutcome.Solved solved:
                record.ElementCount = solved.Answer.Elements.Count;
                record.Iterations = solved.Answer.Solution.Iterations;
                return new SolveChargeResponse { Answer = AnswerMapping.ToWire(solved.Answer) };
            case SolveOutcome.Invalid invalid:
                throw Refuse([], invalid.Violations);
            case SolveOutcome.Failed failed:
                throw ServiceErrors.Failed(failed);
            default:
                throw new InvalidOperationException("unknown outcome");
        }
    }

    /// <summary>One refusal with both lists; where both name a field, the message's own shape is the better explanation.</summary>
    private static ServiceException Refuse(List<CaseViolation> shape, IReadOnlyList<CaseViolation> rules)
    {
        var named = shape.Select(v => v.Field).ToHashSet(StringComparer.Ordinal);
        return ServiceErrors.InvalidFields(
            [.. shape.Concat(rules.Where(v => !named.Contains(v.Field))).Select(v => v with { Field = $"{CaseField}.{v.Field}" })]);
    }
}
