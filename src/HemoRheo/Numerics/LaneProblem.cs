namespace HemoRheo;

/// <summary>Four least-squares problems side by side. Variance of a datum: (relative * model)^2 + floor^2, at the fitted model.</summary>
/// <param name="x">Predictor, point by point.</param>
/// <param name="y">Data, point by point.</param>
/// <param name="present">Mask: the point exists. Shorter data sets are padded with points that do not.</param>
/// <param name="start">Where the parameters start.</param>
/// <param name="free">Mask a parameter: it is fitted; otherwise it stays at its start.</param>
/// <param name="wall">A parameter below this ends its lane.</param>
/// <param name="relative">Relative standard deviation.</param>
/// <param name="floor">Floor of the standard deviation.</param>
internal sealed class LaneProblem(Lane[] x, Lane[] y, Lane[] present, Lane[] start, Lane[] free, Lane[] wall, double relative, double floor)
{
    /// <summary>Predictor, point by point.</summary>
    public Lane[] X { get; } = x;

    /// <summary>Data, point by point.</summary>
    public Lane[] Y { get; } = y;

    /// <summary>Mask: the point exists. Shorter data sets are padded with points that do not.</summary>
    public Lane[] Present { get; } = present;

    /// <summary>Where the parameters start.</summary>
    public Lane[] Start { get; } = start;

    /// <summary>Mask a parameter: it is fitted; otherwise it stays at its start.</summary>
    public Lane[] Free { get; } = free;

    /// <summary>A parameter below this ends its lane.</summary>
    public Lane[] Wall { get; } = wall;

    /// <summary>Relative standard deviation.</summary>
    public double Relative { get; } = relative;

    /// <summary>Floor of the standard deviation.</summary>
    public double Floor { get; } = floor;
}
