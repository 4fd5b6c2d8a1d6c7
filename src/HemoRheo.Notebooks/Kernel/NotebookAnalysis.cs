using System.Runtime.CompilerServices;
using HemoRheo.Notebooks;
using Microsoft.DotNet.Interactive;

namespace HemoRheo;

/// <summary>The study's verb as a notebook cell says it, with a progress bar and the cell's Interrupt button.</summary>
public static class NotebookAnalysis
{
    /// <summary>
    /// Analyzes a study in a notebook cell: the same numbers as the library's own <c>Analyze</c>, with a progress bar while it runs.
    /// The Interrupt button cancels it. Outside a notebook there is no bar.
    /// </summary>
    /// <param name="study">The study.</param>
    /// <param name="readings">What <c>study.ReadExports()</c> gave.</param>
    /// <returns>The samples with their values and verdicts.</returns>
    /// <exception cref="OperationCanceledException">The cell was interrupted.</exception>
    public static StudyResult Analyze(this Study study, StudyReadings readings) =>
        KernelSession.Begun ? InCell(study, readings) : study.Analyze(readings, null, CancellationToken.None);

    [MethodImpl(MethodImplOptions.NoInlining)]
    private static StudyResult InCell(Study study, StudyReadings readings)
    {
        if (KernelInvocationContext.Current is not { } context) return study.Analyze(readings, null, CancellationToken.None);
        using var progress = new CellProgress(context);
        return study.Analyze(readings, progress, context.CancellationToken);
    }
}
