namespace HemoRheo;

/// <summary>Quantities the library reads and writes, with the unit they have inside.</summary>
public enum Quantity
{
    /// <summary>A plain number.</summary>
    Number,

    /// <summary>Shear rate, 1/s.</summary>
    ShearRate,

    /// <summary>Shear stress, Pa.</summary>
    ShearStress,

    /// <summary>Dynamic viscosity, Pa.s.</summary>
    Viscosity,

    /// <summary>Temperature, degC.</summary>
    Temperature,

    /// <summary>Difference of temperatures, K.</summary>
    TemperatureDifference,

    /// <summary>Temperature coefficient, 1/K.</summary>
    PerKelvin,

    /// <summary>Torque, N.m.</summary>
    Torque,

    /// <summary>Rotational speed, rad/s.</summary>
    RotationalSpeed,

    /// <summary>Length, m.</summary>
    Length,

    /// <summary>Time, s.</summary>
    Time,

    /// <summary>Hematocrit or another fraction, L/L.</summary>
    Fraction,

    /// <summary>Mass concentration, g/L.</summary>
    Concentration,

    /// <summary>Kinematic viscosity, m2/s.</summary>
    KinematicViscosity,

    /// <summary>Density, kg/m3.</summary>
    Density,
}
