using HemoRheo.App;

namespace HemoRheo.Notebooks.Tests;

/// <summary>One run of the console program inside the test's process.</summary>
/// <param name="Exit">Its exit code.</param>
/// <param name="Output">What it told.</param>
/// <param name="Error">Why it could not run.</param>
internal sealed record ConsoleRun(int Exit, string Output, string Error)
{
    public static Task<ConsoleRun> Of(string workingFolder, params string[] args) => Of(workingFolder, null, args);

    public static async Task<ConsoleRun> Of(string workingFolder, StopOn? stop, params string[] args)
    {
        var output = stop ?? new StopOn("");
        var error = new StringWriter();
        var exit = await new CommandLine(workingFolder, workingFolder, output, error, live: false, TimeProvider.System).RunAsync(args, output.Token);
        return new(exit, output.ToString(), error.ToString());
    }
}
