using static System.FormattableString;

namespace HemoRheo;

/// <summary>What is odd about the fluid of a check that all the same gives a value.</summary>
internal static class FluidFindings
{
    internal static IEnumerable<Finding> Of(Study study, Recording recording, CalibrationFluid fluid, Temperature temperature)
    {
        var where = recording.Where with { Sample = recording.Sample, Loading = recording.Loading };
        if (fluid.Certificate is { } certificate)
        {
            if (!certificate.ValidOn(recording.Day))
            {
                yield return CalibrationFindings.CertificateNotValid.At(
                    where, Invariant($"Check '{recording.Sample}' of {recording.Day:yyyy-MM-dd} rests on {certificate.File}, valid from {certificate.Issued:yyyy-MM-dd} to {certificate.ValidUntil:yyyy-MM-dd}."));
            }

            foreach (var finding in Scattered(where, certificate)) yield return finding;
        }

        if (fluid.Bath is { } bath && Math.Abs(temperature.DegreesCelsius - bath.DegreesCelsius) > study.Screening.TemperatureTolerance)
        {
            yield return CalibrationFindings.BathDiffers.At(
                where,
                Invariant($"Check '{recording.Sample}' reads {temperature}, and the bath of '{fluid.Name}' is set to {bath}; {study.Screening.TemperatureTolerance:G3} K are allowed."),
                temperature.DegreesCelsius,
                bath.DegreesCelsius);
        }
    }

    private static IEnumerable<Finding> Scattered(Where where, Certificate certificate)
    {
        var residuals = CertificateCurve.Of(certificate)!.Residuals;
        for (var i = 0; i < residuals.Count; i++)
        {
            var row = certificate.Rows[i];
            if (Math.Abs(residuals[i]) <= row.RelativeExpandedUncertainty) continue;
            yield return CalibrationFindings.CertificateRowsScatter.At(
                where,
                Invariant($"In {certificate.File} the viscosity at {row.At} departs by {100 * residuals[i]:+0.00;-0.00} % from the curve through all rows; its expanded uncertainty is {100 * row.RelativeExpandedUncertainty:G3} %."),
                100 * residuals[i],
                100 * row.RelativeExpandedUncertainty);
        }
    }
}
