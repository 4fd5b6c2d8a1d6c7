namespace HemoRheo;

/// <summary>Finds what would decide a check, of its budget.</summary>
internal static class CheckNeeds
{
    private const int MostReadings = 1000;
    private const int MostFillings = 100;

    internal static CheckNeed Of(Value error, int readings, Interval limits, double level)
    {
        double? Factor(params SourceKind[] kinds) => NeededPrecision.Factor(error, limits, level, source => kinds.Contains(source.Kind));
        var certificate = error.Part(SourceKind.Certificate) is { } part ? Factor(SourceKind.Certificate) * Math.Abs(part) * 2 : null;
        return new(
            More(readings, Factor(SourceKind.Fit), MostReadings),
            More(1, Factor(SourceKind.Fit, SourceKind.Day), MostFillings),
            certificate > 0 ? certificate : null,
            error.Parts.Where(own => own.Source.Kind is not (SourceKind.Fit or SourceKind.Day))
                .GroupBy(own => own.Source.Kind)
                .OrderByDescending(kind => kind.Sum(own => own.Amount * own.Amount))
                .Where(kind => Verdict.Of(error.Only(source => source.Kind == kind.Key), limits, level).Outcome == Outcome.Undecided)
                .Select(kind => (SourceKind?)kind.Key)
                .FirstOrDefault());
    }

    // The mean of n falls with the root of n; one part in a billion for the end of the search.
    private static int? More(int now, double? factor, int most)
    {
        if (factor is not > 0) return null;
        var needed = Math.Ceiling(now / (factor.Value * factor.Value) * (1 - 1e-9)) - now;
        return needed <= most ? (int)needed : null;
    }
}
