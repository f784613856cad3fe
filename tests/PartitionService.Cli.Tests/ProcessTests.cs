using System.Diagnostics;
using System.Text;
using PartitionService.Client.Tests.Serving;
using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Tests;

/// <summary>Runs the tool as a process of its own, with the real service inside it.</summary>
public sealed class ProcessTests
{
    private static readonly string Example = Path.Combine(ExampleFilesTests.Folder, "lead-softening.yaml");

    [Theory]
    [MemberData(nameof(ExampleFilesTests.Names), MemberType = typeof(ExampleFilesTests))]
    public async Task Solves_every_example_without_control_characters(string name)
    {
        var (code, output, error) = await RunAsync("solve", Path.Combine(ExampleFilesTests.Folder, name), "--data");

        Assert.Equal((ExitCode.Success, ""), (code, error));
        Assert.StartsWith("Hollowmere Works, ", output, StringComparison.Ordinal);
        Assert.DoesNotContain(output, letter => char.IsControl(letter) && letter is not ('\r' or '\n'));
        Assert.DoesNotContain("NaN", output, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("csv", "case,section,subject,quantity,value,unit,text\r\n")]
    [InlineData("json", "{\n  \"name\": \"Hollowmere Works, ")]
    public async Task Writes_nothing_but_the_result_to_standard_output(string format, string start)
    {
        var (code, output, error) = await RunAsync("solve", Example, "--format", format);

        Assert.Equal((ExitCode.Success, ""), (code, error));
        Assert.StartsWith(start, output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_wrong_case_file_gives_2_and_every_error()
    {
        var (code, output, error) = await RunOnTextAsync("temperature_kelvin: 1,5\ncharge: [{formula: Cu}]\noxygne: closed_balance\n");

        Assert.Equal((ExitCode.WrongInput, ""), (code, output));
        Assert.Contains("x.yaml:1:21: temperature_kelvin: \"1,5\" is not a number", error, StringComparison.Ordinal);
        Assert.Contains("x.yaml:2:10: charge, item 1: One of these keys is missing", error, StringComparison.Ordinal);
        Assert.Contains("x.yaml:3:1: Unknown key \"oxygne\"; did you mean \"oxygen\"?", error, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_case_that_the_service_refuses_gives_3_and_points_at_lines()
    {
        var (code, output, error) = await RunOnTextAsync(
            "temperature_celsius: 20\noxygen: closed_balance\nslag: {family: fog}\ncharge:\n- {formula: Cu, mass_kg: 1}\n- {formula: Qq, mass_kg: -1}\n");

        Assert.Equal((ExitCode.InvalidCase, ""), (code, output));
        Assert.Contains("x.yaml:1:22: temperature_celsius: ", error, StringComparison.Ordinal);
        Assert.Contains("x.yaml:3:16: slag, family: ", error, StringComparison.Ordinal);
        Assert.Contains("x.yaml:6:13: charge, item 2, formula: ", error, StringComparison.Ordinal);
        Assert.Contains("x.yaml:6:26: charge, item 2, mass_kg: ", error, StringComparison.Ordinal);
        Assert.Contains("Request id: ", error, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_condition_that_cannot_hold_gives_4()
    {
        var (code, output, error) = await RunOnTextAsync("temperature_kelvin: 1573\noxygen: closed_balance\ncharge: [{formula: SiO2, mass_kg: 10}]\n");

        Assert.Equal((ExitCode.CannotHold, ""), (code, output));
        Assert.StartsWith("The case cannot hold: ", error, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_service_that_is_not_there_gives_5()
    {
        Uri address;
        await using (var service = await LoopbackService.StartAsync(new LoopbackService.Script()))
            address = service.Address;

        var (code, output, error) = await RunAsync("solve", Example, "--address", address.ToString());

        Assert.Equal((ExitCode.Unavailable, ""), (code, output));
        Assert.StartsWith("The service cannot be reached: ", error, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_deadline_that_passes_gives_6()
    {
        await using var service = await LoopbackService.StartAsync(NeverAnswering(() => { }));

        Assert.Equal(ExitCode.OutOfTime, (await RunAsync("solve", Example, "--address", service.Address.ToString(), "--timeout", "0.3")).Code);
    }

    [Theory]
    [InlineData("INT", ExitCode.Interrupted)]
    [InlineData("TERM", ExitCode.Terminated)]
    public async Task A_signal_ends_the_run_with_its_own_code(string signal, int expected)
    {
        var asked = new TaskCompletionSource();
        await using var service = await LoopbackService.StartAsync(NeverAnswering(asked.SetResult));
        using var process = Start("solve", Example, "--address", service.Address.ToString());
        await asked.Task.WaitAsync(TimeSpan.FromSeconds(30));

        using (var kill = Process.Start("kill", [$"-{signal}", process.Id.ToString(System.Globalization.CultureInfo.InvariantCulture)]))
            await kill.WaitForExitAsync();
        var error = await process.StandardError.ReadToEndAsync();
        await process.WaitForExitAsync();

        Assert.Equal((expected, "Interrupted; nothing was written."), (process.ExitCode, error.Trim()));
    }

    private static LoopbackService.Script NeverAnswering(Action asked) => new()
    {
        Solve = async (_, _, context) =>
        {
            asked();
            await Task.Delay(Timeout.Infinite, context.CancellationToken);
            return new ChargeAnswer();
        },
    };

    private static async Task<(int Code, string Output, string Error)> RunOnTextAsync(string text)
    {
        using var file = new TemporaryFile(Encoding.UTF8.GetBytes(text));
        var (code, output, error) = await RunAsync("solve", file.Path);
        return (code, output, error.Replace(file.Path, "x.yaml", StringComparison.Ordinal));
    }

    private static async Task<(int Code, string Output, string Error)> RunAsync(params string[] arguments)
    {
        using var process = Start(arguments);
        // Both streams are read at once: a full pipe would stop the process for ever.
        var output = process.StandardOutput.ReadToEndAsync();
        var error = process.StandardError.ReadToEndAsync();
        await process.WaitForExitAsync().WaitAsync(TimeSpan.FromMinutes(2));
        return (process.ExitCode, await output, await error);
    }

    private static Process Start(params string[] arguments) => Process.Start(new ProcessStartInfo("dotnet", [Path.Combine(AppContext.BaseDirectory, "partition.dll"), .. arguments])
    {
        RedirectStandardOutput = true,
        RedirectStandardError = true,
    })!;
}
