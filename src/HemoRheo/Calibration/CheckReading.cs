using static System.FormattableString;

namespace HemoRheo;

/// <summary>What the recording of one filling of a check gives: a check judged on its own uncertainty, or the finding that says why it gives none.</summary>
/// <param name="Check">The check; null where the recording gives none.</param>
/// <param name="Fault">Why it gives none; null where it gives one.</param>
internal sealed record CheckReading(InstrumentCheck? Check, Finding? Fault)
{
    /// <summary>Fits one viscosity to the readings above the torque floor and in laminar flow, and holds it against the fluid's at their mean temperature.</summary>
    internal static CheckReading Of(Study study, Instrument instrument, Items<BlankRun> blanks, Recording recording)
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

        var raw = recording.ToCurve(study, study.Analysis.Ramp, InstrumentTorques.Of(instrument, blanks, recording.StartedAt));
        var curve = raw.WithFindings(TorqueFloor.Judge(raw, study));
        if (Unusable(fluid, curve) is { } fault) return Without(fault);
        if (ExportedGeometry.Contradiction(study, recording) is { } other) return Without(other);
        curve = curve.WithFindings(LaminarFlow.Judge(study, curve, fluid));
        if (Unusable(fluid, curve) is { } left) return Without(left);

        FittedLaw fit = curve.Fit(FlowLaw.Newtonian, ReadingErrorModel.Of(study, curve));
        if (!fit.Usable)
        {
            return Without(CalibrationFindings.FitUnusable.At(where, $"Check '{recording.Sample}' gives no viscosity: {fit.Convergence.Message}{string.Concat(fit.Findings.Select(finding => "; " + finding.Message))}"));
        }

        return new(Judged(study, instrument, recording, fluid, curve.MeanTemperature!.Value, fit), null);
    }

    private static CheckReading Without(Finding fault) => new(null, fault);

    /// <summary>Why a curve cannot be held against the fluid; null where it can.</summary>
    private static Finding? Unusable(CalibrationFluid fluid, FlowCurve curve)
    {
        var (where, name) = (curve.Label.Where, curve.Label.Sample);
        if (curve.Points.Count == 0)
        {
            var why = curve.SetAside.Count == 0 ? "" : $" The first: {curve.SetAside[0].Findings[0].Message}";
            return CalibrationFindings.FitUnusable.At(where, $"Check '{name}' keeps none of {curve.Label.Recording!.Readings.Count} readings.{why}");
        }

        if (curve.MeanTemperature is not { } temperature) return CalibrationFindings.TemperatureUnusable.At(where, $"Check '{name}' states no temperature.");
        var range = fluid.ValidTemperatures();
        if (!range.Contains(temperature.DegreesCelsius))
        {
            return CalibrationFindings.TemperatureUnusable.At(where, fluid.IsWater
                ? $"Check '{name}' was taken at {temperature}, where the viscosity of water is not known."
                : Invariant($"Check '{name}' was taken at {temperature}; the viscosity of '{fluid.Name}' is known from {range.Lower:G4} to {range.Upper:G4} degC only."));
        }

        return fluid.Certificate is { } certificate && CertificateCurve.Of(certificate) is null
            ? CalibrationFindings.CertificateUnusable.At(where, $"The rows of {certificate.File} follow no Vogel-Fulcher-Tammann curve; check '{name}' has nothing to be held against.")
            : null;
    }

    private static InstrumentCheck Judged(Study study, Instrument instrument, Recording recording, CalibrationFluid fluid, Temperature temperature, FittedLaw fit)
    {
        var measured = new Viscosity(Math.Exp(fit.Scaled[0]));
        var expected = fluid.ViscosityAt(temperature);
        var error = new Value(fit.Scaled[0] - Math.Log(expected.PascalSeconds), CheckBudget.Of(study, instrument, recording, fluid, temperature, fit).ToItems());
        var name = recording.Loading == 1 ? recording.Sample : Invariant($"{recording.Sample}/{recording.Loading}");
        var findings = recording.Findings
            .Concat(fit.Curve.SetAside.SelectMany(aside => aside.Findings))
            .Concat(fit.Curve.Findings)
            .Concat(fit.Findings)
            .Concat(ReadingErrorModel.Findings(study, fit.Curve))
            .Concat(InstrumentTorques.Findings(study, fit.Curve))
            .Concat(OwnFindings(instrument, recording, fit))
            .Concat(FluidFindings.Of(study, recording, fluid, temperature));
        return new InstrumentCheck(
            name, instrument.Name, fluid, recording.StartedAt, temperature, measured, expected, error, instrument.CheckLimit, CheckOutcome.CannotTell, 0, fit, findings.ToItems()).Judged(study.Analysis.Level);
    }

    private static IEnumerable<Finding> OwnFindings(Instrument instrument, Recording recording, FittedLaw fit)
    {
        var where = fit.Curve.Label.Where;
        if (fit.Curve.StressPerTorque is null && fit.Curve.Torque!.ZeroParts([null]).Any())
        {
            yield return CalibrationFindings.TorqueZeroUnknown.At(where, $"Check '{recording.Sample}' names no geometry.");
        }
    }
}
