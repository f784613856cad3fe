using System.Globalization;
using System.Text;

namespace PartitionService.Server.Errors;

/// <summary>Makes text from a caller safe to show: it must not steer a terminal, hide a part of itself or turn a line around.</summary>
internal static class VisibleText
{
    /// <summary>The text with every character that has no shape of its own written as <c>\u202E</c> and the like.</summary>
    public static string Of(string text)
    {
        if (text.EnumerateRunes().All(IsVisible))
            return text;
        var shown = new StringBuilder(text.Length + 16);
        foreach (var rune in text.EnumerateRunes())
        {
            if (IsVisible(rune))
                shown.Append(rune);
            else
                shown.Append(CultureInfo.InvariantCulture, $"\\u{rune.Value:X4}");
        }

        return shown.ToString();
    }

    /// <summary>Half a pair is read as the replacement character, which says that text was lost and not which.</summary>
    private static bool IsVisible(Rune rune) =>
        rune != Rune.ReplacementChar
        && Rune.GetUnicodeCategory(rune) is not (
            UnicodeCategory.Control or UnicodeCategory.Format or UnicodeCategory.LineSeparator or UnicodeCategory.ParagraphSeparator);
}
