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
catch (IOException notListening)
{
    // The port is taken, or the address is not one of this machine; the message says which.
    await Console.Error.WriteLineAsync(notListening.Message);
    return 3;
}
