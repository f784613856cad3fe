using CsvHelper;

namespace PartitionService.Core.Catalogue;

/// <summary>One catalogue file split into rows; the header must be exactly the expected columns in the expected order.</summary>
internal sealed class CsvTable
{
    private static readonly CsvReaderOptions Options = new()
    {
        Separator = ',',
        MalformedData = CsvMalformedDataHandling.Throw,
        TrackLineNumbers = true,
        SkipEmptyLines = false,
    };

    private CsvTable(string file, IReadOnlyList<RowReader> rows)
    {
        File = file;
        Rows = rows;
    }

    /// <summary>File name, for example <c>oxidation.csv</c>.</summary>
    public string File { get; }

    /// <summary>Rows in file order, header excluded.</summary>
    public IReadOnlyList<RowReader> Rows { get; }

    /// <summary>Splits a file (RFC 4180, comma, quotes only where needed).</summary>
    /// <exception cref="CatalogueException">The header differs, a row has another number of fields, or a quote is out of place.</exception>
    public static CsvTable Read(string file, string content, IReadOnlyList<string> columns)
    {
        if (content.Length == 0)
            throw new CatalogueException(file, 0, "the file is empty");
        try
        {
            using var reader = CsvReader.FromText(content, Options);
            reader.ReadHeader();
            CheckHeader(file, [.. reader.Headers], columns);
            var positions = columns.Index().ToDictionary(c => c.Item, c => c.Index, StringComparer.Ordinal);
            var rows = new List<RowReader>();
            while (reader.Read())
            {
                var line = (int)reader.LineNumber;
                if (reader.FieldCount != columns.Count)
                    throw new CatalogueException(file, line, $"{reader.FieldCount} fields, {columns.Count} are expected");
                rows.Add(new RowReader(file, line, positions, [.. Enumerable.Range(0, columns.Count).Select(reader.GetString)]));
            }

            return rows.Count > 0 ? new CsvTable(file, rows) : throw new CatalogueException(file, 0, "the file has no rows");
        }
        catch (CsvFormatException malformed)
        {
            throw new CatalogueException(file, (int)malformed.LineNumber, $"not well-formed: {malformed.Message}");
        }
    }

    private static void CheckHeader(string file, string[] found, IReadOnlyList<string> expected)
    {
        if (found.SequenceEqual(expected, StringComparer.Ordinal))
            return;
        var missing = expected.Except(found, StringComparer.Ordinal);
        var unknown = found.Except(expected, StringComparer.Ordinal);
        throw new CatalogueException(
            file,
            1,
            $"the header must be '{string.Join(',', expected)}'; "
            + $"missing: [{string.Join(", ", missing)}], unknown: [{string.Join(", ", unknown)}]");
    }
}
