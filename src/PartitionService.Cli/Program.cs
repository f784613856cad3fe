using PartitionService.Cli;

return await Tool.RunAsync(args, Terminal.Standard).ConfigureAwait(false);
