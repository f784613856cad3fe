namespace PartitionService.Cli.Output;

/// <summary>Writes comma-separated values after RFC 4180: CRLF, quotation marks where needed, numbers with a decimal point.</summary>
internal static class Csv
{
    private static readonly System.Buffers.SearchValues<char> NeedQuotes = System.Buffers.SearchValues.Create(",\"\r\n");

    /// <summary>Writes one record.</summary>
    /// <param name="output">Takes the record.</param>
    /// <param name="fields">Its fields.</param>
    public static void WriteRecord(TextWriter output, params IEnumerable<string> fields)
    {
        output.Write(string.Join(',', fields.Select(Quote)));
        output.Write("\r\n");
    }

    /// <summary>Writes a number so that reading it back gives the same number.</summary>
    /// <param name="value">The number; null gives an empty field.</param>
    /// <returns>The number with a decimal point, whatever the country.</returns>
    public static string Number(double? value) => value?.ToString("R", System.Globalization.CultureInfo.InvariantCulture) ?? "";

    private static string Quote(string field) =>
        field.AsSpan().ContainsAny(NeedQuotes) ? $"\"{field.Replace("\"", "\"\"", StringComparison.Ordinal)}\"" : field;
}
