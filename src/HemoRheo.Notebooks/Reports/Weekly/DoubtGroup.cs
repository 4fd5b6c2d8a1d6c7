namespace HemoRheo.Notebooks;

/// <summary>Samples in doubt for one reason.</summary>
/// <param name="Status">The instrument's status.</param>
/// <param name="Reason">Why.</param>
/// <param name="Samples">The samples, by time.</param>
internal sealed record DoubtGroup(InstrumentStatus Status, string Reason, Items<SampleInDoubt> Samples)
{
    private const int Named = 3;

    /// <summary>When they were measured, the first and the last day.</summary>
    public string Days => Figures.Date(Samples[0].At) is var first && Figures.Date(Samples[^1].At) is var last && first == last ? first : $"{first} to {last}";

    /// <summary>The first of them by name, and how many there are beside.</summary>
    public string Names => string.Join(", ", Samples.Take(Named).Select(sample => sample.Sample)) + (Samples.Count > Named ? $" and {Samples.Count - Named} more" : "");

    /// <summary>The samples of a review by reason, in order of time.</summary>
    public static Items<DoubtGroup> Of(InstrumentReview review) => review.InDoubt
        .GroupBy(doubt => (doubt.Status, doubt.Reason))
        .Select(group => new DoubtGroup(group.Key.Status, group.Key.Reason, group.ToItems()))
        .ToItems();
}
