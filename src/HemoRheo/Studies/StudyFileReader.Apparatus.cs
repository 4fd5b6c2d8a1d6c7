namespace HemoRheo;

/// <content>Instruments, geometries, counters, and what is assumed of blood and readings.</content>
internal sealed partial class StudyFileReader
{
    private static Instrument Instrument(SectionReader section) => new(
        section.Text("name"),
        section.OptionalAmount("torque_floor"),
        section.Amount("torque_zero"),
        section.Amount("thermometer"),
        section.Span("check_every"),
        section.Amount("check_limit"),
        section.OptionalAmount("check_scatter"),
        section.Moments("adjusted"),
        section.OptionalAmount("torque_resolution"))
    {
        CorrectTorqueZero = section.Truth("correct_torque_zero"),
    };

    private static Geometry Geometry(SectionReader section)
    {
        var geometry = new Geometry(section.Text("name"), section.Amount("inner_radius"), section.Amount("outer_radius"), section.Amount("length"), section.Number("end_factor"))
        {
            Turning = section.OptionalText("turning") switch { "inner" => TurningCylinder.Inner, "outer" => TurningCylinder.Outer, _ => null },
        };
        if (geometry.OuterRadius <= geometry.InnerRadius)
            section.Refuse("outer_radius", "an outer radius that is not larger than the inner one", "outer_radius > inner_radius", "correct one of the two");
        return geometry;
    }

    private static Counter Counter(SectionReader section) => new(section.Text("name"), section.Amount("uncertainty"), section.Amount("shared_uncertainty"));

    private static Blood Blood(SectionReader section) => new(
        section.Amount("per_kelvin"),
        section.Amount("per_kelvin_uncertainty"),
        section.Amount("plasma_per_kelvin"),
        section.Amount("plasma_uncertainty"));

    private static ReadingErrors Errors(SectionReader section)
    {
        var errors = new ReadingErrors(section.Amount("relative"), section.Amount("floor"), section.Truth("known"), section.OptionalAmount("loading"), section.Has("point_correlation") ? section.Number("point_correlation") : null);
        if (errors is { Relative: 0, Floor: 0 }) section.Refuse("relative", "readings without any error", "relative or floor greater than 0", "give the size of at least one");
        return errors;
    }

    private static ScreeningLimits Screening(SectionReader section)
    {
        var limits = new ScreeningLimits(
            Temperature.FromDegreesCelsius(section.Amount("temperature")),
            section.Amount("temperature_tolerance"),
            section.Amount("speed_tolerance"),
            section.Span("longest_since_draw"),
            section.Amount("duplicate_tolerance"),
            section.Amount("lowest_hematocrit"),
            section.Amount("highest_hematocrit"));
        if (limits.HighestHematocrit <= limits.LowestHematocrit)
            section.Refuse("highest_hematocrit", "a highest hematocrit that is not above the lowest", "highest_hematocrit > lowest_hematocrit", "correct one of the two");
        return limits;
    }
}
