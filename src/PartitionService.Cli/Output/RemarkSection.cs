using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Output;

/// <summary>What a careful reader must know, and the hazards.</summary>
internal static class RemarkSection
{
    private const string General =
        "An estimate from equilibrium, not a permit to operate. Molten metal, fume and furnace gas injure and kill: "
        + "local codes and licensed practice decide.";

    /// <summary>Writes the section.</summary>
    /// <param name="output">Takes the lines.</param>
    /// <param name="answer">The answer.</param>
    /// <param name="page">The page.</param>
    public static void Write(TextWriter output, ChargeAnswer answer, Page page)
    {
        if (answer.Remarks.Count > 0)
        {
            output.WriteLine();
            output.WriteLine("Remarks");
            foreach (var (severity, text) in RemarkGroups.Of(answer.Remarks))
                PlainText.WriteLabelled(output, Words.Of(severity), AnswerTable.LabelWidth, text, page.Width);
        }

        output.WriteLine();
        output.WriteLine("Cautions");
        foreach (var caution in answer.Cautions)
        {
            // The service's own sentence may give the load already.
            var load = caution.HasLoadGramPerNormalCubicMetre && !caution.Text.Contains("g/Nm3", StringComparison.Ordinal)
                ? $" ({NumberText.Significant(caution.LoadGramPerNormalCubicMetre)} g/Nm3 in the gas)"
                : "";
            PlainText.WriteLabelled(output, PlainText.Clean(caution.Substance), AnswerTable.LabelWidth, caution.Text + load, page.Width);
        }

        // No page goes without a caution, also where the service names no hazard: molten metal is hazard enough.
        if (answer.Cautions.Count == 0)
            PlainText.WriteLabelled(output, "All", AnswerTable.LabelWidth, General, page.Width);
    }
}
