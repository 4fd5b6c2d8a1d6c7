using System.Globalization;

namespace HemoRheo;

/// <summary>From the numbers of a solved curve to a <see cref="FittedLaw"/> with its findings.</summary>
internal static class FitReport
{
    /// <summary>Largest standard error on the fitting scale: a factor of 22,000 either way for a positive parameter. One that may end at its bound is not asked.</summary>
    private const double LargestScaledError = 10;

    /// <summary>A curve that could not be fitted at all.</summary>
    public static FittedLaw Unfitted(FlowLaw law, FlowCurve curve, ErrorModel errors, Finding fault) =>
        new(law, curve, errors, new(StopReason.BadData, 0, fault.Message), [], [], [], [], [], new(0, 0, null), [fault]);

    /// <summary>A curve that was fitted, well or badly.</summary>
    public static FittedLaw Of(FlowLaw law, FlowCurve curve, ErrorModel errors, CurveSolution solution)
    {
        var free = solution.Scaled.Length - (solution.Held is null ? 0 : 1);
        var degrees = solution.Residuals.Length - free;
        var lack = new LackOfFit(solution.ChiSquare, degrees, errors.ScaleKnown && degrees > 0 ? SquaresDistribution.Independent(degrees).ProbabilityAbove(solution.ChiSquare) : null);
        var covariance = Covariance(errors, solution, degrees);
        var fit = new FittedLaw(
            law,
            curve,
            errors,
            solution.End,
            Parameters(law, solution.Scaled, covariance, solution.Held, WhyNone(solution, degrees)).ToItems(),
            solution.Scaled.ToItems(),
            covariance.ToItems(),
            solution.Response.ToItems(),
            solution.Residuals.ToItems(),
            lack,
            []);
        return fit with { Findings = Findings(fit).ToItems() };
    }

    /// <summary>The same fit for the correlation of readings it carries.</summary>
    public static FittedLaw Correlated(FittedLaw fit)
    {
        if (WeightedDesign.Of(fit) is not { } design) return fit;
        var spread = CorrelationSpread.Of(fit.Correlation, fit.CorrelationError);
        var lack = Lack(fit, [.. spread.Select(node => (node.Weight, design.Squares(node.Correlation)))]);
        var scale = fit.Errors.ScaleKnown ? 1 : lack.ChiSquare / lack.Expected;
        var covariance = new double[fit.Covariance.Count];
        foreach (var (weight, correlation) in spread)
        {
            var one = design.Covariance(correlation);
            for (var k = 0; k < covariance.Length; k++) covariance[k] += weight * scale * one[k];
        }

        int? held = Enumerable.Range(0, fit.Parameters.Count).Where(k => fit.Parameters[k].AtBound).Select(k => (int?)k).FirstOrDefault();
        var correlated = fit with { Covariance = covariance.ToItems(), Parameters = Parameters(fit.Law, fit.Scaled, covariance, held, "").ToItems(), Fit = lack };
        return correlated with { Findings = [.. Findings(correlated), .. fit.Findings.Where(finding => finding.Kind == FittingFindings.StartDecides || finding.Kind == FittingFindings.SeveralMinima)] };
    }

    private static LackOfFit Lack(FittedLaw fit, (double Weight, SquaresDistribution Squares)[] spread)
    {
        var (chiSquare, degrees) = (fit.Fit.ChiSquare, fit.Fit.DegreesOfFreedom);
        if (degrees == 0) return fit.Fit;
        var expected = spread.Sum(node => node.Weight * node.Squares.First);
        var halfVariance = spread.Sum(node => node.Weight * (node.Squares.Second + 0.5 * (node.Squares.First - expected) * (node.Squares.First - expected)));
        return new(chiSquare, degrees, fit.Errors.ScaleKnown ? spread.Sum(node => node.Weight * node.Squares.ProbabilityAbove(chiSquare)) : null)
        {
            Expected = expected,
            EffectiveDegreesOfFreedom = expected * expected / halfVariance,
        };
    }

