namespace HemoRheo.Notebooks;

/// <summary>Whether a law fits, for one fit: a fit that ended well is no proof that the law holds.</summary>
internal static class FitJudgment
{
    /// <summary>Yes, or no with what contradicts it; nothing where the fit cannot be used.</summary>
    public static string Of(Edition edition, FittedLaw fit)
    {
        if (!fit.Usable) return "";
        var study = edition.Results.Analyzed.Pool.Laws.Any(law => law.Law == fit.Law.Name && !law.Fits);
        return (fit.Fit.Contradicts, study) switch
        {
            (true, true) => "no: the curve and the study contradict the law",
            (true, false) => "no: the curve contradicts the law",
            (false, true) => "no: the study contradicts the law",
            _ => "yes",
        };
    }
}
