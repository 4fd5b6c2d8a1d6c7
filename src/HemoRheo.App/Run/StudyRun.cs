using HemoRheo.Notebooks;

namespace HemoRheo.App;

/// <summary>The whole chain, from a study file to pages in a results folder.</summary>
internal sealed class StudyRun(TextWriter output, bool live)
{
    private const string StartPage = "index.html";

    private readonly StepLines steps = new(output, live);

    /// <summary>Runs it.</summary>
    /// <param name="request">What is asked.</param>
    /// <param name="cancel">Ends it; earlier results stay as they were.</param>
    /// <returns>The exit code.</returns>
    public int Of(RunRequest request, CancellationToken cancel)
    {
        output.Write($"{ResearchUse.Caution}\n\n");
        var study = Study.Open(request.StudyFile);
        steps.Done("study", study.Name);
        var results = new OutputFolder(request.ResultsFolder, study.Folder);
        var readings = study.ReadExports();
        steps.Done("read", readings.ToString());
        cancel.ThrowIfCancellationRequested();
        var result = study.Analyze(readings, steps, cancel);
        steps.Done("analyzed", $"{result.Samples.Count} samples, {result.Ranges.Count} reference ranges");
        steps.Done("laws", result.Analyzed.Pool.Comparison.Words);
        steps.Done("readings", result.Analyzed.Pool.Correlation.Words);
        var summary = readings.People.Count == 0 ? null : study.Summarize(result).By("group");
        var record = RunRecord.Of(result, summary);
        var comparison = ComparedWithPrevious(record, results);
        cancel.ThrowIfCancellationRequested();
        results.Replace(fresh =>
        {
            StudyPages.Write(result, summary, record, comparison, fresh);
            cancel.ThrowIfCancellationRequested();
        });
        steps.Done("written", results.Path);
        Close(result, results);
        return request.Strict && Attention.NeedsAPerson(result) ? ExitCode.NeedsAPerson : ExitCode.Done;
    }

    private RunComparison? ComparedWithPrevious(RunRecord record, OutputFolder results)
    {
        if (results.PreviousRecord() is not { } text)
        {
            steps.Done("compared", "first run here, nothing to compare with");
            return null;
        }
        try
        {
            var comparison = record.ComparedWith(RunRecord.FromJson(text));
            foreach (var line in ComparisonLines.Of(comparison)) steps.Done("compared", line);
            return comparison;
        }
        catch (FormatException unreadable)
        {
            steps.Done("compared", $"not compared. {unreadable.Message}");
            return null;
        }
    }

    private void Close(StudyResult result, OutputFolder results)
    {
        output.Write("\nWhat needs attention\n");
        foreach (var line in Attention.Lines(result)) output.Write($"  {Plain.Text(line)}\n");
        output.Write($"\nStart page: {Path.Combine(results.Path, StartPage)}\n");
        output.Write($"{ResearchUse.Caution}\n");
    }
}
