namespace HemoRheo;

/// <summary>A point of a profile: one value of the quantity, with the other parameters at their best.</summary>
/// <param name="Value">The value, SI.</param>
/// <param name="Rise">Signed root of the rise of the weighted sum of squares, in standard deviations: below zero under the estimate, above zero over it. A straight line where the law is linear.</param>
/// <param name="Parameters">All parameters there, natural scale, in the order of the law.</param>
public sealed record ProfilePoint(double Value, double Rise, Items<double> Parameters);
