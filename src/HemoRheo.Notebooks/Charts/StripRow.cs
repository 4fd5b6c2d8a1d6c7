namespace HemoRheo.Notebooks;

/// <summary>One row of a strip: a name, the range its values are held against, and the values.</summary>
/// <param name="Name">Name of the row.</param>
/// <param name="Range">The range; null where there is none.</param>
/// <param name="Values">The values, all of one measurand.</param>
/// <param name="Samples">The sample of each value; empty where the picture is of one sample.</param>
internal sealed record StripRow(string Name, ReferenceRange? Range, Items<JudgedValue> Values, Items<string> Samples)
{
    /// <summary>The sample of one of its values; empty where the picture is of one sample.</summary>
    public string SampleOf(int value) => value < Samples.Count ? Samples[value] : "";
}