    private static IEnumerable<Finding> Findings(FittedLaw fit)
    {
        var (law, where) = (fit.Law, fit.Curve.Label.Where);
        if (fit.Convergence.Reason is StopReason.Singular)
        {
            yield return FittingFindings.NotIdentifiable.At(where, $"{law.Name}: {fit.Convergence.Message}.");
        }
        else if (!fit.Convergence.Converged)
        {
            yield return FittingFindings.NotConverged.At(where, $"{law.Name}: {fit.Convergence.Message}.");
        }

        if (fit.Curve.Label.Recording is null && 2 * Math.Max(fit.Curve.Points.Count(PlausibleViscosity.IsBelow), fit.Curve.Points.Count(PlausibleViscosity.IsAbove)) > fit.Curve.Points.Count)
        {
            yield return FittingFindings.NotLikeBlood.At(where, string.Create(CultureInfo.InvariantCulture, $"At {fit.Curve.Points[0].Rate} the viscosity is {fit.Curve.Points[0].ApparentViscosity.MillipascalSeconds:G4} mPa.s."));
        }

        for (var k = 0; k < fit.Parameters.Count; k++)
        {
            if (fit.Parameters[k].AtBound) yield return FittingFindings.Boundary.At(where, BoundaryWords(law, k));
        }

        if (!fit.Errors.ScaleKnown && fit.Fit.DegreesOfFreedom == 0)
        {
            yield return FittingFindings.NoScale.At(where, $"{fit.Residuals.Count} points, {fit.Residuals.Count} parameters: no degrees of freedom left to estimate the size of the errors.", 0, 1);
        }

        if (fit.Fit.Contradicts)
        {
            yield return FittingFindings.LackOfFit.At(where, LackWords(law, fit.Fit), fit.Fit.Probability, LackOfFit.SmallestProbability);
        }

        if (Loose(law, fit.Covariance) is { } loose)
        {
            var error = Math.Sqrt(fit.Covariance[loose * fit.Scaled.Count + loose]);
            yield return FittingFindings.NotIdentifiable.At(where, LooseWords(law, loose, error), error, LargestScaledError);
        }
    }

    /// <summary>A parameter of which the curve says nothing.</summary>
    private static int? Loose(FlowLaw law, Items<double> covariance)
    {
        var size = law.Parameters.Count;
        for (var k = 0; k * size < covariance.Count; k++)
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
        $"{law.Name}: chi-square {fit.ChiSquare:F1} on {fit.DegreesOfFreedom} degrees of freedom{(fit.Expected < fit.DegreesOfFreedom ? FormattableString.Invariant($" ({fit.Expected:F1} to be expected of correlated readings)") : "")}, probability {fit.Probability:G2} if the law and the declared errors are right.");

    private static double[] Covariance(ErrorModel errors, CurveSolution solution, int degrees)
    {
        if (!solution.End.Converged || !solution.Inverse.All(double.IsFinite)) return [];
        if (errors.ScaleKnown) return solution.Inverse;
        return degrees == 0 ? [] : [.. solution.Inverse.Select(x => x * (solution.ChiSquare / degrees))];
    }

    private static string WhyNone(CurveSolution solution, int degrees) =>
        solution.End.Converged && degrees == 0 ? "no degrees of freedom left to estimate the size of the errors" : $"no covariance: {solution.End.Message}";

    private static IEnumerable<FittedParameter> Parameters(FlowLaw law, IReadOnlyList<double> scaled, double[] covariance, int? held, string whyNone)
    {
        var size = scaled.Count;
        for (var k = 0; k < size; k++)
        {
            var parameter = law.Parameters[k];
            var natural = parameter.ToNatural(new Lane(scaled[k]));
            var slope = parameter.SlopeOf(natural)[0];
            var why = held == k ? "held at its bound" : covariance.Length == 0 ? whyNone : null;
            yield return new(parameter, natural[0], why is null ? slope * Math.Sqrt(covariance[k * size + k]) : null, why, held == k);
        }
    }
}
