using static System.FormattableString;

namespace HemoRheo;

/// <summary>What the recording of one filling of a check gives: a check judged on its own uncertainty, or the finding that says why it gives none.</summary>
/// <param name="Check">The check; null where the recording gives none.</param>
/// <param name="Fault">Why it gives none; null where it gives one.</param>
internal sealed record CheckReading(InstrumentCheck? Check, Finding? Fault)
{
    /// <summary>Fits one viscosity to the readings above the torque floor and holds it against the fluid's at their mean temperature.</summary>
    internal static CheckReading Of(Study study, Instrument instrument, Recording recording)
    {
        var where = new CurveLabel(recording.Sample, recording.Loading, study.Analysis.Ramp, recording).Where;
        if (study.Fluids.FirstOrDefault(known => known.Name == recording.Fluid) is not { } fluid)
        {
            var declared = study.Fluids.Count == 0 ? "none" : string.Join(", ", study.Fluids.Select(known => known.Name));
            var named = recording.Fluid is null ? "names no fluid" : $"names the fluid '{recording.Fluid}'";
            return Without(CalibrationFindings.FluidUnknown.At(where, $"Check '{recording.Sample}' {named}; declared: {declared}."));
        }

        if (recording.HasFault)
        {
            return Without(CalibrationFindings.RecordingFaulty.At(where, $"Check '{recording.Sample}': {recording.Findings.First(finding => finding.Severity == Severity.Fault && finding.Where.Point is null).Message}"));
        }

        var raw = recording.ToCurve(study, study.Analysis.Ramp);
        var curve = raw.WithFindings(TorqueFloor.Judge(raw, study));
        if (curve.Points.Count == 0) return Without(CalibrationFindings.FitUnusable.At(where, $"Check '{recording.Sample}' keeps none of {recording.Readings.Count} readings."));
        if (curve.MeanTemperature is not { } temperature)
        {
            return Without(CalibrationFindings.TemperatureUnusable.At(where, $"Check '{recording.Sample}' states no temperature."));
        }

        if (fluid.IsWater && !Water.ValidKelvins.Contains(temperature.Kelvins))
        {
            return Without(CalibrationFindings.TemperatureUnusable.At(where, $"Check '{recording.Sample}' was taken at {temperature}, where the viscosity of water is not known."));
        }

        FittedLaw fit = curve.Fit(FlowLaw.Newtonian, ReadingErrorModel.Of(study, curve));
        if (!fit.Usable)
        {
            return Without(CalibrationFindings.FitUnusable.At(where, $"Check '{recording.Sample}' gives no viscosity: {fit.Convergence.Message}{string.Concat(fit.Findings.Select(finding => "; " + finding.Message))}"));
        }

        return new(Judged(study, instrument, recording, fluid, temperature, fit), null);
    }

    private static CheckReading Without(Finding fault) => new(null, fault);

    private static InstrumentCheck Judged(Study study, Instrument instrument, Recording recording, CalibrationFluid fluid, Temperature temperature, FittedLaw fit)
    {
        var measured = new Viscosity(Math.Exp(fit.Scaled[0]));
        var expected = fluid.ViscosityAt(temperature);
        var error = new Value(fit.Scaled[0] - Math.Log(expected.PascalSeconds), CheckBudget.Of(instrument, recording, fluid, temperature, fit).ToItems());
        var name = recording.Loading == 1 ? recording.Sample : Invariant($"{recording.Sample}/{recording.Loading}");
        var findings = recording.Findings.Concat(fit.Curve.SetAside.SelectMany(aside => aside.Findings)).Concat(fit.Curve.Findings).Concat(fit.Findings).Concat(ReadingErrorModel.Findings(study, fit.Curve)).Concat(OwnFindings(instrument, recording, fit));
        return new InstrumentCheck(
            name, instrument.Name, fluid, recording.StartedAt, temperature, measured, expected, error, instrument.CheckLimit, CheckOutcome.CannotTell, 0, fit, findings.ToItems()).Judged(study.Analysis.Level);
    }

    private static IEnumerable<Finding> OwnFindings(Instrument instrument, Recording recording, FittedLaw fit)
    {
        var where = fit.Curve.Label.Where;
        if (instrument.TorqueZero > 0 && fit.Curve.StressPerTorque is null)
        {
            yield return CalibrationFindings.TorqueZeroUnknown.At(where, $"Check '{recording.Sample}' names no geometry.");
        }
    }
}
