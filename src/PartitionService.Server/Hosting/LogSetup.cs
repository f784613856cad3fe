using PartitionService.Server.Options;
using Serilog;
using Serilog.Core;
using Serilog.Events;
using Serilog.Formatting.Compact;

namespace PartitionService.Server.Hosting;

/// <summary>Structured logs: one compact JSON object a line.</summary>
internal static class LogSetup
{
    /// <summary>Replaces the default providers. A sink registered as <see cref="ILogEventSink"/> receives the events as well.</summary>
    public static void Add(IServiceCollection services, ServerOptions options) =>
        services.AddSerilog(
            (provider, logger) => Configure(logger, provider, options),
            // The process-wide logger stays alone: two servers in one process would write to the one that came last.
            preserveStaticLogger: true);

    private static void Configure(LoggerConfiguration logger, IServiceProvider provider, ServerOptions options)
    {
        var level = LevelOf(options.LogLevel);
        // Below warning the framework repeats error texts and addresses per call, which may quote a request.
        var frameworkLevel = level > LogEventLevel.Warning ? level : LogEventLevel.Warning;
        logger
            .MinimumLevel.Is(level)
            .MinimumLevel.Override("Microsoft", frameworkLevel)
            .MinimumLevel.Override("Grpc", frameworkLevel)
            .Enrich.FromLogContext();
        if (options.LogLevel == LogLevel.None)
            logger.Filter.ByExcluding(_ => true);
        if (options.LogOutput == LogOutput.StandardOutput)
            logger.WriteTo.Console(new CompactJsonFormatter());
        else if (options.LogOutput == LogOutput.StandardError)
            logger.WriteTo.Console(new CompactJsonFormatter(), standardErrorFromLevel: LogEventLevel.Verbose);
        foreach (var sink in provider.GetServices<ILogEventSink>())
            logger.WriteTo.Sink(sink);
    }

    private static LogEventLevel LevelOf(LogLevel level) => level switch
    {
        LogLevel.Trace => LogEventLevel.Verbose,
        LogLevel.Debug => LogEventLevel.Debug,
        LogLevel.Information => LogEventLevel.Information,
        LogLevel.Warning => LogEventLevel.Warning,
        LogLevel.Error => LogEventLevel.Error,
        _ => LogEventLevel.Fatal,
    };
}
