using System.Text.RegularExpressions;

namespace PartitionService.ArchitectureTests;

/// <summary>The core computes: the same input gives the same answer, and nothing is read or written beside it.</summary>
public sealed class PurityTests
{
    [Theory]
    [InlineData(@"\bDateTime(Offset)?\.(Utc)?(Now|Today)\b", "clock")]
    [InlineData(@"\bStopwatch\b|\bTimeProvider\b|\bEnvironment\.Tick", "clock")]
    [InlineData(@"\bConsole\.", "console")]
    [InlineData(@"\b(File|Directory|FileStream|FileInfo|DirectoryInfo)\b\s*[.(]", "file")]
    [InlineData(@"\bILogger\b|\bSerilog\b|\bTrace\.Write|\bDebug\.Write", "log")]
    [InlineData(@"\bHttpClient\b|\bSocket\b|\bEnvironment\.GetEnvironmentVariable\b", "outside")]
    [InlineData(@"\bnew Random\(|\bRandom\.Shared\b|\bGuid\.NewGuid\b", "chance")]
    public void Core_sources_use_no(string pattern, string what)
    {
        var offenders = Repository.Sources("src/PartitionService.Core")
            .SelectMany(file => File.ReadLines(file).Select(line => (File: Repository.Relative(file), Line: line)))
            .Where(entry => !entry.Line.TrimStart().StartsWith("//", StringComparison.Ordinal) && Regex.IsMatch(entry.Line, pattern));
        Assert.True(!offenders.Any(), $"{what}: {string.Join("; ", offenders)}");
    }
}
