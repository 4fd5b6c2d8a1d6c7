namespace HemoRheo;

/// <summary>The formula of a flow law, written once on a readonly struct.</summary>
public interface IFormula
{
    /// <summary>Shear stress, Pa.</summary>
    /// <typeparam name="T">The number type.</typeparam>
    /// <param name="rate">Shear rate, 1/s.</param>
    /// <param name="p">Parameters on their natural scale, SI.</param>
    T Stress<T>(T rate, ReadOnlySpan<T> p) where T : struct, ILawNumber<T>;
}
