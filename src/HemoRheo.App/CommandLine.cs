using System.CommandLine;
using HemoRheo.App.Synthetic;

namespace HemoRheo.App;

/// <summary>The program: its commands, and what becomes of whatever goes wrong.</summary>
internal sealed class CommandLine(string workingFolder, TextWriter output, TextWriter error)
{
    /// <summary>Runs one command line.</summary>
    /// <param name="args">The command line.</param>
    /// <param name="cancel">Ends the run; what was there before stays.</param>
    /// <returns>The exit code.</returns>
    public async Task<int> RunAsync(string[] args, CancellationToken cancel)
    {
        var parsed = Commands().Parse(args, new ParserConfiguration { ResponseFileTokenReplacer = null });
        if (parsed.Errors.Count > 0)
        {
            foreach (var fault in parsed.Errors) await error.WriteLineAsync(fault.Message);
            await error.WriteLineAsync("\"hemorheo --help\" shows what can be asked for.");
            return ExitCode.CouldNotRun;
        }
        try
        {
            return await parsed.InvokeAsync(new InvocationConfiguration { Output = output, Error = error, EnableDefaultExceptionHandler = false }, cancel);
        }
        catch (OperationCanceledException)
        {
            await error.WriteLineAsync("Stopped. Nothing was written; results of an earlier run are as they were.");
        }
        catch (CouldNotRunException fault)
        {
            await error.WriteLineAsync(fault.Message);
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            await error.WriteLineAsync($"A file could not be read or written: {fault.Message}");
        }
        return ExitCode.CouldNotRun;
    }

    private RootCommand Commands() => new("From rheometer exports of whole blood to a study result, every value with its uncertainty. For research use only.")
    {
        Synthesize(),
    };

    private Command Synthesize()
    {
        var folder = new Argument<string>("folder") { Description = "Folder to write the cohort into; made where it is not there." };
        var seed = new Option<long>("--seed") { Description = "Seed of all random numbers.", DefaultValueFactory = _ => SyntheticCohort.RepositorySeed };
        var replace = new Option<bool>("--replace") { Description = "Replace files of the same names." };
        var command = new Command("synthesize", "Writes a synthetic cohort: invented people, exports with faults put in on purpose, and the truth beside.") { folder, seed, replace };
        command.SetAction(parsed =>
        {
            var target = Path.GetFullPath(parsed.GetValue(folder)!, workingFolder);
            var count = CohortFolder.Write(target, parsed.GetValue(seed), parsed.GetValue(replace));
            output.WriteLine($"{count} files of a synthetic cohort are in {target}. No person is in them.");
            return ExitCode.Done;
        });
        return command;
    }
}
