namespace HemoRheo;

/// <summary>What a field of an export holds.</summary>
public enum FieldMeaning
{
    /// <summary>Pseudonym of the sample, or name of the check.</summary>
    Sample,

    /// <summary>Pseudonym of the person.</summary>
    Person,

    /// <summary>Number of the visit.</summary>
    Visit,

    /// <summary>Number of the loading.</summary>
    Loading,

    /// <summary>Instrument.</summary>
    Instrument,

    /// <summary>Geometry.</summary>
    Geometry,

    /// <summary>Calibration fluid, in a check.</summary>
    Fluid,

    /// <summary>Date and time of the recording's start, with offset.</summary>
    StartedAt,

    /// <summary>Ramp: a word that the layout's up and down words settle.</summary>
    Ramp,

    /// <summary>Temperature of the sample.</summary>
    Temperature,

    /// <summary>Time since the recording's start.</summary>
    Elapsed,

    /// <summary>Rotational speed that was asked for.</summary>
    SetSpeed,

    /// <summary>Rotational speed that was reached.</summary>
    Speed,

    /// <summary>Torque.</summary>
    Torque,

    /// <summary>Shear rate as exported.</summary>
    ShearRate,

    /// <summary>Shear rate that was asked for.</summary>
    SetShearRate,

    /// <summary>Shear stress as exported.</summary>
    ShearStress,

    /// <summary>Number of readings that a block announces.</summary>
    ReadingCount,
}
