using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Output;

/// <summary>Lays out the cells of a coverage table so that a page of 120 characters holds them.</summary>
internal static class CoverageGrid
{
    private const string OtherSpecies = "-";

    /// <summary>Writes a table with a line per species and a column per solvent or slag family.</summary>
    /// <param name="output">Takes the lines.</param>
    /// <param name="table">The table.</param>
    /// <param name="width">Width of the page in characters.</param>
    public static void Write(TextWriter output, CoverageTable table, int width)
    {
        var headings = Headings(table.Rows);
        if (table.Rows.Zip(headings).Any(pair => pair.First != pair.Second))
        {
            PlainText.WriteLabelled(
                output, "Columns", CoverageText.LabelWidth, string.Join(", ", headings.Zip(table.Rows, (s, l) => $"{s} {l}")) + ".", width);
        }

        var cells = table.Cells.ToLookup(cell => (cell.Row, cell.Species));
        var known = table.Cells.Where(cell => cell.Species.Length > 0).ToLookup(cell => (cell.Row, cell.Element));
        var grid = new PlainTable([new("", Alignment.Left), .. headings.Select(heading => new TableColumn(heading, Alignment.Left))]);
        var lines = table.Cells.Where(cell => cell.Species.Length > 0).Select(cell => (cell.Element, cell.Species)).Distinct()
            .OrderBy(line => line.Element, StringComparer.Ordinal).ThenBy(line => line.Species, StringComparer.Ordinal);
        foreach (var (element, species) in lines)
        {
            grid.Add([species, .. table.Rows.Select(row =>
                cells[(row, species)].FirstOrDefault() is { } cell ? Text(cell)
                : known[(row, element)].Any() ? OtherSpecies
                : CoverageText.Letter(CoverageTrust.Missing))]);
        }

        grid.Write(output, width);
    }

    /// <summary>Lays out vapour species with a line per element.</summary>
    /// <param name="table">The table.</param>
    /// <returns>The lines.</returns>
    public static PlainTable Vapours(CoverageTable table)
    {
        var lines = new PlainTable(
            new("", Alignment.Left), new("number", Alignment.Decimal), new("sigma, kJ/mol", Alignment.Left), new("species", Alignment.Left));
        foreach (var element in table.Elements)
        {
            var cells = table.Cells.Where(cell => cell.Element == element && cell.HasSigma).ToList();
            var species = cells.GroupBy(cell => cell.Trust).OrderBy(group => group.Key)
                .Select(group => $"{CoverageText.Letter(group.Key)} {string.Join(' ', group.Select(cell => cell.Species))}");
            lines.Add(
                element,
                NumberText.Fixed(cells.Count, 0),
                cells.Count == 0 ? "" : $"{Kilojoule(cells.Min(cell => cell.Sigma))}-{Kilojoule(cells.Max(cell => cell.Sigma))}",
                cells.Count == 0 ? CoverageText.Letter(CoverageTrust.Missing) : string.Join("; ", species));
        }

        return lines;
    }

    /// <summary>Shortens long names to their initials where those stay different.</summary>
    private static List<string> Headings(Google.Protobuf.Collections.RepeatedField<string> names)
    {
        const int longest = 6;
        if (names.All(name => name.Length <= longest))
            return [.. names];
        var initials = names.Select(name => string.Concat(name.Split('-').Select(word => char.ToUpperInvariant(word[0])))).ToList();
        return initials.Distinct().Count() == names.Count ? initials : [.. names];
    }

    private static string Text(CoverageCell cell) =>
        CoverageText.Letter(cell.Trust) + (cell.HasSigma ? NumberText.Significant(cell.Sigma, 2) : "");

    private static string Kilojoule(double joule) => NumberText.Significant(joule / 1000, 2);
}
