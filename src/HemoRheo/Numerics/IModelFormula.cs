namespace HemoRheo;

/// <summary>The formula of a model of several predictors, written once on a readonly struct.</summary>
public interface IModelFormula
{
    /// <summary>The model's value.</summary>
    /// <typeparam name="T">The number type.</typeparam>
    /// <param name="x">Predictors of a point.</param>
    /// <param name="p">Parameters.</param>
    T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T>;
}
