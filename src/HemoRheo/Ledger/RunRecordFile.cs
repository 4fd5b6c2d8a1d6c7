namespace HemoRheo;

/// <summary>A record of a run as its JSON file lays it out.</summary>
internal sealed record RunRecordFile(
    int Format,
    string Study,
    long Seed,
    string Settings,
    NamedText[] Versions,
    NamedText[] Inputs,
    NamedText[] Feeds,
    NamedText[] Results,
    string ResultDigest);
