using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Output;

/// <summary>What a careful reader must know, and the hazards.</summary>
internal static class RemarkSection
{
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
            foreach (var remark in answer.Remarks)
                PlainText.WriteLabelled(output, Words.Of(remark.Severity), AnswerTable.LabelWidth, remark.Text, page.Width);
        }

        output.WriteLine();
        output.WriteLine("Cautions");
        foreach (var caution in answer.Cautions)
        {
            var load = caution.HasLoadGramPerNormalCubicMetre
                ? $" ({NumberText.Significant(caution.LoadGramPerNormalCubicMetre)} g/Nm3 in the gas)"
                : "";
            PlainText.WriteLabelled(output, PlainText.Clean(caution.Substance), AnswerTable.LabelWidth, caution.Text + load, page.Width);
        }

        // Stands on every page, also where the service names no single hazard: molten metal is hazard enough.
        PlainText.WriteLabelled(
            output,
            "All",
            AnswerTable.LabelWidth,
            "An estimate from equilibrium, not a permit to operate. Molten metal, fume and furnace gas injure and kill: local codes and licensed practice decide.",
            page.Width);
    }
}
