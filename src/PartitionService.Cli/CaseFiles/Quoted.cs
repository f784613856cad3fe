namespace PartitionService.Cli.CaseFiles;

/// <summary>Quotes what a file says.</summary>
internal static class Quoted
{
    private const int LongestText = 60;

    /// <summary>The text in quotation marks, cut where it is long: a value of a megabyte must not fill the terminal.</summary>
    /// <param name="text">Text of the file.</param>
    /// <returns>The text for an error message.</returns>
    public static string Of(string text)
    {
        if (text.Length <= LongestText)
            return $"\"{text}\"";
        // Half a surrogate pair is no character.
        var length = char.IsHighSurrogate(text[LongestText - 1]) ? LongestText - 1 : LongestText;
        return $"\"{text[..length]}...\"";
    }
}
