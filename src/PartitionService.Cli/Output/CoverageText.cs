using System.Globalization;
using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Output;

/// <summary>Writes what the catalogue knows and how well.</summary>
internal static class CoverageText
{
    private static readonly string[] CsvHeader = ["table", "row", "element", "species", "trust", "sigma", "unit", "key"];

    private static readonly (CoverageTrust Trust, string Letter, string Word)[] Levels =
    [
        (CoverageTrust.Read, "R", "read in a source"),
        (CoverageTrust.Abstract, "A", "seen in an abstract"),
        (CoverageTrust.Derived, "D", "computed from seen numbers"),
        (CoverageTrust.Memory, "M", "recalled, not checked"),
        (CoverageTrust.Assumed, "X", "assumed, do not use the figure"),
        (CoverageTrust.Missing, ".", "no number"),
    ];

    /// <summary>Writes the tables in one of the formats.</summary>
    /// <param name="coverage">The tables.</param>
    /// <param name="format">table, csv or json.</param>
    /// <param name="terminal">Tells whether the output is a terminal.</param>
    /// <param name="file">File that the text is for; null: the standard output.</param>
    /// <returns>The text.</returns>
    public static string Render(GetCoverageResponse coverage, string format, Terminal terminal, string? file)
    {
        using var text = new StringWriter();
        switch (format)
        {
            case "csv":
                WriteCsv(text, coverage);
                break;
            case "json":
                AnswerJson.Write(text, coverage);
                break;
            default:
                WriteForReading(text, coverage, Page.For(terminal.IsTerminal && file is null, false).Width);
                break;
        }

        return text.ToString();
    }

    private static void WriteCsv(TextWriter output, GetCoverageResponse coverage)
    {
        Csv.WriteRecord(output, CsvHeader);
        foreach (var table in coverage.Tables)
        {
            foreach (var cell in table.Cells)
            {
                Csv.WriteRecord(
                    output,
                    Words.Hyphenated(table.Kind),
                    cell.Row,
                    cell.Element,
                    cell.Species,
                    Words.Hyphenated(cell.Trust),
                    Csv.Number(cell.HasSigma ? cell.Sigma : null),
                    cell.Unit,
                    cell.Key);
            }
        }
    }

    private static void WriteForReading(TextWriter output, GetCoverageResponse coverage, int width)
    {
        PlainText.WriteLabelled(
            output, "Legend", LabelWidth, string.Join("; ", Levels.Select(level => $"{level.Letter} {level.Word}")) + ".", width);
        foreach (var table in coverage.Tables)
        {
            output.WriteLine();
            var (title, help) = Headings(table.Kind);
            PlainText.WriteLabelled(output, title, LabelWidth, help, width);
            PlainText.WriteLabelled(output, "Cells", LabelWidth, string.Join(", ", table.Counts.Select(Count)) + ".", width);
            if (table.Kind == CoverageKind.Vapours)
                CoverageGrid.Vapours(table).Write(output, width);
            else
                CoverageGrid.Write(output, table, width);
        }
    }

    /// <summary>Columns kept for the labels of the lines above a table.</summary>
    internal const int LabelWidth = 9;

    /// <summary>Gives the letter of a trust level.</summary>
    /// <param name="trust">The level.</param>
    /// <returns>One letter.</returns>
    internal static string Letter(CoverageTrust trust) =>
        Levels.Where(level => level.Trust == trust).Select(level => level.Letter).FirstOrDefault("?");

    private static string Count(CoverageCount count) =>
        string.Create(CultureInfo.InvariantCulture, $"{Letter(count.Trust)} {count.CellCount}");

    private static (string Title, string Help) Headings(CoverageKind kind) => kind switch
    {
        CoverageKind.Metals => ("Metals", "Solute (line) in liquid metal (column). The number is one standard deviation of ln gamma0."),
        CoverageKind.Slags => ("Slags", "Oxide or chloride (line) in slag family (column). The number is one standard deviation of ln gamma; "
            + "- another oxide of the element counts there."),
        _ => ("Vapours", "Vapour species by element, with the smallest and largest standard deviation of their Gibbs energy."),
    };
}
