namespace HemoRheo;

/// <summary>How an instrument changed.</summary>
public enum ChangeShape
{
    /// <summary>From one check to the next, then steady.</summary>
    Step,

    /// <summary>Steadily from a moment on.</summary>
    Drift,
}
