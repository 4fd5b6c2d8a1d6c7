namespace HemoRheo;

/// <summary>What a contribution to a value's uncertainty comes from.</summary>
public enum SourceKind
{
    /// <summary>The fit of one loading's readings.</summary>
    Fit,

    /// <summary>The scatter between loadings (fillings of the gap).</summary>
    Loading,

    /// <summary>The correction of an instrument in a period between calibrations.</summary>
    Calibration,

    /// <summary>The instrument's day-to-day scatter.</summary>
    Day,

    /// <summary>The certificate of a calibration fluid's lot.</summary>
    Certificate,

    /// <summary>The temperature coefficient of a calibration fluid.</summary>
    FluidBeta,

    /// <summary>The thermometer of an instrument.</summary>
    Thermometer,

    /// <summary>The temperature coefficient of blood.</summary>
    BloodBeta,

    /// <summary>The hematocrit of one sample.</summary>
    Hematocrit,

    /// <summary>The bias that all samples of a hematocrit counter share.</summary>
    Counter,

    /// <summary>The plasma viscosity of one sample.</summary>
    Plasma,

    /// <summary>The torque zero of an instrument's day.</summary>
    TorqueZero,

    /// <summary>The study's slope against hematocrit.</summary>
    Slope,

    /// <summary>The choice among laws that the study's curves cannot part.</summary>
    Law,

    /// <summary>A known bias of the instrument that the study chose not to correct.</summary>
    Bias,

    /// <summary>The scatter of a quantity among the people of a group, which already holds what is individual in each of their values.</summary>
    People,
}
