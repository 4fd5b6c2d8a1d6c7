namespace HemoRheo;

/// <summary>A minimum that another start reached, beside the one given. Distances are sums of squares whose variances stand between reading and law, (relative)^2 reading x law + floor^2: at the law's own stress a law far above all readings would win by its large errors, at the readings one far below.</summary>
/// <param name="Distance">Its distance from the readings.</param>
/// <param name="Given">That of the minimum given.</param>
/// <param name="IsEqual">Whether the two are equal, so that only the start decides between their estimates.</param>
internal sealed record OtherMinimum(double Distance, double Given, bool IsEqual);
