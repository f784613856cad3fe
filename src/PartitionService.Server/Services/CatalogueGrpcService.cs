using System.Globalization;
using Grpc.Core;
using PartitionService.Contracts.V1;
using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;
using PartitionService.Server.Errors;
using PartitionService.Server.Mapping;
using PartitionService.Server.Paging;

namespace PartitionService.Server.Services;

/// <summary>What the catalogue holds.</summary>
internal sealed class CatalogueGrpcService(ThermochemicalCatalogue catalogue) : CatalogueService.CatalogueServiceBase
{
    private const int MaximumSlotLength = 100;

    private readonly Pager pager = new(catalogue);

    /// <inheritdoc/>
    public override Task<ListSolventsResponse> ListSolvents(ListSolventsRequest request, ServerCallContext context)
    {
        Check(request.PageSize, null);
        var page = pager.Take(catalogue.Solvents, request.PageSize, request.PageToken, ListName(nameof(ListSolvents)));
        var response = new ListSolventsResponse
        {
            NextPageToken = page.NextToken,
            TotalSize = page.TotalSize,
            CatalogueDigest = catalogue.Digest,
        };
        response.Solvents.AddRange(page.Entries.Select(s => InventoryMapping.ToWire(s, catalogue)));
        return Task.FromResult(response);
    }

    /// <inheritdoc/>
    public override Task<ListSolutesResponse> ListSolutes(ListSolutesRequest request, ServerCallContext context)
    {
        double? temperature = request.HasTemperatureKelvin ? request.TemperatureKelvin : null;
        Check(request.PageSize, temperature, violations =>
        {
            if (request.Solvent.Length > 0)
                FieldChecks.OneOf(violations, "solvent", request.Solvent, catalogue.Solvents, "a solvent that ListSolvents returns");
        });
        var rows = catalogue.Data.OfType<InfiniteDilutionDatum>()
            .Where(d => request.Solvent.Length == 0 || d.Solvent == request.Solvent)
            .GroupBy(d => (d.Solvent, d.Solute))
            .Select(solute => PreferredRow.Of(solute, temperature))
            .OfType<InfiniteDilutionDatum>()
            .OrderBy(d => d.Solvent, StringComparer.Ordinal)
            .ThenBy(d => d.Solute, StringComparer.Ordinal)
            .ToList();
        var page = pager.Take(
            rows, request.PageSize, request.PageToken, ListName(nameof(ListSolutes), request.Solvent, Text(temperature)));
        var response = new ListSolutesResponse
        {
            NextPageToken = page.NextToken,
            TotalSize = page.TotalSize,
            CatalogueDigest = catalogue.Digest,
        };
        response.Solutes.AddRange(page.Entries.Select(row => InventoryMapping.ToWire(row, temperature)));
        return Task.FromResult(response);
    }

    /// <inheritdoc/>
    public override Task<ListSlagFamiliesResponse> ListSlagFamilies(ListSlagFamiliesRequest request, ServerCallContext context)
    {
        Check(request.PageSize, null);
        var families = catalogue.SlagFamilies.Values.OrderBy(f => f.Name, StringComparer.Ordinal).ToList();
        var page = pager.Take(families, request.PageSize, request.PageToken, ListName(nameof(ListSlagFamilies)));
        var response = new ListSlagFamiliesResponse
        {
            NextPageToken = page.NextToken,
            TotalSize = page.TotalSize,
            CatalogueDigest = catalogue.Digest,
        };
        response.SlagFamilies.AddRange(page.Entries.Select(family => InventoryMapping.ToWire(family, catalogue)));
        return Task.FromResult(response);
    }

