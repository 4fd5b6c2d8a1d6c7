using static System.FormattableString;

namespace HemoRheo;

/// <summary>
/// Signed contributions to a check's ln(measured/expected), each the change when its input is raised by one standard uncertainty:
/// certified value -U/k; the fluid's temperature coefficient +(T - certificate's) u, or the interpolation of its certificate; thermometer +coefficient u; torque zero; fit.
/// </summary>
internal static class CheckBudget
{
    internal static IEnumerable<Contribution> Of(Study study, Instrument instrument, Recording recording, CalibrationFluid fluid, Temperature temperature, FittedLaw fit)
    {
        foreach (var part in fluid.LnViscosityAt(temperature).Parts) yield return part.Times(-1);
        yield return new(new(SourceKind.Thermometer, instrument.Name), fluid.PerKelvinAt(temperature) * instrument.Thermometer);
        if (fit.Curve.StressPerTorque is { } stressPerTorque && fit.Curve.Torque is { } torque)
        {
            foreach (var part in torque.ZeroParts(fit.Curve.Points.Select(point => fit.Curve.SpeedOf(point, study)))) yield return part.Times(fit.StressResponse[0] * stressPerTorque);
        }

        var filling = Invariant($"{recording.Sample}/{recording.Loading}");
        var size = Math.Sqrt(fit.Covariance[0]);
        yield return fit.Errors.ScaleKnown
            ? new(new(SourceKind.Fit, filling + "/0"), size)
            : new(new(SourceKind.Fit, filling + "/0"), size, "fit of " + filling, fit.Fit.DegreesOfFreedom);
    }
}
