namespace HemoRheo;

/// <summary>A solved least-squares problem.</summary>
/// <param name="Parameters">Estimates.</param>
/// <param name="Inverse">Inverse of the weighted normal equations, row by row; not yet times a scale.</param>
/// <param name="Response">Change of the estimates when 1 is added to every datum.</param>
/// <param name="Residuals">Standardized residuals, point by point.</param>
/// <param name="ChiSquare">Their sum of squares.</param>
/// <param name="LeastPivot">Smallest pivot of the scaled slopes: sine of the angle between a parameter's slopes and those before it.</param>
/// <param name="End">How it ended.</param>
internal sealed record LeastSquaresSolution(double[] Parameters, double[] Inverse, double[] Response, double[] Residuals, double ChiSquare, double LeastPivot, Convergence End);
