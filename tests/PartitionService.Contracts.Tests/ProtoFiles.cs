using Google.Protobuf.Reflection;
using PartitionService.Contracts.V1;

namespace PartitionService.Contracts.Tests;

/// <summary>The contract as text (for its comments) and as descriptors (for its content).</summary>
internal static class ProtoFiles
{
    private static readonly string Folder = Path.Combine(AppContext.BaseDirectory, "protos");

    public static IReadOnlyList<FileDescriptor> Descriptors { get; } =
    [
        ActivityServiceReflection.Descriptor,
        AnswerReflection.Descriptor,
        CatalogueReflection.Descriptor,
        CatalogueServiceReflection.Descriptor,
        ChargeReflection.Descriptor,
        DerivativeReflection.Descriptor,
        EquilibriumServiceReflection.Descriptor,
        ErrorReflection.Descriptor,
    ];

    public static IEnumerable<MessageDescriptor> Messages => Descriptors.SelectMany(d => d.MessageTypes);

    public static IEnumerable<string> Names => Directory.GetFiles(Folder, "*.proto").Select(Path.GetFileName).OfType<string>().Order();

    public static string[] Lines(string name) => File.ReadAllLines(Path.Combine(Folder, name));

    public static string ServiceConfig => File.ReadAllText(Path.Combine(Folder, "service_config.json"));
}
