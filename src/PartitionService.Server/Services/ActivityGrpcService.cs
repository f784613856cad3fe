using System.Globalization;
using Grpc.Core;
using PartitionService.Contracts.V1;
using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;
using PartitionService.Core.Thermodynamics;
using PartitionService.Server.Errors;
using PartitionService.Server.Mapping;

namespace PartitionService.Server.Services;

/// <summary>Activity coefficients between reference states.</summary>
internal sealed class ActivityGrpcService(ThermochemicalCatalogue catalogue) : ActivityService.ActivityServiceBase
{
    private const double LargestLnGamma = 60;
    private const double LargestActivity = 1e30;

    /// <inheritdoc/>
    public override Task<ConvertActivityCoefficientResponse> ConvertActivityCoefficient(
        ConvertActivityCoefficientRequest request, ServerCallContext context)
    {
        FieldChecks.ThrowIfAny(Violations(request));
        var row = request.HasLnGamma0 ? null : FindRow(request);
        var lnGamma0 = row?.LnGamma(request.TemperatureKelvin) ?? request.LnGamma0;
        var solute = catalogue.Elements[request.Solute].AtomicMassGramPerMol;
        var solvent = catalogue.Elements[request.Solvent].AtomicMassGramPerMol;
        var percentPerFraction = ReferenceStateConversion.DiluteMassPercentPerMoleFraction(solute, solvent);
        var moleFraction = request.From switch
        {
            ReferenceState.Raoultian => ReferenceStateConversion.MoleFractionFromRaoultian(request.Activity, lnGamma0),
            ReferenceState.HenrianMoleFraction => request.Activity,
            _ => request.Activity / percentPerFraction,
        };
        return Task.FromResult(new ConvertActivityCoefficientResponse
        {
            Activity = request.To switch
            {
                // The same number comes back unchanged, not rounded twice.
                _ when request.To == request.From => request.Activity,
                ReferenceState.Raoultian => ReferenceStateConversion.RaoultianFromMoleFraction(moleFraction, lnGamma0),
                ReferenceState.HenrianMoleFraction => moleFraction,
                _ => moleFraction * percentPerFraction,
            },
            LnGamma0 = lnGamma0,
            MoleFraction = moleFraction,
            MassPercent = moleFraction * percentPerFraction,
            GibbsEnergyToOneMassPercentJoulePerMol =
                ReferenceStateConversion.GibbsEnergyToOneMassPercent(request.TemperatureKelvin, lnGamma0, solute, solvent),
            StandardState = row is null ? StandardStateWords.ForCallersNumber(request.Solute) : StandardStateWords.Of(row.SoluteState),
            DatumKey = row?.Key ?? "",
            Access = EnumMapping.ToWire(row?.Access),
        });
    }

    private InfiniteDilutionDatum FindRow(ConvertActivityCoefficientRequest request)
    {
        var slot = $"metal/{request.Solvent}/{request.Solute}";
        return PreferredRow.Of(catalogue.Slot<InfiniteDilutionDatum>(slot), request.TemperatureKelvin)
            ?? throw ServiceErrors.UnknownDatum(slot);
    }

    private List<CaseViolation> Violations(ConvertActivityCoefficientRequest request)
    {
        var violations = new List<CaseViolation>();
        string[] elements = [.. catalogue.Elements.Keys];
        FieldChecks.OneOf(violations, "solvent", request.Solvent, elements, "the symbol of an element of the catalogue");
        FieldChecks.OneOf(violations, "solute", request.Solute, elements, "the symbol of an element of the catalogue");
        if (request.Solute.Length > 0 && request.Solute == request.Solvent)
            violations.Add(new CaseViolation("solute", request.Solute, "must be an element other than the solvent"));
        FieldChecks.Temperature(violations, request.TemperatureKelvin);
        CheckState(violations, "from", request.From);
        CheckState(violations, "to", request.To);
        if (!(request.Activity > 0 && request.Activity <= LargestActivity))
        {
            violations.Add(new CaseViolation(
                "activity", request.Activity.ToString("R", CultureInfo.InvariantCulture), "must be a number in (0, 1e30]"));
        }

        if (request.HasLnGamma0)
            FieldChecks.Range(violations, "ln_gamma0", request.LnGamma0, -LargestLnGamma, LargestLnGamma);
        return violations;
    }

    private static void CheckState(List<CaseViolation> violations, string field, ReferenceState state)
    {
        if (state == ReferenceState.Unspecified)
            violations.Add(new CaseViolation(field, "", "required: a reference state"));
        else if (!Enum.IsDefined(state))
            violations.Add(new CaseViolation(field, ((int)state).ToString(CultureInfo.InvariantCulture), "must be a value of ReferenceState"));
    }
}
