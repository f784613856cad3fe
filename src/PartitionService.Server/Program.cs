using Microsoft.Extensions.Options;
using PartitionService.Server;

try
{
    await using var app = PartitionServer.Build(args);
    await app.RunAsync();
    return 0;
}
catch (OptionsValidationException settings)
{
    foreach (var failure in settings.Failures)
        await Console.Error.WriteLineAsync(failure);
    return 2;
}
