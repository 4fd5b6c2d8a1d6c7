namespace HemoRheo;

/// <summary>A model of any number of parameters and predictors: its values and slopes at every point.</summary>
/// <param name="parameters">Parameters.</param>
/// <param name="values">Receives the model's values.</param>
/// <param name="slopes">Receives slope k of point i at k * values.Length + i.</param>
internal delegate void PointModel(ReadOnlySpan<double> parameters, Span<double> values, Span<double> slopes);
