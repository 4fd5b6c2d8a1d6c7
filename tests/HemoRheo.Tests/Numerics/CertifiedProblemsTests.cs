namespace HemoRheo.Tests.Numerics;

/// <summary>The public least-squares entry against certified values, with its defaults, on all 27 problems from both published starts.</summary>
public class CertifiedProblemsTests
{
    private const double ParameterDigits = 8;
    private const double DeviationDigits = 6;
    private const double SumDigits = 8;

    /// <summary>Lanczos1 is generated data: its sum of squares, 1.4e-25, is of residuals a few hundred times the rounding of doubles.</summary>
    private const double LanczosDigits = 3;

    public static TheoryData<string, int> Cases()
    {
        var cases = new TheoryData<string, int>();
        foreach (var name in CertifiedProblem.Names)
        {
            cases.Add(name, 1);
            cases.Add(name, 2);
        }

        return cases;
    }

    [Fact]
    public void There_are_27_problems() => Assert.Equal(27, CertifiedProblem.Names.Distinct().Count());

    [Theory]
    [MemberData(nameof(Cases))]
    public void Certified_parameters_deviations_and_sums_are_reached(string name, int start)
    {
        var problem = CertifiedProblem.Read(Repository.Reference("nist-strd"), name);

        var solution = CertifiedFormulas.Fit(problem, start == 1 ? problem.Start1 : problem.Start2);

        Assert.True(solution.End.Converged, solution.End.Message);
        Assert.Equal(problem.Certified.Count, solution.Estimates.Count);
        for (var k = 0; k < solution.Estimates.Count; k++)
        {
            Reached(name == "Lanczos1" ? LanczosDigits : DeviationDigits, solution.StandardErrors[k], problem.Deviations[k], $"deviation of b{k + 1}");
            Reached(ParameterDigits, solution.Estimates[k], problem.Certified[k], $"b{k + 1}");
        }

        if (name == "Lanczos1") Assert.Equal(Rounded(problem.SumOfSquares), Rounded(solution.ChiSquare));
        else Reached(SumDigits, solution.ChiSquare, problem.SumOfSquares, "sum of squares");
    }

    private static void Reached(double digits, double found, double certified, string what) =>
        Assert.True(CertifiedProblem.Digits(found, certified) >= digits, $"{what} {found:R}, certified {certified:R}");

    /// <summary>Three significant digits.</summary>
    private static string Rounded(double value) => value.ToString("E2", System.Globalization.CultureInfo.InvariantCulture);
}
