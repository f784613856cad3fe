using System.Net;

namespace PartitionService.Server.Options;

/// <summary>Settings of the server, section <c>Partition</c> of the configuration (environment: <c>PARTITION__PORT</c> and so on).</summary>
/// <remarks>Every setting has a default. All are checked before the server listens; an unknown name in the section is refused too.</remarks>
public sealed class ServerOptions
{
    /// <summary>Name of the configuration section.</summary>
    public const string Section = "Partition";

    /// <summary>IP address to listen on; <c>0.0.0.0</c> or <c>::</c> for all interfaces. Names are refused.</summary>
    /// <value>The default is <c>127.0.0.1</c>.</value>
    [IpAddressText]
    public string ListenAddress { get; set; } = "127.0.0.1";

    /// <summary>TCP port to listen on, in [1025, 65535]; 0 lets the system choose a free one.</summary>
    /// <value>The default is 5080.</value>
    [UnprivilegedPort]
    public int Port { get; set; } = 5080;

    /// <summary>Largest message that is read, in bytes, in [1024, 67108864] (1 KiB to 64 MiB).</summary>
    /// <value>The default is 4194304 (4 MiB).</value>
    [InRange(1024, 64 * 1024 * 1024, "bytes")]
    public int MaxReceiveMessageBytes { get; set; } = 4 * 1024 * 1024;

    /// <summary>Time that a computation may take where the caller sends no deadline, in seconds, in [0.001, 3600].</summary>
    /// <value>The default is 30 s.</value>
    [InRange(0.001, 3600, "s")]
    public double DefaultDeadlineSeconds { get; set; } = 30;

    /// <summary>Vessels that are solved at the same time, in [0, 256]; further calls wait. 0: the number of processors.</summary>
    /// <value>The default is 0.</value>
    [InRange(0, 256, "solutions")]
    public int ParallelSolutions { get; set; }

    /// <summary>Whether gRPC server reflection is served. Unset: on in the environment Development or on a loopback address.</summary>
    /// <value>The default is unset.</value>
    [OptionalSwitch]
    public bool? Reflection { get; set; }

    /// <summary>Where log events go, one JSON object a line.</summary>
    /// <value>The default is <see cref="Options.LogOutput.StandardOutput"/>.</value>
    [KnownName(typeof(LogOutput))]
    public LogOutput LogOutput { get; set; } = LogOutput.StandardOutput;

    /// <summary>Least severe level that is logged.</summary>
    /// <value>The default is <see cref="LogLevel.Information"/>.</value>
    [KnownName(typeof(LogLevel))]
    public LogLevel LogLevel { get; set; } = LogLevel.Information;

    /// <summary>The address of <see cref="ListenAddress"/>.</summary>
    internal IPAddress Address => IPAddress.Parse(ListenAddress);

    /// <summary>Vessels that are solved at the same time, at least 1.</summary>
    internal int ParallelSolutionsOrProcessors => ParallelSolutions > 0 ? ParallelSolutions : Environment.ProcessorCount;

    /// <summary>Whether reflection is served in the given environment.</summary>
    internal bool ServesReflection(bool isDevelopment) => Reflection ?? (isDevelopment || IPAddress.IsLoopback(Address));
}
