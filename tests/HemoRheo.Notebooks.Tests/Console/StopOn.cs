namespace HemoRheo.Notebooks.Tests;

/// <summary>A console that presses Ctrl-C when a text is written; with an empty text it never does.</summary>
internal sealed class StopOn(string text) : StringWriter
{
    private readonly CancellationTokenSource stop = new();

    public CancellationToken Token => stop.Token;

    public override void Write(string? value)
    {
        base.Write(value);
        if (text.Length > 0 && value is not null && value.Contains(text, StringComparison.Ordinal)) stop.Cancel();
    }
}
