namespace PartitionService.Cli.Tests;

/// <summary>A file that lasts as long as a test.</summary>
internal sealed class TemporaryFile : IDisposable
{
    public TemporaryFile(byte[]? contents = null)
    {
        if (contents is not null)
            File.WriteAllBytes(Path, contents);
    }

    public string Path { get; } = System.IO.Path.Combine(System.IO.Path.GetTempPath(), $"partition-test-{Guid.NewGuid():N}.yaml");

    public void Dispose() => File.Delete(Path);
}
