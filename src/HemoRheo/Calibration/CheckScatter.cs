namespace HemoRheo;

/// <summary>The standard deviation of one check's ln error about its period's mean.</summary>
/// <param name="Size">The standard deviation.</param>
/// <param name="DegreesOfFreedom">Its degrees of freedom; infinite where declared.</param>
/// <param name="Estimate">Its name as contributions carry it.</param>
internal sealed record CheckScatter(double Size, double DegreesOfFreedom, string Estimate)
{
    /// <summary>Pooled over periods; the declared one where the checks have no degrees of freedom; null where there is neither.</summary>
    internal static CheckScatter? Of(Instrument instrument, IReadOnlyList<CheckSpan> spans)
    {
        var estimate = $"checks of {instrument.Name}";
        var df = spans.Sum(span => span.Checks.Count - 1);
        if (df == 0) return instrument.CheckScatter is { } declared ? new(declared, double.PositiveInfinity, estimate) : null;
        var squares = spans.Sum(span =>
        {
            var mean = span.Checks.Average(check => check.Error.X);
            return span.Checks.Sum(check => (check.Error.X - mean) * (check.Error.X - mean));
        });
        return new(Math.Sqrt(squares / df), df, estimate);
    }

    /// <summary>As a part of a value that holds one check's or one day's scatter times a factor.</summary>
    internal Contribution As(SourceKind kind, string of, double factor = 1) => new(new(kind, of), factor * Size, Estimate, DegreesOfFreedom);
}
