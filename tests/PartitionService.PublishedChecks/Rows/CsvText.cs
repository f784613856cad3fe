using System.Text;

namespace PartitionService.PublishedChecks.Rows;

/// <summary>Reads and writes comma-separated text (RFC 4180).</summary>
internal static class CsvText
{
    /// <summary>Splits text into records of fields.</summary>
    public static IReadOnlyList<IReadOnlyList<string>> Split(string text)
    {
        var records = new List<IReadOnlyList<string>>();
        var fields = new List<string>();
        var field = new StringBuilder();
        var quoted = false;
        for (var index = 0; index < text.Length; index++)
        {
            var sign = text[index];
            if (quoted && sign == '"' && index + 1 < text.Length && text[index + 1] == '"')
            {
                field.Append('"');
                index++;
            }
            else if (sign == '"')
            {
                quoted = !quoted;
            }
            else if (!quoted && sign == ',')
            {
                fields.Add(field.ToString());
                field.Clear();
            }
            else if (!quoted && sign == '\n')
            {
                fields.Add(field.ToString());
                field.Clear();
                records.Add(fields);
                fields = [];
            }
            else if (quoted || sign != '\r')
            {
                field.Append(sign);
            }
        }

        return quoted || fields.Count > 0 || field.Length > 0
            ? throw new InvalidDataException("the text ends inside a record; the last line must end with a line feed")
            : records;
    }

    /// <summary>Joins fields into one line, quoting where needed.</summary>
    public static string Join(IEnumerable<string> fields) => string.Join(',', fields.Select(Quote));

    private static string Quote(string field) =>
        field.AsSpan().IndexOfAny(",\"\n") < 0 ? field : $"\"{field.Replace("\"", "\"\"", StringComparison.Ordinal)}\"";
}
