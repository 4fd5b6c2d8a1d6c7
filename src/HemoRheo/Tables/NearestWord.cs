namespace HemoRheo;

/// <summary>Finds the known word nearest to one that is not known, for messages.</summary>
internal static class NearestWord
{
    /// <summary>The known word with the fewest single-letter changes (letters inserted, removed or replaced; case ignored); null where there is none.</summary>
    public static string? To(string word, IEnumerable<string> known) => known.MinBy(candidate => Distance(word.ToUpperInvariant(), candidate.ToUpperInvariant()));

    private static int Distance(string a, string b)
    {
        var above = new int[b.Length + 1];
        for (var j = 0; j <= b.Length; j++) above[j] = j;
        for (var i = 1; i <= a.Length; i++)
        {
            var diagonal = above[0];
            above[0] = i;
            for (var j = 1; j <= b.Length; j++)
            {
                var replaced = diagonal + (a[i - 1] == b[j - 1] ? 0 : 1);
                diagonal = above[j];
                above[j] = Math.Min(replaced, 1 + Math.Min(above[j], above[j - 1]));
            }
        }

        return above[b.Length];
    }
}
