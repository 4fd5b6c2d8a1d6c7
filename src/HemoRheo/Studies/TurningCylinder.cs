namespace HemoRheo;

/// <summary>Which of two concentric cylinders turns.</summary>
public enum TurningCylinder
{
    /// <summary>The inner one; vortices set in at a critical speed.</summary>
    Inner,

    /// <summary>The outer one; no such vortices arise.</summary>
    Outer,
}
