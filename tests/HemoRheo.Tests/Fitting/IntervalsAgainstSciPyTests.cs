namespace HemoRheo.Tests.Fitting;

/// <summary>Limits of parameters and derived viscosities against constrained optimization in SciPy.</summary>
public class IntervalsAgainstSciPyTests
{
    private const double SixDigits = 1e-8;

    public static TheoryData<string, string, string> Cases => [.. from sample in new[] { "A-001/1", "A-001/2", "A-002/1" } from law in new[] { "Casson", "Quemada" } from scale in new[] { "known", "estimated" } select (sample, law, scale)];

    [Theory]
    [MemberData(nameof(Cases))]
    public void Profile_and_Wald_limits_agree(string curve, string law, string scale)
    {
        var errors = WeightedFits.Errors with { ScaleKnown = scale == "known" };
        var fit = WeightedFits.Curves[curve].Fit(FlowLaw.Named(law), errors);
        var rows = ReferenceTable.Read("intervals", "profile-limits.scipy.csv").Where(row => $"{row["sample"]}/{row["loading"]}" == curve && row["law"] == law && row["scale"] == scale).ToArray();
        Assert.NotEmpty(rows);
        foreach (var row in rows)
        {
            Agrees(row, "profile", Ask(fit, row["quantity"], IntervalMethod.ProfileLikelihood));
            Agrees(row, "wald", Ask(fit, row["quantity"], IntervalMethod.Wald));
        }
    }

    private static FitInterval Ask(FittedLaw fit, string quantity, IntervalMethod method) => quantity.StartsWith("viscosity at", StringComparison.Ordinal)
        ? fit.Interval(Measurand.Viscosity(ShearRate.FromReciprocalSeconds(double.Parse(quantity.Split(' ')[2], System.Globalization.CultureInfo.InvariantCulture))), 0.95, method)
        : fit.Interval(quantity, 0.95, method);

    private static void Agrees(IReadOnlyDictionary<string, string> row, string method, FitInterval interval)
    {
        Assert.Equal(IntervalKind.Closed, interval.Kind);
        foreach (var (side, limit) in new[] { ("lower", interval.Lower), ("upper", interval.Upper) })
        {
            var expected = row.Number($"{method}_{side}");
            Assert.True(Math.Abs(limit!.Value / expected - 1) <= SixDigits, $"{row["quantity"]}, {method} {side}: {limit} instead of {expected}");
        }
    }
}
