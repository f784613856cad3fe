namespace PartitionService.Core.Catalogue;

/// <summary>How well one cell of a <see cref="CoverageMatrix"/> is founded, from the best to the worst.</summary>
/// <remarks>The members up to <see cref="Assumed"/> have the values of <see cref="Access"/>.</remarks>
public enum CoverageTrust
{
    /// <summary>The number was seen in a document or data set.</summary>
    Read = Access.Read,

    /// <summary>The number was seen in an abstract or excerpt; conditions are partly unknown.</summary>
    Abstract = Access.Abstract,

    /// <summary>The number was computed by this catalogue from numbers that were seen.</summary>
    Derived = Access.Derived,

    /// <summary>The number was recalled and has not been checked against its source.</summary>
    Memory = Access.Memory,

    /// <summary>No data: the number was assumed so that the direction is right.</summary>
    Assumed = Access.Assumed,

    /// <summary>The catalogue has no number at all.</summary>
    Missing = Access.Assumed + 1,
}
