namespace HemoRheo;

/// <summary>One speed of a blank run.</summary>
/// <param name="Speed">Rotational speed, rad/s.</param>
/// <param name="Zero">Mean torque less the drag of air, N.m.</param>
/// <param name="Noise">Standard deviation of one reading, N.m; of all speeds together where this one was read once.</param>
/// <param name="Readings">How many readings.</param>
public sealed record BlankSpeed(double Speed, double Zero, double Noise, int Readings);
