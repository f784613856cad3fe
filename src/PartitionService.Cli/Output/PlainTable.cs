namespace PartitionService.Cli.Output;

/// <summary>How a column is set.</summary>
internal enum Alignment
{
    /// <summary>To the left, wrapped where it is the last column.</summary>
    Left,

    /// <summary>On the decimal point.</summary>
    Decimal,
}

/// <summary>A column of a table.</summary>
/// <param name="Heading">Heading.</param>
/// <param name="Alignment">How its cells are set.</param>
internal sealed record TableColumn(string Heading, Alignment Alignment);

/// <summary>A table of aligned plain text. The last column takes the width that is left and wraps.</summary>
/// <param name="columns">Columns, at least one.</param>
internal sealed class PlainTable(params TableColumn[] columns)
{
    private const string Gap = "  ";
    private const int NarrowestLastColumn = 24;

    private readonly List<string[]> rows = [];

    /// <summary>Adds a row.</summary>
    /// <param name="cells">One text per column.</param>
    public void Add(params string[] cells) => rows.Add([.. cells.Select(PlainText.Clean)]);

    /// <summary>Writes headings and rows.</summary>
    /// <param name="output">Takes the lines.</param>
    /// <param name="width">Width of the page in characters.</param>
    public void Write(TextWriter output, int width)
    {
        var set = columns.Select((column, index) => Set(column, [.. rows.Select(row => row[index])])).ToArray();
        var last = columns.Length - 1;
        var widths = set.Select((cells, index) => Math.Max(columns[index].Heading.Length, cells.Select(cell => cell.Length).DefaultIfEmpty().Max())).ToArray();
        var before = widths.Take(last).Sum() + (Gap.Length * last);
        // A page that is too narrow for the fixed columns lets the terminal fold the line rather than losing text.
        var lastWidth = Math.Max(width - before, columns[last].Alignment == Alignment.Left ? NarrowestLastColumn : widths[last]);
        output.WriteLine(Join(columns.Select((column, index) => Pad(column, column.Heading, widths[index]))));
        for (var row = 0; row < rows.Count; row++)
        {
            var lines = columns[last].Alignment == Alignment.Left ? PlainText.Wrap(set[last][row], lastWidth) : [set[last][row]];
            output.WriteLine(Join(columns.Select((column, index) => index < last ? Pad(column, set[index][row], widths[index]) : Pad(column, lines[0], column.Alignment == Alignment.Left ? 0 : widths[last]))));
            foreach (var line in lines.Skip(1))
                output.WriteLine(new string(' ', before) + line);
        }
    }

    private static string Join(IEnumerable<string> cells) => string.Join(Gap, cells).TrimEnd();

    private static string Pad(TableColumn column, string cell, int width) =>
        column.Alignment == Alignment.Left ? cell.PadRight(width) : cell.PadLeft(width);

    private static string[] Set(TableColumn column, string[] cells)
    {
        if (column.Alignment == Alignment.Left)
            return cells;
        var tail = cells.Select(cell => cell.Length - PointOf(cell)).DefaultIfEmpty().Max();
        return [.. cells.Select(cell => cell.PadRight(PointOf(cell) + tail))];
    }

    private static int PointOf(string cell)
    {
        var point = cell.AsSpan().IndexOfAny('.', 'e');
        return point < 0 ? cell.Length : point;
    }
}
