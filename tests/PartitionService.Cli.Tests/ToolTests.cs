using System.Text;
using Google.Protobuf;
using Google.Protobuf.WellKnownTypes;
using Google.Rpc;
using Grpc.Core;
using PartitionService.Cli.Tests.Output;
using PartitionService.Client.Tests.Serving;
using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Tests;

/// <summary>Runs the tool inside the test process against a scripted service, for answers that a real one gives too rarely.</summary>
public sealed class ToolTests
{
    private static readonly string Example = Path.Combine(ExampleFilesTests.Folder, "black-copper.yaml");

    [Theory]
    [InlineData("table", "Where each element goes")]
    [InlineData("csv", "case,section,subject,quantity,value,unit,text")]
    [InlineData("json", "\"catalogueDigest\": \"0123456789abcdef")]
    public async Task Writes_the_answer_in_the_wanted_form(string format, string expected)
    {
        await using var service = await Serve((_, _, _) => Task.FromResult(HandMadeAnswer.Create()));

        var (code, output, error) = await RunAsync("solve", Example, "--address", service.Address.ToString(), "--format", format);

        Assert.Equal((ExitCode.Success, ""), (code, error));
        Assert.Contains(expected, output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Writes_the_answer_to_a_file()
    {
        await using var service = await Serve((_, _, _) => Task.FromResult(HandMadeAnswer.Create()));
        using var file = new TemporaryFile();

        var (code, output, _) = await RunAsync("solve", Example, "--address", service.Address.ToString(), "--format", "json", "--output", file.Path);

        Assert.Equal((ExitCode.Success, ""), (code, output));
        Assert.Equal(HandMadeAnswer.Create(), JsonParser.Default.Parse<ChargeAnswer>(await File.ReadAllTextAsync(file.Path)));
    }

    [Fact]
    public async Task Tells_that_the_output_file_cannot_be_written()
    {
        await using var service = await Serve((_, _, _) => Task.FromResult(HandMadeAnswer.Create()));
        var file = Path.Combine(AppContext.BaseDirectory, "no", "such", "folder", "x.txt");

        var (code, output, error) = await RunAsync("solve", Example, "--address", service.Address.ToString(), "--output", file);

        Assert.Equal((ExitCode.WrongInput, ""), (code, output));
        Assert.StartsWith($"{file}: The file cannot be written", error, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Puts_refusals_of_the_service_back_to_lines()
    {
        var bad = new BadRequest { FieldViolations = { new BadRequest.Types.FieldViolation { Field = "vessel_case.charge[1].mass_kg", Description = "is -5" } } };
        await using var service = await Serve((_, _, _) => throw Failure(StatusCode.InvalidArgument, "INVALID_CASE", "bad", bad));
        using var file = new TemporaryFile(Encoding.UTF8.GetBytes("temperature_kelvin: 1500\noxygen: closed_balance\ncharge:\n- {formula: Cu, mass_kg: 1}\n- {formula: Pb, mass_kg: -5}\n"));

        var (code, output, error) = await RunAsync("solve", file.Path, "--address", service.Address.ToString());

        Assert.Equal((ExitCode.InvalidCase, ""), (code, output));
        Assert.Equal(["The service refuses the case:", $"{file.Path}:5:26: charge, item 2, mass_kg: is -5", "Request id: r-7"], Lines(error));
    }

    [Fact]
    public async Task Tells_which_condition_cannot_hold()
    {
        await using var service = await Serve((_, _, _) => throw Failure(StatusCode.FailedPrecondition, "OXYGEN_HAS_NO_HOME", "Too much oxygen."));

        var (code, output, error) = await RunAsync("solve", Example, "--address", service.Address.ToString());

        Assert.Equal((ExitCode.CannotHold, ""), (code, output));
        Assert.Equal(["The case cannot hold: Too much oxygen.", "It is about: O", "Request id: r-7"], Lines(error));
    }

    [Fact]
    public async Task Tells_that_the_service_failed()
    {
        await using var service = await Serve((_, _, _) => throw Failure(StatusCode.Internal, "NOT_CONVERGED", "No solution \u001b[31mfound."));

        var (code, _, error) = await RunAsync("solve", Example, "--address", service.Address.ToString());

        Assert.Equal(ExitCode.Unexpected, code);
        Assert.Equal(["The service failed (Internal, NotConverged): No solution  [31mfound.", "Request id: r-7"], Lines(error));
    }

    [Fact]
    public async Task Tells_that_the_time_ran_out()
    {
        await using var service = await Serve(async (_, _, context) =>
        {
            await Task.Delay(Timeout.Infinite, context.CancellationToken);
            return new ChargeAnswer();
        });

        var (code, _, error) = await RunAsync("solve", Example, "--address", service.Address.ToString(), "--timeout", "0.2");

        Assert.Equal(ExitCode.OutOfTime, code);
        Assert.Contains("Add --timeout with more seconds.", error, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Ends_on_request_without_a_result()
    {
        using var stop = new CancellationTokenSource();
        await using var service = await Serve(async (_, _, context) =>
        {
            await stop.CancelAsync();
            await Task.Delay(Timeout.Infinite, context.CancellationToken);
            return new ChargeAnswer();
        });
        using var output = new StringWriter();
        using var error = new StringWriter();

        var code = await Tool.RunAsync(["solve", Example, "--address", service.Address.ToString()], new Terminal(output, error, false), stop.Token);

        Assert.Equal((ExitCode.Interrupted, ""), (code, output.ToString()));
        Assert.Equal("Interrupted; nothing was written.", error.ToString().Trim());
    }

    [Theory]
    [InlineData("Add --help", "solve")]
    [InlineData("not an http or https address", "solve", "x.yaml", "--address", "ftp://x")]
    [InlineData("--timeout: 0 is out of range; it must be above 0 and at most 3600.", "solve", "x.yaml", "--timeout", "0")]
    [InlineData("--timeout: \"1,5\" is not a number", "solve", "x.yaml", "--timeout", "1,5")]
    [InlineData("--temperature: \"NaN\" is not a finite number.", "catalogue", "solutes", "Cu", "--temperature", "NaN")]
    [InlineData("@x.yaml: There is no such file.", "solve", "@x.yaml")]
    [InlineData("Unrecognized command or argument 'sovle'", "sovle")]
    [InlineData("Argument 'xml' not recognized", "solve", "x.yaml", "--format", "xml")]
    public async Task Tells_what_is_wrong_with_the_command_line(string expected, params string[] arguments)
    {
        var (code, output, error) = await RunAsync(arguments);

        Assert.Equal((ExitCode.WrongInput, ""), (code, output));
        Assert.Contains(expected, error, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Help_explains_every_exit_code()
    {
        var (code, output, _) = await RunAsync("--help");

        Assert.Equal(ExitCode.Success, code);
        foreach (var field in typeof(ExitCode).GetFields().Where(field => field.FieldType == typeof(int)))
            Assert.Matches($@"(?m)^ +{field.GetRawConstantValue()} ", output);
    }

    internal static async Task<(int Code, string Output, string Error)> RunAsync(params string[] arguments)
    {
        using var output = new StringWriter();
        using var error = new StringWriter();
        var code = await Tool.RunAsync(arguments, new Terminal(output, error, false));
        return (code, output.ToString(), error.ToString());
    }

    private static string[] Lines(string text) => text.Split(Environment.NewLine, StringSplitOptions.RemoveEmptyEntries);

    private static Task<LoopbackService> Serve(Func<SolveChargeRequest, int, ServerCallContext, Task<ChargeAnswer>> solve) =>
        LoopbackService.StartAsync(new LoopbackService.Script { Solve = solve });

    private static RpcException Failure(StatusCode status, string reason, string message, params IMessage[] more)
    {
        var info = new ErrorInfo { Domain = "partition.v1", Reason = reason, Metadata = { ["request_id"] = "r-7", ["elements"] = "O" } };
        IMessage[] details = [info, .. more];
        return new Google.Rpc.Status { Code = (int)status, Message = message, Details = { details.Select(Any.Pack) } }.ToRpcException();
    }
}
