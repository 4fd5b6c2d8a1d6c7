namespace HemoRheo.Tests.Numerics;

/// <summary>The general path against certified values, with its defaults, from both published starts.</summary>
public class CertifiedProblemsTests
{
    private const double ParameterDigits = 8;
    private const double DeviationDigits = 6;

    public static TheoryData<string, int> Cases()
    {
        var cases = new TheoryData<string, int>();
        foreach (var name in (string[])["Misra1a", "Thurber", "MGH09", "Rat43", "BoxBOD"])
        {
            cases.Add(name, 1);
            cases.Add(name, 2);
        }

        return cases;
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void Certified_parameters_and_deviations_are_reached(string name, int start)
    {
        var problem = CertifiedProblem.Read(name);
        double[] from = [.. start == 1 ? problem.Start1 : problem.Start2];

        var solution = LeastSquares.Solve(CertifiedFormulas.Of(name, problem.X), problem.Y, from);

        Assert.True(solution.End.Converged, solution.End.Message);
        var scale = solution.ChiSquare / (problem.Y.Length - from.Length);
        for (var k = 0; k < from.Length; k++)
        {
            var deviation = Math.Sqrt(scale * solution.Inverse[k * from.Length + k]);
            Assert.True(Digits(solution.Parameters[k], problem.Certified[k]) >= ParameterDigits, $"b{k + 1} {solution.Parameters[k]:R}, certified {problem.Certified[k]:R}; {solution.End}");
            Assert.True(Digits(deviation, problem.Deviations[k]) >= DeviationDigits, $"deviation of b{k + 1} {deviation:R}, certified {problem.Deviations[k]:R}");
        }
    }

    private static double Digits(double found, double certified) => -Math.Log10(Math.Max(Math.Abs(found - certified) / Math.Abs(certified), 1e-16));
}
