using static System.FormattableString;

namespace HemoRheo;

/// <summary>Holds the torque of every kept point against the instrument's floor. Used for blood and for checks alike.</summary>
internal static class TorqueFloor
{
    /// <summary>Faults at points below the floor; a note where no floor is declared; a warning where torques are not known.</summary>
    internal static IEnumerable<Finding> Judge(FlowCurve curve, Study study)
    {
        var instrument = study.Instruments.FirstOrDefault(known => known.Name == curve.Label.Recording?.Instrument);
        var standing = curve.Torque ?? (instrument is null ? null : TorqueTrust.OfDeclared(instrument, ""));
        if (instrument is null || standing is null || standing.Basis == TorqueBasis.None)
        {
            var whose = curve.Label.Recording is { } recording ? $"instrument '{recording.Instrument}'" : "a curve made from numbers";
            return [RheometryFindings.NoTorqueFloor.At(curve.Label.Where, $"No torque floor declared for {whose}.")];
        }

        return Judge(curve, study, instrument, standing);
    }

    private static IEnumerable<Finding> Judge(FlowCurve curve, Study study, Instrument instrument, TorqueTrust standing)
    {
        var by = standing.BlankRun is { } run ? $" by blank run '{run}'" : "";
        var unknown = 0;
        foreach (var point in curve.Points)
        {
            var speed = curve.SpeedOf(point, study);
            var torque = point.Reading?.Torque - standing.Correction(speed) ?? point.Stress.Pascals / curve.StressPerTorque;
            if (torque is null)
            {
                unknown++;
            }
            else if (standing.Floor(speed) is { } floor && torque < floor)
            {
                // Where both are exported the reading's column is that of the stress.
                var where = point.Reading is { Torque: not null, Stress: not null } ? curve.PlaceOf(point) : curve.PlaceOfStress(point);
                yield return RheometryFindings.TorqueBelowFloor.At(
                    where, Invariant($"Reading {point.Number} has a torque of {1e6 * torque:G4} uN.m, below the floor of {1e6 * floor:G4} uN.m of '{instrument.Name}'{by}."), torque, floor);
            }
        }

        if (unknown > 0)
        {
            yield return RheometryFindings.TorqueNotKnown.At(curve.Label.Where, $"The torque of {unknown} of {curve.Points.Count} readings is not known.");
        }
    }
}
