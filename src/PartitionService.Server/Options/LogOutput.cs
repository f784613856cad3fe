namespace PartitionService.Server.Options;

/// <summary>Where log events go.</summary>
public enum LogOutput
{
    /// <summary>Standard output.</summary>
    StandardOutput,

    /// <summary>Standard error; for a host that prints results on standard output.</summary>
    StandardError,

    /// <summary>Nowhere.</summary>
    None,
}
