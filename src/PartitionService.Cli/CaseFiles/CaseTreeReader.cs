using YamlDotNet.Core;
using YamlDotNet.Core.Events;

namespace PartitionService.Cli.CaseFiles;

/// <summary>Reads YAML into nodes with places, and refuses what a case file has no use for.</summary>
/// <remarks>Anchors, aliases, tags and deep nesting are how a small file grows without bound; none of them is needed here.</remarks>
internal sealed class CaseTreeReader
{
    /// <summary>Deepest nesting; a case file needs five levels.</summary>
    internal const int DeepestLevel = 10;

    private readonly Parser parser;

    private CaseTreeReader(string text) => parser = new Parser(new StringReader(text));

    /// <summary>Reads the one document of a file.</summary>
    /// <param name="text">Contents of the file.</param>
    /// <returns>Its root.</returns>
    /// <exception cref="CaseTreeException">The text is not YAML, or uses what is refused.</exception>
    public static CaseNode Read(string text)
    {
        var reader = new CaseTreeReader(text);
        try
        {
            return reader.ReadDocument();
        }
        catch (YamlException fault)
        {
            throw new CaseTreeException((int)fault.Start.Line, (int)fault.Start.Column, "This is not valid YAML: " + fault.Message);
        }
        catch (Exception fault) when (fault is InvalidOperationException or ArgumentException)
        {
            // The library gives up on some damaged text without a word or a place; what it read last stands just before.
            var last = reader.parser.Current?.End;
            throw new CaseTreeException(
                Math.Max(1, (int)(last?.Line ?? 1)),
                Math.Max(1, (int)(last?.Column ?? 1)),
                "This is not valid YAML: what follows here cannot be read. Close quotation marks and brackets on the line they start on.");
        }
    }

    private CaseNode ReadDocument()
    {
        parser.Consume<StreamStart>();
        if (parser.Accept<StreamEnd>(out _))
            throw new CaseTreeException(1, 1, "The file holds no case.");
        parser.Consume<DocumentStart>();
        var root = ReadNode(1);
        parser.Consume<DocumentEnd>();
        if (parser.Accept<DocumentStart>(out var second))
        {
            throw new CaseTreeException(
                (int)second.Start.Line, (int)second.Start.Column, "A file holds one case; a second document starts here.");
        }

        return root;
    }

    private CaseNode ReadNode(int level)
    {
        var current = parser.Consume<ParsingEvent>();
        var line = (int)current.Start.Line;
        var column = (int)current.Start.Column;
        if (current is AnchorAlias)
            throw new CaseTreeException(line, column, "References (*name) are not allowed; write the value itself.");
        if (current is NodeEvent { Anchor.IsEmpty: false })
            throw new CaseTreeException(line, column, "Anchors (&name) are not allowed; write the value where it is used.");
        if (current is NodeEvent { Tag: { IsEmpty: false, IsNonSpecific: false } })
            throw new CaseTreeException(line, column, "Type tags (!name) are not allowed; write the plain value.");
        if (level > DeepestLevel)
            throw new CaseTreeException(line, column, $"Nested more than {DeepestLevel} levels deep.");
        return current switch
        {
            Scalar scalar => new ScalarNode(line, column, scalar.Value, scalar.Style != ScalarStyle.Plain),
            SequenceStart => new SequenceNode(line, column, ReadItems(level)),
            MappingStart => new MappingNode(line, column, ReadEntries(level)),
            _ => throw new CaseTreeException(line, column, "A value is expected here."),
        };
    }

    private List<CaseNode> ReadItems(int level)
    {
        var items = new List<CaseNode>();
        while (!parser.TryConsume<SequenceEnd>(out _))
            items.Add(ReadNode(level + 1));
        return items;
    }

    private List<(ScalarNode Key, CaseNode Value)> ReadEntries(int level)
    {
        var entries = new List<(ScalarNode, CaseNode)>();
        while (!parser.TryConsume<MappingEnd>(out _))
        {
            var key = ReadNode(level + 1);
            if (key is not ScalarNode word)
                throw new CaseTreeException(key.Line, key.Column, "A key must be a single word.");
            entries.Add((word, ReadNode(level + 1)));
        }

        return entries;
    }
}

/// <summary>The text cannot be read as a tree at all, so that only this one error can be told.</summary>
/// <param name="line">Line, from 1.</param>
/// <param name="column">Column, from 1.</param>
/// <param name="message">What is wrong.</param>
internal sealed class CaseTreeException(int line, int column, string message) : Exception(message)
{
    /// <summary>The error with its place.</summary>
    public CaseFileError Error { get; } = new(line, column, "", message);
}
