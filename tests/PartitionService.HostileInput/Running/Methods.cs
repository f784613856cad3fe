using Google.Protobuf;
using Grpc.Core;
using PartitionService.Contracts.V1;

namespace PartitionService.HostileInput.Running;

/// <summary>Every method of the contract with its messages.</summary>
public static class Methods
{
    private static readonly Dictionary<string, Google.Protobuf.Reflection.MethodDescriptor> ByName =
        new[] { EquilibriumService.Descriptor, CatalogueService.Descriptor, ActivityService.Descriptor }
            .SelectMany(service => service.Methods)
            .ToDictionary(method => method.Name, StringComparer.Ordinal);

    /// <summary>Names of all methods.</summary>
    public static IEnumerable<string> Names => ByName.Keys;

    /// <summary>Reads a request of a method.</summary>
    public static MessageParser RequestParser(string method) => ByName[method].InputType.Parser;

    /// <summary>Reads an answer of a method.</summary>
    public static MessageParser ResponseParser(string method) => ByName[method].OutputType.Parser;

    /// <summary>Path of a method on the wire.</summary>
    public static string Path(string method) => $"/{ByName[method].Service.FullName}/{method}";

    /// <summary>A method that takes and gives bytes, so that no client library stands between the mutation and the server.</summary>
    public static Method<byte[], byte[]> OnBytes(string method)
    {
        var asTheyAre = Marshallers.Create<byte[]>(bytes => bytes, bytes => bytes);
        return new Method<byte[], byte[]>(MethodType.Unary, ByName[method].Service.FullName, method, asTheyAre, asTheyAre);
    }
}
