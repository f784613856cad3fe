using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Output;

/// <summary>The heart of the page: where each element goes.</summary>
internal static class ElementSection
{
    private const int WidePage = 118;

    /// <summary>Writes the section.</summary>
    /// <param name="output">Takes the lines.</param>
    /// <param name="answer">The answer.</param>
    /// <param name="page">The page.</param>
    public static void Write(TextWriter output, ChargeAnswer answer, Page page)
    {
        var hasDust = answer.Elements.Any(element => element.MechanicalDustFraction != 0);
        var hasOther = answer.Elements.Any(element => element.UnburntCarbonFraction + element.UnplacedFraction != 0);
        var cells = page.Width >= WidePage ? 20 : hasDust && hasOther ? 8 : 12;
        var columns = new List<TableColumn>
        {
            new("", Alignment.Left), new("in, kg", Alignment.Decimal), new("metal %", Alignment.Decimal), new("slag %", Alignment.Decimal), new("gas %", Alignment.Decimal),
        };
        if (hasDust)
            columns.Add(new("dust %", Alignment.Decimal));
        if (hasOther)
            columns.Add(new("else %", Alignment.Decimal));
        columns.AddRange(
        [
            new("split", Alignment.Left), new("in metal", Alignment.Decimal), new("", Alignment.Left), new("in slag", Alignment.Decimal), new("", Alignment.Left), new("L slag/metal", Alignment.Decimal),
        ]);
        var table = new PlainTable([.. columns]);
        foreach (var element in answer.Elements)
            table.Add([.. Row(element, page.Bar, cells, hasDust, hasOther)]);
        output.WriteLine("Where each element goes, % of what is charged");
        table.Write(output, page.Width);
        output.WriteLine(page.Bar.Legend);
        foreach (var element in answer.Elements.Where(element => element.UnplacedFraction != 0))
            PlainText.WriteLabelled(output, "", 2, $"{element.Element}: {NumberText.Percent(element.UnplacedFraction)} % cannot be placed, the catalogue lacks the data.", page.Width);
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
