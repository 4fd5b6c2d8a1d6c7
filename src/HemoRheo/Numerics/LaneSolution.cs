namespace HemoRheo;

/// <summary>Four solved problems side by side.</summary>
/// <param name="parameters">Estimates.</param>
/// <param name="inverse">Inverse of the normal equations, row by row; zero rows for parameters that were held.</param>
/// <param name="response">Change of the estimates when 1 is added to every datum.</param>
/// <param name="residuals">Standardized residuals, point by point.</param>
/// <param name="chiSquare">Their sum of squares.</param>
/// <param name="leastPivot">Smallest pivot of the scaled normal equations: 1 less the squared multiple correlation of a parameter with those before it.</param>
/// <param name="atWall">Mask: a parameter ran below its wall.</param>
/// <param name="ends">How each lane ended.</param>
internal sealed class LaneSolution(Lane[] parameters, Lane[] inverse, Lane[] response, Lane[] residuals, Lane chiSquare, Lane leastPivot, Lane atWall, Convergence[] ends)
{
    /// <summary>Estimates.</summary>
    public Lane[] Parameters { get; } = parameters;

    /// <summary>Inverse of the normal equations, row by row; zero rows for parameters that were held.</summary>
    public Lane[] Inverse { get; } = inverse;

    /// <summary>Change of the estimates when 1 is added to every datum.</summary>
    public Lane[] Response { get; } = response;

    /// <summary>Standardized residuals, point by point.</summary>
    public Lane[] Residuals { get; } = residuals;

    /// <summary>Their sum of squares.</summary>
    public Lane ChiSquare { get; } = chiSquare;

    /// <summary>Smallest pivot of the scaled normal equations: 1 less the squared multiple correlation of a parameter with those before it.</summary>
    public Lane LeastPivot { get; } = leastPivot;

    /// <summary>Mask: a parameter ran below its wall.</summary>
    public Lane AtWall { get; } = atWall;

    /// <summary>How each lane ended.</summary>
    public Convergence[] Ends { get; } = ends;
}
