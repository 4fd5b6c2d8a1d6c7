namespace HemoRheo;

/// <summary>A measurand of one loading, corrected and moved to 37 degC, with every part of its budget but the scatter between loadings.</summary>
internal static class LoadingValue
{
    /// <summary>The corrected value.</summary>
    /// <param name="study">The study.</param>
    /// <param name="loading">The loading.</param>
    /// <param name="fit">The fit the measurand comes from.</param>
    /// <param name="value">The measurand of that fit, logarithmic and proportional to stress.</param>
    public static Value Of(Study study, LoadingResult loading, FittedLaw fit, FitValue value)
    {
        var terms = new List<(double, Value)> { (1, value.ToValue(fit)), (1, Shift(study, loading)) };
        var response = value.StressResponse(fit) * (loading.Curve.StressPerTorque ?? 0);
        if (response != 0 && loading.Curve.Torque is { } torque)
        {
            terms.Add((1, new(0, torque.ZeroParts(loading.Curve.Points.Select(point => loading.Curve.SpeedOf(point, study))).Select(part => part.Times(response)).ToItems())));
        }

        return Value.Combine(terms);
    }

    /// <summary>What correction and temperature add to every log value of a loading.</summary>
    public static Value Shift(Study study, LoadingResult loading)
    {
        var recording = loading.Recording;
        var temperature = loading.Curve.MeanTemperature;
        return Value.Combine([
            (1, Corrected(study, loading.Standing, InstrumentDay.Key(recording.Instrument, recording.Day))),
            (1, temperature is { } read ? ToBody(read, study.Blood.PerKelvin, Thermometer(study, recording.Instrument), recording.Instrument) : Value.Exact(0)),
            (1, temperature is { } at ? BloodCoefficient(study, at) : Value.Exact(0))]);
    }

    /// <summary>What the correction of an instrument adds to a log value of a day.</summary>
    public static Value Corrected(Study study, InstrumentStanding standing, string day)
    {
        if (standing.Period is not { } period) return Value.Exact(0);
        var correction = -1 * period.Correction;
        if (!study.Analysis.CorrectBias) correction = (correction with { X = 0 }).With(new(new(SourceKind.Bias, period.Key), -period.Correction.X));
        return correction.With(new(new(SourceKind.Day, day), period.Scatter, period.ScatterEstimate, period.ScatterDegreesOfFreedom));
    }

    /// <summary>What moving a log value from the temperature read to 37 degC adds.</summary>
    public static Value ToBody(Temperature read, double perKelvin, double thermometer, string instrument) => new(
        perKelvin * (read.DegreesCelsius - Temperature.Body.DegreesCelsius),
        [new(new(SourceKind.Thermometer, instrument), perKelvin * thermometer)]);

    private static Value BloodCoefficient(Study study, Temperature read) => new(
        0,
        [new(new(SourceKind.BloodBeta, ""), (read.DegreesCelsius - Temperature.Body.DegreesCelsius) * study.Blood.PerKelvinUncertainty)]);

    private static double Thermometer(Study study, string instrument) => study.Instruments.FirstOrDefault(known => known.Name == instrument)?.Thermometer ?? 0;
}
