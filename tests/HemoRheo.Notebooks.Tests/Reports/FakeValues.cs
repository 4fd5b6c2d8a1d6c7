namespace HemoRheo.Notebooks.Tests.Reports;

/// <summary>Invented values, ranges, verdicts and pool.</summary>
internal static class FakeValues
{
    private static readonly double[] Level = [13.2, 6.5, 4.3];
    private static readonly HematocritBasis[] Bases = [HematocritBasis.Native, HematocritBasis.StandardByPlasma, HematocritBasis.StandardBySlope];

    public static ViscosityAtRate[] Rates { get; } = [new(new(1)), new(new(10)), new(new(100))];

    public static Items<SampleValue> Of(string sample, int place, Items<Finding> why) => Bases
        .SelectMany(basis => Rates.Select((rate, i) => new SampleValue(rate, "Casson", basis, Value(sample, Math.Log(Level[i] / 1000) + 0.05 * (place - 4), basis, i), i == 2 ? null : Math.Log(Level[i] / 1000) + 0.05 * (place - 4) + 0.01, why.Count == 0, why)))
        .Append(new(Measurand.CassonYieldStress, "Casson", HematocritBasis.Native, Value(sample, Math.Log(0.004) + 0.1 * place, HematocritBasis.Native, 0), null, why.Count == 0, why))
        .ToItems();

    public static Items<ReferenceRange> Ranges() => new[] { HematocritBasis.StandardByPlasma, HematocritBasis.Native }.SelectMany(basis => Rates.Select((rate, i) => Range(rate, basis, Level[i]))).ToItems();

    public static JudgedValue Judge(SampleValue value, Items<ReferenceRange> ranges, int place)
    {
        var range = ranges.FirstOrDefault(range => range.Measurand == value.Measurand && range.Basis == value.Basis);
        if (range is null) return new(value, null, null, "There is no reference range for this quantity.", false, false);
        if (!value.Decidable) return new(value, range, null, "The value may not be decided on.", false, false);
        return new(value, range, Verdict.Of(value.Value, range.Limits), null, place == 3, place >= 8);
    }

    public static StudyPool Pool() => new(
        [new("Casson", Rates.ToItems<Measurand>(), [new([0.025, 0.018, 0.012], 4.2)], 5, [])],
        [new("Casson", 15, 131.5, 135, 0.57, 0.41, true, "The law describes the curves of this study.")],
        [.. Rates.Select(rate => new HematocritSlope("Casson", rate, 4.6, 0.5, 30, 3.9, 8, null))],
        new(0.31, 0.08, 0.31, 0.08, 0.0004, 15, "Neighboring readings of a ramp are correlated: the residuals of 15 curves say 0.31 ± 0.08."),
        new([new("Casson", LawStanding.NotParted, 15, -812.4, 0, null, 0.9), new("Quemada", LawStanding.NotParted, 15, -808.1, 4.3, 3.9, 0.1)], "These 15 curves cannot tell Casson and Quemada apart."),
        [.. Rates.Select(rate => new LawSpread("Casson", rate, 0.004, 8))],
        []);

    private static ReferenceRange Range(ViscosityAtRate rate, HematocritBasis basis, double level) => new(
        rate, "Casson", basis, Ln(0.88 * level, 1.18 * level), Ln(0.85 * level, 0.91 * level), Ln(1.14 * level, 1.22 * level), "Robust 2.5th and 97.5th percentiles", 24, [new("too-long-since-draw", 1)], [], "CLSI EP28-A3c 2010");

    private static Interval Ln(double lower, double upper) => new(Math.Log(lower / 1000), Math.Log(upper / 1000));

    private static Value Value(string sample, double x, HematocritBasis basis, int rate)
    {
        var size = 1 - 0.25 * rate;
        Contribution[] parts =
        [
            new(new(SourceKind.Fit, $"{sample}/1/0"), 0.009 * size), new(new(SourceKind.Fit, $"{sample}/1/1"), 0.004 * size), new(new(SourceKind.Loading, $"{sample}/1/0"), 0.025 * size, "loading", 4.2),
            new(new(SourceKind.Calibration, "R1/1"), -0.002, "checks R1", 2), new(new(SourceKind.Day, "R1/8"), 0.0035, "checks R1", 2), new(new(SourceKind.Certificate, "LOT"), 0.002), new(new(SourceKind.FluidBeta, "oil"), -0.0004),
            new(new(SourceKind.Thermometer, "R1"), 0.0005), new(new(SourceKind.BloodBeta, ""), 0.00006), new(new(SourceKind.TorqueZero, "R1/8"), 0.006 * size * size),
        ];
        return new(x, basis switch
        {
            HematocritBasis.Native => parts.ToItems(),
            HematocritBasis.StandardByPlasma => [.. parts, new(new(SourceKind.Hematocrit, sample), -0.03 * size), new(new(SourceKind.Counter, "counter A"), -0.009 * size), new(new(SourceKind.Plasma, sample), -0.002)],
            _ => [.. parts, new(new(SourceKind.Hematocrit, sample), -0.028 * size), new(new(SourceKind.Counter, "counter A"), -0.008 * size), new(new(SourceKind.Slope, "Casson"), 0.011, "slope", 30)],
        });
    }
}
