namespace PartitionService.Client.Tests;

public sealed class PartitionClientOptionsTests
{
    [Fact]
    public void Defaults_are_as_documented()
    {
        var options = new PartitionClientOptions();

        Assert.Null(options.Address);
        Assert.Equal(TimeSpan.FromSeconds(30), options.DefaultDeadline);
        Assert.Equal(4, options.MaximumAttempts);
    }

    [Theory]
    [InlineData("http://localhost:5080", 0.001, 1)]
    [InlineData("https://example.org", 3600, 5)]
    public void Accepts_what_lies_within_the_limits(string address, double seconds, int attempts) =>
        Assert.Empty(Options(address, seconds, attempts).FindFaults());

    [Theory]
    [InlineData(null, 30, 4, "Address is required, for example http://localhost:5080.")]
    [InlineData("ftp://localhost", 30, 4, "Address must be an absolute http or https address, but is \"ftp://localhost/\".")]
    [InlineData("/relative", 30, 4, "Address must be an absolute http or https address, but is \"/relative\".")]
    [InlineData("http://localhost", 0, 4, "DefaultDeadline must be longer than zero and at most 01:00:00, but is 00:00:00.")]
    [InlineData("http://localhost", 3601, 4, "DefaultDeadline must be longer than zero and at most 01:00:00, but is 01:00:01.")]
    [InlineData("http://localhost", 30, 0, "MaximumAttempts must be in [1, 5], but is 0.")]
    [InlineData("http://localhost", 30, 6, "MaximumAttempts must be in [1, 5], but is 6.")]
    public void Says_what_is_wrong(string? address, double seconds, int attempts, string expected) =>
        Assert.Equal([expected], Options(address, seconds, attempts).FindFaults());

    [Fact]
    public void Lists_every_fault_at_once() => Assert.Equal(3, Options(null, -1, 99).FindFaults().Count);

    private static PartitionClientOptions Options(string? address, double seconds, int attempts) => new()
    {
        // On Unix "/relative" would pass as an absolute file address without the scheme being told apart.
        Address = address is null ? null : new Uri(address, address.StartsWith('/') ? UriKind.Relative : UriKind.Absolute),
        DefaultDeadline = TimeSpan.FromSeconds(seconds),
        MaximumAttempts = attempts,
    };
}
