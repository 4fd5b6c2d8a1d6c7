namespace HemoRheo.Notebooks;

/// <summary>Well-formed HTML. It is made from interpolated text only, whose holes are encoded, so text from data can never become markup.</summary>
/// <param name="Text">The HTML.</param>
internal readonly record struct Markup(string Text)
{
    /// <summary>Nothing.</summary>
    public static Markup None { get; } = new("");

    /// <summary>HTML whose literal parts are kept and whose holes are encoded, unless they are HTML themselves.</summary>
    public static Markup Of(MarkupText text) => new(text.ToString());

    /// <summary>One piece after another.</summary>
    public static Markup All(IEnumerable<Markup> pieces) => new(string.Concat(pieces.Select(piece => piece.Text)));

    /// <inheritdoc/>
    public override string ToString() => Text;
}
