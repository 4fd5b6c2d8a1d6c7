namespace HemoRheo;

/// <summary>One reading of an export, in SI, with the line it came from. Null where the export has no such column.</summary>
/// <param name="Number">Its number in the recording, from 1.</param>
/// <param name="Ramp">Ramp as the export says.</param>
/// <param name="Speed">Rotational speed reached, rad/s.</param>
/// <param name="SetSpeed">Rotational speed asked for, rad/s.</param>
/// <param name="Torque">Torque, N.m.</param>
/// <param name="Rate">Shear rate as exported, 1/s.</param>
/// <param name="SetRate">Shear rate asked for, 1/s.</param>
/// <param name="Stress">Shear stress as exported, Pa.</param>
/// <param name="Temperature">Temperature, degC.</param>
/// <param name="Elapsed">Time since the recording's start, s.</param>
/// <param name="Where">File, sheet, line.</param>
public sealed record Reading(
    int Number,
    Ramp Ramp,
    double? Speed,
    double? SetSpeed,
    double? Torque,
    double? Rate,
    double? SetRate,
    double? Stress,
    double? Temperature,
    double? Elapsed,
    Where Where);
