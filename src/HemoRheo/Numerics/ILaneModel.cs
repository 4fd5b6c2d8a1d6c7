namespace HemoRheo;

/// <summary>A model of one predictor in four lanes, one data set a lane.</summary>
internal interface ILaneModel
{
    /// <summary>Values and slopes at every point.</summary>
    /// <param name="x">Predictor, point by point.</param>
    /// <param name="parameters">Parameters.</param>
    /// <param name="values">Receives the model's values.</param>
    /// <param name="slopes">Receives slope k of point i at k * x.Length + i.</param>
    void Evaluate(ReadOnlySpan<Lane> x, ReadOnlySpan<Lane> parameters, Span<Lane> values, Span<Lane> slopes);
}
