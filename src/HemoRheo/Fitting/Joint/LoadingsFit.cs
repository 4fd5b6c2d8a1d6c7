using static System.FormattableString;

namespace HemoRheo;

/// <summary>
/// Loadings of one sample fitted together: stress of loading l = exp(f_l) x law(rate), the law's parameters shared and the f_l summing to zero.
/// The parameters so speak of the geometric mean of the loadings.
/// </summary>
/// <param name="Joint">The joint fit: the law's parameters, then a factor exp(f_l) for every loading.</param>
/// <remarks>
/// Standard errors of the parameters hold the errors of the readings and not the scatter between loadings, of which the mean of L loadings keeps s/sqrt(L).
/// That part stands beside the fit's in values derived from it, such as <c>loadings.ApparentViscosity(at)</c>: with A the variance of the f_l and V what the fit explains of it, (A - V)/L with A - V kept between A/10 and A, on (L - 1) m^2 degrees of freedom, m = (A - V)/A.
/// </remarks>
public sealed record LoadingsFit(JointFit Joint)
{
    private const double LeastShare = 0.1;

    /// <summary>The law.</summary>
    public FlowLaw Law => Joint.Laws[0];

    /// <summary>Whether values may be taken from this fit.</summary>
    public bool Usable => Joint.Usable;

    /// <summary>Findings about the fit.</summary>
    public Items<Finding> Findings => Joint.Findings;

    /// <summary>How much thicker each loading reads than their geometric mean.</summary>
    public Items<LoadingFactor> Factors => Joint.Parameters
        .Where(IsFactor)
        .Select(parameter => new LoadingFactor(Joint.Curves[parameter.Curve!.Value].Label, parameter.Number.Estimate, parameter.Number.StandardError / parameter.Number.Estimate))
        .ToItems();

    /// <summary>Standard deviation of the factors' logarithms, on one degree of freedom less than loadings; the errors of the readings are still in it.</summary>
    public double Scatter => Math.Sqrt(Logs().Sum(f => f * f) / (Joint.Curves.Count - 1));

    /// <summary>Share of the factors' variance that the errors of the readings do not explain, kept between 0.1 and 1.</summary>
    public double ShareOfLoadings => Math.Clamp(ShareLeft, LeastShare, 1);

    /// <summary>A parameter of the law by its name.</summary>
    /// <param name="name">Its name.</param>
    /// <exception cref="ArgumentException">There is no such parameter.</exception>
    public FittedParameter this[string name] => Joint[name];

    /// <summary>One row a parameter and a factor.</summary>
    public Table ToTable() => Joint.ToTable();

    /// <inheritdoc/>
    public override string ToString() => Joint.ToString();

    /// <summary>The loadings of a joint fit; scatter that the readings explain is a finding.</summary>
    internal static LoadingsFit Of(JointFit joint)
    {
        var fit = new LoadingsFit(joint);
        if (joint.Covariance.Count == 0 || fit.ShareLeft >= LeastShare) return fit;
        var words = Invariant($"{joint.LawName}: the factors of {joint.Curves.Count} loadings scatter by {100 * fit.Scatter:G2} %, of which errors of the readings explain {100 * Math.Sqrt(fit.Explained):G2} %.");
        return new(joint with { Findings = joint.Findings.With([FittingFindings.LoadingScatterHidden.At(joint.Where, words, fit.ShareLeft, LeastShare)]) });
    }

    /// <summary>What the scatter between loadings adds to the mean of these, for a quantity whose working value moves by this response when every stress is raised by a relative unit.</summary>
    internal Contribution LoadingPart(double response) => new(
        new(SourceKind.Loading, $"{Joint.Samples}/0"),
        response * Scatter * Math.Sqrt(ShareOfLoadings / Joint.Curves.Count),
        $"loadings of {Joint.Samples}",
        (Joint.Curves.Count - 1) * ShareOfLoadings * ShareOfLoadings);

    /// <summary>The mean loading as a fit of all points: what measurands are asked of.</summary>
    internal FittedLaw Mean() => Joint.Part(0, Joint.Curves[0] with
    {
        Label = Joint.Curves[0].Label with { Sample = Joint.Samples, Loading = 0 },
        Points = Joint.Curves.SelectMany(curve => curve.Points).ToItems(),
    });

    private double Explained => Places().Sum(k => Joint.Covariance[k * Joint.Scaled.Count + k]) / (Joint.Curves.Count - 1);

    private double ShareLeft => Scatter > 0 ? 1 - Explained / (Scatter * Scatter) : 0;

    private IEnumerable<double> Logs() => Places().Select(k => Joint.Scaled[k]);

    private IEnumerable<int> Places() => Enumerable.Range(0, Joint.Parameters.Count).Where(k => IsFactor(Joint.Parameters[k]));

    private static bool IsFactor(JointParameter parameter) => ReferenceEquals(parameter.Number.Parameter, LoadingFactor.Parameter);
}
