namespace PartitionService.Cli.CaseFiles;

/// <summary>A piece of a case file with the place where it stands.</summary>
/// <param name="Line">Line, from 1.</param>
/// <param name="Column">Column, from 1.</param>
internal abstract record CaseNode(int Line, int Column);

/// <summary>A single value, still as written.</summary>
/// <param name="Line">Line, from 1.</param>
/// <param name="Column">Column, from 1.</param>
/// <param name="Text">The text without quotation marks.</param>
/// <param name="Quoted">True where it stands in quotation marks or in a block of text.</param>
internal sealed record ScalarNode(int Line, int Column, string Text, bool Quoted) : CaseNode(Line, Column)
{
    /// <summary>True where nothing was written, or one of the words for nothing.</summary>
    public bool IsEmpty => !Quoted && Text is "" or "~" or "null";
}

/// <summary>Keys with values, in the order of the file; the same key may stand twice until it is checked.</summary>
/// <param name="Line">Line, from 1.</param>
/// <param name="Column">Column, from 1.</param>
/// <param name="Entries">Keys with values.</param>
internal sealed record MappingNode(int Line, int Column, IReadOnlyList<(ScalarNode Key, CaseNode Value)> Entries)
    : CaseNode(Line, Column);

/// <summary>A list.</summary>
/// <param name="Line">Line, from 1.</param>
/// <param name="Column">Column, from 1.</param>
/// <param name="Items">Items in the order of the file.</param>
internal sealed record SequenceNode(int Line, int Column, IReadOnlyList<CaseNode> Items) : CaseNode(Line, Column);
