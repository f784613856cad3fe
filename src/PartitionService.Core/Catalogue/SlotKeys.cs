using System.Globalization;

namespace PartitionService.Core.Catalogue;

/// <summary>Hands out row keys: the slot, a number sign and the one-based position of the row in the slot.</summary>
internal sealed class SlotKeys
{
    private readonly Dictionary<string, int> counts = new(StringComparer.Ordinal);

    /// <summary>Key of the next row of a slot.</summary>
    public string Next(string slot)
    {
        var position = counts.GetValueOrDefault(slot) + 1;
        counts[slot] = position;
        return string.Create(CultureInfo.InvariantCulture, $"{slot}#{position}");
    }

    /// <summary>A slot part made of lower-case letters and digits with single hyphens between them.</summary>
    public static string Hyphenate(string text) =>
        string.Join('-', text.ToLowerInvariant().Split(
            [.. text.ToLowerInvariant().Where(c => !char.IsAsciiLetterOrDigit(c)).Distinct()],
            StringSplitOptions.RemoveEmptyEntries));
}
