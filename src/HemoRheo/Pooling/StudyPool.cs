namespace HemoRheo;

/// <summary>What only the whole study can tell.</summary>
/// <param name="Scatter">Loading scatter, by law and set of measurands.</param>
/// <param name="Laws">Evidence for each law.</param>
/// <param name="Slopes">Slopes against hematocrit, by law and measurand.</param>
/// <param name="Correlation">Correlation of the readings within a ramp.</param>
/// <param name="Comparison">The laws compared on all curves together.</param>
/// <param name="Spreads">Parts of the budget among laws that the curves cannot part, by law and measurand; none where they are parted.</param>
/// <param name="Findings">Findings about the study as a whole.</param>
public sealed record StudyPool(Items<LoadingScatter> Scatter, Items<LawEvidence> Laws, Items<HematocritSlope> Slopes, PointCorrelation Correlation, PooledComparison Comparison, Items<LawSpread> Spreads, Items<Finding> Findings);