    /// <inheritdoc/>
    public override Task<ListDataResponse> ListData(ListDataRequest request, ServerCallContext context)
    {
        double? temperature = request.HasTemperatureKelvin ? request.TemperatureKelvin : null;
        Check(request.PageSize, temperature, violations =>
        {
            if (!Enum.IsDefined(request.Kind))
                violations.Add(new CaseViolation("kind", Text((int)request.Kind), "must be a value of DatumKind"));
            FieldChecks.Length(violations, "slot_prefix", request.SlotPrefix, MaximumSlotLength);
            if (request.Element.Length > 0)
                FieldChecks.OneOf(violations, "element", request.Element, [.. catalogue.Elements.Keys], "the symbol of an element of the catalogue");
        });
        var rows = catalogue.Data.Where(d => Matches(d, request)).ToList();
        var page = pager.Take(rows, request.PageSize, request.PageToken, ListName(
            nameof(ListData),
            Text((int)request.Kind),
            request.SlotPrefix,
            request.Element,
            request.IncludeCompeting ? "all" : "preferred",
            Text(temperature)));
        var response = new ListDataResponse
        {
            NextPageToken = page.NextToken,
            TotalSize = page.TotalSize,
            CatalogueDigest = catalogue.Digest,
        };
        response.Data.AddRange(page.Entries.Select(row => DatumMapping.ToWire(row, catalogue, temperature)));
        return Task.FromResult(response);
    }

    /// <inheritdoc/>
    public override Task<ExplainDatumResponse> ExplainDatum(ExplainDatumRequest request, ServerCallContext context)
    {
        double? temperature = request.HasTemperatureKelvin ? request.TemperatureKelvin : null;
        Check(0, temperature, violations =>
        {
            if (request.Slot.Length == 0)
                violations.Add(new CaseViolation("slot", "", "required: a slot or key, for example metal/Cu/Pb or metal/Cu/Pb#2"));
            FieldChecks.Length(violations, "slot", request.Slot, MaximumSlotLength);
        });
        var slot = catalogue.Find(request.Slot)?.Slot ?? request.Slot;
        var rows = catalogue.Slot(slot);
        if (rows.Count == 0)
            throw ServiceErrors.UnknownDatum(request.Slot);
        var response = new ExplainDatumResponse { Slot = slot, CatalogueDigest = catalogue.Digest };
        response.Data.AddRange(rows.OrderByDescending(r => r.Preferred).Select(r => DatumMapping.ToWire(r, catalogue, temperature)));
        return Task.FromResult(response);
    }

    /// <inheritdoc/>
    public override Task<GetCoverageResponse> GetCoverage(GetCoverageRequest request, ServerCallContext context)
    {
        Check(0, null, violations =>
        {
            if (!Enum.IsDefined(request.Kind))
                violations.Add(new CaseViolation("kind", Text((int)request.Kind), "must be a value of CoverageKind"));
        });
        var response = new GetCoverageResponse { CatalogueDigest = catalogue.Digest };
        response.Tables.AddRange(CoverageMapping.ToWire(CoverageMatrix.Of(catalogue), request.Kind));
        return Task.FromResult(response);
    }

    private static bool Matches(Datum datum, ListDataRequest request)
    {
        if (!request.IncludeCompeting && !datum.Preferred)
            return false;
        if (!datum.Slot.StartsWith(request.SlotPrefix, StringComparison.Ordinal))
            return false;
        if (request.Kind == DatumKind.Unspecified && request.Element.Length == 0)
            return true;
        var description = DatumDescription.Of(datum);
        return (request.Kind == DatumKind.Unspecified || request.Kind == description.Kind)
            && (request.Element.Length == 0 || description.Elements.Contains(request.Element));
    }

    private static void Check(int pageSize, double? temperatureKelvin, Action<List<CaseViolation>>? more = null)
    {
        var violations = new List<CaseViolation>();
        more?.Invoke(violations);
        if (temperatureKelvin is { } temperature)
            FieldChecks.Temperature(violations, temperature);
        Pager.CheckSize(pageSize, violations);
        FieldChecks.ThrowIfAny(violations);
    }

    /// <summary>List and filter as one text; the separator cannot occur in a slot or symbol.</summary>
    private static string ListName(params string[] parts) => string.Join('\n', parts);

    private static string Text(double? number) => number?.ToString("R", CultureInfo.InvariantCulture) ?? "";

    private static string Text(int number) => number.ToString(CultureInfo.InvariantCulture);
}
