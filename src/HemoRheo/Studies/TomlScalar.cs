using System.Globalization;

namespace HemoRheo;

/// <summary>A text, a number, true or false, or a moment. A time without an offset has the value null.</summary>
internal sealed record TomlScalar(object? Value, int Line, int Column) : TomlNode(Line, Column)
{
    public override string InWords => Value switch
    {
        string text => $"the text \"{text}\"",
        bool truth => truth ? "true" : "false",
        DateTimeOffset => "a date and time",
        DateOnly => "a date without a time",
        null => "a date or time without an offset",
        IFormattable number => $"the number {number.ToString(null, CultureInfo.InvariantCulture)}",
        _ => "a value",
    };
}
