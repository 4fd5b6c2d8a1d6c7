namespace HemoRheo.Notebooks;

/// <summary>Plain words for what pages, tables and pictures name.</summary>
internal static class Words
{
    public static string Of(InstrumentStatus status) => status.Words();

    public static string Of(InstrumentStanding standing) =>
        standing.Status == InstrumentStatus.InDoubt && standing.Findings.Any(finding => finding.Kind == CalibrationFindings.LastCheckUnsure) ? "the last check could not tell" : Of(standing.Status);

    public static string Of(CheckOutcome outcome) => outcome.Words();

    public static string Of(Outcome outcome) => outcome.Words();

    public static string Of(HematocritBasis basis) => basis.Words();

    public static string Short(HematocritBasis basis) => basis switch
    {
        HematocritBasis.Native => "native",
        HematocritBasis.StandardByPlasma => "std. (plasma)",
        _ => "std. (slope)",
    };

    public static string Of(Severity severity) => severity switch
    {
        Severity.Fault => "fault",
        Severity.Warning => "warning",
        _ => "note",
    };

    public static string Of(Ramp ramp) => ramp.Words();

    public static string Of(StopReason reason) => reason switch
    {
        StopReason.SmallStep => "the step became smaller than the tolerance",
        StopReason.SmallDecrease => "the sum of squares stopped falling",
        StopReason.SmallGradient => "the gradient vanished",
        StopReason.IterationLimit => "the largest number of iterations was reached",
        StopReason.Singular => "the equations had no unique solution",
        _ => "the data cannot be fitted",
    };

    public static string Of(IntervalMethod method) => method switch
    {
        IntervalMethod.Wald => "Wald",
        IntervalMethod.ProfileLikelihood => "profile likelihood",
        IntervalMethod.ParametricBootstrap => "parametric bootstrap",
        _ => "residual bootstrap",
    };

    public static string Of(IntervalKind kind) => kind switch
    {
        IntervalKind.Closed => "closed",
        IntervalKind.AtMost => "at most",
        IntervalKind.AtLeast => "at least",
        IntervalKind.NotIdentifiable => "not identifiable",
        _ => "no answer",
    };

    /// <summary>A quantity with its unit, where it has one.</summary>
    public static string WithUnit(Measurand measurand) => measurand.Shown.Symbol == "1" ? measurand.Name : $"{measurand.Name}, {measurand.Shown.Symbol}";

    /// <summary>The basis whose values a rule makes.</summary>
    public static HematocritBasis Basis(this StandardisingRule rule) => rule == StandardisingRule.StudySlope ? HematocritBasis.StandardBySlope : HematocritBasis.StandardByPlasma;
}
