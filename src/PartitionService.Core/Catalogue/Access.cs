namespace PartitionService.Core.Catalogue;

/// <summary>How a catalogue number was obtained, from the most to the least trustworthy.</summary>
/// <remarks>The order of the members is the order of trust: a larger value is a weaker access.</remarks>
public enum Access
{
    /// <summary>The number was seen in a document or data set.</summary>
    Read = 0,

    /// <summary>The number was seen in an abstract or excerpt; conditions are partly unknown.</summary>
    Abstract = 1,

    /// <summary>The number was computed by this catalogue from numbers that were seen.</summary>
    Derived = 2,

    /// <summary>The number was recalled from the named work and has not been checked against it.</summary>
    Memory = 3,

    /// <summary>No data: the number was assumed so that the direction is right. The figure must not be used on its own.</summary>
    Assumed = 4,
}
