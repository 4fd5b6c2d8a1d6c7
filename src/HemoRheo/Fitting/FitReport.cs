using System.Globalization;
using MathNet.Numerics;

namespace HemoRheo;

/// <summary>From the numbers of a solved curve to a <see cref="FittedLaw"/> with its findings.</summary>
internal static class FitReport
{
    private const double LackOfFitLevel = 0.001;

    /// <summary>Largest standard error on the fitting scale: a factor of 22,000 either way for a positive parameter. One that may end at its bound is not asked.</summary>
    private const double LargestScaledError = 10;

    /// <summary>A curve that could not be fitted at all.</summary>
    public static FittedLaw Unfitted(FlowLaw law, FlowCurve curve, ErrorModel errors, Finding fault) =>
        new(law, curve, errors, new(StopReason.BadData, 0, fault.Message), [], [], [], [], [], new(0, 0, null), [fault]);

    /// <summary>A curve that was fitted, well or badly.</summary>
    public static FittedLaw Of(FlowLaw law, FlowCurve curve, ErrorModel errors, CurveSolution solution)
    {
        var where = curve.Label.Where;
        var free = solution.Scaled.Length - (solution.Held is null ? 0 : 1);
        var degrees = solution.Residuals.Length - free;
        var fit = new LackOfFit(solution.ChiSquare, degrees, errors.ScaleKnown && degrees > 0 ? SpecialFunctions.GammaUpperRegularized(0.5 * degrees, 0.5 * solution.ChiSquare) : null);
        var findings = new List<Finding>();
        if (solution.End.Reason is StopReason.Singular)
        {
            findings.Add(FittingFindings.NotIdentifiable.At(where, $"{law.Name}: {solution.End.Message}."));
        }
        else if (!solution.End.Converged)
        {
            findings.Add(FittingFindings.NotConverged.At(where, $"{law.Name}: {solution.End.Message}."));
        }

        if (solution.Held is { } held)
        {
            findings.Add(FittingFindings.Boundary.At(where, BoundaryWords(law, held)));
        }

        if (!errors.ScaleKnown && degrees == 0)
        {
            findings.Add(FittingFindings.NoScale.At(where, $"{solution.Residuals.Length} points, {free} parameters: no degrees of freedom left to estimate the size of the errors.", 0, 1));
        }

        if (fit.Probability < LackOfFitLevel)
        {
            findings.Add(FittingFindings.LackOfFit.At(where, LackWords(law, fit), fit.Probability, LackOfFitLevel));
        }

        var covariance = Covariance(errors, solution, degrees);
        if (Loose(law, covariance) is { } loose)
        {
            var error = Math.Sqrt(covariance[loose * solution.Scaled.Length + loose]);
            findings.Add(FittingFindings.NotIdentifiable.At(where, LooseWords(law, loose, error), error, LargestScaledError));
        }

        return new(
            law,
            curve,
            errors,
            solution.End,
            Parameters(law, solution, covariance, WhyNone(solution, degrees)).ToItems(),
            solution.Scaled.ToItems(),
            covariance.ToItems(),
            solution.Response.ToItems(),
            solution.Residuals.ToItems(),
            fit,
            findings.ToItems());
    }

    /// <summary>A parameter of which the curve says nothing.</summary>
    private static int? Loose(FlowLaw law, double[] covariance)
    {
        var size = law.Parameters.Count;
        for (var k = 0; k * size < covariance.Length; k++)
        {
            if (k != law.Boundary?.Parameter && !(Math.Sqrt(covariance[k * size + k]) <= LargestScaledError)) return k;
        }

        return null;
    }

    private static string LooseWords(FlowLaw law, int loose, double error) => string.Create(
        CultureInfo.InvariantCulture,
        $"{law.Name}: the curve says nothing of {law.Parameters[loose].Name}, whose standard error on the fitting scale is {error:G2}, more than {LargestScaledError}.");

    private static string BoundaryWords(FlowLaw law, int held) => string.Create(
        CultureInfo.InvariantCulture,
        $"{law.Name} at its boundary, {law.Parameters[held].Name} = {law.Parameters[held].Lower:G3}: {law.Boundary!.Law} describes this curve.");

    private static string LackWords(FlowLaw law, LackOfFit fit) => string.Create(
        CultureInfo.InvariantCulture,
        $"{law.Name}: chi-square {fit.ChiSquare:F1} on {fit.DegreesOfFreedom} degrees of freedom, probability {fit.Probability:G2} if the law and the declared errors are right.");

    private static double[] Covariance(ErrorModel errors, CurveSolution solution, int degrees)
    {
        if (!solution.End.Converged || !solution.Inverse.All(double.IsFinite)) return [];
        if (errors.ScaleKnown) return solution.Inverse;
        return degrees == 0 ? [] : [.. solution.Inverse.Select(x => x * (solution.ChiSquare / degrees))];
    }

    private static string WhyNone(CurveSolution solution, int degrees) =>
        solution.End.Converged && degrees == 0 ? "no degrees of freedom left to estimate the size of the errors" : $"no covariance: {solution.End.Message}";

    private static IEnumerable<FittedParameter> Parameters(FlowLaw law, CurveSolution solution, double[] covariance, string whyNone)
    {
        var size = solution.Scaled.Length;
        for (var k = 0; k < size; k++)
        {
            var parameter = law.Parameters[k];
            var natural = parameter.ToNatural(new Lane(solution.Scaled[k]));
            var slope = parameter.SlopeOf(natural)[0];
            var why = solution.Held == k ? "held at its bound" : covariance.Length == 0 ? whyNone : null;
            yield return new(parameter, natural[0], why is null ? slope * Math.Sqrt(covariance[k * size + k]) : null, why, solution.Held == k);
        }
    }
}
