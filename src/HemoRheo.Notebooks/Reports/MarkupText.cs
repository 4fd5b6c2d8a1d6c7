using System.Globalization;
using System.Runtime.CompilerServices;
using System.Text;

namespace HemoRheo.Notebooks;

/// <summary>Collects HTML from an interpolated string: literal parts as they are, text in holes encoded, HTML in holes kept. Numbers other than counts must be made text first, with digits that fit.</summary>
[InterpolatedStringHandler]
internal readonly struct MarkupText
{
    private readonly StringBuilder _html;

    public MarkupText(int literalLength, int formattedCount) => _html = new(literalLength + 24 * formattedCount);

    public void AppendLiteral(string literal) => _html.Append(literal);

    public void AppendFormatted(Markup html) => _html.Append(html.Text);

    public void AppendFormatted(IEnumerable<Markup> pieces)
    {
        foreach (var piece in pieces) _html.Append(piece.Text);
    }

    public void AppendFormatted(int count) => _html.Append(count.ToString(CultureInfo.InvariantCulture));

    public void AppendFormatted(string? text)
    {
        foreach (var rune in (text ?? "").EnumerateRunes())
        {
            if (Entity(rune) is { } entity) _html.Append(entity);
            else _html.Append(rune.ToString());
        }
    }

    /// <inheritdoc/>
    public override string ToString() => _html.ToString();

    private static string? Entity(Rune rune) => rune.Value switch
    {
        '&' => "&amp;",
        '<' => "&lt;",
        '>' => "&gt;",
        '"' => "&quot;",
        '\'' => "&#39;",
        '\t' or '\n' or '\r' => " ",
        < 0x20 or (>= 0x7f and < 0xa0) or 0xfffe or 0xffff => "\ufffd",
        0x061c or 0x200e or 0x200f or (>= 0x202a and <= 0x202e) or (>= 0x2066 and <= 0x2069) => "\ufffd",
        _ => null,
    };
}
