using System.CommandLine;
using System.CommandLine.Help;
using System.CommandLine.Parsing;
using HemoRheo.App.Synthetic;

namespace HemoRheo.App;

/// <summary>The program: its commands, and what becomes of whatever goes wrong.</summary>
/// <param name="workingFolder">Folder that paths on the command line are taken from.</param>
/// <param name="programFolder">Folder of the program, from which the synthetic cohort is found too.</param>
/// <param name="output">Where progress and results are told.</param>
/// <param name="error">Where it is told why the program could not run.</param>
/// <param name="live">Whether lines of progress may be rewritten.</param>
/// <param name="clock">Where the present moment is read.</param>
internal sealed partial class CommandLine(string workingFolder, string programFolder, TextWriter output, TextWriter error, bool live, TimeProvider clock)
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
            foreach (var fault in parsed.Errors) Tell(fault.Message);
            return CouldNotRun("\"hemorheo --help\" shows what can be asked for.");
        }
        try
        {
            return await parsed.InvokeAsync(new InvocationConfiguration { Output = output, Error = error, EnableDefaultExceptionHandler = false, ProcessTerminationTimeout = null }, cancel);
        }
        catch (OperationCanceledException)
        {
            return CouldNotRun("Stopped. Nothing was written; results of an earlier run are as they were.");
        }
        catch (Exception fault) when (fault is CouldNotRunException or StudyFileException or InstrumentLogException or FileNotFoundException)
        {
            return CouldNotRun(fault.Message);
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            return CouldNotRun($"A file could not be read or written: {fault.Message}");
        }
        catch (Exception fault)
        {
            return CouldNotRun($"This should not have happened, and nothing was written: {fault.Message} ({fault.GetType().Name}). Please report it with the study file.");
        }
    }

    private int CouldNotRun(string why)
    {
        Tell(why);
        return ExitCode.CouldNotRun;
    }

    // A message may quote a file; its lines stay lines, all else that could steer a terminal is shown as a question mark.
    private void Tell(string message)
    {
        foreach (var line in message.Split('\n')) error.Write(Plain.Text(line.TrimEnd('\r')) + "\n");
    }

    private RootCommand Commands()
    {
        var folder = new Argument<string?>("folder") { Arity = ArgumentArity.ZeroOrOne };
        folder.Validators.Add(RefuseUnknownOption);
        var results = new Option<string?>("--output", "-o");
        var strict = new Option<bool>("--strict");
        var root = new RootCommand { folder, results, strict, New(), Synthesize(), Check() };
        root.Options.OfType<HelpOption>().Single().Action = new PlainHelp(output);
        root.SetAction((parsed, cancel) => Task.Run(
            () =>
            {
                var studyFile = parsed.GetValue(folder) is { } named ? StudyLocation.Of(Full(named)) : StudyLocation.OfSyntheticCohort(workingFolder, programFolder);
                var request = new RunRequest(studyFile, parsed.GetValue(results) is { } place ? Full(place) : null, parsed.GetValue(strict));
                return new StudyRun(output, live).Of(request, cancel);
            },
            cancel));
        return root;
    }

    private Command New()
    {
        var folder = new Argument<string>("folder");
        folder.Validators.Add(RefuseUnknownOption);
        var command = new Command(PlainHelp.New) { folder };
        command.SetAction(parsed =>
        {
            var path = StudyFileToStartFrom.Write(Full(parsed.GetValue(folder)!));
            output.Write(StudyFileToStartFrom.WhatToDoNext(path, parsed.GetValue(folder)!));
            return ExitCode.Done;
        });
        return command;
    }

    private Command Synthesize()
    {
        var folder = new Argument<string>("folder");
        folder.Validators.Add(RefuseUnknownOption);
        var seed = new Option<long>("--seed") { DefaultValueFactory = _ => SyntheticCohort.RepositorySeed };
        var replace = new Option<bool>("--replace");
        var command = new Command(PlainHelp.Synthesize) { folder, seed, replace };
        command.SetAction(parsed =>
        {
            var target = Full(parsed.GetValue(folder)!);
            var count = CohortFolder.Write(target, parsed.GetValue(seed), parsed.GetValue(replace));
            output.Write($"{count} files of a synthetic cohort are in {target}. No person is in them.\n");
            return ExitCode.Done;
        });
        return command;
    }

    // Else a misspelled option would be taken for a folder.
    private static void RefuseUnknownOption(ArgumentResult argument)
    {
        if (argument.Tokens is [{ Value: ['-', ..] and var word }, ..]) argument.AddError($"There is no option \"{word}\". For a folder of that name write ./{word}");
    }

    private string Full(string path) => Path.GetFullPath(path, workingFolder);
}
