namespace HemoRheo;

/// <summary>Four solved problems side by side.</summary>
/// <param name="Parameters">Estimates.</param>
/// <param name="Inverse">Inverse of the normal equations, row by row; zero rows for parameters that were held.</param>
/// <param name="Response">Change of the estimates when 1 is added to every datum.</param>
/// <param name="Residuals">Standardized residuals, point by point.</param>
/// <param name="ChiSquare">Their sum of squares.</param>
/// <param name="LeastPivot">Smallest pivot of the scaled normal equations: 1 less the squared multiple correlation of a parameter with those before it.</param>
/// <param name="AtWall">Mask: a parameter ran below its wall.</param>
/// <param name="Ends">How each lane ended.</param>
internal readonly record struct LaneSolution(
    Lane[] Parameters, Lane[] Inverse, Lane[] Response, Lane[] Residuals, Lane ChiSquare, Lane LeastPivot, Lane AtWall, Convergence[] Ends);
