namespace PartitionService.Core.Catalogue;

/// <summary>The catalogue holds a row that must not be used; the program refuses to start on it.</summary>
/// <param name="file">File name, for example <c>oxidation.csv</c>.</param>
/// <param name="line">One-based line in the file; zero where the problem is not about one line.</param>
/// <param name="reason">What is wrong, with the value and what was expected.</param>
public sealed class CatalogueException(string file, int line, string reason)
    : Exception(line > 0 ? $"{file} line {line}: {reason}" : $"{file}: {reason}")
{
    /// <summary>File name.</summary>
    public string File { get; } = file;

    /// <summary>One-based line; zero where the problem is not about one line.</summary>
    public int Line { get; } = line;

    /// <summary>What is wrong.</summary>
    public string Reason { get; } = reason;
}
