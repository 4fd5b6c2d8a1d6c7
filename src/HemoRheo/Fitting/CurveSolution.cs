namespace HemoRheo;

/// <summary>The numbers of one solved curve.</summary>
/// <param name="scaled">Estimates on the fitting scale.</param>
/// <param name="inverse">Inverse of the weighted normal equations, row by row; zero rows for a held parameter.</param>
/// <param name="response">Change of the estimates a pascal of constant stress.</param>
/// <param name="residuals">Standardized residuals.</param>
/// <param name="chiSquare">Their sum of squares.</param>
/// <param name="end">How it ended.</param>
/// <param name="held">Number of the parameter held at its bound; null where none is.</param>
internal sealed class CurveSolution(double[] scaled, double[] inverse, double[] response, double[] residuals, double chiSquare, Convergence end, int? held)
{
    /// <summary>Estimates on the fitting scale.</summary>
    public double[] Scaled { get; } = scaled;

    /// <summary>Inverse of the weighted normal equations, row by row; zero rows for a held parameter.</summary>
    public double[] Inverse { get; } = inverse;

    /// <summary>Change of the estimates a pascal of constant stress.</summary>
    public double[] Response { get; } = response;

    /// <summary>Standardized residuals.</summary>
    public double[] Residuals { get; } = residuals;

    /// <summary>Their sum of squares.</summary>
    public double ChiSquare { get; } = chiSquare;

    /// <summary>How it ended.</summary>
    public Convergence End { get; } = end;

    /// <summary>Number of the parameter held at its bound; null where none is.</summary>
    public int? Held { get; } = held;

    /// <summary>What other starts reached, where it is not this minimum.</summary>
    public OtherMinimum? Other { get; init; }

    /// <summary>The same numbers with another end.</summary>
    public CurveSolution Ended(Convergence end) => new(Scaled, Inverse, Response, Residuals, ChiSquare, end, Held) { Other = Other };

    /// <summary>The same numbers beside what other starts reached.</summary>
    public CurveSolution Beside(OtherMinimum? other) => new(Scaled, Inverse, Response, Residuals, ChiSquare, End, Held) { Other = other };
}
