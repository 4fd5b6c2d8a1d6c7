using HemoRheo.App;

return await new CommandLine(Environment.CurrentDirectory, Console.Out, Console.Error).RunAsync(args, CancellationToken.None);
