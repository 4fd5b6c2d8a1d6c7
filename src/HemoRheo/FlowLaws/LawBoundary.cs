namespace HemoRheo;

/// <summary>A limiting case of a law: one parameter at its lower bound, where another law takes over.</summary>
/// <param name="Parameter">Number of the parameter.</param>
/// <param name="Wall">A natural value so near the bound that the bound itself is tried, from the lowest stress of the curve, Pa.</param>
/// <param name="Inside">A natural value to start again from, from the lowest stress of the curve, Pa.</param>
/// <param name="Law">Name of the law that takes over.</param>
internal sealed record LawBoundary(int Parameter, Func<double, double> Wall, Func<double, double> Inside, string Law);
