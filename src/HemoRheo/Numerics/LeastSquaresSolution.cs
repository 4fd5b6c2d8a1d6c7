namespace HemoRheo;

/// <summary>A solved least-squares problem.</summary>
public sealed class LeastSquaresSolution
{
    /// <param name="parameters">Estimates.</param>
    /// <param name="inverse">Inverse of the weighted normal equations, row by row; not yet times a scale.</param>
    /// <param name="response">Change of the estimates when 1 is added to every datum.</param>
    /// <param name="residuals">Standardized residuals, point by point.</param>
    /// <param name="chiSquare">Their sum of squares.</param>
    /// <param name="leastPivot">Smallest pivot of the scaled slopes: sine of the angle between a parameter's slopes and those before it.</param>
    /// <param name="end">How it ended.</param>
    internal LeastSquaresSolution(double[] parameters, double[] inverse, double[] response, double[] residuals, double chiSquare, double leastPivot, Convergence end) =>
        (Parameters, Inverse, Response, Residuals, ChiSquare, LeastPivot, End) = (parameters, inverse, response, residuals, chiSquare, leastPivot, end);

    /// <summary>Estimates, in the order of the start.</summary>
    public IReadOnlyList<double> Estimates => Parameters;

    /// <summary>Standard errors with the scale estimated from the residuals; not numbers where nothing is left to estimate it from, or where the fit did not converge.</summary>
    public IReadOnlyList<double> StandardErrors
    {
        get
        {
            var degrees = Residuals.Length - Parameters.Length;
            var scale = degrees > 0 && End.Converged ? ChiSquare / degrees : double.NaN;
            return [.. Enumerable.Range(0, Parameters.Length).Select(k => Math.Sqrt(scale * Inverse[k * Parameters.Length + k]))];
        }
    }

    /// <summary>Sum of squared standardized residuals.</summary>
    public double ChiSquare { get; }

    /// <summary>How it ended.</summary>
    public Convergence End { get; }

    /// <summary>Estimates.</summary>
    internal double[] Parameters { get; }

    /// <summary>Inverse of the weighted normal equations, row by row; not yet times a scale.</summary>
    internal double[] Inverse { get; }

    /// <summary>Change of the estimates when 1 is added to every datum.</summary>
    internal double[] Response { get; }

    /// <summary>Standardized residuals, point by point.</summary>
    internal double[] Residuals { get; }

    /// <summary>Smallest pivot of the scaled slopes: sine of the angle between a parameter's slopes and those before it.</summary>
    internal double LeastPivot { get; }
}
