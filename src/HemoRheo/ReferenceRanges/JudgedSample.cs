namespace HemoRheo;

/// <summary>A sample with its verdicts.</summary>
/// <param name="Result">The sample.</param>
/// <param name="Values">Every value, judged or with the reason why not.</param>
public sealed record JudgedSample(SampleResult Result, Items<JudgedValue> Values)
{
    /// <summary>Pseudonym of the sample.</summary>
    public string Sample => Result.Sample;

    /// <inheritdoc/>
    public override string ToString() => Result.ToString();
}
