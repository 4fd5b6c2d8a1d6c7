using static System.FormattableString;

namespace HemoRheo;

/// <summary>A decade of torque, N.m: from its lower end to below its upper one.</summary>
internal static class TorqueDecade
{
    /// <summary>The decade of a torque above zero.</summary>
    internal static Interval Of(double newtonMeters)
    {
        var power = (int)Math.Floor(Math.Log10(newtonMeters));
        return new(Math.Pow(10, power), Math.Pow(10, power + 1));
    }

    internal static bool Holds(Interval decade, double newtonMeters) => newtonMeters >= decade.Lower && newtonMeters < decade.Upper;

    /// <summary>In words, e.g. <c>1 to 10 uN.m</c>.</summary>
    internal static string Words(Interval decade) => Invariant($"{1e6 * decade.Lower:G3} to {1e6 * decade.Upper:G3} uN.m");
}
