using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Output;

/// <summary>The heart of the page: where each element goes.</summary>
internal static class ElementSection
{
    private static readonly int[] BarCells = [20, 16, 12, 8];

    /// <summary>Writes the section.</summary>
    /// <param name="output">Takes the lines.</param>
    /// <param name="answer">The answer.</param>
    /// <param name="page">The page.</param>
    public static void Write(TextWriter output, ChargeAnswer answer, Page page)
    {
        // The longest bar that fits; on a narrow page the shortest.
        var tables = BarCells.Select(cells => Build(answer, page.Bar, cells)).ToArray();
        var table = tables.FirstOrDefault(candidate => candidate.Measure() <= page.Width) ?? tables[^1];
        output.WriteLine("Where each element goes, % of what is charged");
        table.Write(output, page.Width);
        var legend = $"{page.Bar.Legend}; L = mass % in slag / mass % in metal at equilibrium, without allowances";
        PlainText.WriteLabelled(output, "", 0, legend, page.Width);
        foreach (var element in answer.Elements.Where(element => element.UnplacedFraction != 0))
        {
            var share = NumberText.Percent(element.UnplacedFraction);
            var text = $"{element.Element}: {share} % cannot be placed, the catalogue lacks the data.";
            PlainText.WriteLabelled(output, "", 0, text, page.Width);
        }
    }

    private static PlainTable Build(ChargeAnswer answer, SplitBar bar, int cells)
    {
        var hasDust = answer.Elements.Any(element => element.MechanicalDustFraction != 0);
        var hasOther = answer.Elements.Any(element => element.UnburntCarbonFraction + element.UnplacedFraction != 0);
        TableColumn[] columns =
        [
            new("", Alignment.Left),
            new("in, kg", Alignment.Decimal),
            new("metal %", Alignment.Decimal),
            new("slag %", Alignment.Decimal),
            new("gas %", Alignment.Decimal),
            .. hasDust ? [new TableColumn("dust %", Alignment.Decimal)] : Array.Empty<TableColumn>(),
            .. hasOther ? [new TableColumn("other %", Alignment.Decimal)] : Array.Empty<TableColumn>(),
            new("split", Alignment.Left),
            new("in metal", Alignment.Decimal),
            new("", Alignment.Left),
            new("in slag", Alignment.Decimal),
            new("", Alignment.Left),
            new("L", Alignment.Decimal),
        ];
        var table = new PlainTable(columns);
        foreach (var element in answer.Elements)
            table.Add([.. Row(element, bar, cells, hasDust, hasOther)]);
        return table;
    }

    private static IEnumerable<string> Row(ElementDistribution element, SplitBar bar, int cells, bool hasDust, bool hasOther)
    {
        yield return element.Element;
        yield return NumberText.Quantity(element.InputKg);
        yield return NumberText.Percent(element.MetalFraction);
        yield return NumberText.Percent(element.SlagFraction);
        yield return NumberText.Percent(element.GasFraction);
        if (hasDust)
            yield return NumberText.Percent(element.MechanicalDustFraction);
        if (hasOther)
            yield return NumberText.Percent(element.UnburntCarbonFraction + element.UnplacedFraction);
        yield return bar.Draw(cells, element.MetalFraction, element.SlagFraction, element.GasFraction, element.MechanicalDustFraction);
        var (inMetal, metalUnit) = NumberText.Content(element.HasMetalMassPpm ? element.MetalMassPpm : null);
        yield return inMetal;
        yield return metalUnit;
        var (inSlag, slagUnit) = NumberText.Content(element.HasSlagMassPpm ? element.SlagMassPpm : null);
        yield return inSlag;
        yield return slagUnit;
        yield return element.HasPartitionRatioSlagToMetal ? NumberText.Significant(element.PartitionRatioSlagToMetal) : NumberText.None;
    }
}
