using System.Globalization;
using MathNet.Numerics;

namespace HemoRheo;

/// <summary>From a plan to a <see cref="JointFit"/> with its findings.</summary>
internal static class JointReport
{
    /// <summary>Largest standard error on a logarithmic fitting scale, as for fits of one curve.</summary>
    private const double LargestScaledError = 10;

    /// <summary>Fits what is planned; curves that cannot take part are left out with a finding.</summary>
    public static JointFit Of(JointPlan whole)
    {
        var everyone = whole.Curves.Select((curve, i) => Fits.OfAll([curve], whole.Alone ?? whole.Laws[i], whole.Errors[i])[0]).ToArray();
        int[] members = [.. Enumerable.Range(0, everyone.Length).Where(i => CanTakePart(everyone[i], whole.OwnParameters))];
        var findings = Enumerable.Range(0, everyone.Length).Except(members).Select(i => LeftOut(everyone[i])).ToList();
        if (members.Length < 2) return Refused(whole, findings, FittingFindings.TooFewCurves.At(Where.Nowhere, $"{members.Length} of {everyone.Length} curves are left; a joint fit needs two.", members.Length, 2));
        var plan = whole.Of(members);
        FittedLaw[] alone = [.. members.Select(i => everyone[i])];
        try
        {
            var problem = plan.ToProblem();
            return Told(plan, problem, JointStarts.Solve(problem, plan.Alone is null ? alone : null), alone, findings);
        }
        catch (Exception thrown) when (plan.Laws.Any(law => law is UserLaw))
        {
            return Refused(plan, findings, FittingFindings.LawFailed.At(Where.Nowhere, $"{plan.Laws[0].Name} throws: {thrown.Message}."));
        }
    }

    private static JointFit Refused(JointPlan plan, List<Finding> findings, Finding fault) => new(
        plan.Laws.ToItems(), plan.Curves.ToItems(), plan.Errors.ToItems(), new(StopReason.BadData, 0, fault.Message), [], [], [], [], [], [], new(0, 0, null), null, findings.Append(fault).ToItems());

    private static JointFit Told(JointPlan plan, JointProblem problem, JointSolution solution, FittedLaw[] alone, List<Finding> findings)
    {
        var (known, degrees) = (plan.Errors[0].ScaleKnown, problem.Points - solution.Free);
        var why = solution.End.Converged && degrees == 0 && !known ? "no degrees of freedom left to estimate the size of the errors" : "no covariance: the fit found no minimum";
        var unknowns = new JointUnknowns(problem, solution);
        double[] covariance = solution.End.Converged && solution.Inverse().All(double.IsFinite) && (known || degrees > 0)
            ? unknowns.Covariance(known ? 1 : solution.ChiSquare / degrees)
            : [];
        var fit = new JointFit(
            plan.Laws.ToItems(),
            plan.Curves.ToItems(),
            plan.Errors.ToItems(),
            solution.End,
            unknowns.Parameters(covariance, why).ToItems(),
            unknowns.Expanded(solution.Scaled).ToItems(),
            covariance.ToItems(),
            unknowns.Expanded(solution.Response(_ => 1)).ToItems(),
            unknowns.Expanded(solution.Response(i => solution.Fitted[i])).ToItems(),
            Residuals(problem, solution).ToItems(),
            new(solution.ChiSquare, degrees, known && degrees > 0 ? SpecialFunctions.GammaUpperRegularized(0.5 * degrees, 0.5 * solution.ChiSquare) : null),
            null,
            []);
        findings.AddRange(Endings(fit));
        findings.AddRange(unknowns.AtBounds(fit));
        if (fit.Covariance.Count > 0 && solution.End.Converged)
        {
            fit = fit with { Compatibility = SharingTest.Of(plan, solution, alone, out var untested) };
            if (untested is not null) findings.Add(FittingFindings.SharingNotTested.At(fit.Where, $"{fit.LawName}: {untested}."));
            if (fit.Compatibility is { Contradicts: true } contradicted) findings.Add(FittingFindings.SharedContradicted.At(fit.Where, $"{fit.LawName}: against fits of each curve alone {contradicted}.", contradicted.Probability, LackOfFit.SmallestProbability));
        }

        return fit with { Findings = findings.ToItems() };
    }

    private static IEnumerable<Finding> Endings(JointFit fit)
    {
        if (fit.Convergence.Reason is StopReason.Singular) yield return FittingFindings.NotIdentifiable.At(fit.Where, $"{fit.LawName}: {fit.Convergence.Message}.");
        else if (!fit.Convergence.Converged) yield return FittingFindings.NotConverged.At(fit.Where, $"{fit.LawName}: {fit.Convergence.Message}.");
        if (!fit.Errors[0].ScaleKnown && fit.Fit.DegreesOfFreedom <= 0) yield return FittingFindings.NoScale.At(fit.Where, "As many points as free parameters: no degrees of freedom left to estimate the size of the errors.", fit.Fit.DegreesOfFreedom, 1);
        if (fit.Fit.Contradicts)
        {
            yield return FittingFindings.LackOfFit.At(
                fit.Where,
                string.Create(CultureInfo.InvariantCulture, $"{fit.LawName}, {fit.Curves.Count} curves together: chi-square {fit.Fit.ChiSquare:F1} on {fit.Fit.DegreesOfFreedom} degrees of freedom, probability {fit.Fit.Probability:G2} if the law and the declared errors are right."),
                fit.Fit.Probability,
                LackOfFit.SmallestProbability);
        }

        var size = fit.Parameters.Count;
        for (var k = 0; k * size < fit.Covariance.Count; k++)
        {
            var (number, error) = (fit.Parameters[k].Number, Math.Sqrt(fit.Covariance[k * size + k]));
            if (number.AtBound || double.IsInfinity(number.Parameter.Lower) || error <= LargestScaledError) continue;
            yield return FittingFindings.NotIdentifiable.At(fit.Where, string.Create(CultureInfo.InvariantCulture, $"{fit.LawName}: the curves say nothing of {number.Parameter.Name}, whose standard error on the fitting scale is {error:G2}, more than {LargestScaledError}."), error, LargestScaledError);
            break;
        }
    }

    private static IEnumerable<Items<double>> Residuals(JointProblem problem, JointSolution solution)
    {
        var from = 0;
        foreach (var curve in problem.Curves)
        {
            yield return solution.Residuals.Skip(from).Take(curve.Points).ToItems();
            from += curve.Points;
        }
    }

    /// <summary>Whether the curve's numbers can be fitted, and its different rates are enough for what is its own.</summary>
    private static bool CanTakePart(FittedLaw alone, int ownParameters) =>
        alone.Convergence.Reason is not StopReason.BadData ||
        (alone.Findings is [{ } only] && only.Kind == FittingFindings.TooFewPoints && only.Observed >= Math.Max(1, ownParameters));

    private static Finding LeftOut(FittedLaw alone) =>
        FittingFindings.CurveLeftOut.At(alone.Curve.Label.Where, $"Loading {alone.Curve.Label.Loading} of {alone.Curve.Label.Sample} took no part: {alone.Convergence.Message}");
}
