namespace HemoRheo;

/// <summary>One reading of a logged check.</summary>
/// <param name="Rate">Shear rate, 1/s.</param>
/// <param name="Torque">Torque, N.m; null where neither torque nor geometry is known.</param>
/// <param name="Error">ln(apparent viscosity/expected).</param>
public sealed record LoggedReading(double Rate, double? Torque, double Error);
