using Microsoft.Extensions.Configuration;
using Microsoft.Extensions.Logging;
using Microsoft.Extensions.Options;
using PartitionService.Server.Options;

namespace PartitionService.Server.Tests.Options;

public sealed class ServerOptionsTests
{
    [Fact]
    public void Defaults_are_those_of_the_documentation()
    {
        var options = Read();
        Assert.Equal("127.0.0.1", options.ListenAddress);
        Assert.Equal(5080, options.Port);
        Assert.Equal(4194304, options.MaxReceiveMessageBytes);
        Assert.Equal(30, options.DefaultDeadlineSeconds);
        Assert.Equal(0, options.ParallelSolutions);
        Assert.Equal(Environment.ProcessorCount, options.ParallelSolutionsOrProcessors);
        Assert.Null(options.Reflection);
        Assert.Equal(LogOutput.StandardOutput, options.LogOutput);
        Assert.Equal(LogLevel.Information, options.LogLevel);
    }

    [Theory]
    [InlineData("ListenAddress", "localhost", "Partition:ListenAddress is 'localhost'; allowed is an IP address such as 127.0.0.1, 0.0.0.0 or ::1.")]
    [InlineData("Port", "1024", "Partition:Port is '1024'; allowed is [1025, 65535], or 0 for any free port.")]
    [InlineData("Port", "65536", "Partition:Port is '65536'; allowed is [1025, 65535], or 0 for any free port.")]
    [InlineData("Port", "-1", "Partition:Port is '-1'; allowed is [1025, 65535], or 0 for any free port.")]
    [InlineData("Port", "http", "Partition:Port is 'http'; allowed is [1025, 65535], or 0 for any free port.")]
    [InlineData("MaxReceiveMessageBytes", "1023", "Partition:MaxReceiveMessageBytes is '1023'; allowed is [1024, 67108864] bytes.")]
    [InlineData("MaxReceiveMessageBytes", "67108865", "Partition:MaxReceiveMessageBytes is '67108865'; allowed is [1024, 67108864] bytes.")]
    [InlineData("DefaultDeadlineSeconds", "0", "Partition:DefaultDeadlineSeconds is '0'; allowed is [0.001, 3600] s.")]
    [InlineData("DefaultDeadlineSeconds", "3601", "Partition:DefaultDeadlineSeconds is '3601'; allowed is [0.001, 3600] s.")]
    [InlineData("DefaultDeadlineSeconds", "NaN", "Partition:DefaultDeadlineSeconds is 'NaN'; allowed is [0.001, 3600] s.")]
    [InlineData("ParallelSolutions", "-1", "Partition:ParallelSolutions is '-1'; allowed is [0, 256] solutions.")]
    [InlineData("ParallelSolutions", "257", "Partition:ParallelSolutions is '257'; allowed is [0, 256] solutions.")]
    [InlineData("Reflection", "perhaps", "Partition:Reflection is 'perhaps'; allowed is true, false or unset.")]
    [InlineData("LogOutput", "Printer", "Partition:LogOutput is 'Printer'; allowed is StandardOutput, StandardError, None.")]
    [InlineData("LogOutput", "7", "Partition:LogOutput is '7'; allowed is StandardOutput, StandardError, None.")]
    [InlineData("LogLevel", "Loud", "Partition:LogLevel is 'Loud'; allowed is Trace, Debug, Information, Warning, Error, Critical, None.")]
    public void Bad_setting_is_refused_with_name_value_and_range(string name, string value, string message)
    {
        var refusal = Assert.Throws<OptionsValidationException>(() => Read((name, value)));
        Assert.Equal([message], refusal.Failures);
    }

    [Theory]
    [InlineData("Port", "0")]
    [InlineData("Port", "1025")]
    [InlineData("Port", "65535")]
    [InlineData("MaxReceiveMessageBytes", "1024")]
    [InlineData("MaxReceiveMessageBytes", "67108864")]
    [InlineData("DefaultDeadlineSeconds", "0.001")]
    [InlineData("DefaultDeadlineSeconds", "3600")]
    [InlineData("ParallelSolutions", "256")]
    [InlineData("ListenAddress", "::1")]
    [InlineData("Reflection", "")]
    public void Ends_of_the_ranges_are_allowed(string name, string value) => Assert.NotNull(Read((name, value)));

    [Fact]
    public void All_bad_settings_are_listed_at_once()
    {
        var refusal = Assert.Throws<OptionsValidationException>(() => Read(("Port", "80"), ("ListenAddress", "here"), ("LogLevel", "x")));
        Assert.Equal(3, refusal.Failures.Count());
    }

    [Fact]
    public void Misspelt_setting_is_refused()
    {
        var refusal = Assert.Throws<OptionsValidationException>(() => Read(("Prot", "5081")));
        Assert.Contains("Partition:Prot is no setting; known are DefaultDeadlineSeconds, ", Assert.Single(refusal.Failures), StringComparison.Ordinal);
    }

    [Fact]
    public void Setting_made_in_code_is_checked_too() =>
        Assert.Throws<OptionsValidationException>(() => PartitionServer.Build([], options => options.Port = 22));

    [Fact]
    public void Names_are_read_without_regard_to_case_as_environments_write_them() =>
        Assert.Equal(6000, Read(("PORT", "6000")).Port);

    [Theory]
    [InlineData("127.0.0.1", null, false, true)]
    [InlineData("0.0.0.0", null, false, false)]
    [InlineData("0.0.0.0", null, true, true)]
    [InlineData("0.0.0.0", true, false, true)]
    [InlineData("127.0.0.1", false, true, false)]
    public void Reflection_is_on_for_developers_and_loopback_unless_stated(string address, bool? stated, bool development, bool served) =>
        Assert.Equal(served, new ServerOptions { ListenAddress = address, Reflection = stated }.ServesReflection(development));

    [Fact]
    public void Every_setting_has_a_rule() =>
        Assert.All(
            typeof(ServerOptions).GetProperties(),
            p => Assert.Single(p.GetCustomAttributes(typeof(SettingAttribute), inherit: true)));

    private static ServerOptions Read(params (string Name, string Value)[] settings) =>
        ServerOptionsReader.Read(
            new ConfigurationBuilder()
                .AddInMemoryCollection(settings.Select(s => KeyValuePair.Create($"Partition:{s.Name}", (string?)s.Value)))
                .Build(),
            null);
}
