using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Output;

/// <summary>Lays out what the catalogue knows.</summary>
internal static class CatalogueListings
{
    private static readonly TableColumn[] DatumColumns =
    [
        new("key", Alignment.Left), new("value", Alignment.Decimal), new("sigma", Alignment.Decimal), new("unit", Alignment.Left),
        new("K", Alignment.Left), new("what, how obtained, from where", Alignment.Left),
    ];

    private static readonly string[] DatumCsv =
    [
        "key", "slot", "kind", "description", "formula", "value", "unit", "value_temperature_kelvin", "sigma", "minimum_temperature_kelvin",
        "maximum_temperature_kelvin", "preferred", "preferred_reason", "access", "sources", "flags", "note",
    ];

    /// <summary>Lays out solvents.</summary>
    /// <param name="solvents">The solvents.</param>
    /// <returns>The listing.</returns>
    public static Listing OfSolvents(IReadOnlyList<Solvent> solvents) => new(
        [
            new("", Alignment.Left),
            new("melts at, K", Alignment.Decimal),
            new("solutes", Alignment.Decimal),
            new("interactions", Alignment.Decimal),
        ],
        [.. solvents.Select(solvent => Row(solvent, NumberText.Fixed(solvent.MeltingPointKelvin, 1)))],
        ["element", "melting_point_kelvin", "solute_count", "interaction_count"],
        [.. solvents.Select(solvent => Row(solvent, Csv.Number(solvent.MeltingPointKelvin)))],
        new ListSolventsResponse { Solvents = { solvents }, TotalSize = solvents.Count });

    /// <summary>Lays out solutes.</summary>
    /// <param name="solutes">The solutes.</param>
    /// <returns>The listing.</returns>
    public static Listing OfSolutes(IReadOnlyList<Solute> solutes) => new(
        [
            new("in", Alignment.Left),
            new("solute", Alignment.Left),
            new("ln gamma0", Alignment.Decimal),
            new("sigma", Alignment.Decimal),
            new("at K", Alignment.Decimal),
            new("range, K", Alignment.Left),
            new("activity 1 is", Alignment.Left),
            new("how obtained", Alignment.Left),
        ],
        [.. solutes.Select(solute => new[]
        {
            solute.Solvent,
            solute.Element,
            NumberText.Significant(solute.LnGamma0),
            NumberText.Significant(solute.SigmaLnGamma),
            NumberText.Fixed(solute.TemperatureKelvin, 0),
            Range(solute.MinimumTemperatureKelvin, solute.MaximumTemperatureKelvin),
            solute.StandardState,
            Words.Of(solute.Access),
        })],
        [
            "solvent", "element", "ln_gamma0", "sigma_ln_gamma", "temperature_kelvin", "minimum_temperature_kelvin",
            "maximum_temperature_kelvin", "standard_state", "access", "key",
        ],
        [.. solutes.Select(solute => new[]
        {
            solute.Solvent,
            solute.Element,
            Csv.Number(solute.LnGamma0),
            Csv.Number(solute.SigmaLnGamma),
            Csv.Number(solute.TemperatureKelvin),
            Csv.Number(solute.MinimumTemperatureKelvin),
            Csv.Number(solute.MaximumTemperatureKelvin),
            solute.StandardState,
            Words.Hyphenated(solute.Access),
            solute.Key,
        })],
        new ListSolutesResponse { Solutes = { solutes }, TotalSize = solutes.Count });

