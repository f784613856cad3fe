using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Output;

/// <summary>Writes an answer as a page for reading.</summary>
internal static class AnswerTable
{
    /// <summary>Columns kept for the label of a line.</summary>
    internal const int LabelWidth = 13;

    private const int ShownDigestDigits = 12;
    private const double KelvinAtZeroCelsius = 273.15;

    /// <summary>Writes the page.</summary>
    /// <param name="output">Takes the lines.</param>
    /// <param name="answer">The answer.</param>
    /// <param name="page">How it is laid out.</param>
    public static void Write(TextWriter output, ChargeAnswer answer, Page page)
    {
        WriteHeader(output, answer, page);
        output.WriteLine();
        ElementSection.Write(output, answer, page);
        output.WriteLine();
        PhaseSection.Write(output, answer, page);
        RedoxSection.Write(output, answer, page);
        AllowanceSection.Write(output, answer, page);
        RemarkSection.Write(output, answer, page);
        DataSection.Write(output, answer, page);
    }

    private static void WriteHeader(TextWriter output, ChargeAnswer answer, Page page)
    {
        PlainText.WriteLabelled(output, "", 0, answer.Name.Length > 0 ? answer.Name : "Case without a name", page.Width);
        var celsius = NumberText.Fixed(answer.TemperatureKelvin - KelvinAtZeroCelsius, 0);
        var digest = answer.CatalogueDigest[..Math.Min(ShownDigestDigits, answer.CatalogueDigest.Length)];
        string[] facts =
        [
            $"{NumberText.Fixed(answer.TemperatureKelvin, 2)} K ({celsius} degC), {NumberText.Significant(answer.PressureAtm)} atm",
            answer.Solvent.Length > 0 ? $"solvent {answer.Solvent}" : "no solvent",
            answer.SlagFamily.Length > 0 ? $"slag {answer.SlagFamily}" : "no slag allowed",
            $"catalogue {digest}",
        ];
        PlainText.WriteLabelled(output, "", 0, string.Join(" | ", facts), page.Width);
    }
}
