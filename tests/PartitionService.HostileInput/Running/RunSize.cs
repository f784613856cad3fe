using System.Globalization;

namespace PartitionService.HostileInput.Running;

/// <summary>Seed and size of a run; the environment may ask for another, to look further or to see one message again.</summary>
public static class RunSize
{
    /// <summary>Seed: HOSTILE_SEED, or one that every machine shares.</summary>
    public static int Seed => FromEnvironment("HOSTILE_SEED") ?? 20261101;

    /// <summary>Number of the first message: HOSTILE_FIRST, or 0.</summary>
    public static int First => FromEnvironment("HOSTILE_FIRST") ?? 0;

    /// <summary>Number of messages: HOSTILE_COUNT, or the usual one.</summary>
    public static int Count(int usual) => FromEnvironment("HOSTILE_COUNT") ?? usual;

    private static int? FromEnvironment(string name) =>
        int.TryParse(Environment.GetEnvironmentVariable(name), NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture, out var value)
            ? value
            : null;
}
