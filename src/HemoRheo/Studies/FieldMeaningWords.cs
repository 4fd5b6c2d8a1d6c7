namespace HemoRheo;

/// <summary>How the study file names the fields of exports, and what each holds.</summary>
internal static class FieldMeaningWords
{
    private static readonly Dictionary<FieldMeaning, string> Names = new()
    {
        [FieldMeaning.Sample] = "sample",
        [FieldMeaning.Person] = "person",
        [FieldMeaning.Visit] = "visit",
        [FieldMeaning.Loading] = "loading",
        [FieldMeaning.Instrument] = "instrument",
        [FieldMeaning.Geometry] = "geometry",
        [FieldMeaning.Fluid] = "fluid",
        [FieldMeaning.StartedAt] = "started_at",
        [FieldMeaning.ReadingCount] = "reading_count",
        [FieldMeaning.Ramp] = "ramp",
        [FieldMeaning.Temperature] = "temperature",
        [FieldMeaning.Elapsed] = "elapsed",
        [FieldMeaning.SetSpeed] = "set_speed",
        [FieldMeaning.Speed] = "speed",
        [FieldMeaning.Torque] = "torque",
        [FieldMeaning.ShearRate] = "shear_rate",
        [FieldMeaning.SetShearRate] = "set_shear_rate",
        [FieldMeaning.ShearStress] = "shear_stress",
    };

    /// <summary>The name the study file uses.</summary>
    public static string Word(this FieldMeaning meaning) => Names[meaning];

    /// <summary>The meaning of a name of the study file; null where no field is named so.</summary>
    public static FieldMeaning? Meaning(string word) => Names.Where(pair => pair.Value == word).Select(pair => (FieldMeaning?)pair.Key).FirstOrDefault();

    /// <summary>The quantity a field holds; null for names, counts, words and times of day.</summary>
    public static Quantity? Quantity(this FieldMeaning meaning) => meaning switch
    {
        FieldMeaning.Temperature => HemoRheo.Quantity.Temperature,
        FieldMeaning.Elapsed => HemoRheo.Quantity.Time,
        FieldMeaning.SetSpeed or FieldMeaning.Speed => HemoRheo.Quantity.RotationalSpeed,
        FieldMeaning.Torque => HemoRheo.Quantity.Torque,
        FieldMeaning.ShearRate or FieldMeaning.SetShearRate => HemoRheo.Quantity.ShearRate,
        FieldMeaning.ShearStress => HemoRheo.Quantity.ShearStress,
        _ => null,
    };

    /// <summary>What a field holds, in words.</summary>
    public static string InWords(this FieldMeaning meaning) => meaning switch
    {
        FieldMeaning.Sample => "pseudonym of the sample, or name of the check",
        FieldMeaning.Person => "pseudonym of the person; where the samples table has one too, both must agree",
        FieldMeaning.Visit => "number of the visit; where the samples table has one too, both must agree",
        FieldMeaning.Loading => "number of the loading, from 1; without it every recording is loading 1",
        FieldMeaning.Instrument => "name of the instrument",
        FieldMeaning.Geometry => "name of the geometry",
        FieldMeaning.Fluid => "name of the calibration fluid, in a check",
        FieldMeaning.StartedAt => "date and time at which the recording started, with offset",
        FieldMeaning.ReadingCount => "number of readings that a block announces; a shorter block was cut",
        FieldMeaning.Ramp => "word that up_words and down_words settle",
        FieldMeaning.Temperature => "temperature of the sample",
        FieldMeaning.Elapsed => "time since the recording's start",
        FieldMeaning.SetSpeed => "rotational speed asked for",
        FieldMeaning.Speed => "rotational speed reached",
        FieldMeaning.Torque => "torque",
        FieldMeaning.ShearRate => "shear rate as exported",
        FieldMeaning.SetShearRate => "shear rate asked for",
        FieldMeaning.ShearStress => "shear stress as exported",
        _ => meaning.ToString(),
    };
}
