namespace HemoRheo.App;

/// <summary>A study read only as far as its instruments need it, and the instrument that is asked about.</summary>
/// <param name="Readings">What was read.</param>
/// <param name="History">The instrument's checks.</param>
/// <param name="Log">Where its log lies.</param>
internal sealed record CheckedStudy(StudyReadings Readings, InstrumentHistory History, LogPlace Log)
{
    /// <summary>Name of the instrument.</summary>
    public string Instrument => History.Instrument.Name;

    /// <summary>Reads a study.</summary>
    public static CheckedStudy Of(CheckRequest request)
    {
        var study = Study.Open(request.StudyFile);
        var instrument = Chosen(study, request.Instrument);
        var readings = study.ReadExports();
        var history = study.CheckInstruments(readings).First(history => history.Instrument.Name == instrument);
        return new(readings, history, LogPlace.Of(request.Log, study, instrument));
    }

    /// <summary>The log of a study's instrument, without reading exports.</summary>
    public static InstrumentLog OpenLog(CheckRequest request)
    {
        if (request.Log is { } named) return InstrumentLog.Open(named);
        var study = Study.Open(request.StudyFile);
        return LogPlace.Of(null, study, Chosen(study, request.Instrument)).Open();
    }

    private static string Chosen(Study study, string? named)
    {
        var names = study.Instruments.Select(instrument => instrument.Name).ToArray();
        if (names.Length == 0) throw new CouldNotRunException("The study file declares no instrument. Declare it under [[instruments]], with how often it is checked and how far it may be off.");
        if (named is not null && !names.Contains(named)) throw new CouldNotRunException($"The study file declares no instrument \"{named}\"; it declares {string.Join(", ", names)}.");
        return named ?? (names.Length == 1 ? names[0] : throw new CouldNotRunException($"The study has several instruments: {string.Join(", ", names)}. Say which one: --instrument <name>"));
    }
}
