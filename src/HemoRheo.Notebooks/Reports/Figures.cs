using System.Globalization;

namespace HemoRheo.Notebooks;

/// <summary>Numbers as pages print them: to the digits that their uncertainty allows.</summary>
internal static class Figures
{
    /// <summary>What stands where there is no number.</summary>
    public const string Nothing = "–";

    /// <summary>The standard uncertainty of a value in its shown unit.</summary>
    public static double Uncertainty(Measurand measurand, Value value)
    {
        var u = value.StandardUncertainty;
        return measurand.Logarithmic ? Math.Abs(measurand.ToShown(value.X)) * u : u / measurand.Shown.Factor;
    }

    /// <summary>A value in its shown unit, without the unit.</summary>
    public static string Estimate(Measurand measurand, Value value) => double.IsFinite(value.X) ? Number(measurand.ToShown(value.X), Uncertainty(measurand, value)) : Nothing;

    /// <summary>A value in its shown unit, without the unit.</summary>
    public static string Estimate(SampleValue value) => Estimate(value.Measurand, value.Value);

    /// <summary>Its 95 % interval.</summary>
    public static string Interval(Measurand measurand, Value value)
    {
        if (!double.IsFinite(value.X) || !double.IsFinite(value.StandardUncertainty)) return Nothing;
        var interval = value.Interval().Select(measurand.ToShown);
        var u = Uncertainty(measurand, value);
        return $"{Number(interval.Lower, u)} to {Number(interval.Upper, u)}";
    }

    /// <summary>Its 95 % interval.</summary>
    public static string Interval(SampleValue value) => Interval(value.Measurand, value.Value);

    /// <summary>An interval given on the working scale of a measurand, in its shown unit.</summary>
    public static string Limits(Measurand measurand, Interval? working) => working is { } known ? Span(known.Select(measurand.ToShown)) : Nothing;

    /// <summary>The ratio that a difference of logarithms stands for.</summary>
    public static string Ratio(Value difference) => Number(Math.Exp(difference.X), Math.Exp(difference.X) * difference.StandardUncertainty);

    /// <summary>Its 95 % interval.</summary>
    public static string RatioInterval(Value difference)
    {
        var interval = difference.Interval().Select(Math.Exp);
        var u = Math.Exp(difference.X) * difference.StandardUncertainty;
        return $"{Number(interval.Lower, u)} to {Number(interval.Upper, u)}";
    }

    /// <summary>Both ends with three significant digits.</summary>
    public static string Span(Interval interval) => interval switch
    {
        { Lower: double.NegativeInfinity or 0 } => $"up to {Rounding.Digits(interval.Upper, 3)}",
        { Upper: double.PositiveInfinity } => $"from {Rounding.Digits(interval.Lower, 3)}",
        _ => Rounding.Interval(interval.Lower, interval.Upper),
    };

    /// <summary>A probability.</summary>
    public static string Probability(double probability) => probability switch
    {
        < 0.001 => "< 0.001",
        > 0.999 => "> 0.999",
        _ => probability.ToString("F3", CultureInfo.InvariantCulture),
    };

    /// <summary>A probability that may be missing.</summary>
    public static string Probability(double? probability) => probability is { } known ? Probability(known) : Nothing;

    /// <summary>Effective degrees of freedom.</summary>
    public static string Freedom(double degrees) => double.IsInfinity(degrees) ? "∞" : degrees >= 100 ? "> 100" : degrees.ToString(degrees < 10 ? "F1" : "F0", CultureInfo.InvariantCulture);

    /// <summary>A share with its sign, in per cent.</summary>
    public static string Signed(double percent) => (Math.Abs(percent) < 0.005 ? 0 : percent).ToString("+0.00;−0.00;0.00", CultureInfo.InvariantCulture);

    /// <summary>A number with some decimals.</summary>
    public static string Fixed(double number, int decimals) => number.ToString($"F{decimals}", CultureInfo.InvariantCulture);

    /// <summary>A round number, as short as it can be.</summary>
    public static string Digits(double number) => number.ToString("G3", CultureInfo.InvariantCulture);

    /// <summary>A local date.</summary>
    public static string Date(DateTimeOffset moment) => moment.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture);

    /// <summary>A local date and time with its offset.</summary>
    public static string Moment(DateTimeOffset moment) => moment.ToString("yyyy-MM-dd HH:mm zzz", CultureInfo.InvariantCulture);

    /// <summary>A count with the right form of its noun.</summary>
    public static string Count(int count, string one, string? many = null) => $"{count.ToString(CultureInfo.InvariantCulture)} {(count == 1 ? one : many ?? $"{one}s")}";

    /// <summary>The beginning of a digest.</summary>
    public static string Digest(string digest) => digest.Length > 12 ? digest[..12] : digest;

    private static string Number(double number, double uncertainty) => double.IsFinite(uncertainty) ? Rounding.Number(number, uncertainty) : Rounding.Digits(number, 4);
}
