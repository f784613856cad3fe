using System.Text.RegularExpressions;
using Google.Protobuf.Reflection;

namespace PartitionService.Contracts.Tests;

/// <summary>Whoever fills in a request learns from the field what it may hold.</summary>
public sealed partial class RangeTests
{
    private static IEnumerable<FieldDescriptor> RequestFields =>
        ProtoFiles.Descriptors.SelectMany(file => file.Services).SelectMany(service => service.Methods)
            .SelectMany(method => Within(method.InputType, [])).Distinct();

    [Fact]
    public void Every_number_of_a_request_states_its_range()
    {
        var numbers = RequestFields.Where(field => field.FieldType is FieldType.Double or FieldType.Int32).ToList();
        Assert.NotEmpty(numbers);
        Assert.Empty(numbers.Where(field => !Range().IsMatch(CommentOf(field))).Select(field => field.FullName));
    }

    [Fact]
    public void Every_optional_field_of_a_request_says_what_unset_means() =>
        Assert.Empty(RequestFields
            .Where(field => field.ContainingOneof is { IsSynthetic: true } && !Unset().IsMatch(CommentOf(field)))
            .Select(field => field.FullName));

    private static IEnumerable<FieldDescriptor> Within(MessageDescriptor message, HashSet<string> seen) =>
        seen.Add(message.FullName)
            ? message.Fields.InDeclarationOrder().SelectMany(field => field.FieldType == FieldType.Message
                ? Within(field.MessageType, seen).Prepend(field)
                : [field])
            : [];

    /// <summary>All comment lines above a field.</summary>
    private static string CommentOf(FieldDescriptor field)
    {
        var lines = ProtoFiles.Lines(Path.GetFileName(field.File.Name));
        var message = Array.FindIndex(lines, line => line.StartsWith($"message {field.ContainingType.Name} {{", StringComparison.Ordinal));
        var declared = Array.FindIndex(
            lines, message, line => Regex.IsMatch(line, $@"\b{field.Name} = {field.FieldNumber.ToString(System.Globalization.CultureInfo.InvariantCulture)}\b"));
        var comment = lines[..declared].Reverse().TakeWhile(line => line.TrimStart().StartsWith("//", StringComparison.Ordinal)).Reverse();
        return string.Join(' ', comment.Select(line => line.Trim().TrimStart('/')));
    }

    [GeneratedRegex(@"[\[(][-0-9.e]+, [-0-9.e]+\]")]
    private static partial Regex Range();

    [GeneratedRegex("[Uu]nset")]
    private static partial Regex Unset();
}
