namespace HemoRheo.Notebooks;

/// <summary>Finds what an instrument's troubles touch.</summary>
internal static class TouchedSamples
{
    /// <summary>The first loading of each sample that was measured while the instrument was not in order, by time.</summary>
    public static Items<TouchedSample> Of(Edition edition, string instrument) => edition.Results.Samples
        .Select(sample => (sample.Sample, Loading: sample.Result.Loadings.FirstOrDefault(loading => loading.Recording.Instrument == instrument && loading.Standing.Status != InstrumentStatus.InOrder)))
        .Where(pair => pair.Loading is not null)
        .Select(pair => new TouchedSample(pair.Sample, pair.Loading!.Recording.Loading, pair.Loading.Recording.StartedAt, pair.Loading.Standing))
        .OrderBy(touched => touched.At).ToItems();
}
