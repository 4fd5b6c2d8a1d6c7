using System.Globalization;

namespace HemoRheo;

/// <summary>A number and its unit written as text, such as "12.5 mm": decimal point, a spelling of the unit table, a space between them or none.</summary>
public static class QuantityText
{
    /// <summary>The value in SI (temperatures in degC).</summary>
    /// <param name="text">Number and unit.</param>
    /// <param name="quantity">The quantity that is wanted.</param>
    /// <exception cref="FormatException">The text is not a number with a unit of that quantity; the message says what was found and expected.</exception>
    public static double Read(string text, Quantity quantity) => TryRead(text, quantity, out var si, out var fault) ? si : throw new FormatException(fault);

    internal static bool TryRead(string text, Quantity quantity, out double si, out string fault)
    {
        si = 0;
        fault = "";
        var end = NumberEnd(text);
        var spelling = text[end..].Trim();
        if (!double.TryParse(Spelling.Normalized(text[..end]), NumberStyles.AllowLeadingSign | NumberStyles.AllowDecimalPoint | NumberStyles.AllowExponent, CultureInfo.InvariantCulture, out var number)
            || !double.IsFinite(number))
            fault = $"\"{text}\" does not begin with a number";
        else if (spelling.Length == 0)
            fault = $"\"{text}\" has no unit";
        else if (spelling.StartsWith(','))
            fault = $"\"{text}\" has a decimal comma; write a decimal point";
        else if (UnitTable.Find(spelling, quantity) is not { } unit)
            fault = UnitTable.Nearest(spelling, quantity) is { } near ? $"unit \"{spelling}\" is unknown for this quantity; the nearest is \"{near}\"" : $"unit \"{spelling}\" is unknown for this quantity";
        else
            si = unit.ToSi(number);
        return fault.Length == 0;
    }

    private static int NumberEnd(string text)
    {
        var at = 0;
        if (at < text.Length && text[at] is '+' or '-' or '\u2212') at++;
        while (at < text.Length && (char.IsAsciiDigit(text[at]) || text[at] == '.')) at++;
        var exponent = at;
        if (exponent < text.Length && text[exponent] is 'e' or 'E')
        {
            exponent++;
            if (exponent < text.Length && text[exponent] is '+' or '-') exponent++;
            if (exponent < text.Length && char.IsAsciiDigit(text[exponent]))
            {
                while (exponent < text.Length && char.IsAsciiDigit(text[exponent])) exponent++;
                at = exponent;
            }
        }

        return at;
    }
}
