namespace HemoRheo;

/// <summary>A parameter of a flow law.</summary>
/// <param name="Name">Its name, e.g. <c>yield stress</c>.</param>
/// <param name="Symbol">Its symbol.</param>
/// <param name="Unit">Its unit inside, e.g. <c>Pa</c>.</param>
/// <param name="Lower">Lower bound; 0 means fitted on the log scale.</param>
/// <param name="Upper">Upper bound; positive infinity where there is none. Both bounds finite means fitted on the logit scale.</param>
public sealed record LawParameter(string Name, string Symbol, string Unit, double Lower = 0, double Upper = double.PositiveInfinity);
