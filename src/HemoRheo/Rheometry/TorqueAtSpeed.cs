namespace HemoRheo;

/// <summary>Torque zero and noise of an instrument with nothing in the gap.</summary>
/// <param name="Speed">Rotational speed, rad/s; null where zero and noise are the same at all speeds.</param>
/// <param name="Zero">Mean torque, N.m.</param>
/// <param name="Uncertainty">Standard uncertainty of that, N.m.</param>
/// <param name="DegreesOfFreedom">Its degrees of freedom.</param>
/// <param name="Noise">Standard deviation of one reading of the torque, N.m.</param>
public sealed record TorqueAtSpeed(double? Speed, double Zero, double Uncertainty, double DegreesOfFreedom, double Noise);
