using System.CommandLine;
using System.CommandLine.Invocation;

namespace HemoRheo.App;

/// <summary>What <c>--help</c> says.</summary>
internal sealed class PlainHelp(TextWriter output) : SynchronousCommandLineAction
{
    /// <summary>The command that writes a study file.</summary>
    public const string New = "new";

    /// <summary>The command that writes a synthetic cohort.</summary>
    public const string Synthesize = "synthesize";

    private const string OfRun = """
        From rheometer exports of whole blood to a study result, every value with its uncertainty. For research use only.

          hemorheo                       analyze the synthetic cohort of the repository
          hemorheo <folder>              analyze the study in a folder (or name its study file)
          hemorheo new <folder>          write a commented study file to start from
          hemorheo synthesize <folder>   write a synthetic cohort, with the truth beside

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

    /// <inheritdoc/>
    public override bool ClearsParseErrors => true;

    /// <inheritdoc/>
    public override int Invoke(ParseResult parseResult)
    {
        output.Write(parseResult.CommandResult.Command.Name switch { New => OfNew, Synthesize => OfSynthesize, _ => OfRun });
        return ExitCode.Done;
    }
}
