using System.Runtime.CompilerServices;

namespace HemoRheo;

/// <summary>Four numbers side by side, each with its slopes with respect to five parameters. Values have the bits of <see cref="Lane"/>. Plain fields, since an inline array is ten times slower.</summary>
public readonly struct LaneDual : ILawNumber<LaneDual>
{
    internal const int Slopes = 5;

    internal readonly Lane Value;
    internal readonly Lane S0;
    internal readonly Lane S1;
    internal readonly Lane S2;
    internal readonly Lane S3;
    internal readonly Lane S4;

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    internal LaneDual(Lane value) => Value = value;

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private LaneDual(Lane value, Lane s0, Lane s1, Lane s2, Lane s3, Lane s4)
    {
        Value = value;
        S0 = s0;
        S1 = s1;
        S2 = s2;
        S3 = s3;
        S4 = s4;
    }

    /// <summary>A number that is the given parameter itself.</summary>
    /// <param name="value">Its value.</param>
    /// <param name="parameter">Which of the five slopes is its own; any other number for none.</param>
    /// <param name="slope">That slope.</param>
    internal static LaneDual Seed(Lane value, int parameter, Lane slope) => new(
        value,
        parameter == 0 ? slope : default,
        parameter == 1 ? slope : default,
        parameter == 2 ? slope : default,
        parameter == 3 ? slope : default,
        parameter == 4 ? slope : default);

    internal Lane Slope(int parameter) => parameter switch { 0 => S0, 1 => S1, 2 => S2, 3 => S3, _ => S4 };

    /// <inheritdoc/>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static LaneDual operator +(LaneDual x, LaneDual y) => new(x.Value + y.Value, x.S0 + y.S0, x.S1 + y.S1, x.S2 + y.S2, x.S3 + y.S3, x.S4 + y.S4);

    /// <inheritdoc/>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static LaneDual operator +(LaneDual x, double y) => new(x.Value + y, x.S0, x.S1, x.S2, x.S3, x.S4);

    /// <inheritdoc/>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static LaneDual operator +(double x, LaneDual y) => new(x + y.Value, y.S0, y.S1, y.S2, y.S3, y.S4);

    /// <inheritdoc/>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static LaneDual operator -(LaneDual x, LaneDual y) => new(x.Value - y.Value, x.S0 - y.S0, x.S1 - y.S1, x.S2 - y.S2, x.S3 - y.S3, x.S4 - y.S4);

    /// <inheritdoc/>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static LaneDual operator -(LaneDual x, double y) => new(x.Value - y, x.S0, x.S1, x.S2, x.S3, x.S4);

    /// <inheritdoc/>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static LaneDual operator -(double x, LaneDual y) => new(x - y.Value, -y.S0, -y.S1, -y.S2, -y.S3, -y.S4);

    /// <inheritdoc/>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static LaneDual operator -(LaneDual x) => new(-x.Value, -x.S0, -x.S1, -x.S2, -x.S3, -x.S4);

    /// <inheritdoc/>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static LaneDual operator *(LaneDual x, LaneDual y) => new(
        x.Value * y.Value,
        x.S0 * y.Value + x.Value * y.S0,
        x.S1 * y.Value + x.Value * y.S1,
        x.S2 * y.Value + x.Value * y.S2,
        x.S3 * y.Value + x.Value * y.S3,
        x.S4 * y.Value + x.Value * y.S4);

    /// <inheritdoc/>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static LaneDual operator *(LaneDual x, double y) => x.Chain(x.Value * y, new(y));

    /// <inheritdoc/>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static LaneDual operator *(double x, LaneDual y) => y.Chain(x * y.Value, new(x));

    /// <inheritdoc/>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static LaneDual operator /(LaneDual x, LaneDual y)
    {
        var inverse = 1 / y.Value;
        var quotient = x.Value / y.Value;
        return new(
            quotient,
            (x.S0 - quotient * y.S0) * inverse,
            (x.S1 - quotient * y.S1) * inverse,
            (x.S2 - quotient * y.S2) * inverse,
            (x.S3 - quotient * y.S3) * inverse,
            (x.S4 - quotient * y.S4) * inverse);
    }

    /// <inheritdoc/>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static LaneDual operator /(LaneDual x, double y) => x.Chain(x.Value / y, new(1 / y));

    /// <inheritdoc/>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static LaneDual operator /(double x, LaneDual y)
    {
        var quotient = x / y.Value;
        return y.Chain(quotient, -quotient / y.Value);
    }

    /// <summary>Square root; at zero its slopes are zero, so that a parameter held at zero, or a rate of zero, is harmless.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static LaneDual Sqrt(LaneDual x)
    {
        var root = Lane.Sqrt(x.Value);
        return x.Chain(root, (0.5 / root) & (root > Lane.Zero));
    }

    /// <inheritdoc/>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static LaneDual Square(LaneDual x) => x.Chain(Lane.Square(x.Value), x.Value + x.Value);

    /// <inheritdoc/>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static LaneDual Exp(LaneDual x)
    {
        var exp = Lane.Exp(x.Value);
        return x.Chain(exp, exp);
    }

    /// <inheritdoc/>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static LaneDual Log(LaneDual x) => x.Chain(Lane.Log(x.Value), 1 / x.Value);

    /// <summary>Power; where x is zero its slopes are zero, so that a rate of zero is harmless.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static LaneDual Pow(LaneDual x, LaneDual y)
    {
        var power = Lane.Pow(x.Value, y.Value);
        var there = ~Lane.IsZero(x.Value);
        var byX = power * y.Value / x.Value & there;
        var byY = power * Lane.Log(x.Value) & there;
        return new(
            power,
            x.S0 * byX + y.S0 * byY,
            x.S1 * byX + y.S1 * byY,
            x.S2 * byX + y.S2 * byY,
            x.S3 * byX + y.S3 * byY,
            x.S4 * byX + y.S4 * byY);
    }

    /// <inheritdoc/>
    public static LaneDual Sin(LaneDual x) => x.Chain(Lane.Sin(x.Value), Lane.Cos(x.Value));

    /// <inheritdoc/>
    public static LaneDual Cos(LaneDual x) => x.Chain(Lane.Cos(x.Value), -Lane.Sin(x.Value));

    /// <inheritdoc/>
    public static LaneDual Atan(LaneDual x) => x.Chain(Lane.Atan(x.Value), 1 / (1 + Lane.Square(x.Value)));

    /// <summary>A function of this number alone: its value and its derivative.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private LaneDual Chain(Lane value, Lane derivative) => new(value, S0 * derivative, S1 * derivative, S2 * derivative, S3 * derivative, S4 * derivative);
}
