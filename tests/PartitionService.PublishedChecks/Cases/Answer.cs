using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;

namespace PartitionService.PublishedChecks.Cases;

/// <summary>Reads figures off an answer.</summary>
internal static class Answer
{
    /// <summary>Balance of one element.</summary>
    public static ElementDistribution Of(this VesselAnswer answer, string element) =>
        answer.Elements.Single(entry => entry.Element == element);

    /// <summary>L slag/metal by mass.</summary>
    public static double Ratio(this VesselAnswer answer, string element) =>
        answer.Of(element).PartitionRatioSlagToMetal
            ?? throw new InvalidOperationException($"{element} is not in both metal and slag");

    /// <summary>Species of a phase.</summary>
    public static SpeciesContent Species(PhaseReport phase, string species) =>
        phase.Species.Single(content => content.Species == species);

    /// <summary>Mole fraction of an element in a phase, all of its mononuclear species together.</summary>
    public static double MoleFraction(PhaseReport phase, string element) =>
        phase.Species
            .Where(content => ChemicalFormula.TryParse(content.Species, out var formula, out _) && formula.Atoms.ContainsKey(element))
            .Sum(content => content.MoleFraction);

    /// <summary>Mass of an element in the gas, kg.</summary>
    public static double GasKg(this VesselAnswer answer, string element) =>
        answer.Gas!.Elements.SingleOrDefault(content => content.Element == element)?.MassKg ?? 0;
}
