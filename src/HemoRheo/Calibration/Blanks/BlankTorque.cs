namespace HemoRheo;

/// <summary>One torque of an empty gap.</summary>
/// <param name="Speed">Rotational speed, rad/s.</param>
/// <param name="NewtonMeters">Torque less the drag of air, N.m.</param>
/// <param name="Time">When in the run: seconds, or its number where times are not given.</param>
internal readonly record struct BlankTorque(double Speed, double NewtonMeters, double Time);
