namespace HemoRheo;

/// <summary>Log plasma viscosity of a sample at 37 degC, with its budget and what vouches for it.</summary>
/// <param name="Value">The value.</param>
/// <param name="Standing">Standing of the instrument of the study that measured it, then; null where another device did.</param>
internal sealed record PlasmaValue(Value Value, InstrumentStanding? Standing)
{
    /// <summary>The plasma viscosity of a sample; null where it was not measured or its temperature is not stated.</summary>
    /// <param name="study">The study.</param>
    /// <param name="record">The sample's row of the samples table.</param>
    /// <param name="bloodAt">When its blood was measured, which counts where the row does not say when the plasma was.</param>
    /// <param name="histories">Histories of the study's instruments.</param>
    public static PlasmaValue? Of(Study study, SampleRecord record, DateTimeOffset bloodAt, IReadOnlyDictionary<string, InstrumentHistory> histories)
    {
        if (record.PlasmaViscosity is not { } viscosity || record.PlasmaTemperature is not { } temperature) return null;
        var own = new Value(Math.Log(viscosity.PascalSeconds), [new(new(SourceKind.Plasma, record.Sample), study.Blood.PlasmaUncertainty)]);
        if (record.PlasmaInstrument is { } name && histories.TryGetValue(name, out var history))
        {
            var at = record.PlasmaMeasuredAt ?? bloodAt;
            var day = InstrumentDay.Key(name, DateOnly.FromDateTime(at.DateTime));
            var standing = history.At(at);
            return new(
                Value.Combine([
                    (1, own),
                    (1, LoadingValue.Corrected(study, standing, day)),
                    (1, LoadingValue.ToBody(temperature, study.Blood.PlasmaPerKelvin, history.Instrument.Thermometer, name))]),
                standing);
        }

        return new(own with { X = own.X + study.Blood.PlasmaPerKelvin * (temperature.DegreesCelsius - Temperature.Body.DegreesCelsius) }, null);
    }

    /// <summary>Why values made with this one may not be decided on.</summary>
    /// <param name="sample">Pseudonym of the sample.</param>
    public IEnumerable<Finding> Findings(string sample) => Standing is { Period: null } unvouched
        ? [SampleFindings.NotCalibrated.At(new(Sample: sample), $"Plasma: {SampleFindings.WhyNotCalibrated(unvouched)}")]
        : [];
}
