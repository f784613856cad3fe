namespace PartitionService.Core.Catalogue;

/// <summary>A value together with the line that it was read from, so that a later check can still point at it.</summary>
internal sealed record Located<T>(T Value, string File, int Line)
{
    /// <summary>The exception that refuses this row.</summary>
    public CatalogueException Refuse(string reason) => new(File, Line, reason);
}
