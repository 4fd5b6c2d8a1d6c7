namespace HemoRheo;

/// <summary>The numbers a formula is written on. One text of a formula then serves plain evaluation, exact slopes, and four evaluations at a time.</summary>
/// <typeparam name="T">The number type itself.</typeparam>
/// <remarks>Write <c>T.Sqrt(x)</c>, not <c>Math.Sqrt(x)</c>. There are no comparisons: a formula has no branches.</remarks>
public interface ILawNumber<T> where T : struct, ILawNumber<T>
{
    /// <summary>Sum.</summary>
    static abstract T operator +(T x, T y);

    /// <summary>Sum with a plain number.</summary>
    static abstract T operator +(T x, double y);

    /// <summary>Sum with a plain number.</summary>
    static abstract T operator +(double x, T y);

    /// <summary>Difference.</summary>
    static abstract T operator -(T x, T y);

    /// <summary>Difference with a plain number.</summary>
    static abstract T operator -(T x, double y);

    /// <summary>Difference with a plain number.</summary>
    static abstract T operator -(double x, T y);

    /// <summary>Opposite.</summary>
    static abstract T operator -(T x);

    /// <summary>Product.</summary>
    static abstract T operator *(T x, T y);

    /// <summary>Product with a plain number.</summary>
    static abstract T operator *(T x, double y);

    /// <summary>Product with a plain number.</summary>
    static abstract T operator *(double x, T y);

    /// <summary>Quotient.</summary>
    static abstract T operator /(T x, T y);

    /// <summary>Quotient with a plain number.</summary>
    static abstract T operator /(T x, double y);

    /// <summary>Quotient with a plain number.</summary>
    static abstract T operator /(double x, T y);

    /// <summary>Square root; not a number below zero.</summary>
    static abstract T Sqrt(T x);

    /// <summary>Square.</summary>
    static abstract T Square(T x);

    /// <summary>Exponential; 0 below about -708 and infinity above about 709.</summary>
    static abstract T Exp(T x);

    /// <summary>Natural logarithm; not a number below zero.</summary>
    static abstract T Log(T x);

    /// <summary>x to the power y, for x above zero.</summary>
    static abstract T Pow(T x, T y);

    /// <summary>Sine of an angle in radians.</summary>
    static abstract T Sin(T x);

    /// <summary>Cosine of an angle in radians.</summary>
    static abstract T Cos(T x);

    /// <summary>Arctangent in radians, between -pi/2 and pi/2.</summary>
    static abstract T Atan(T x);
}
