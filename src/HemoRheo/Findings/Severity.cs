namespace HemoRheo;

/// <summary>How much a finding matters.</summary>
public enum Severity
{
    /// <summary>Worth knowing; nothing is kept from a decision.</summary>
    Note,

    /// <summary>A person should look; the value is marked.</summary>
    Warning,

    /// <summary>What it concerns is set aside or not decided on until a person has acted.</summary>
    Fault,
}
