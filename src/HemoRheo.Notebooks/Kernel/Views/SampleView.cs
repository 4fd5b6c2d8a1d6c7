namespace HemoRheo.Notebooks;

/// <summary>Everything of one sample: what is known of it, its values with their verdicts, its findings, and the caution.</summary>
internal static class SampleView
{
    public static Markup Of(JudgedSample sample)
    {
        var judged = sample.Values.Where(value => value.Verdict is not null).ToArray();
        var others = sample.Values.Where(value => value.Verdict is null).ToArray();
        var verdicts = judged.Length == 0 ? Markup.None : TableMarkup.Of(ValuesView.Table(judged), "Values with their 95 % intervals (whole budget) and verdicts");
        return Markup.Of($"""
            {Head(sample.Result)}{verdicts}{TableMarkup.Folded(ValuesView.Table(others), $"{others.Length} values that are shown, not judged")}{FindingsView.Folded(sample.Result.Findings)}<p><i>{ResearchUse.Caution}</i></p>
            """);
    }

    public static Markup Of(SampleResult sample) => Markup.Of($"""
        {Head(sample)}{TableMarkup.Of(ValuesView.Table(sample.Values), "Values with their 95 % intervals (whole budget), not judged")}{FindingsView.Folded(sample.Findings)}<p><i>{ResearchUse.Caution}</i></p>
        """);

    private static Markup Head(SampleResult sample)
    {
        var known = new List<string> { $"{sample.Loadings.Count} loadings", $"instrument {Words.Of(sample.Status)}" };
        if (sample.Record?.Hematocrit is { } hematocrit) known.Add($"hematocrit {hematocrit}");
        if (sample.Record?.PlasmaViscosity is { } plasma) known.Add($"plasma viscosity {Rounding.Digits(plasma.MillipascalSeconds, 4)} mPa·s");
        return Markup.Of($"<p><b>Sample {sample.Sample}</b>: {string.Join(", ", known)}</p>\n");
    }
}
