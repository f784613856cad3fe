using System.Globalization;

namespace PartitionService.PublishedChecks.Rows;

/// <summary>One published statement with its source, tolerance and the recipe that recomputes it.</summary>
/// <param name="Kind">File that the row stands in, without extension.</param>
/// <param name="Fields">Fields by column.</param>
internal sealed record PublishedRow(string Kind, IReadOnlyDictionary<string, string> Fields)
{
    /// <summary>Name of the recipe of a row that the product cannot compute.</summary>
    public const string NotComputable = "none";

    /// <summary>Identifier, unique over all files.</summary>
    public string Id => Fields["id"];

    /// <summary>pass_fail, order, trend, sign or context.</summary>
    public string Use => Fields["use"];

    /// <summary>Element or elements that the row is about.</summary>
    public IReadOnlyList<string> Elements =>
        Fields["element"].Split(',', StringSplitOptions.TrimEntries | StringSplitOptions.RemoveEmptyEntries);

    /// <summary>The only element.</summary>
    public string Element => Elements.Single();

    /// <summary>Element that the first is compared with; empty where there is none.</summary>
    public string CompareElement => Fields["compare_element"];

    /// <summary>Relation between computed and published: =, &lt;, &lt;=, &gt;, &gt;=, between, increases, decreases.</summary>
    public string Relation => Fields["relation"];

    /// <summary>Published number.</summary>
    public double? Value => Number("value");

    /// <summary>Lower published number.</summary>
    public double? Low => Number("value_low");

    /// <summary>Upper published number.</summary>
    public double? High => Number("value_high");

    /// <summary>Accepted distance on <see cref="Scale"/>.</summary>
    public double Tolerance => Number("tolerance") ?? 0;

    /// <summary>log10, absolute, relative, kelvin or percent-points.</summary>
    public string Scale => Fields["tolerance_scale"];

    /// <summary>Name of the recipe.</summary>
    public string Recipe => Fields["recipe"];

    /// <summary>How the case is set up.</summary>
    public Setup Setup => new(Fields["setup"]);

    /// <summary>True where the row counts for the rate of success.</summary>
    public bool Scored => Use != "context" && Recipe != NotComputable;

    /// <summary>Number of a column; null where empty.</summary>
    public double? Number(string column) =>
        Fields[column].Length == 0 ? null : double.Parse(Fields[column], NumberStyles.Float, CultureInfo.InvariantCulture);
}
