using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Output;

/// <summary>The oxygen potential and what it takes to hold it.</summary>
internal static class RedoxSection
{
    /// <summary>Writes the section.</summary>
    /// <param name="output">Takes the lines.</param>
    /// <param name="answer">The answer.</param>
    /// <param name="page">The page.</param>
    public static void Write(TextWriter output, ChargeAnswer answer, Page page)
    {
        if (answer.Redox is not { } redox)
            return;
        var facts = new List<string>();
        if (redox.HasLog10Po2Atm)
            facts.Add($"log10 pO2/atm {NumberText.Fixed(redox.Log10Po2Atm, 2)}");
        if (redox.HasOxygenPotentialKilojoulePerMol)
            facts.Add($"{NumberText.Fixed(redox.OxygenPotentialKilojoulePerMol, 1)} kJ/mol O2");
        if (redox.HasCo2ToCoRatio)
            facts.Add($"CO2/CO {NumberText.Significant(redox.Co2ToCoRatio)}");
        if (redox.HasH2OToH2Ratio)
            facts.Add($"H2O/H2 {NumberText.Significant(redox.H2OToH2Ratio)}");
        if (redox.HasDissolvedOxygenMassPpm)
            facts.Add($"{NumberText.Significant(redox.DissolvedOxygenMassPpm)} ppm O dissolved in the metal");
        if (redox.HasLog10Ps2Atm)
            facts.Add($"log10 pS2/atm {NumberText.Fixed(redox.Log10Ps2Atm, 2)}");
        if (redox.HasLog10Pcl2Atm)
            facts.Add($"log10 pCl2/atm {NumberText.Fixed(redox.Log10Pcl2Atm, 2)}");
        facts.Add(Demand(redox));
        PlainText.WriteLabelled(output, "Oxygen", AnswerTable.LabelWidth, string.Join(", ", facts), page.Width);
    }

    private static string Demand(RedoxReport redox)
    {
        if (redox.OxygenToSupplyKg == 0)
            return "no oxygen to supply or to remove";
        var kg = NumberText.Quantity(Math.Abs(redox.OxygenToSupplyKg));
        var volume = NumberText.Quantity(Math.Abs(redox.OxygenToSupplyNormalCubicMetre));
        return $"{kg} kg ({volume} Nm3) O2 to {(redox.OxygenToSupplyKg > 0 ? "supply" : "remove")}";
    }
}
