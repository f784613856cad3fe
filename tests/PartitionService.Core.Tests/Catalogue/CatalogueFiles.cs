using PartitionService.Core.Catalogue;

namespace PartitionService.Core.Tests.Catalogue;

/// <summary>The embedded files with one line changed, so that a refusal can be provoked in a real row.</summary>
internal static class CatalogueFiles
{
    public static Dictionary<string, string> Embedded() => CatalogueLoader.ReadEmbeddedFiles();

    /// <summary>Changes the first occurrence of a text in the first line that starts with a prefix and loads the result.</summary>
    /// <returns>The refusal and the one-based number of the changed line.</returns>
    public static (CatalogueException Refusal, int Line) Break(string file, string linePrefix, string oldText, string newText)
    {
        var files = Embedded();
        var lines = files[file].Split('\n');
        var index = Array.FindIndex(lines, l => l.StartsWith(linePrefix, StringComparison.Ordinal));
        Assert.True(index >= 0, $"{file} has no line that starts with '{linePrefix}'");
        var position = lines[index].IndexOf(oldText, StringComparison.Ordinal);
        Assert.True(position >= 0, $"'{oldText}' does not stand in: {lines[index]}");
        lines[index] = string.Concat(lines[index].AsSpan(0, position), newText, lines[index].AsSpan(position + oldText.Length));
        files[file] = string.Join('\n', lines);
        return (Assert.Throws<CatalogueException>(() => CatalogueLoader.Load(files)), index + 1);
    }
}
