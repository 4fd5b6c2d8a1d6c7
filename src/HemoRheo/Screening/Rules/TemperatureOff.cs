using static System.FormattableString;

namespace HemoRheo;

/// <summary>
/// Temperature of a reading beyond the study's tolerance. Cause: the sample was not yet warm, or the bath drifted. Cure: wait before the ramp.
/// </summary>
internal sealed class TemperatureOff : IScreeningRule
{
    // Temperatures are decimal text: 37.1 is at a tolerance of 0.1 K, not beyond it.
    private const double DecimalRounding = 1e-9;

    public Items<FindingKind> Kinds { get; } = [ScreeningFindings.TemperatureOff, ScreeningFindings.TemperatureExcursion, ScreeningFindings.TemperatureNotStated];

    public IEnumerable<Finding> Judge(FlowCurve curve, Study study, SampleRecord? sample)
    {
        var limits = study.Screening;
        var target = limits.Temperature.DegreesCelsius;
        var (off, unstated, farthest) = (0, 0, 0.0);
        foreach (var point in curve.Points.Where(point => point.Reading is not null))
        {
            if (point.Reading!.Temperature is not { } temperature)
            {
                unstated++;
                continue;
            }

            var away = temperature - target;
            if (Math.Abs(away) <= limits.TemperatureTolerance + DecimalRounding) continue;
            off++;
            if (Math.Abs(away) > Math.Abs(farthest)) farthest = away;
            yield return ScreeningFindings.TemperatureOff.At(
                curve.PlaceOf(point), Invariant($"Reading {point.Number} was taken at {temperature:F2} degC; {target:G4} degC within {limits.TemperatureTolerance:G3} K is asked for."), temperature, target + Math.CopySign(limits.TemperatureTolerance, away));
        }

        if (off > 0)
        {
            yield return ScreeningFindings.TemperatureExcursion.At(
                curve.Label.Where, Invariant($"{off} of {curve.Points.Count} readings were beyond {limits.TemperatureTolerance:G3} K of {target:G4} degC, at most {farthest:+0.00;-0.00} K away."), farthest, limits.TemperatureTolerance);
        }

        if (unstated > 0)
        {
            yield return ScreeningFindings.TemperatureNotStated.At(curve.Label.Where, $"{unstated} of {curve.Points.Count} readings state no temperature.");
        }
    }
}
