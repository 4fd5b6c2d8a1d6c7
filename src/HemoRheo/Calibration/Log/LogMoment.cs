using System.Globalization;

namespace HemoRheo;

/// <summary>Moments as the log writes them: ISO 8601 with offset, a fraction of a second only where there is one.</summary>
internal static class LogMoment
{
    private const string Form = "yyyy-MM-dd'T'HH:mm:ss.FFFFFFFzzz";

    internal static string Text(DateTimeOffset moment) => moment.ToString(Form, CultureInfo.InvariantCulture);

    internal static DateTimeOffset Read(string text) => DateTimeOffset.ParseExact(text, Form, CultureInfo.InvariantCulture);
}
