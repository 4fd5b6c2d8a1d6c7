namespace HemoRheo.App;

/// <summary>What the program tells the shell.</summary>
internal static class ExitCode
{
    /// <summary>Done; findings are shown, not counted as failure.</summary>
    public const int Done = 0;

    /// <summary>Done, but <c>--strict</c> was asked for and something needs a person.</summary>
    public const int NeedsAPerson = 1;

    /// <summary>Could not run. What was there before is as it was.</summary>
    public const int CouldNotRun = 2;
}
