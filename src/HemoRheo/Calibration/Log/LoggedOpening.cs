namespace HemoRheo;

/// <summary>The first entry of every log.</summary>
/// <param name="Instrument">Name of the instrument.</param>
public sealed record LoggedOpening(string Instrument) : LoggedEvent
{
    internal override string Kind => "opening";

    /// <inheritdoc/>
    public override string ToString() => $"log of {Instrument} opened";
}
