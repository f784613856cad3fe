using Google.Protobuf;
using PartitionService.Cli.Output;
using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Tests.Output;

public sealed class AnswerJsonTests
{
    [Fact]
    public void Reads_back_as_the_same_answer()
    {
        using var output = new StringWriter();

        AnswerJson.Write(output, HandMadeAnswer.Create());

        Assert.Equal(HandMadeAnswer.Create(), JsonParser.Default.Parse<ChargeAnswer>(output.ToString()));
        Assert.Contains("\"temperatureKelvin\": 1573.15", output.ToString(), StringComparison.Ordinal);
    }
}
