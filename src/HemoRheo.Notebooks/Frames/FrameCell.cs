using System.Globalization;

namespace HemoRheo.Notebooks;

/// <summary>One cell of a frame.</summary>
internal static class FrameCell
{
    private const int ShortText = 30;

    public static Markup Of(object? value) => value switch
    {
        null or double.NaN or float.NaN => Markup.Of($"<td><i>missing</i></td>"),
        double or float or decimal or int or long => Markup.Of($"<td style=\"text-align:right\">{Text(value)}</td>"),
        _ when Text(value) is { Length: <= ShortText } text => Markup.Of($"<td style=\"text-align:left;white-space:nowrap\">{text}</td>"),
        _ => Markup.Of($"<td style=\"text-align:left\">{Text(value)}</td>"),
    };

    public static string Text(object? value) => value switch
    {
        null => "missing",
        double number => Rounding.Digits(number, 6),
        bool answer => answer ? "yes" : "no",
        IFormattable other => other.ToString(null, CultureInfo.InvariantCulture),
        _ => value.ToString() ?? "",
    };
}
