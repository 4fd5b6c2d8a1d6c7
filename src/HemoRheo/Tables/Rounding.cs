using System.Globalization;

namespace HemoRheo;

/// <summary>How numbers are shown: a value to the place of the second significant digit of its standard uncertainty, always with a decimal point.</summary>
/// <remarks>Source: JCGM 100:2008 (GUM), 7.2.6: at most two significant digits for an uncertainty, and the estimate to the same place. Only what is shown is rounded; files carry numbers in full.</remarks>
public static class Rounding
{
    /// <summary>A value, to the place of the second digit of its standard uncertainty.</summary>
    /// <param name="value">The value.</param>
    /// <param name="uncertainty">Its standard uncertainty, in the same unit; where it is 0 or infinite, the value is shown to five significant digits.</param>
    /// <exception cref="ArgumentOutOfRangeException">The uncertainty is negative or not a number.</exception>
    public static string Number(double value, double uncertainty) => Place(uncertainty) is { } place ? ToPlace(value, place) : Digits(value, 5);

    /// <summary>A standard uncertainty, to two significant digits.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The uncertainty is negative or not a number.</exception>
    public static string Uncertainty(double uncertainty) => Place(uncertainty) is { } place ? ToPlace(uncertainty, place) : Digits(uncertainty, 2);

    /// <summary>A value with its standard uncertainty, e.g. <c>4.87 (u 0.11)</c>.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The uncertainty is negative or not a number.</exception>
    public static string WithUncertainty(double value, double uncertainty) => $"{Number(value, uncertainty)} (u {Uncertainty(uncertainty)})";

    /// <summary>An interval, e.g. <c>4.65 to 5.09</c>, both ends to the place that a quarter of its width has its second digit at.</summary>
    /// <param name="lower">Lower end.</param>
    /// <param name="upper">Upper end.</param>
    /// <remarks>A quarter of a 95 % interval is near its standard uncertainty, so value and interval are shown to the same place or one digit apart.</remarks>
    public static string Interval(double lower, double upper)
    {
        var quarter = Math.Abs(upper - lower) / 4;
        return $"{Number(lower, quarter)} to {Number(upper, quarter)}";
    }

    /// <summary>A number to so many significant digits, trailing zeros of its fraction left out, without an exponent from 1e-5 up to 1e15.</summary>
    /// <param name="value">The number.</param>
    /// <param name="digits">Significant digits.</param>
    public static string Digits(double value, int digits)
    {
        if (double.IsInfinity(value)) return value > 0 ? "∞" : "-∞";
        if (Math.Abs(value) is not (>= 1e-5 and < 1e15)) return value.ToString($"G{digits}", CultureInfo.InvariantCulture);
        var text = ToPlace(value, Exponent(value, digits) - digits + 1);
        return text.Contains('.', StringComparison.Ordinal) ? text.TrimEnd('0').TrimEnd('.') : text;
    }

    private static int? Place(double uncertainty)
    {
        if (!(uncertainty >= 0)) throw new ArgumentOutOfRangeException(nameof(uncertainty), uncertainty, "A standard uncertainty is zero or above.");
        return uncertainty == 0 || double.IsInfinity(uncertainty) ? null : Exponent(uncertainty, 2) - 1;
    }

    private static int Exponent(double value, int digits)
    {
        var text = value.ToString($"E{digits - 1}", CultureInfo.InvariantCulture);
        return int.Parse(text.AsSpan(text.IndexOf('E', StringComparison.Ordinal) + 1), CultureInfo.InvariantCulture);
    }

    private static string ToPlace(double value, int place)
    {
        if (place <= 0)
        {
            var text = value.ToString($"F{-place}", CultureInfo.InvariantCulture);
            return text.AsSpan().IndexOfAnyInRange('1', '9') < 0 ? text.TrimStart('-') : text;
        }

        var step = Math.Pow(10, place);
        return (Math.Round(value / step, MidpointRounding.AwayFromZero) * step + 0).ToString("F0", CultureInfo.InvariantCulture);
    }
}
