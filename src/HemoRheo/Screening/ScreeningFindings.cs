namespace HemoRheo;

/// <summary>Kinds of finding raised where curves are screened. Those about torque and about rates or stresses not above zero are in <see cref="RheometryFindings"/>.</summary>
public static class ScreeningFindings
{
    /// <summary>A reading was taken at another temperature.</summary>
    public static FindingKind TemperatureOff { get; } = new(
        "temperature-off",
        Severity.Fault,
        "The reading was taken at a temperature beyond the study's tolerance.",
        "The sample was not yet warm, the bath drifted, or the lid was open.",
        "Leave the reading aside; wait for the temperature to settle before the ramp.",
        "tolerance is the study's; 37 degC within 0.5 K is common practice, no source");

    /// <summary>Some of a curve was taken at another temperature.</summary>
    public static FindingKind TemperatureExcursion { get; } = new(
        "temperature-excursion",
        Severity.Warning,
        "The temperature left the study's tolerance during the recording.",
        "The sample was not yet warm, the bath drifted, or the lid was open.",
        "Look at the temperatures over time; measure again if the kept readings do not cover the standard shear rates.");

    /// <summary>A temperature is missing.</summary>
    public static FindingKind TemperatureNotStated { get; } = new(
        "temperature-not-stated",
        Severity.Warning,
        "Readings state no temperature, so nobody can say whether they were taken at the right one.",
        "The export leaves the temperature out, or the layout does not declare its column.",
        "Declare the column, or write the temperature in the export's header.");

    /// <summary>The speed asked for was not reached.</summary>
    public static FindingKind SpeedNotReached { get; } = new(
        "speed-not-reached",
        Severity.Fault,
        "Speed or shear rate differs from the one asked for by more than the study's tolerance.",
        "The reading was taken while the speed still changed, or the torque was too much for the drive.",
        "Leave the reading aside; give the step more time.");

    /// <summary>The blood is too old.</summary>
    public static FindingKind TooLongSinceDraw { get; } = new(
        "too-long-since-draw",
        Severity.Fault,
        "The blood was measured longer after the draw than the study allows; its cells have changed.",
        "A queue at the instrument, or a sample kept overnight.",
        "Do not decide on the values; draw again.",
        "limit is the study's; Baskurt et al. 2009 and Uyuklu et al. 2009 for about 4 h at room temperature");

    /// <summary>The measurement lies before the draw.</summary>
    public static FindingKind MeasuredBeforeDraw { get; } = new(
        "measured-before-draw",
        Severity.Fault,
        "The measurement is dated before the draw, so one of the two times is wrong.",
        "A clock that is off, a wrong offset from universal time, or a typing error in the samples table.",
        "Correct the time that is wrong.");

    /// <summary>The age of the blood is not known.</summary>
    public static FindingKind TimeSinceDrawUnknown { get; } = new(
        "time-since-draw-unknown",
        Severity.Warning,
        "The samples table does not say when the blood was drawn, so its age is not known.",
        "An empty field, or a sample without a row in the samples table.",
        "Write the time of the draw in the samples table.");

    /// <summary>A reading lies before an earlier one in time.</summary>
    public static FindingKind OutOfTimeOrder { get; } = new(
        "out-of-time-order",
        Severity.Fault,
        "The reading's time lies before that of a reading above it, so the file is not in the order of measurement.",
        "A file sorted, joined or edited by hand.",
        "Export the recording again, unedited.");

    /// <summary>A reading repeats one of the same ramp.</summary>
    public static FindingKind DuplicateReading { get; } = new(
        "duplicate-reading",
        Severity.Fault,
        "The reading repeats the shear rate of an earlier one of the same ramp; two of a rate would count double.",
        "A step that was read twice, or lines copied in the file.",
        "The earlier reading is kept; nothing to do if the step was read twice.");

    /// <summary>Viscosities are outside what blood or plasma can show.</summary>
    public static FindingKind ImplausibleViscosity { get; } = new(
        "implausible-viscosity",
        Severity.Warning,
        "Most kept points of the curve have viscosities outside what blood or plasma can show.",
        "A unit in the layout that is not the export's: a factor of 1000 between Pa and mPa, or rates in another unit.",
        "Compare a few numbers of the export with the layout in the study file, and correct the unit. Nothing is rescaled.",
        "from below the viscosity of water at 37 degC, 0.69 mPa.s (IAPWS 2008), with room; from above common practice, no source");
}
