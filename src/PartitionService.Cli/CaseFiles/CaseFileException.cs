namespace PartitionService.Cli.CaseFiles;

/// <summary>A case file cannot be used.</summary>
/// <param name="file">Name of the file as the user gave it.</param>
/// <param name="errors">Everything that is wrong, at least one.</param>
internal sealed class CaseFileException(string file, IReadOnlyList<CaseFileError> errors)
    : Exception(string.Join(Environment.NewLine, errors.Select(error => error.Describe(file))))
{
    /// <summary>Everything that is wrong, in the order of the file.</summary>
    public IReadOnlyList<CaseFileError> Errors { get; } = errors;
}
