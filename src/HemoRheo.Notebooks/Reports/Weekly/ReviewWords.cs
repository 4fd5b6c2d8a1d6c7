namespace HemoRheo.Notebooks;

/// <summary>The three answers about an instrument, in words for a person with no statistics.</summary>
internal static class ReviewWords
{
    private const int MostStretches = 3;

    /// <summary>Is it right, did it change, what does that touch.</summary>
    public static Items<ReviewAnswer> Of(InstrumentReview review) => [Now(review), Change(review), Touched(review)];

    private static ReviewAnswer Now(InstrumentReview review)
    {
        var word = review.Standing.Status switch
        {
            InstrumentStatus.InOrder => "Yes.",
            InstrumentStatus.InDoubt => "In doubt.",
            InstrumentStatus.Failed => "No.",
            _ => "Nobody knows.",
        };
        return new("Is it right now?", word, new[] { review.Standing.Reason }.Concat(Last(review)).Concat(AtTorques(review)).ToItems());
    }

    private static IEnumerable<string> Last(InstrumentReview review)
    {
        if (review.Course.Checks.Count == 0) yield break;
        var last = review.Course.Checks[^1];
        yield return $"Its last check, on {Figures.Date(last.At)}, read {Off(last.Error.X)}; {Figures.Fixed(100 * last.Limit, 1)} % is allowed.";
    }

    private static IEnumerable<string> AtTorques(InstrumentReview review) => review.ByTorque
        .Where(decade => decade.Standing.Status != review.Standing.Status)
        .GroupBy(decade => Words.Of(decade.Standing))
        .Select(same => $"At torques of {string.Join(" and ", same.Select(decade => decade.Range))}: {same.Key}.");

    private static ReviewAnswer Change(InstrumentReview review)
    {
        var current = review.Chart.Current;
        var since = current.From is { } adjusted ? $" since the adjustment of {Figures.Date(adjusted)}" : "";
        var checks = $"{Figures.Count(current.Points.Count, "check")}{since}";
        var settled = current.Baseline is { Established: true };
        var (word, lines) = current switch
        {
            { Changes: null } when WentWrong(review) is { } wrong => ("Yes.", new[] { wrong }),
            { Points.Count: 0 } => ("Cannot be told.", [$"There is no check{since}."]),
            { Changes: { } changes } => ("Yes.", Changed(current, changes)),
            _ when settled => ("No.", [$"{checks}, and none shows a change."]),
            _ => ("No sign of it so far.", [$"{checks}. A change is seen with certainty only once there are {ControlChart.LeastBaseline} checks to compare with."]),
        };
        var earlier = review.Chart.Segments.Where(segment => segment != current && segment.Changes is not null)
            .Select(segment => $"Before it was adjusted it had changed as well, most likely on {Figures.Date(segment.Changes!.Better.MostLikely)}.");
        return new("Has it drifted, and since when?", word, lines.Concat(earlier.TakeLast(1)).Concat(Stretches(review)).ToItems());
    }

    // A failed check dates the trouble where the chart does not.
    private static string? WentWrong(InstrumentReview review)
    {
        if (review.Standing.Status != InstrumentStatus.Failed) return null;
        var checks = review.Course.Checks;
        var passed = checks.LastOrDefault(check => check.Outcome == CheckOutcome.Passes);
        var failed = checks.First(check => check.Outcome == CheckOutcome.Fails && (passed is null || check.At > passed.At));
        return passed is null
            ? $"It has failed since {Figures.Date(failed.At)}, and no check passed before."
            : $"It went wrong between {Figures.Date(passed.At)}, when it last passed, and {Figures.Date(failed.At)}, when it failed; its checks do not say when in between.";
    }

    private static string[] Changed(ChartSegment segment, ChartChanges changes)
    {
        var (better, first) = (changes.Better, segment.Signals[0]);
        var percent = Figures.Signed(100 * (Math.Exp(better.Size) - 1));
        var latest = changes.ToldApart || changes.Other.Latest < better.Latest ? better.Latest : changes.Other.Latest;
        return
        [
            better.Shape == ChangeShape.Step ? $"It jumped by {percent} %." : $"It drifts slowly, by {percent} % a month.",
            $"Most likely since {Figures.Date(better.MostLikely)}; with 95 % certainty between {Figures.Date(changes.Earliest)} and {Figures.Date(latest)}{(changes.Preliminary ? ", to be dated better by the next checks" : "")}.",
            $"First seen at {first.First}. Of 100 instruments that do not change, {Figures.Fixed(100 * first.FalseAlarm.Within52, 0)} give such a sign within 52 checks.",
        ];
    }

    private static IEnumerable<string> Stretches(InstrumentReview review)
    {
        var troubles = StatusSpans.Of(review.Course).Where(span => span.Status != InstrumentStatus.InOrder && span.From <= review.At).ToArray();
        if (troubles.Length == 0) return [];
        var words = troubles.TakeLast(MostStretches).Select(span => $"{Words.Of(span.Status)} from {Figures.Date(span.From)} to {Figures.Date(span.Until < review.At ? span.Until : review.At)}");
        return [$"{(troubles.Length > MostStretches ? "Lately it was" : "It was")} {string.Join(", ", words)}."];
    }

    private static ReviewAnswer Touched(InstrumentReview review)
    {
        if (review.Samples == 0) return new("Which samples are in doubt?", "None.", ["No sample was measured on it so far."]);
        var counts = review.InDoubt.GroupBy(doubt => doubt.Status).OrderBy(group => group.Key).Select(group => group.Key switch
        {
            InstrumentStatus.Failed => $"{group.Count()} measured after a failed check",
            InstrumentStatus.Unknown => $"{group.Count()} that no check vouches for",
            _ => $"{group.Count()} in doubt",
        });
        return review.InDoubt.Count == 0
            ? new("Which samples are in doubt?", "None.", [$"{Figures.Count(review.Samples, "sample")} measured on it so far."])
            : new("Which samples are in doubt?", $"{review.InDoubt.Count} of {review.Samples}.", [$"{string.Join(", ", counts)}."]);
    }

    /// <summary>An error as a person says it.</summary>
    private static string Off(double logError)
    {
        var percent = 100 * (Math.Exp(logError) - 1);
        return percent < 0 ? $"{Figures.Fixed(-percent, 2)} % too low" : $"{Figures.Fixed(percent, 2)} % too high";
    }
}
