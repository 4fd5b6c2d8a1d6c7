namespace HemoRheo;

/// <summary>Four least-squares problems side by side. Variance of a datum: (relative * model)^2 + floor^2, at the fitted model.</summary>
/// <param name="X">Predictor, point by point.</param>
/// <param name="Y">Data, point by point.</param>
/// <param name="Present">Mask: the point exists. Shorter data sets are padded with points that do not.</param>
/// <param name="Start">Where the parameters start.</param>
/// <param name="Free">Mask a parameter: it is fitted; otherwise it stays at its start.</param>
/// <param name="Wall">A parameter below this ends its lane.</param>
/// <param name="Relative">Relative standard deviation.</param>
/// <param name="Floor">Floor of the standard deviation.</param>
internal readonly record struct LaneProblem(Lane[] X, Lane[] Y, Lane[] Present, Lane[] Start, Lane[] Free, Lane[] Wall, double Relative, double Floor);
