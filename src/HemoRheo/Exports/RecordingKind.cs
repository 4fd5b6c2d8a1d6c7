namespace HemoRheo;

/// <summary>What was in the gap.</summary>
public enum RecordingKind
{
    /// <summary>Blood of a sample.</summary>
    Blood,

    /// <summary>A calibration fluid.</summary>
    Check,

    /// <summary>Nothing but air: a blank run, which shows the torque zero and its noise.</summary>
    Blank,
}
