using System.CommandLine;
using System.CommandLine.Invocation;
using System.CommandLine.Parsing;

namespace HemoRheo.App;

/// <summary>What <c>--help</c> says.</summary>
internal sealed class PlainHelp(TextWriter output) : SynchronousCommandLineAction
{
    /// <summary>The command that writes a study file.</summary>
    public const string New = "new";

    /// <summary>The command that writes a synthetic cohort.</summary>
    public const string Synthesize = "synthesize";

    /// <summary>The commands about checks of instruments.</summary>
    public const string Check = "check";

    private const string OfRun = """
        From rheometer exports of whole blood to a study result, every value with its uncertainty. For research use only.

          hemorheo                       analyze the synthetic cohort of the repository
          hemorheo <folder>              analyze the study in a folder (or name its study file)
          hemorheo new <folder>          write a commented study file to start from
          hemorheo synthesize <folder>   write a synthetic cohort, with the truth beside
          hemorheo check status <folder> is the instrument right, since when not, which samples does that touch
          hemorheo check --help          more about checks: record them in a log, weekly page, export, verify

        Options when analyzing
          -o, --output <folder>   folder for pages and tables, replaced whole at every run; default: results, beside the study file
          --strict                exit with 1 when something needs a person
          -h, --help              this text; after a command, that command's
          --version               the version

        Exit codes
          0   done; findings are shown and do not count as failure
          1   only with --strict: something needs a person (a failed check, a file that could not be read, any fault)
          2   could not run, and what was there before is as it was

        """;

    private const string OfNew = """
        hemorheo new <folder>

        Writes a commented study file (study.toml) into the folder, which is made where it is not there. Never writes over one.
        Then: put in your own values, lay exports and tables beside it, and run "hemorheo <folder>".

        """;

    private const string OfSynthesize = """
        hemorheo synthesize <folder> [--seed <number>] [--replace]

        Writes a synthetic cohort into the folder: invented people, exports with faults put in on purpose, and the truth beside.
        The same seed gives the same files; without --seed it is the seed of the repository's cohort.

          --seed <number>   seed of all random numbers
          --replace         replace files of the same names that differ

        """;

    private const string OfCheck = """
        hemorheo check record <folder> --by <name>      append checks and adjustments of the study to the instrument's log
        hemorheo check status <folder>                  three answers in words, and who must do what
        hemorheo check export <folder> --to <file.csv>  write the whole log as comma-separated values
        hemorheo check verify <folder>                  hold every entry of the log against its digest

        A log is one file for one instrument, to which entries are added and in which nothing is changed: a correction is a new entry.
        Without a log, the status goes by the study's own checks. Close other programs that write the log; keep it on this machine's own disk.

          --log <file>           the log; default: checks-of-<instrument>.log beside the study file
          --instrument <name>    which instrument, where the study has several
          --by <name>            record: who records
          --page <file.html>     status: write the weekly page too, one side of A4
          --at <moment>          status: of another moment than now, e.g. 2025-04-02T12:00+02:00
          --noted <digest>       verify: a last digest noted earlier outside the log; shows whether entries were cut off since
          --strict               status, verify: exit with 1 when something needs a person

        """;

    /// <inheritdoc/>
    public override bool ClearsParseErrors => true;

    /// <inheritdoc/>
    public override int Invoke(ParseResult parseResult)
    {
        var command = parseResult.CommandResult;
        output.Write((command.Parent as CommandResult is { Parent: not null } above ? above : command).Command.Name switch { New => OfNew, Synthesize => OfSynthesize, Check => OfCheck, _ => OfRun });
        return ExitCode.Done;
    }
}
