namespace PartitionService.Core.Equilibrium;

/// <summary>One thing that is wrong with a case.</summary>
/// <param name="Field">Path with indices in snake case, for example <c>charge[3].mass_kg</c>.</param>
/// <param name="Value">The value as it was given, invariant text; empty where nothing was given.</param>
/// <param name="Allowed">The allowed range or what is expected, in words.</param>
public sealed record CaseViolation(string Field, string Value, string Allowed)
{
    /// <summary>The violation in one sentence.</summary>
    public string Message => Value.Length == 0 ? $"{Field}: {Allowed}" : $"{Field} is {Value}; {Allowed}";
}
