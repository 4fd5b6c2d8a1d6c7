namespace HemoRheo;

/// <summary>A solved least-squares problem.</summary>
/// <param name="parameters">Estimates.</param>
/// <param name="inverse">Inverse of the weighted normal equations, row by row; not yet times a scale.</param>
/// <param name="response">Change of the estimates when 1 is added to every datum.</param>
/// <param name="residuals">Standardized residuals, point by point.</param>
/// <param name="chiSquare">Their sum of squares.</param>
/// <param name="leastPivot">Smallest pivot of the scaled slopes: sine of the angle between a parameter's slopes and those before it.</param>
/// <param name="end">How it ended.</param>
internal sealed class LeastSquaresSolution(double[] parameters, double[] inverse, double[] response, double[] residuals, double chiSquare, double leastPivot, Convergence end)
{
    /// <summary>Estimates.</summary>
    public double[] Parameters { get; } = parameters;

    /// <summary>Inverse of the weighted normal equations, row by row; not yet times a scale.</summary>
    public double[] Inverse { get; } = inverse;

    /// <summary>Change of the estimates when 1 is added to every datum.</summary>
    public double[] Response { get; } = response;

    /// <summary>Standardized residuals, point by point.</summary>
    public double[] Residuals { get; } = residuals;

    /// <summary>Their sum of squares.</summary>
    public double ChiSquare { get; } = chiSquare;

    /// <summary>Smallest pivot of the scaled slopes: sine of the angle between a parameter's slopes and those before it.</summary>
    public double LeastPivot { get; } = leastPivot;

    /// <summary>How it ended.</summary>
    public Convergence End { get; } = end;
}
