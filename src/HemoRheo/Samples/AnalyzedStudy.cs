namespace HemoRheo;

/// <summary>A study's samples analyzed, before anything is judged.</summary>
/// <param name="Study">The study.</param>
/// <param name="Readings">What was read.</param>
/// <param name="Histories">Histories of its instruments.</param>
/// <param name="Pool">What only the whole study tells.</param>
/// <param name="Samples">Its samples, by pseudonym.</param>
public sealed record AnalyzedStudy(Study Study, StudyReadings Readings, Items<InstrumentHistory> Histories, StudyPool Pool, Items<SampleResult> Samples);
