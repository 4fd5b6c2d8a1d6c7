using System.Text;

namespace HemoRheo.Notebooks;

/// <summary>File names for pages of samples and instruments: made of plain letters only, and no two alike, whatever the pseudonyms hold.</summary>
internal sealed class PageNames
{
    private const int Longest = 60;

    private readonly Dictionary<string, string> _files = [];

    /// <summary>Gives each name its file name, in order.</summary>
    /// <param name="names">Pseudonyms or names of instruments, each once.</param>
    public PageNames(IEnumerable<string> names)
    {
        var taken = new HashSet<string>(StringComparer.OrdinalIgnoreCase);
        foreach (var name in names.Distinct())
        {
            var plain = Plain(name);
            var file = plain;
            for (var number = 2; !taken.Add(file); number++) file = $"{plain}-{number.ToString(System.Globalization.CultureInfo.InvariantCulture)}";
            _files[name] = $"{file}.html";
        }
    }

    /// <summary>The file name; null for a name that was not given.</summary>
    public string? Find(string name) => _files.GetValueOrDefault(name);

    /// <summary>The file name.</summary>
    public string this[string name] => _files[name];

    private static string Plain(string name)
    {
        var plain = new StringBuilder();
        foreach (var letter in name.Take(Longest)) plain.Append(char.IsAsciiLetterOrDigit(letter) || letter is '-' ? letter : '_');
        var text = plain.ToString().Trim('_', '-');
        return text.Length == 0 || Reserved(text) ? $"page-{text}".TrimEnd('-') : text;
    }

    private static bool Reserved(string text) =>
        text.ToUpperInvariant() is "CON" or "PRN" or "AUX" or "NUL" or "INDEX" || (text.Length == 4 && char.IsAsciiDigit(text[3]) && text[..3].ToUpperInvariant() is "COM" or "LPT");
}