    /// <summary>Lays out slag families.</summary>
    /// <param name="families">The families.</param>
    /// <returns>The listing.</returns>
    public static Listing OfSlags(IReadOnlyList<SlagFamily> families) => new(
        [
            new("family", Alignment.Left),
            new("range, K", Alignment.Left),
            new("what it is, mass %, oxides and salts with data", Alignment.Left),
        ],
        [.. families.Select(family => new[]
        {
            family.Name,
            Range(family.MinimumTemperatureKelvin, family.MaximumTemperatureKelvin),
            $"{family.Description} | {string.Join(", ", family.Components.Select(Window))} | "
                + string.Join(' ', family.Oxides.Select(oxide => oxide.Oxide)),
        })],
        ["family", "oxide", "element", "sigma_ln_gamma", "access", "key"],
        [.. families.SelectMany(family => family.Oxides.Select(oxide => new[]
        {
            family.Name, oxide.Oxide, oxide.Element, Csv.Number(oxide.SigmaLnGamma), Words.Hyphenated(oxide.Access), oxide.Key,
        }))],
        new ListSlagFamiliesResponse { SlagFamilies = { families }, TotalSize = families.Count });

    /// <summary>Lays out catalogue rows.</summary>
    /// <param name="data">The rows.</param>
    /// <returns>The listing.</returns>
    public static Listing OfData(IReadOnlyList<CatalogueDatum> data) => new(
        DatumColumns,
        [.. data.Select(datum => ForReading(datum, isLong: false))],
        DatumCsv,
        [.. data.Select(ForCsv)],
        new ListDataResponse { Data = { data }, TotalSize = data.Count });

    /// <summary>Lays out the competing rows of one slot.</summary>
    /// <param name="explanation">The rows.</param>
    /// <returns>The listing.</returns>
    public static Listing OfExplanation(ExplainDatumResponse explanation) => new(
        DatumColumns,
        [.. explanation.Data.Select(datum => ForReading(datum, isLong: true))],
        DatumCsv,
        [.. explanation.Data.Select(ForCsv)],
        explanation);

    private static string[] ForReading(CatalogueDatum datum, bool isLong)
    {
        var standing = datum.Preferred ? "counts" : "does not count";
        var words = new List<string> { datum.Description, datum.Formula, Words.Of(datum.Access), standing };
        if (isLong)
        {
            var sources = datum.Sources.Select(source => $"{source.Citation} {source.Locator}".Trim());
            words.AddRange([datum.PreferredReason, .. sources, .. datum.Flags, datum.Note]);
        }
        else
        {
            words.Add(string.Join(", ", datum.Sources.Select(source => source.Id)));
        }

        return
        [
            datum.Key,
            datum.HasValue ? NumberText.Significant(datum.Value, 4, 1e7) : NumberText.None,
            datum.HasSigma ? NumberText.Significant(datum.Sigma, 3, 1e7) : NumberText.None,
            datum.Unit,
            Range(datum.MinimumTemperatureKelvin, datum.MaximumTemperatureKelvin),
            string.Join("; ", words.Where(word => word.Length > 0)),
        ];
    }

    private static string[] ForCsv(CatalogueDatum datum) =>
    [
        datum.Key,
        datum.Slot,
        Words.Hyphenated(datum.Kind),
        datum.Description,
        datum.Formula,
        Csv.Number(datum.HasValue ? datum.Value : null),
        datum.Unit,
        Csv.Number(datum.ValueTemperatureKelvin),
        Csv.Number(datum.HasSigma ? datum.Sigma : null),
        Csv.Number(datum.MinimumTemperatureKelvin),
        Csv.Number(datum.MaximumTemperatureKelvin),
        datum.Preferred ? "true" : "false",
        datum.PreferredReason,
        Words.Hyphenated(datum.Access),
        string.Join(';', datum.Sources.Select(source => source.Id)),
        string.Join(';', datum.Flags),
        datum.Note,
    ];

    private static string[] Row(Solvent solvent, string meltingPoint) =>
        [solvent.Element, meltingPoint, Count(solvent.SoluteCount), Count(solvent.InteractionCount)];

    private static string Window(SlagComponent part) =>
        $"{part.Formula} {NumberText.Significant(part.LowMassPercent)}-{NumberText.Significant(part.HighMassPercent)}";

    private static string Count(int count) => count.ToString(System.Globalization.CultureInfo.InvariantCulture);

    private static string Range(double low, double high) => $"{NumberText.Fixed(low, 0)}-{NumberText.Fixed(high, 0)}";
}
