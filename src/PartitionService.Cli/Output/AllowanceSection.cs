using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Output;

/// <summary>What was switched on beyond the plain equilibrium.</summary>
internal static class AllowanceSection
{
    /// <summary>Writes the section where anything is on.</summary>
    /// <param name="output">Takes the lines.</param>
    /// <param name="answer">The answer.</param>
    /// <param name="page">The page.</param>
    public static void Write(TextWriter output, ChargeAnswer answer, Page page)
    {
        if (answer.Allowances is not { } on)
            return;
        var facts = new List<string>();
        if (on.MetalInSlagMassPercent != 0)
        {
            var origin = on.MetalInSlagSlot.Length > 0 ? $", typical value {on.MetalInSlagSlot}" : "";
            var mass = NumberText.Quantity(on.MetalInSlagKg);
            facts.Add($"{NumberText.Significant(on.MetalInSlagMassPercent)} % metal droplets in the slag ({mass} kg{origin})");
        }

        if (on.SlagInMetalMassPercent != 0)
            facts.Add($"{NumberText.Significant(on.SlagInMetalMassPercent)} % slag in the metal ({NumberText.Quantity(on.SlagInMetalKg)} kg)");
        if (on.MechanicalDustMassFraction != 0)
            facts.Add($"{NumberText.Significant(100 * on.MechanicalDustMassFraction)} % of the solid charge as mechanical dust");
        facts.AddRange(on.StageEfficiencies.Select(Describe));
        if (facts.Count > 0)
            PlainText.WriteLabelled(output, "Allowances", AnswerTable.LabelWidth, string.Join("; ", facts), page.Width);
    }

    private static string Describe(AppliedStageEfficiency stage) =>
        $"{NumberText.Significant(100 * stage.Efficiency)} % of {stage.Element} reaches equilibrium "
            + $"({NumberText.Quantity(stage.BypassedKg)} kg pass by)";
}
