namespace HemoRheo;

/// <summary>One speed of a blank run.</summary>
/// <param name="Speed">Rotational speed, rad/s.</param>
/// <param name="Torque">Mean torque with nothing in the gap, less the drag of air, N.m.</param>
/// <param name="Noise">Standard deviation of one torque reading, N.m.</param>
/// <param name="Readings">How many readings it was made of.</param>
public sealed record LoggedBlankReading(double Speed, double Torque, double Noise, int Readings);
