using System.Globalization;

namespace HemoRheo.App.Synthetic;

/// <summary>Numbers and times as the cohort's files write them.</summary>
internal static class Written
{
    /// <summary>With a decimal point and a fixed number of decimals.</summary>
    public static string Point(double number, int decimals) => number.ToString("F" + decimals, CultureInfo.InvariantCulture);

    /// <summary>With a decimal comma and a fixed number of decimals.</summary>
    public static string Comma(double number, int decimals) => Point(number, decimals).Replace('.', ',');

    /// <summary>A whole number.</summary>
    public static string Whole(int number) => number.ToString(CultureInfo.InvariantCulture);

    /// <summary>Date and time with offset.</summary>
    public static string Moment(DateTimeOffset moment) => moment.ToString("yyyy-MM-dd HH:mm:sszzz", CultureInfo.InvariantCulture);

    /// <summary>The date alone.</summary>
    public static string Day(DateTimeOffset moment) => moment.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture);
}
