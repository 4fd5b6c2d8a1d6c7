using System.Globalization;
using HemoRheo.Tests.Numerics;

namespace HemoRheo.Benchmarks;

/// <summary>The certified nonlinear problems of the NIST Statistical Reference Datasets, all from both published starts, with the defaults of the public entry.</summary>
internal static class CertifiedRun
{
    private const double Needed = 8;

    public static IEnumerable<string> Run(string folder)
    {
        yield return "problem    start  digits of parameters  of errors  of sum  iterations  reason";
        int[] reached = [0, 0];
        foreach (var name in CertifiedProblem.Names)
        {
            var problem = CertifiedProblem.Read(folder, name);
            for (var start = 0; start < 2; start++)
            {
                var solution = CertifiedFormulas.Fit(problem, start == 0 ? problem.Start1 : problem.Start2);
                var digits = Fewest(solution.Estimates, problem.Certified);
                if (digits >= Needed && solution.End.Converged) reached[start]++;
                yield return string.Create(
                    CultureInfo.InvariantCulture,
                    $"{name,-10}{start + 1,6}{digits,22:F1}{Fewest(solution.StandardErrors, problem.Deviations),11:F1}{CertifiedProblem.Digits(solution.ChiSquare, problem.SumOfSquares),8:F1}{solution.End.Iterations,12}  {solution.End.Reason}: {solution.End.Message}");
            }
        }

        yield return $"start 1: {reached[0]}/{CertifiedProblem.Names.Count} start 2: {reached[1]}/{CertifiedProblem.Names.Count} at 8 digits or more";
    }

    private static double Fewest(IReadOnlyList<double> found, IReadOnlyList<double> certified) => found.Zip(certified, CertifiedProblem.Digits).Min();
}
