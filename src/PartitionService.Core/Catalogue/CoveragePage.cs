using System.Globalization;
using System.Text;

namespace PartitionService.Core.Catalogue;

/// <summary>Writes a <see cref="CoverageMatrix"/> as a page in Markdown, the file <c>COVERAGE.md</c> beside the catalogue files.</summary>
public static class CoveragePage
{
    private const string OtherSpecies = "-";

    private static readonly CoverageTrust[] Levels = Enum.GetValues<CoverageTrust>();

    /// <summary>Writes the page.</summary>
    /// <param name="coverage">The tables.</param>
    /// <returns>The page with LF at the end of every line; the same tables give the same page.</returns>
    public static string Write(CoverageMatrix coverage)
    {
        ArgumentNullException.ThrowIfNull(coverage);
        var page = new StringBuilder();
        Line(page, "# What the catalogue knows and how well");
        Line(page, "");
        Line(page, "Generated from the catalogue files: do not edit. A test compares this page with a fresh one and writes that one where the");
        Line(page, "environment variable `PARTITION_WRITE_COVERAGE` is `1`. Only rows that count enter; access words as in `FORMAT.md`.");
        Line(page, "");
        Counts(page, coverage);
        Line(page, "");
        Line(page, "Cells below: R read, A abstract, D derived, M memory, X assumed (do not use the figure), empty: missing, - : another oxide of the");
        Line(page, "element counts in this slag. The number is one standard deviation of ln gamma0 or ln gamma, natural logarithm.");
        Line(page, "");
        Line(page, "## Solutes in liquid metals");
        Line(page, "");
        Grid(page, coverage.Metals, "solute");
        Line(page, "");
        Line(page, "## Oxides and chlorides in slags");
        Line(page, "");
        Grid(page, coverage.Slags, "species");
        Line(page, "");
        Line(page, "## Vapour species");
        Line(page, "");
        Vapours(page, coverage.Vapours);
        return page.ToString();
    }

    private static void Counts(StringBuilder page, CoverageMatrix coverage)
    {
        Row(page, ["cells", .. Levels.Select(Word), "all"]);
        Row(page, Enumerable.Repeat("---", Levels.Length + 2));
        foreach (var (name, table) in ((string, CoverageTable)[])
            [("solutes in metals", coverage.Metals), ("oxides and chlorides in slags", coverage.Slags), ("vapour species", coverage.Vapours)])
        {
            Row(page, [name, .. Levels.Select(level => Number(table.Count(level))), Number(table.Cells.Count)]);
        }
    }

    private static void Grid(StringBuilder page, CoverageTable table, string corner)
    {
        Row(page, [corner, .. table.Rows]);
        Row(page, Enumerable.Repeat("---", table.Rows.Count + 1));
        var cells = table.Cells.ToLookup(cell => (cell.Row, cell.Species));
        var elements = table.Cells.Where(cell => cell.Species.Length > 0).ToLookup(cell => (cell.Row, cell.Element));
        var species = table.Cells.Where(cell => cell.Species.Length > 0)
            .Select(cell => (cell.Element, cell.Species)).Distinct()
            .OrderBy(pair => pair.Element, StringComparer.Ordinal).ThenBy(pair => pair.Species, StringComparer.Ordinal);
        foreach (var (element, name) in species)
        {
            Row(page, [name, .. table.Rows.Select(row =>
                cells[(row, name)].FirstOrDefault() is { } cell ? Text(cell) : elements[(row, element)].Any() ? OtherSpecies : "")]);
        }
    }

    private static void Vapours(StringBuilder page, CoverageTable table)
    {
        Row(page, ["element", .. Levels.Where(level => level != CoverageTrust.Missing).Select(Word)]);
        Row(page, Enumerable.Repeat("---", Levels.Length));
        foreach (var element in table.Elements)
        {
            var cells = table.Cells.Where(cell => cell.Element == element).ToLookup(cell => cell.Trust, cell => cell.Species);
            Row(page, [element, .. Levels.Where(level => level != CoverageTrust.Missing).Select(level => string.Join(' ', cells[level]))]);
        }
    }

    private static string Text(CoverageCell cell) => string.Create(CultureInfo.InvariantCulture, $"{Letter(cell.Trust)} {cell.Sigma:0.0#}");

    private static char Letter(CoverageTrust trust) => trust == CoverageTrust.Assumed ? 'X' : trust.ToString()[0];

    private static string Word(CoverageTrust trust) => trust.ToString().ToLowerInvariant();

    private static string Number(int count) => count.ToString(CultureInfo.InvariantCulture);

    private static void Row(StringBuilder page, IEnumerable<string> cells) =>
        Line(page, string.Concat("|", string.Concat(cells.Select(cell => cell.Length > 0 ? $" {cell} |" : " |"))));

    private static void Line(StringBuilder page, string line) => page.Append(line).Append('\n');
}
