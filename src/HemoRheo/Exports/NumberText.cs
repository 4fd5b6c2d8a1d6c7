using System.Globalization;

namespace HemoRheo;

/// <summary>Numbers as exports write them: a sign, digits, the declared decimal sign, an exponent. No thousands signs, no other spelling.</summary>
internal static class NumberText
{
    private static readonly string[] NotFinite = ["nan", "inf", "infinity", "+inf", "-inf", "+infinity", "-infinity", "∞", "+∞", "-∞", "1.#inf", "-1.#inf", "1.#qnan", "-1.#ind", "#num!", "#div/0!"];

    /// <summary>Reads a number; says why where it is none.</summary>
    public static NumberFault Read(string text, char decimalSign, out double value)
    {
        value = 0;
        if (text.Length == 0) return NumberFault.Empty;
        var plain = text[0] == '\u2212' ? string.Concat("-", text.AsSpan(1)) : text;
        if (WellFormed(plain, decimalSign))
        {
            var pointed = decimalSign == '.' ? plain : plain.Replace(decimalSign, '.');
            value = double.Parse(pointed, NumberStyles.AllowLeadingSign | NumberStyles.AllowDecimalPoint | NumberStyles.AllowExponent, CultureInfo.InvariantCulture);
            return double.IsFinite(value) ? NumberFault.None : NumberFault.NotFinite;
        }

        if (WellFormed(plain, decimalSign == '.' ? ',' : '.')) return NumberFault.OtherDecimalSign;
        return NotFinite.Contains(plain.ToLowerInvariant()) ? NumberFault.NotFinite : NumberFault.NotANumber;
    }

    private static bool WellFormed(ReadOnlySpan<char> text, char decimalSign)
    {
        var at = text[0] is '+' or '-' ? 1 : 0;
        var whole = Digits(text, ref at);
        if (at < text.Length && text[at] == decimalSign)
        {
            at++;
            if (Digits(text, ref at) == 0) return false;
            whole++;
        }

        if (whole == 0) return false;
        if (at < text.Length && text[at] is 'e' or 'E')
        {
            at++;
            if (at < text.Length && text[at] is '+' or '-') at++;
            if (Digits(text, ref at) == 0) return false;
        }

        return at == text.Length;
    }

    private static int Digits(ReadOnlySpan<char> text, ref int at)
    {
        var start = at;
        while (at < text.Length && char.IsAsciiDigit(text[at])) at++;
        return at - start;
    }
}
