using System.Runtime.CompilerServices;
using System.Runtime.Intrinsics;

namespace HemoRheo;

/// <summary>Four numbers side by side, one a curve (or one a point on the general path). No lane ever feels another.</summary>
internal readonly struct Lane(Vector256<double> bits) : ILawNumber<Lane>
{
    public const int Count = 4;

    private const double ExpLimit = 708;

    public readonly Vector256<double> Bits = bits;

    public Lane(double all) : this(Vector256.Create(all))
    {
    }

    public Lane(double a, double b, double c, double d) : this(Vector256.Create(a, b, c, d))
    {
    }

    public double this[int lane] => Bits.GetElement(lane);

    public static Lane Zero => default;

    /// <summary>A mask that is true in every lane.</summary>
    public static Lane Everywhere => new(Vector256<double>.AllBitsSet);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane operator +(Lane x, Lane y) => new(x.Bits + y.Bits);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane operator +(Lane x, double y) => new(x.Bits + Vector256.Create(y));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane operator +(double x, Lane y) => new(Vector256.Create(x) + y.Bits);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane operator -(Lane x, Lane y) => new(x.Bits - y.Bits);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane operator -(Lane x, double y) => new(x.Bits - Vector256.Create(y));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane operator -(double x, Lane y) => new(Vector256.Create(x) - y.Bits);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane operator -(Lane x) => new(-x.Bits);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane operator *(Lane x, Lane y) => new(x.Bits * y.Bits);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane operator *(Lane x, double y) => new(x.Bits * Vector256.Create(y));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane operator *(double x, Lane y) => new(Vector256.Create(x) * y.Bits);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane operator /(Lane x, Lane y) => new(x.Bits / y.Bits);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane operator /(Lane x, double y) => new(x.Bits / Vector256.Create(y));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane operator /(double x, Lane y) => new(Vector256.Create(x) / y.Bits);

    /// <summary>A mask, true where x lies below y; false where either is not a number.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane operator <(Lane x, Lane y) => new(Vector256.LessThan(x.Bits, y.Bits));

    /// <summary>A mask, true where x lies above y; false where either is not a number.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane operator >(Lane x, Lane y) => new(Vector256.GreaterThan(x.Bits, y.Bits));

    /// <summary>Both masks.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane operator &(Lane x, Lane y) => new(x.Bits & y.Bits);

    /// <summary>Either mask.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane operator |(Lane x, Lane y) => new(x.Bits | y.Bits);

    /// <summary>The opposite mask.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane operator ~(Lane x) => new(~x.Bits);

    public bool AnyTrue => Vector256.ExtractMostSignificantBits(Bits) != 0;

    public bool TrueAt(int lane) => (Vector256.ExtractMostSignificantBits(Bits) >> lane & 1) != 0;

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane Select(Lane mask, Lane yes, Lane no) => new(Vector256.ConditionalSelect(mask.Bits, yes.Bits, no.Bits));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane Abs(Lane x) => new(Vector256.Abs(x.Bits));

    /// <summary>The larger; y where x is not a number.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane Max(Lane x, Lane y) => Select(x > y, x, y);

    /// <summary>The smaller; y where x is not a number.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane Min(Lane x, Lane y) => Select(x < y, x, y);

    /// <summary>A mask, true where x is a finite number.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane IsFinite(Lane x) => Abs(x) < new Lane(double.PositiveInfinity);

    /// <summary>A mask, true where x is zero.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane IsZero(Lane x) => new(Vector256.Equals(x.Bits, Vector256<double>.Zero));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane Sqrt(Lane x) => new(Vector256.Sqrt(x.Bits));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane Square(Lane x) => new(x.Bits * x.Bits);

    /// <summary>Exponential. The vector function takes another road for all four lanes when one is out of range, so such lanes are masked and put back.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane Exp(Lane x)
    {
        var inside = Vector256.LessThan(Vector256.Abs(x.Bits), Vector256.Create(ExpLimit));
        var answer = Vector256.Exp(x.Bits & inside);
        var low = Vector256.LessThan(x.Bits, Vector256.Create(-ExpLimit)) | Vector256.Equals(x.Bits, Vector256.Create(-ExpLimit));
        var outside = Vector256.ConditionalSelect(low, Vector256<double>.Zero, x.Bits * Vector256.Create(double.PositiveInfinity));
        return new(Vector256.ConditionalSelect(inside, answer, outside));
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane Log(Lane x) => new(Vector256.Log(x.Bits));

    /// <summary>x to the power y; 1 where y is zero, also at x = 0, where the logarithm is not finite.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lane Pow(Lane x, Lane y) => Exp(y * Log(x) & ~IsZero(y));

    /// <summary>Sine, lane by lane: no law in use needs it fast.</summary>
    public static Lane Sin(Lane x) => new(Math.Sin(x[0]), Math.Sin(x[1]), Math.Sin(x[2]), Math.Sin(x[3]));

    /// <summary>Cosine, lane by lane.</summary>
    public static Lane Cos(Lane x) => new(Math.Cos(x[0]), Math.Cos(x[1]), Math.Cos(x[2]), Math.Cos(x[3]));

    /// <summary>Arctangent, lane by lane.</summary>
    public static Lane Atan(Lane x) => new(Math.Atan(x[0]), Math.Atan(x[1]), Math.Atan(x[2]), Math.Atan(x[3]));
}
