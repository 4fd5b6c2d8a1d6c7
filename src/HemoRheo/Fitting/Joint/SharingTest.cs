namespace HemoRheo;

/// <summary>Holds a joint fit against fits of each curve alone, with the joint fit's weights in both.</summary>
internal static class SharingTest
{
    /// <summary>A standardized residual of this size is rounding, not a reading.</summary>
    private const double Rounding = 1e-9;

    /// <summary>The test, or why there is none.</summary>
    /// <param name="plan">What was fitted together.</param>
    /// <param name="solution">The joint solution.</param>
    /// <param name="alone">The curves' own fits.</param>
    /// <param name="why">Why there is none; null where there is one, or where nothing is shared.</param>
    public static Compatibility? Of(JointPlan plan, JointSolution solution, IReadOnlyList<FittedLaw> alone, out string? why)
    {
        why = null;
        var (points, parameters, squares, from) = (solution.Residuals.Length, 0, 0.0, 0);
        for (var l = 0; l < alone.Count; l++)
        {
            var label = plan.Curves[l].Label;
            if (!alone[l].Usable)
            {
                why = $"loading {label.Loading} of {label.Sample} alone cannot tell the parameters of {alone[l].Law.Name}";
                return null;
            }

            var single = Alone(alone[l], solution.Deviations.AsSpan(from, plan.Curves[l].Points.Count).ToArray());
            if (!single.End.Converged)
            {
                why = $"loading {label.Loading} of {label.Sample} alone: {single.End.Message}";
                return null;
            }

            parameters += single.Free;
            squares += single.ChiSquare;
            from += plan.Curves[l].Points.Count;
        }

        var fewer = parameters - solution.Free;
        if (fewer <= 0) return null;
        var rise = solution.ChiSquare - squares;
        if (!(rise > Rounding * Rounding * points)) rise = 0;
        if (plan.Errors[0].ScaleKnown) return new(rise, fewer, null, null);
        if (points > parameters) return new(rise, fewer, squares, points - parameters);
        why = $"{points} points and {parameters} parameters of the curves alone leave no degrees of freedom to estimate the size of the errors";
        return null;
    }

    private static JointSolution Alone(FittedLaw fit, double[] deviations)
    {
        var problem = new JointPlan { Curves = [fit.Curve], Laws = [fit.Law], Errors = [fit.Errors], Shared = [] }.ToProblem();
        return JointSolver.Solve(problem, fit.Scaled.ToArray(), deviations);
    }
}
