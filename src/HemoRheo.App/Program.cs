using HemoRheo.App;

using var stop = new CancellationTokenSource();
Console.CancelKeyPress += (_, pressed) =>
{
    pressed.Cancel = !stop.IsCancellationRequested;
    stop.Cancel();
};
var program = new CommandLine(Environment.CurrentDirectory, AppContext.BaseDirectory, Console.Out, Console.Error, live: !Console.IsOutputRedirected, TimeProvider.System);
return await program.RunAsync(args, stop.Token);
