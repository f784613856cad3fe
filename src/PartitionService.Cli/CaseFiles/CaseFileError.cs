using PartitionService.Cli.Output;

namespace PartitionService.Cli.CaseFiles;

/// <summary>One thing that is wrong with a case file.</summary>
/// <param name="Line">Line, from 1; 0 where it is about the whole file.</param>
/// <param name="Column">Column, from 1; 0 where it is about the whole file.</param>
/// <param name="Key">Key in words, for example "charge, item 4, mass_kg"; empty where it is about the whole file.</param>
/// <param name="Message">What is wrong and what to write instead.</param>
internal sealed record CaseFileError(int Line, int Column, string Key, string Message)
{
    /// <summary>Writes the error in one line, in the form that editors turn into a link.</summary>
    /// <param name="file">Name of the file as the user gave it.</param>
    /// <returns>File, line, column, key and message.</returns>
    public string Describe(string file)
    {
        var place = Line > 0 ? FormattableString.Invariant($"{file}:{Line}:{Column}: ") : $"{file}: ";
        return PlainText.Clean(Key.Length > 0 ? $"{place}{Key}: {Message}" : place + Message);
    }
}
