namespace PartitionService.Server.Calls;

/// <summary>Names of the methods that the service defines, as opposed to health and reflection.</summary>
internal static class ServiceMethods
{
    /// <summary>Start of the full name of every method.</summary>
    public const string Prefix = "/partition.v1.";
}
