namespace HemoRheo.App;

/// <summary>Writes what a run is doing: one line a step, rewritten in place where a person watches.</summary>
/// <param name="output">Where to.</param>
/// <param name="live">Whether a line may be rewritten; false where output goes to a file.</param>
internal sealed class StepLines(TextWriter output, bool live) : IProgress<AnalysisProgress>
{
    private const int Column = 12;

    private AnalysisProgress? last;
    private int shown;

    /// <summary>Writes a step that is done.</summary>
    public void Done(string step, string what)
    {
        EndLine();
        output.Write($"{step.PadRight(Column)}{Plain.Text(what)}\n");
    }

    /// <summary>Shows how far a step has come; stages of an analysis become steps.</summary>
    public void Report(AnalysisProgress value)
    {
        if (last is not null && last.Stage != value.Stage) EndLine();
        last = value;
        if (live) Rewrite(over: false);
    }

    /// <summary>Ends the line of the step that is under way.</summary>
    public void EndLine()
    {
        if (last is null) return;
        if (live) Rewrite(over: true);
        else output.Write(Line(over: true));
        output.Write("\n");
        last = null;
        shown = 0;
    }

    private void Rewrite(bool over)
    {
        var line = Line(over);
        output.Write("\r" + line.PadRight(shown));
        shown = line.Length;
    }

    // A stage that tells only its beginning is named without its count once it is over.
    private string Line(bool over) => $"{"",Column}{Plain.Text(last!.Stage)}{(over && last.Done < last.Of ? "" : $": {last.Done} of {last.Of}")}";
}
