using System.Globalization;

namespace PartitionService.Core.Catalogue;

/// <summary>Typed access to one row; every refusal names file, line, column, value and what is allowed.</summary>
internal sealed class RowReader(string file, int line, Dictionary<string, int> positions, string[] fields)
{
    /// <summary>File name.</summary>
    public string File { get; } = file;

    /// <summary>One-based line.</summary>
    public int Line { get; } = line;

    /// <summary>Text with outer blanks removed; may be empty.</summary>
    public string OptionalText(string column) => fields[positions[column]].Trim();

    /// <summary>Text that must not be empty.</summary>
    public string Text(string column) =>
        OptionalText(column) is { Length: > 0 } text ? text : throw Refuse(column, "", "a text");

    /// <summary>A number between two bounds, ends included.</summary>
    public double Number(string column, double minimum, double maximum)
    {
        var text = Text(column);
        return Parse(text) is { } number && number >= minimum && number <= maximum
            ? number
            : throw Refuse(column, text, string.Create(CultureInfo.InvariantCulture, $"a number from {minimum} to {maximum}"));
    }

    /// <summary>A number above zero and at most <paramref name="maximum"/>.</summary>
    public double Positive(string column, double maximum)
    {
        var text = Text(column);
        return Parse(text) is { } number && number > 0 && number <= maximum
            ? number
            : throw Refuse(column, text, string.Create(CultureInfo.InvariantCulture, $"a number above 0 and at most {maximum}"));
    }

    /// <summary>Like <see cref="Positive"/>, null where the field is empty.</summary>
    public double? OptionalPositive(string column, double maximum) =>
        OptionalText(column).Length == 0 ? null : Positive(column, maximum);

    /// <summary>One of a set of words.</summary>
    public T Word<T>(string column, IReadOnlyDictionary<string, T> words)
    {
        var text = Text(column);
        return words.TryGetValue(text, out var value) ? value : throw Refuse(column, text, $"one of: {string.Join(", ", words.Keys)}");
    }

    /// <summary>Entries between semicolons, each once; an empty field is an empty list.</summary>
    public IReadOnlyList<string> List(string column)
    {
        var text = OptionalText(column);
        if (text.Length == 0)
            return [];
        var entries = text.Split(';', StringSplitOptions.TrimEntries);
        return entries.All(e => e.Length > 0) && entries.Distinct(StringComparer.Ordinal).Count() == entries.Length
            ? entries
            : throw Refuse(column, text, "entries between semicolons, none empty, each once");
    }

    /// <summary>Entries like <c>As:4;O:6</c>, counts from 1 to 100, each name once, at least one entry.</summary>
    public OrderedDictionary<string, int> Counts(string column)
    {
        var counts = new OrderedDictionary<string, int>(StringComparer.Ordinal);
        foreach (var entry in List(column))
        {
            var parts = entry.Split(':');
            if (parts.Length != 2
                || !int.TryParse(parts[1], NumberStyles.None, CultureInfo.InvariantCulture, out var count)
                || count is < 1 or > 100
                || !counts.TryAdd(parts[0], count))
            {
                throw Refuse(column, entry, "a symbol, a colon and a count from 1 to 100, each symbol once");
            }
        }

        return counts.Count > 0 ? counts : throw Refuse(column, "", "at least one entry like As:4");
    }

    /// <summary>A chemical formula of known element symbols.</summary>
    public ChemicalFormula Formula(string column)
    {
        var text = Text(column);
        return ChemicalFormula.TryParse(text, out var formula, out var error)
            ? formula
            : throw Refuse(column, text, $"a chemical formula ({error})");
    }

    /// <summary>The exception that refuses a field of this row.</summary>
    public CatalogueException Refuse(string column, string value, string allowed) =>
        new(File, Line, $"column {column} holds '{value}', allowed is {allowed}");

    /// <summary>The value with the place it was read from.</summary>
    public Located<T> At<T>(T value) => new(value, File, Line);

    private static double? Parse(string text) =>
        double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out var number) && double.IsFinite(number) ? number : null;
}
