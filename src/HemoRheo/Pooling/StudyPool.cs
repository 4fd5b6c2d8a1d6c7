namespace HemoRheo;

/// <summary>What only the whole study can tell.</summary>
/// <param name="Scatter">Loading scatter, by law and set of measurands.</param>
/// <param name="Laws">Evidence for each law.</param>
/// <param name="Slopes">Slopes against hematocrit, by law and measurand.</param>
/// <param name="Correlation">Correlation of the readings within a ramp.</param>
/// <param name="Findings">Findings about the study as a whole.</param>
public sealed record StudyPool(Items<LoadingScatter> Scatter, Items<LawEvidence> Laws, Items<HematocritSlope> Slopes, PointCorrelation Correlation, Items<Finding> Findings);
