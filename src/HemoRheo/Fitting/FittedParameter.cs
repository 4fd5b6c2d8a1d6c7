namespace HemoRheo;

/// <summary>A fitted parameter on its natural scale.</summary>
/// <param name="Parameter">Which parameter.</param>
/// <param name="Estimate">Its estimate, in the parameter's unit.</param>
/// <param name="StandardError">Its standard error on the natural scale; null with a reason beside it.</param>
/// <param name="WhyNoError">Why there is no standard error; null where there is one.</param>
/// <param name="AtBound">Whether it lies at a bound.</param>
public sealed record FittedParameter(LawParameter Parameter, double Estimate, double? StandardError, string? WhyNoError, bool AtBound);
