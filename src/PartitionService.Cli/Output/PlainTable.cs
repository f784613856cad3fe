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
    private const string WideGap = "  ";
    private const string NarrowGap = " ";
    private const int NarrowestLastColumn = 24;

    private readonly List<string[]> rows = [];

    /// <summary>Adds a row.</summary>
    /// <param name="cells">One text per column.</param>
    public void Add(params string[] cells) => rows.Add([.. cells.Select(PlainText.Clean)]);

    /// <summary>Width that the table needs where nothing wraps and columns stand two blanks apart.</summary>
    /// <returns>Width in characters.</returns>
    public int Measure() => Widths(SetAll()).Sum() + (WideGap.Length * (columns.Length - 1));

    /// <summary>Writes headings and rows.</summary>
    /// <param name="output">Takes the lines.</param>
    /// <param name="width">Width of the page in characters.</param>
    public void Write(TextWriter output, int width)
    {
        var set = SetAll();
        var widths = Widths(set);
        var last = columns.Length - 1;
        var wraps = columns[last].Alignment == Alignment.Left;
        var needed = widths.Take(last).Sum() + (wraps ? NarrowestLastColumn : widths[last]);
        // A page that is too narrow even so lets the terminal fold the line rather than losing text.
        var gap = needed + (WideGap.Length * last) > width ? NarrowGap : WideGap;
        var before = widths.Take(last).Sum() + (gap.Length * last);
        var lastWidth = Math.Max(width - before, wraps ? NarrowestLastColumn : widths[last]);
        output.WriteLine(Join(gap, columns.Select((column, index) => Pad(column, column.Heading, widths[index]))));
        for (var row = 0; row < rows.Count; row++)
        {
            var cells = set.Select(column => column[row]).ToArray();
            var lines = wraps ? PlainText.Wrap(cells[last], lastWidth) : [cells[last]];
            cells[last] = lines[0];
            output.WriteLine(Join(gap, columns.Select((column, index) => Pad(column, cells[index], widths[index]))));
            foreach (var line in lines.Skip(1))
                output.WriteLine(new string(' ', before) + line);
        }
    }

    private string[][] SetAll() => [.. columns.Select((column, index) => Set(column, [.. rows.Select(row => row[index])]))];

    private int[] Widths(string[][] set) =>
        [.. set.Select((cells, index) => cells.Select(cell => cell.Length).Append(columns[index].Heading.Length).Max())];

    private static string Join(string gap, IEnumerable<string> cells) => string.Join(gap, cells).TrimEnd();

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
