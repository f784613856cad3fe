using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Output;

/// <summary>What leaves the vessel, and where the solvent goes.</summary>
internal static class PhaseSection
{
    private const int MainSpecies = 6;

    /// <summary>Writes the section.</summary>
    /// <param name="output">Takes the lines.</param>
    /// <param name="answer">The answer.</param>
    /// <param name="page">The page.</param>
    public static void Write(TextWriter output, ChargeAnswer answer, Page page)
    {
        Line(output, page, "Metal", answer.Metal is null ? "none left" : Condensed(answer.Metal, ", mol fractions "));
        Line(output, page, "Slag", answer.Slag is null ? "none formed" : Condensed(answer.Slag, ", cation fractions "));
        Line(output, page, "Gas", answer.Gas is null ? "none formed" : Describe(answer.Gas));
        if (answer.MechanicalDustKg != 0)
            Line(output, page, "Dust", $"{NumberText.Quantity(answer.MechanicalDustKg)} kg of the charge leave unreacted");
        if (answer.UnburntCarbonKg != 0)
            Line(output, page, "Carbon", $"{NumberText.Quantity(answer.UnburntCarbonKg)} kg stay unburnt");
        if (answer.SolventLoss is { } loss)
            Line(output, page, "Solvent lost", Describe(loss, answer.Solvent));
    }

    private static void Line(TextWriter output, Page page, string label, string text) =>
        PlainText.WriteLabelled(output, label, AnswerTable.LabelWidth, text, page.Width);

    private static string Condensed(PhaseReport phase, string introduction)
    {
        var main = phase.Species.Take(MainSpecies)
            .Select(species => $"{species.Species} {NumberText.Significant(species.MoleFraction)}").ToArray();
        return $"{NumberText.Quantity(phase.MassKg)} kg" + (main.Length > 0 ? introduction + string.Join(", ", main) : "");
    }

    private static string Describe(GasReport gas)
    {
        var main = gas.Species.Take(MainSpecies).Select(species => $"{species.Species} {NumberText.Percent(species.VolumeFraction)} %");
        var load = NumberText.Significant(gas.DustFormingLoadGramPerNormalCubicMetre);
        return $"{NumberText.Quantity(gas.VolumeNormalCubicMetre)} Nm3, {NumberText.Quantity(gas.MassKg)} kg; "
            + $"by volume {string.Join(", ", main)}; {load} g/Nm3 of elements that turn into fume and dust on cooling";
    }

    private static string Describe(SolventLoss loss, string solvent)
    {
        (double Kg, string Where)[] parts =
        [
            (loss.DissolvedInSlagKg, "dissolved in the slag"), (loss.EntrainedInSlagKg, "as droplets in the slag"),
            (loss.GasKg, "in the gas"), (loss.MechanicalDustKg, "in mechanical dust"),
        ];
        var lost = parts.Where(part => part.Kg != 0).Select(part => $"{NumberText.Quantity(part.Kg)} kg {part.Where}");
        return $"{NumberText.Percent(loss.LossFraction)} % of {NumberText.Quantity(loss.InputKg)} kg {solvent}: "
            + string.Join(", ", lost.DefaultIfEmpty("nothing"));
    }
}
