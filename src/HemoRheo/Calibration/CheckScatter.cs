namespace HemoRheo;

/// <summary>The standard deviation of one check's ln error about its period's mean.</summary>
/// <param name="Size">The standard deviation.</param>
/// <param name="DegreesOfFreedom">Its degrees of freedom; infinite where declared.</param>
/// <param name="Estimate">Its name as contributions carry it.</param>
/// <param name="BeyondFit">Share of its variance that the checks' fits do not explain, between 0.1 and 1.</param>
internal sealed record CheckScatter(double Size, double DegreesOfFreedom, string Estimate, double BeyondFit)
{
    // As for loadings: scatter that the fits seem to explain wholly is still given a tenth, so that few checks never claim to scatter not at all.
    private const double LeastBeyondFit = 0.1;

    /// <summary>Pooled over periods; the declared one where the checks have no degrees of freedom; null where there is neither.</summary>
    internal static CheckScatter? Of(Instrument instrument, IReadOnlyList<CheckSpan> spans)
    {
        var estimate = $"checks of {instrument.Name}";
        var df = spans.Sum(span => span.Checks.Count - 1);
        if (df == 0)
        {
            if (instrument.CheckScatter is not { } declared) return null;
            var fits = spans.Count == 0 ? 0 : spans.Average(FitVariance);
            return new(declared, double.PositiveInfinity, estimate, Beyond(declared * declared, fits));
        }

        var variance = spans.Sum(span => SquaresAboutMean(span.Checks)) / df;
        var explained = spans.Sum(span => (span.Checks.Count - 1) * FitVariance(span)) / df;
        return new(Math.Sqrt(variance), df, estimate, Beyond(variance, explained));
    }

    /// <summary>What the mean of a period's checks owes to their scatter.</summary>
    internal Contribution OfMean(string period, int checks) => new(new(SourceKind.Calibration, period), Size / Math.Sqrt(checks), Estimate, DegreesOfFreedom);

    /// <summary>What one check owes to the scatter beyond its own fit.</summary>
    internal Contribution OfCheck(string day) => new(new(SourceKind.Day, day), Size * Math.Sqrt(BeyondFit), Estimate, DegreesOfFreedom * BeyondFit * BeyondFit);

    private static double Beyond(double variance, double explained) => variance > 0 ? Math.Clamp((variance - explained) / variance, LeastBeyondFit, 1) : 1;

    private static double FitVariance(CheckSpan span) => span.Checks.Average(check => check.Fit.Covariance[0]);

    private static double SquaresAboutMean(Items<InstrumentCheck> checks)
    {
        var mean = checks.Average(check => check.Error.X);
        return checks.Sum(check => (check.Error.X - mean) * (check.Error.X - mean));
    }
}
