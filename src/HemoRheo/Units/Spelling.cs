using System.Text;

namespace HemoRheo;

/// <summary>Spellings of one sign made one, and the nearest of several words.</summary>
internal static class Spelling
{
    /// <summary>
    /// The same text with one micro sign, one multiplication sign, one minus and powers written with a caret:
    /// U+03BC becomes U+00B5; middle dots and '*' become '.'; superscripts become "^2"; minus signs become '-'. Nothing else changes.
    /// </summary>
    public static string Normalized(string text)
    {
        var plain = new StringBuilder(text.Length + 2);
        var raised = false;
        foreach (var sign in text)
        {
            var power = Power(sign);
            if (power != '\0' && !raised) plain.Append('^');
            raised = power != '\0';
            plain.Append(raised ? power : Plain(sign));
        }

        return plain.ToString();
    }

    /// <summary>The candidate with the fewest changed letters, a letter's case counting least; null where none is near (more than a third of its letters, and more than one, would change).</summary>
    public static string? Nearest(string word, IEnumerable<string> candidates)
    {
        string? nearest = null;
        var least = (int.MaxValue, int.MaxValue);
        foreach (var candidate in candidates)
        {
            var changes = Changes(word.ToUpperInvariant(), candidate.ToUpperInvariant());
            if (changes > Math.Max(1, candidate.Length / 3)) continue;
            var both = (changes, Changes(word, candidate));
            if (both.CompareTo(least) < 0) (nearest, least) = (candidate, both);
        }

        return nearest;
    }

    private static char Plain(char sign) => sign switch
    {
        '\u03BC' => '\u00B5',
        '\u00B7' or '\u22C5' or '\u2219' or '\u2022' or '\u30FB' or '*' => '.',
        '\u2212' or '\u2010' or '\u2011' or '\u2013' => '-',
        _ => sign,
    };

    private static char Power(char sign) => sign switch
    {
        '\u2070' => '0',
        '\u00B9' => '1',
        '\u00B2' => '2',
        '\u00B3' => '3',
        >= '\u2074' and <= '\u2079' => (char)('4' + (sign - '\u2074')),
        '\u207B' => '-',
        _ => '\0',
    };

    private static int Changes(string from, string to)
    {
        var row = new int[to.Length + 1];
        for (var j = 0; j <= to.Length; j++) row[j] = j;
        for (var i = 1; i <= from.Length; i++)
        {
            var diagonal = row[0];
            row[0] = i;
            for (var j = 1; j <= to.Length; j++)
            {
                var above = row[j];
                var changed = diagonal + (from[i - 1] == to[j - 1] ? 0 : 1);
                row[j] = Math.Min(changed, 1 + Math.Min(above, row[j - 1]));
                diagonal = above;
            }
        }

        return row[to.Length];
    }
}
