namespace HemoRheo;

/// <summary>One curve of a joint fit.</summary>
/// <param name="law">Its law.</param>
/// <param name="data">Its points with their error model.</param>
/// <param name="places">Column of each parameter of the law.</param>
/// <param name="contrast">Its loading factor, logarithm, as a sum over the columns of the factors; empty where there are none.</param>
internal sealed class JointCurve(FlowLaw law, CurveData data, int[] places, double[] contrast)
{
    private readonly LawOnPoints _model = new(law, data.Rates);

    /// <summary>Its law.</summary>
    public FlowLaw Law => law;

    /// <summary>Its points with their error model.</summary>
    public CurveData Data => data;

    /// <summary>Column of each parameter of the law.</summary>
    public int[] Places => places;

    /// <summary>Its loading factor, logarithm, as a sum over the columns of the factors; empty where there are none.</summary>
    public double[] Contrast => contrast;

    /// <summary>How many points.</summary>
    public int Points => data.Rates.Length;

    /// <summary>Stresses of its law and slopes to the law's own parameters, without the loading factor.</summary>
    public void Evaluate(ReadOnlySpan<double> own, Span<double> stresses, Span<double> slopes) => _model.Evaluate(own, stresses, slopes);
}
