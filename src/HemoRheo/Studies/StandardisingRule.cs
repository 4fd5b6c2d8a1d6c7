namespace HemoRheo;

/// <summary>How a value is moved to the standard hematocrit.</summary>
public enum StandardisingRule
{
    /// <summary>By the sample's plasma viscosity: the power rule.</summary>
    PlasmaPower,

    /// <summary>By the study's own slope of log viscosity against hematocrit.</summary>
    StudySlope,
}
