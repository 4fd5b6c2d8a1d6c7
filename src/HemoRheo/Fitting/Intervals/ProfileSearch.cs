using System.Globalization;

namespace HemoRheo;

/// <summary>Finds a profile and the interval in it.</summary>
/// <remarks>Sources: Bates and Watts 1988, Nonlinear Regression Analysis and Its Applications, chapter 6; Venzon and Moolgavkar 1988, Applied Statistics 37:87-94.</remarks>
internal sealed class ProfileSearch
{
    /// <summary>How far a limit is sought that must lie somewhere, since the end of the range is excluded.</summary>
    private const double FarSpan = 100;

    /// <summary>Scatter below this, in variances of the error model, is that of the arithmetic.</summary>
    private const double LeastUnit = 1e-20;

    private readonly FittedLaw _fit;
    private readonly FitFunction _function;
    private readonly ProfileScale _scale;
    private readonly ConstrainedFit _constrained;

    private ProfileSearch(FittedLaw fit, FitFunction function, double limit)
    {
        var held = new HeldWeights(fit);
        (_fit, _function, _constrained) = (fit, function, new(fit, held, function));
        _scale = new(held.At(fit.Scaled.Span, new double[held.Points], new double[held.Points * fit.Scaled.Count]), RiseUnit.Of(fit, function, held), limit);
    }

    public static Profile Of(FittedLaw fit, FitFunction function, double level)
    {
        const IntervalMethod Method = IntervalMethod.ProfileLikelihood;
        if (IntervalAnswer.Refusal(fit, function, level, Method) is { } refusal) return new(refusal, 0, []);
        var limit = IntervalAnswer.Quantile(fit, level);
        if (!(RiseUnit.Scale(fit) > LeastUnit)) return new(IntervalAnswer.None(fit, function, level, Method, "the readings lie on the law to rounding, so there is no scatter to judge by"), limit, []);
        var search = new ProfileSearch(fit, function, limit);
        return search.Start() is { } start ? search.From(start, level) : new(IntervalAnswer.None(fit, function, level, Method, "it has no value at the fit"), limit, []);
    }

    private Profile From(ConstrainedMinimum start, double level)
    {
        var (lower, upper) = (Side(start, -1), Side(start, 1));
        var trail = lower.Points.Skip(1).Reverse().Concat(upper.Points).ToArray();
        var interval = IntervalAnswer.Of(_fit, _function, Limit(lower, -1), Limit(upper, 1), level, IntervalMethod.ProfileLikelihood, Findings(trail));
        var points = trail.Select(point => new ProfilePoint(_function.ToSi(point.Value), Math.Sign(point.Value - start.Value) * _scale.Root(point), _fit.Law.ToNatural(point.Scaled).ToItems()));
        return new(interval, _scale.Limit, points.ToItems());
    }

    /// <summary>The estimate; where a parameter is held at its bound and the quantity is infinite there, a value next to it.</summary>
    private ConstrainedMinimum? Start()
    {
        var estimate = _function.Estimate(_fit);
        if (double.IsFinite(estimate)) return new(estimate, _fit.Scaled.ToArray(), _fit.Fit.ChiSquare, 0);
        return BelievableRange.Beside(_fit, _function, boundary => boundary.WallAt(new(_constrained.LowestStress))[0]) is { } near ? _constrained.At(near.Value, near.Scaled) : null;
    }

    private ProfileSide Side(ConstrainedMinimum start, int direction)
    {
        var error = _function.StandardError(_fit);
        var step = _function.LongStep(start.Value, error);
        var atBound = !double.IsFinite(_function.Estimate(_fit));
        var range = BelievableRange.Of(_fit, _function);
        var end = RootAtEnd(direction, _fit.Scaled.Span) >= _scale.Limit ? start.Value + direction * FarSpan * step : direction < 0 ? range.Lower : range.Upper;
        var side = new ProfileSide(_constrained, _scale, start, direction, step, end);
        if (!(atBound && direction < 0)) side.Follow(error > 0 ? _scale.Limit * error / 6 : step / 20);
        return side;
    }

    /// <summary>The limit, SI; null where the side is open, also if the rise falls back below the limit at the end of the range.</summary>
    private double? Limit(ProfileSide side, int direction) =>
        side.Limit is { } working && !(RootAtEnd(direction, _fit.Scaled.Span) < _scale.Limit) && !(RootAtEnd(direction, side.Points[^1].Scaled) < _scale.Limit) ? _function.ToSi(working) : null;

    /// <summary>The root of the rise with a parameter at the end of its range; null for another function, where there is no end, or where the law has no value there.</summary>
    private double? RootAtEnd(int direction, ReadOnlySpan<double> near)
    {
        var end = direction < 0 ? _function.Range.Lower : _function.Range.Upper;
        return _function.Parameter is not null && double.IsFinite(end) && _constrained.At(direction * double.PositiveInfinity, near) is { } point ? _scale.Root(point) : null;
    }

    private Items<Finding> Findings(ConstrainedMinimum[] trail)
    {
        var least = trail.MinBy(point => point.Sum)!;
        if (!_scale.IsBelowTheFit(least)) return [];
        var message = string.Create(
            CultureInfo.InvariantCulture,
            $"{_fit.Law.Name}: with {_function.Name} held at {_function.Shown.FromSi(_function.ToSi(least.Value)):G5} {_function.Shown} the sum of squares is {least.Sum:G6}, that of the fit {_fit.Fit.ChiSquare:G6}.");
        return [FittingFindings.BelowTheFit.At(_fit.Curve.Label.Where, message, least.Sum, _fit.Fit.ChiSquare)];
    }
}
