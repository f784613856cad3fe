namespace PartitionService.ArchitectureTests;

/// <summary>Files of the repository, found from the test's own folder upwards; build output is left out.</summary>
internal static class Repository
{
    private static readonly HashSet<string> Output = new(StringComparer.Ordinal)
    {
        "bin", "obj", ".git", ".vs", ".idea", "artifacts", "TestResults", "node_modules",
    };

    private static readonly HashSet<string> TextEndings = new(StringComparer.Ordinal)
    {
        ".cs", ".csproj", ".sln", ".props", ".targets", ".json", ".md", ".proto", ".yaml", ".yml", ".csv", ".txt", ".sh", ".editorconfig",
        ".gitattributes", ".gitignore", "",
    };

    public static string Root { get; } = FindRoot();

    public static IEnumerable<string> TopLevelNames => Directory.EnumerateFileSystemEntries(Root).Select(Path.GetFileName)
        .OfType<string>().Where(name => !Output.Contains(name) && !name.EndsWith(".user", StringComparison.Ordinal));

    public static IEnumerable<string> TextFiles => Files(Root).Where(file => TextEndings.Contains(Path.GetExtension(file)));

    public static IEnumerable<string> Sources(string folder) =>
        Files(Path.Combine(Root, folder)).Where(file => file.EndsWith(".cs", StringComparison.Ordinal));

    public static IEnumerable<string> Projects => Files(Path.Combine(Root, "src"))
        .Where(file => file.EndsWith(".csproj", StringComparison.Ordinal));

    public static string Relative(string file) => Path.GetRelativePath(Root, file).Replace('\\', '/');

    private static IEnumerable<string> Files(string folder) => Directory.EnumerateFiles(folder).Concat(
        Directory.EnumerateDirectories(folder).Where(d => !Output.Contains(Path.GetFileName(d))).SelectMany(Files));

    private static string FindRoot()
    {
        var folder = new DirectoryInfo(AppContext.BaseDirectory);
        while (folder is not null && !File.Exists(Path.Combine(folder.FullName, "PartitionService.sln")))
        {
            folder = folder.Parent;
        }

        return folder?.FullName ?? throw new InvalidOperationException("the tests run outside the repository");
    }
}
