namespace HemoRheo;

/// <summary>The study's slope of a log value against hematocrit, within groups, knowing that hematocrit is measured with error.</summary>
/// <param name="Law">Name of the law.</param>
/// <param name="Measurand">The measurand.</param>
/// <param name="Slope">Slope of the log value per L/L.</param>
/// <param name="StandardUncertainty">Its standard uncertainty.</param>
/// <param name="DegreesOfFreedom">Its degrees of freedom.</param>
/// <param name="Plain">The plain regression slope, which hematocrit's error makes too flat; 0 where hematocrit does not vary within groups.</param>
/// <param name="People">People it rests on.</param>
/// <param name="WhyNot">Why it cannot be used; null where it can.</param>
/// <param name="Hematocrits">Lowest and highest hematocrit it rests on, L/L; a value outside them is not decided on. Null where it cannot be used.</param>
/// <remarks>Source: Fuller 1987, Measurement Error Models (known error variance).</remarks>
public sealed record HematocritSlope(string Law, Measurand Measurand, double Slope, double StandardUncertainty, double DegreesOfFreedom, double Plain, int People, string? WhyNot, Interval? Hematocrits = null);
