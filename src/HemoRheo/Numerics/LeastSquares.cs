using System.Globalization;

namespace HemoRheo;

/// <summary>The general path: any model, any number of parameters and predictors, by QR, with gain-ratio damping, scaling, and undamped steps to finish while they still improve.</summary>
/// <remarks>Source: Moré 1978, Lecture Notes in Mathematics 630:105-116 (scaling); Nielsen 1999, IMM-REP-1999-05 (damping).</remarks>
internal static class LeastSquares
{
    private const int IterationLimit = 2000;
    private const int FinishingLimit = 60;
    private const double StepLimit = 1e-12;
    private const double SmallestPivot = 1e-13;

    /// <summary>Strong at first: a start far off is left by short steps, which a long one may overshoot into a plain without descent.</summary>
    private const double FirstDamping = 100;

    /// <summary>Fits a model. Variance of a datum: (relative * model)^2 + floor^2 at the fitted model; the defaults are ordinary least squares.</summary>
    public static LeastSquaresSolution Solve(PointModel model, ReadOnlySpan<double> data, ReadOnlySpan<double> start, double relative = 0, double floor = 1)
    {
        var state = new LeastSquaresState(model, data.ToArray(), start.ToArray(), relative, floor);
        if (!state.IsFinite)
        {
            return state.Solved(new(StopReason.BadData, 0, "the model is not finite at the start"));
        }

        var (iterations, reached) = Descend(state);
        var (finishing, step, pivot) = Finish(state);
        iterations += finishing;
        var end = pivot < SmallestPivot ? Ended(StopReason.Singular, iterations, $"the equations have no unique solution: smallest pivot {pivot:G2}, at least {SmallestPivot:G2}")
            : step <= StepLimit ? Ended(StopReason.SmallStep, iterations, $"relative step {step:G2}, at most {StepLimit:G2}")
            : step <= 1e-7 ? Ended(StopReason.SmallDecrease, iterations, $"steps no longer fall: relative step {step:G2}")
            : reached ? Ended(StopReason.IterationLimit, iterations, $"no descent from here, but relative step {step:G2}, more than {StepLimit:G2}")
            : Ended(StopReason.IterationLimit, iterations, $"{iterations} iterations, relative step {step:G2}, more than {StepLimit:G2}");
        return state.Solved(end);
    }

    private static Convergence Ended(StopReason reason, int iterations, FormattableString message) => new(reason, iterations, message.ToString(CultureInfo.InvariantCulture));

    /// <summary>Damped steps, each accepted only if the sum of squares falls as the linear model foretells.</summary>
    private static (int Iterations, bool Reached) Descend(LeastSquaresState state)
    {
        var (damping, growth) = (FirstDamping, 2.0);
        for (var iteration = 1; iteration <= IterationLimit; iteration++)
        {
            var step = state.Step(damping);
            var relative = state.RelativeLength(step);
            var predicted = state.Predicted(step);
            if (relative <= StepLimit || predicted <= 1e-15 * state.ChiSquare) return (iteration, true);
            var gain = state.Try(step) / predicted;
            if (gain > 1e-4)
            {
                state.Accept();
                damping *= Math.Max(0.1, 1 - Math.Pow(2 * gain - 1, 3));
                growth = 2;
            }
            else
            {
                damping *= growth;
                growth *= 2;
            }
        }

        return (IterationLimit, false);
    }

    /// <summary>Undamped steps while they get smaller. Near the minimum the sum of squares is too flat to judge by.</summary>
    private static (int Iterations, double Step, double Pivot) Finish(LeastSquaresState state)
    {
        var last = double.PositiveInfinity;
        for (var iteration = 1; ; iteration++)
        {
            var step = state.Step(0);
            var length = state.RelativeLength(step);
            var worse = !(length < 0.9 * last) || (iteration == 1 && length > 1e-3);
            if (worse || iteration == FinishingLimit || length == 0) return (iteration - 1, Math.Min(length, last), state.LeastPivot);
            if (double.IsNaN(state.Try(step))) return (iteration - 1, length, state.LeastPivot);
            state.Accept();
            last = length;
        }
    }
}
