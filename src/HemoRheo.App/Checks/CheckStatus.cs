using HemoRheo.Notebooks;

namespace HemoRheo.App;

/// <summary>Tells an instrument's three answers: is it right, did it change, what does that touch; and who must do what.</summary>
internal sealed class CheckStatus(TextWriter output, TimeProvider clock)
{
    /// <summary>Tells them.</summary>
    /// <param name="request">Which instrument.</param>
    /// <param name="at">The moment; null for now.</param>
    /// <param name="page">Full path of the page to write; null for none.</param>
    /// <param name="strict">Whether the exit code tells that something needs a person.</param>
    /// <returns>The exit code.</returns>
    public int Of(CheckRequest request, DateTimeOffset? at, string? page, bool strict)
    {
        var study = CheckedStudy.Of(request);
        var log = study.Log.ReadIfThere();
        if (log is not null && log.Instrument != study.Instrument) throw new CouldNotRunException($"\"{study.Log.Path}\" is the log of instrument \"{log.Instrument}\", not of \"{study.Instrument}\".");
        var review = study.History.Review(study.Readings, at ?? clock.GetLocalNow(), log);
        var tasks = ReviewTasks.Of(review);

        Tell(FormattableString.Invariant($"Instrument {study.Instrument} on {review.At:yyyy-MM-dd HH:mm zzz}, by {(log is null ? "the study's own checks (there is no log)" : $"its log {study.Log.Path}")}"));
        foreach (var answer in ReviewWords.Of(review))
        {
            Tell("");
            Tell($"{answer.Question} {answer.Short}");
            foreach (var line in answer.Lines) Tell($"  {line}");
        }

        foreach (var group in DoubtGroup.Of(review)) Tell($"  {Words.Of(group.Status)}: {group.Names}, measured {group.Days}. {group.Reason}");
        Tell("");
        Tell("Who must do what");
        foreach (var task in tasks) Tell($"  {task.Who}: {task.What}");
        if (review.Log is { } verified) Tell($"\nlast digest of the log {verified.LastDigest}");
        if (page is not null)
        {
            StudyPages.WriteWeekly(review, page);
            Tell($"\npage {page}");
        }

        output.Write($"{ResearchUse.Caution}\n");
        return strict && tasks.Any(task => task.Urgent) ? ExitCode.NeedsAPerson : ExitCode.Done;
    }

    private void Tell(string line) => output.Write($"{string.Join('\n', line.Split('\n').Select(Plain.Text))}\n");
}
