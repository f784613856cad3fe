using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Output;

/// <summary>The words of the tool for the enumerations of the contract.</summary>
internal static class Words
{
    /// <summary>Trust levels from the most to the least trustworthy, with their words.</summary>
    public static IReadOnlyList<(Access Access, string Word)> Trust { get; } =
    [
        (Access.Read, "read in a source"),
        (Access.Abstract, "seen in an abstract"),
        (Access.Derived, "computed from seen numbers"),
        (Access.Memory, "recalled, not checked"),
        (Access.Assumed, "assumed"),
    ];

    /// <summary>Gives the word of a trust level.</summary>
    /// <param name="access">The level.</param>
    /// <returns>A few words.</returns>
    public static string Of(Access access) =>
        Trust.Where(level => level.Access == access).Select(level => level.Word).FirstOrDefault("given by the case");

    /// <summary>Gives the word of a severity.</summary>
    /// <param name="severity">The severity.</param>
    /// <returns>One word.</returns>
    public static string Of(Severity severity) =>
        severity switch
        {
            Severity.Serious => "SERIOUS",
            Severity.Warning => "Warning",
            _ => "Note",
        };

    /// <summary>Gives the contract's name of a value in lower case with hyphens, without the name of its type.</summary>
    /// <param name="value">A value of an enumeration of the contract.</param>
    /// <returns>For example "slag-activity".</returns>
    public static string Hyphenated<T>(T value)
        where T : struct, Enum =>
        string.Concat(value.ToString().Select((letter, index) =>
            (char.IsUpper(letter) && index > 0 ? "-" : "") + char.ToLowerInvariant(letter)));
}
