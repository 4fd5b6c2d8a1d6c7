using System.Globalization;

namespace HemoRheo;

/// <summary>The general path: any model, any number of parameters and predictors, by QR, with gain-ratio damping, scaling, steps bent by the second order, and undamped steps to finish while they still improve.</summary>
/// <remarks>Source: Moré 1978, Lecture Notes in Mathematics 630:105-116 (scaling); Nielsen 1999, IMM-REP-1999-05 (damping); Transtrum and Sethna 2012, arXiv:1201.5885 (bent steps, steps along a valley).</remarks>
public static class LeastSquares
{
    private const int IterationLimit = 2000;
    private const int FinishingLimit = 60;
    private const double StepLimit = 1e-12;
    private const double SmallestPivot = 1e-13;

    /// <summary>So many weakly damped steps in a row that promise next to no decrease of the sum of squares lead nowhere: a parameter runs off along a plain. The undamped steps then say whether there is a minimum.</summary>
    private const int IdleLimit = 8;

    private const double WeakDamping = 1e-2;
    private const double LeastDecrease = 1e-6;

    /// <summary>Strong at first: a start far off is left by short steps, which a long one may overshoot into a plain without descent.</summary>
    private const double FirstDamping = 100;

    /// <summary>Fits a formula of any number of parameters and predictors by ordinary least squares, its slopes exact.</summary>
    /// <typeparam name="TFormula">The formula, a readonly struct.</typeparam>
    /// <param name="formula">The formula.</param>
    /// <param name="data">What is to be fitted, point by point.</param>
    /// <param name="start">Where the parameters start.</param>
    /// <param name="predictors">One list a predictor, point by point.</param>
    /// <returns>The solution with the reason for its end; one that did not converge says so.</returns>
    /// <exception cref="ArgumentException">There is no predictor, a list has another length than the data, or there are fewer points than parameters.</exception>
    public static LeastSquaresSolution Fit<TFormula>(TFormula formula, ReadOnlySpan<double> data, ReadOnlySpan<double> start, params double[][] predictors) where TFormula : struct, IModelFormula
    {
        ArgumentNullException.ThrowIfNull(predictors);
        if (predictors.Length == 0) throw new ArgumentException("A model needs at least one predictor.", nameof(predictors));
        foreach (var list in predictors)
        {
            if (list.Length != data.Length) throw new ArgumentException($"A predictor has {list.Length} points and the data {data.Length}; each needs one a point.", nameof(predictors));
        }

        if (start.Length == 0 || data.Length < start.Length) throw new ArgumentException($"{data.Length} points cannot tell {start.Length} parameters.", nameof(start));
        return Solve(new FormulaModel<TFormula>(formula, predictors).Evaluate, data, start);
    }

    /// <summary>Fits a model. Variance of a datum: (relative * model)^2 + floor^2 at the fitted model, or the square of a given deviation; the defaults are ordinary least squares.</summary>
    internal static LeastSquaresSolution Solve(PointModel model, ReadOnlySpan<double> data, ReadOnlySpan<double> start, double relative = 0, double floor = 1, double[]? deviations = null, int limit = IterationLimit)
    {
        var state = new LeastSquaresState(model, data.ToArray(), start.ToArray(), relative, floor, deviations);
        if (!state.IsFinite)
        {
            return state.Solved(new(StopReason.BadData, 0, "the model is not finite at the start"));
        }

        var (iterations, reached) = Descend(state, limit);
        var (finishing, step, pivot) = Finish(state);
        iterations += finishing;
        var end = pivot < SmallestPivot ? Ended(StopReason.Singular, iterations, $"the equations have no unique solution: smallest pivot {pivot:G2}, at least {SmallestPivot:G2}")
            : step <= StepLimit ? Ended(StopReason.SmallStep, iterations, $"relative step {step:G2}, at most {StepLimit:G2}")
            : step <= 1e-7 ? Ended(StopReason.SmallDecrease, iterations, $"steps no longer fall: relative step {step:G2}")
            : reached ? Ended(StopReason.Singular, iterations, $"the sum of squares is flat: it no longer falls, yet the undamped step is {step:G2} of a parameter")
            : Ended(StopReason.IterationLimit, iterations, $"{iterations} iterations, relative step {step:G2}, more than {StepLimit:G2}");
        return state.Solved(end);
    }

    private static Convergence Ended(StopReason reason, int iterations, FormattableString message) => new(reason, iterations, message.ToString(CultureInfo.InvariantCulture));

    /// <summary>Damped steps, bent along the curve of the model; each accepted if the sum of squares falls as the linear model foretells, or if it follows a valley.</summary>
    private static (int Iterations, bool Reached) Descend(LeastSquaresState state, int limit)
    {
        var (damping, growth) = (FirstDamping, 2.0);
        var idle = 0;
        var halfway = double.PositiveInfinity;
        for (var iteration = 1; iteration <= limit; iteration++)
        {
            if (iteration == limit / 2) halfway = state.ChiSquare;
            var step = state.Step(damping);
            var relative = state.RelativeLength(step);
            var predicted = state.Predicted(step);
            if (relative <= StepLimit || predicted <= 1e-15 * state.ChiSquare) return (iteration, true);
            idle = damping <= WeakDamping && predicted <= LeastDecrease * state.ChiSquare ? idle + 1 : 0;
            if (idle == IdleLimit) return (iteration, true);
            var decrease = state.Bent(step) is { } bent ? state.Try(bent) : double.NaN;
            var gain = decrease / predicted;
            if (gain > 1e-4 || state.MayClimb(step, decrease))
            {
                state.Accept(step);
                damping *= gain > 1e-4 ? Math.Max(0.1, 1 - Math.Pow(2 * gain - 1, 3)) : 1;
                growth = 2;
            }
            else
            {
                damping *= growth;
                growth *= 2;
            }
        }

        return (limit, halfway - state.ChiSquare <= LeastDecrease * state.ChiSquare);
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
            state.Accept(step);
            last = length;
        }
    }
}
