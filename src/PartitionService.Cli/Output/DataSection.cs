using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Output;

/// <summary>What the answer rests on.</summary>
internal static class DataSection
{
    /// <summary>Writes the section.</summary>
    /// <param name="output">Takes the lines.</param>
    /// <param name="answer">The answer.</param>
    /// <param name="page">The page.</param>
    public static void Write(TextWriter output, ChargeAnswer answer, Page page)
    {
        output.WriteLine();
        PlainText.WriteLabelled(output, "Data", AnswerTable.LabelWidth, Summarise(answer, page.ShowData), page.Width);
        if (!page.ShowData || answer.DataUsed.Count == 0)
            return;
        output.WriteLine();
        var table = new PlainTable(
            new TableColumn("key", Alignment.Left),
            new TableColumn("value", Alignment.Decimal),
            new TableColumn("sigma", Alignment.Decimal),
            new TableColumn("unit", Alignment.Left),
            new TableColumn("what, how obtained, from where", Alignment.Left));
        foreach (var datum in answer.DataUsed)
        {
            var sigma = datum.HasSigma ? NumberText.Significant(datum.Sigma) : NumberText.None;
            table.Add(datum.Key, NumberText.Significant(datum.Value, 4), sigma, datum.Unit, Describe(datum));
        }

        table.Write(output, page.Width);
    }

    private static string Summarise(ChargeAnswer answer, bool isShown)
    {
        var counts = Words.Trust
            .Select(level => (level.Word, Count: answer.DataUsed.Count(datum => datum.Access == level.Access && !datum.Overridden)))
            .Append((Word: "given by the case", Count: answer.DataUsed.Count(datum => datum.Overridden)))
            .Where(level => level.Count > 0)
            .Select(level => FormattableString.Invariant($"{level.Count} {level.Word}"));
        var how = isShown ? "" : " All of them: add --data.";
        return answer.DataUsed.Count == 0
            ? "no catalogue row entered the answer."
            : FormattableString.Invariant($"{answer.DataUsed.Count} rows: {string.Join(", ", counts)}; ")
                + $"weakest: {Words.Of(answer.WeakestAccess)}.{how}";
    }

    private static string Describe(DatumUse datum)
    {
        var parts = new List<string> { datum.Quantity, datum.Overridden ? "given by the case" : Words.Of(datum.Access) };
        if (datum.SourceIds.Count > 0)
            parts.Add(string.Join(", ", datum.SourceIds));
        if (datum.Flags.Count > 0)
            parts.Add(string.Join(", ", datum.Flags));
        if (datum.ExtrapolatedKelvin != 0)
            parts.Add($"{NumberText.Fixed(datum.ExtrapolatedKelvin, 0)} K outside its range");
        return string.Join("; ", parts);
    }
}
