using Google.Protobuf;
using Google.Protobuf.Reflection;

namespace PartitionService.Contracts.Tests;

/// <summary>The contract as clients see it stands in one committed file, so that every change of it shows up in review.</summary>
public sealed class DescriptorSetTests
{
    private const string Name = "partition.v1.descriptors.json";

    private static readonly JsonFormatter Formatter = new(JsonFormatter.Settings.Default.WithIndentation());

    [Fact]
    public void Committed_descriptors_are_those_of_the_contract()
    {
        var compiled = Formatter.Format(Compiled()).ReplaceLineEndings("\n") + "\n";
        var committed = File.ReadAllText(Path.Combine(AppContext.BaseDirectory, Name));
        if (compiled == committed)
            return;
        var proposal = Path.Combine(AppContext.BaseDirectory, "new." + Name);
        File.WriteAllText(proposal, compiled);
        Assert.Fail($"The contract has changed. Where that is meant, copy {proposal} to protos/{Name} and commit it with the change.");
    }

    /// <summary>Clients read the files in order; an import must stand before the file that uses it.</summary>
    [Fact]
    public void Imports_stand_before_their_users()
    {
        var seen = new HashSet<string>(StringComparer.Ordinal);
        foreach (var file in Compiled().File)
        {
            Assert.Subset(seen, file.Dependency.ToHashSet(StringComparer.Ordinal));
            seen.Add(file.Name);
        }

        Assert.Equal(ProtoFiles.Descriptors.Count, seen.Count);
    }

    private static FileDescriptorSet Compiled()
    {
        var files = new FileDescriptorSet();
        foreach (var descriptor in ProtoFiles.Descriptors)
            Add(files, descriptor);
        return files;
    }

    private static void Add(FileDescriptorSet files, FileDescriptor descriptor)
    {
        if (files.File.Any(file => file.Name == descriptor.Name))
            return;
        foreach (var import in descriptor.Dependencies)
            Add(files, import);
        files.File.Add(descriptor.ToProto());
    }
}
