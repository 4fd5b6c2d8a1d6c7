namespace HemoRheo;

/// <summary>The numbers of one solved curve.</summary>
/// <param name="Scaled">Estimates on the fitting scale.</param>
/// <param name="Inverse">Inverse of the weighted normal equations, row by row; zero rows for a held parameter.</param>
/// <param name="Response">Change of the estimates a pascal of constant stress.</param>
/// <param name="Residuals">Standardized residuals.</param>
/// <param name="ChiSquare">Their sum of squares.</param>
/// <param name="End">How it ended.</param>
/// <param name="Held">Number of the parameter held at its bound; null where none is.</param>
internal sealed record CurveSolution(double[] Scaled, double[] Inverse, double[] Response, double[] Residuals, double ChiSquare, Convergence End, int? Held);
