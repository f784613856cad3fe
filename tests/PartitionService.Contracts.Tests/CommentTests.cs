using System.Text.RegularExpressions;

namespace PartitionService.Contracts.Tests;

public sealed partial class CommentTests
{
    [Fact]
    public void Every_file_of_the_contract_is_read() =>
        Assert.Equal(ProtoFiles.Descriptors.Select(d => Path.GetFileName(d.Name)).Order(), ProtoFiles.Names);

    [Fact]
    public void Every_declaration_has_a_leading_comment()
    {
        var bare = ProtoFiles.Names.SelectMany(name => Declarations(name)
            .Where(d => !d.Before.TrimStart().StartsWith("// ", StringComparison.Ordinal))
            .Select(d => $"{name} line {d.Line}: {d.Text.Trim()}"));
        Assert.Empty(bare);
    }

    /// <summary>Guards the pattern: a declaration that it misses would escape the test above.</summary>
    [Fact]
    public void Pattern_finds_as_many_declarations_as_the_descriptors_hold()
    {
        var inText = ProtoFiles.Names.Sum(name => Declarations(name).Count());
        var oneofs = ProtoFiles.Messages.SelectMany(m => m.Oneofs).Count(o => !o.IsSynthetic);
        var inDescriptors = ProtoFiles.Messages.Sum(m => 1 + m.Fields.InDeclarationOrder().Count)
            + oneofs
            + ProtoFiles.Descriptors.SelectMany(d => d.EnumTypes).Sum(e => 1 + e.Values.Count)
            + ProtoFiles.Descriptors.SelectMany(d => d.Services).Sum(s => 1 + s.Methods.Count);
        Assert.Equal(inDescriptors, inText);
    }

    [Fact]
    public void Messages_are_not_nested() => Assert.DoesNotContain(ProtoFiles.Messages, m => m.NestedTypes.Count > 0 || m.EnumTypes.Count > 0);

    private static IEnumerable<(int Line, string Before, string Text)> Declarations(string name)
    {
        var lines = ProtoFiles.Lines(name);
        for (var i = 1; i < lines.Length; i++)
        {
            if (Declaration().IsMatch(lines[i]))
                yield return (i + 1, lines[i - 1], lines[i]);
        }
    }

    [GeneratedRegex(@"^\s*((message|enum|service|oneof)\s+\w+\s*\{|rpc\s+\w+|(optional |repeated )?\w+ \w+ = \d+|[A-Z0-9_]+ = \d+)")]
    private static partial Regex Declaration();
}
