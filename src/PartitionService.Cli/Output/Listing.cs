using Google.Protobuf;

namespace PartitionService.Cli.Output;

/// <summary>A list that can be written as a table, as CSV or as JSON.</summary>
/// <param name="Columns">Columns of the table.</param>
/// <param name="Rows">Rows of the table, for reading.</param>
/// <param name="CsvHeader">Names of the CSV fields, with units.</param>
/// <param name="CsvRows">Records of the CSV, numbers in full.</param>
/// <param name="Message">The list as a message of the contract.</param>
internal sealed record Listing(
    IReadOnlyList<TableColumn> Columns,
    IReadOnlyList<string[]> Rows,
    IReadOnlyList<string> CsvHeader,
    IReadOnlyList<string[]> CsvRows,
    IMessage Message);

/// <summary>Writes lists.</summary>
internal static class ListingText
{
    /// <summary>Writes a list in one of the formats.</summary>
    /// <param name="listing">The list.</param>
    /// <param name="format">table, csv or json.</param>
    /// <param name="terminal">Tells whether the output is a terminal.</param>
    /// <param name="file">File that the text is for; null: the standard output.</param>
    /// <returns>The text.</returns>
    public static string Render(Listing listing, string format, Terminal terminal, string? file)
    {
        using var text = new StringWriter();
        switch (format)
        {
            case "csv":
                Csv.WriteRecord(text, listing.CsvHeader);
                foreach (var row in listing.CsvRows)
                    Csv.WriteRecord(text, row);
                break;
            case "json":
                AnswerJson.Write(text, listing.Message);
                break;
            default:
                var table = new PlainTable([.. listing.Columns]);
                foreach (var row in listing.Rows)
                    table.Add(row);
                table.Write(text, Page.For(terminal.IsTerminal && file is null, false).Width);
                break;
        }

        return text.ToString();
    }
}
