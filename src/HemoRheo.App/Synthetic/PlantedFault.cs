namespace HemoRheo.App.Synthetic;

/// <summary>A fault put into the cohort on purpose.</summary>
internal enum PlantedFault
{
    /// <summary>None.</summary>
    None,

    /// <summary>The bath warms up while the first loading is read.</summary>
    TemperatureExcursion,

    /// <summary>Measured too long after the draw.</summary>
    TooOld,

    /// <summary>The export file ends in the middle of a number of its second loading.</summary>
    FileCut,
}
