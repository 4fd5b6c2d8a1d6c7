namespace HemoRheo;

/// <summary>How loadings of one sample scatter beyond their fits, pooled over the study, for one law.</summary>
/// <param name="Law">Name of the law.</param>
/// <param name="Measurands">The measurands it covers together.</param>
/// <param name="Columns">Columns of its covariance.</param>
/// <param name="DegreesOfFreedom">Replicate degrees of freedom it was pooled from; 0 where declared.</param>
/// <param name="Findings">Findings: declared, held at its floor.</param>
public sealed record LoadingScatter(string Law, Items<Measurand> Measurands, Items<ScatterColumn> Columns, int DegreesOfFreedom, Items<Finding> Findings);
