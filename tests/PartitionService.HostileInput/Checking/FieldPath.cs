using System.Text.RegularExpressions;
using Google.Protobuf.Reflection;

namespace PartitionService.HostileInput.Checking;

/// <summary>Checks that a path leads to a field that exists.</summary>
public static partial class FieldPath
{
    /// <summary>What is wrong with a path from a request; null where nothing is.</summary>
    public static string? FindFault(string path, MessageDescriptor request)
    {
        MessageDescriptor? owner = request;
        foreach (var step in path.Split('.'))
        {
            var match = Step().Match(step);
            if (!match.Success)
                return $"'{step}' is no step of a path";
            if (owner?.FindFieldByName(match.Groups["name"].Value) is not { } field)
                return $"'{step}' is no field of {owner?.Name ?? "a single value"}";
            if (match.Groups["index"].Success && !field.IsRepeated)
                return $"'{step}' is no list";
            owner = field.FieldType == FieldType.Message ? field.MessageType : null;
        }

        return null;
    }

    [GeneratedRegex(@"\A(?<name>[a-z][a-z0-9_]*)(\[(?<index>[0-9]+)\])?\z")]
    private static partial Regex Step();
}
