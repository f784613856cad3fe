namespace PartitionService.Client;

/// <summary>How a <see cref="PartitionClient"/> reaches the service. Validated before the first call.</summary>
public sealed class PartitionClientOptions
{
    /// <summary>Longest deadline that <see cref="DefaultDeadline"/> accepts.</summary>
    /// <value>One hour.</value>
    public static TimeSpan LongestDeadline { get; } = TimeSpan.FromHours(1);

    /// <summary>Most attempts that <see cref="MaximumAttempts"/> accepts; gRPC itself goes no further.</summary>
    /// <value>5.</value>
    public static int MostAttempts => 5;

    /// <summary>Address of the service: scheme, host and port, for example <c>http://localhost:5080</c>.</summary>
    /// <value>Unset by default; required. Absolute, scheme http (HTTP/2 without TLS) or https.</value>
    public Uri? Address { get; set; }

    /// <summary>Time after which each call is given up, retries and waits between them included.</summary>
    /// <value>30 s by default; longer than zero and at most <see cref="LongestDeadline"/>. One page of a list is one call.</value>
    public TimeSpan DefaultDeadline { get; set; } = TimeSpan.FromSeconds(30);

    /// <summary>How often a call is made in all where the service answers UNAVAILABLE; every call is safe to repeat.</summary>
    /// <value>4 by default; in [1, 5]. 1 switches retrying off.</value>
    public int MaximumAttempts { get; set; } = 4;

    /// <summary>Lists everything that is wrong with these options.</summary>
    /// <returns>One sentence per fault; empty where the options are valid.</returns>
    public IReadOnlyList<string> FindFaults()
    {
        var faults = new List<string>();
        if (Address is null)
            faults.Add("Address is required, for example http://localhost:5080.");
        else if (!Address.IsAbsoluteUri || Address.Scheme is not ("http" or "https"))
            faults.Add($"Address must be an absolute http or https address, but is \"{Address}\".");
        if (DefaultDeadline <= TimeSpan.Zero || DefaultDeadline > LongestDeadline)
            faults.Add($"DefaultDeadline must be longer than zero and at most {LongestDeadline:c}, but is {DefaultDeadline:c}.");
        if (MaximumAttempts < 1 || MaximumAttempts > MostAttempts)
            faults.Add($"MaximumAttempts must be in [1, {MostAttempts}], but is {MaximumAttempts}.");
        return faults;
    }
}
