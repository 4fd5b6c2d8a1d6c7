namespace HemoRheo;

/// <summary>Names of the kinds of source as a report prints them.</summary>
public static class SourceKindWords
{
    /// <summary>The kind in plain words, e.g. <c>torque zero</c>.</summary>
    public static string Words(this SourceKind kind) => kind switch
    {
        SourceKind.Fit => "fit",
        SourceKind.Loading => "loading",
        SourceKind.Calibration => "calibration",
        SourceKind.Day => "day",
        SourceKind.Certificate => "certificate",
        SourceKind.FluidBeta => "fluid beta",
        SourceKind.Thermometer => "thermometer",
        SourceKind.BloodBeta => "blood beta",
        SourceKind.Hematocrit => "hematocrit",
        SourceKind.Counter => "counter",
        SourceKind.Plasma => "plasma",
        SourceKind.TorqueZero => "torque zero",
        SourceKind.Slope => "slope",
        SourceKind.Law => "law",
        SourceKind.Bias => "bias",
        SourceKind.People => "people",
        _ => throw new ArgumentOutOfRangeException(nameof(kind)),
    };
}
