namespace PartitionService.Core.Equilibrium;

/// <summary>A hazard of what leaves the vessel.</summary>
/// <param name="Substance">Element or gas that is hazardous.</param>
/// <param name="Text">The hazard in words, deferring to local codes and licensed practice.</param>
/// <param name="LoadGramPerNormalCubicMetre">Load in the gas, g/Nm3; null where it is not about the gas.</param>
public sealed record Caution(string Substance, string Text, double? LoadGramPerNormalCubicMetre);
