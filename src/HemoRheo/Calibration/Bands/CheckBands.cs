using static System.FormattableString;

namespace HemoRheo;

/// <summary>Judges a check by decades of torque: each gets a viscosity of its own readings, and its error the check's budget with fit and torque zero of these readings.</summary>
internal static class CheckBands
{
    /// <summary>The decades of a settled check by ascending torque; none where the torques of its readings are not known or the size of their errors cannot be had.</summary>
    internal static Items<CheckBand> Of(InstrumentCheck check, Instrument instrument, double level)
    {
        if (KnownErrors(check.Fit) is not { } errors) return [];
        return check.Fit.Curve.Points
            .Select(point => (Point: point, Decade: DecadeOf(check.Fit.Curve, point)))
            .Where(item => item.Decade is not null)
            .GroupBy(item => item.Decade!.Value, item => item.Point)
            .OrderBy(decade => decade.Key)
            .Select(decade => Band(check, instrument, level, errors, decade.Key, decade.ToItems()))
            .OfType<CheckBand>()
            .ToItems();
    }

    /// <summary>A warning for each decade that fails while the check as a whole does not.</summary>
    internal static IEnumerable<Finding> Findings(InstrumentCheck check) => check.Outcome == CheckOutcome.Fails ? [] : check.Bands
        .Where(band => band.Outcome == CheckOutcome.Fails)
        .Select(band => CalibrationFindings.BandFailed.At(
            check.Fit.Curve.Label.Where,
            Invariant($"Check '{check.Name}' of {check.Day:yyyy-MM-dd} is off by {Percent(band):+0.00;-0.00} % from {band.Range}, where {100 * check.Limit:G3} % is allowed (E_n {band.NormalizedError:0.00}); as a whole it {(check.Outcome == CheckOutcome.Passes ? "passes" : "cannot tell")}."),
            Percent(band),
            100 * check.Limit));

    private static double Percent(CheckBand band) => 100 * (Math.Exp(band.Error.X) - 1);

    private static int? DecadeOf(FlowCurve curve, FlowPoint point) =>
        curve.TorqueOf(point) is { } torque and > 0 ? (int)Math.Floor(Math.Log10(torque)) : null;

    // Where the sizes of errors are known up to a scale only, all decades share the scale that the whole check shows.
    private static ErrorModel? KnownErrors(FittedLaw fit)
    {
        if (fit.Errors.ScaleKnown) return fit.Errors;
        if (fit.Fit.DegreesOfFreedom == 0) return null;
        var scale = Math.Sqrt(fit.Fit.ChiSquare / fit.Fit.DegreesOfFreedom);
        return scale > 0 ? ErrorModel.Known(scale * fit.Errors.Relative, new(scale * fit.Errors.Floor.Pascals)) : null;
    }

    private static CheckBand? Band(InstrumentCheck check, Instrument instrument, double level, ErrorModel errors, int decade, Items<FlowPoint> points)
    {
        FittedLaw fit = (check.Fit.Curve with { Points = points }).Fit(FlowLaw.Newtonian, errors);
        if (!fit.Usable) return null;
        var torque = new Interval(Math.Pow(10, decade), Math.Pow(10, decade + 1));
        var error = new Value(fit.Scaled[0] - Math.Log(check.Expected.PascalSeconds), check.Error.Parts.Select(part => OfBand(part, check.Fit, fit, instrument, decade)).ToItems());
        var verdict = Verdict.Of(error, CheckJudgement.Limits(check.Limit), level);
        return new(torque, points.Count, new(Math.Exp(fit.Scaled[0])), error, check.Limit, level, CheckJudgement.OutcomeOf(verdict), verdict.Within);
    }

    private static Contribution OfBand(Contribution part, FittedLaw whole, FittedLaw band, Instrument instrument, int decade) => part.Source.Kind switch
    {
        SourceKind.Fit => part with { Source = part.Source with { Of = Invariant($"{part.Source.Of}/1e{decade} N.m") }, Amount = Math.Sqrt(band.Covariance[0]) },
        SourceKind.TorqueZero => part with { Amount = band.StressResponse[0] * whole.Curve.StressPerTorque!.Value * instrument.TorqueZero },
        _ => part,
    };
}
