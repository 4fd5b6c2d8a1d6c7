namespace HemoRheo;

/// <summary>A measuring geometry: concentric cylinders, torque and stress taken at the inner one.</summary>
/// <param name="Name">Name that exports and tables use.</param>
/// <param name="InnerRadius">Radius of the inner cylinder, m.</param>
/// <param name="OuterRadius">Radius of the outer cylinder, m.</param>
/// <param name="Length">Length of the inner cylinder, m.</param>
/// <param name="EndFactor">Factor on the torque for the cylinder's ends, 1.10 for the standard shape of ISO 3219.</param>
/// <remarks>Source: ISO 3219:1993, annex B.</remarks>
public sealed record Geometry(string Name, double InnerRadius, double OuterRadius, double Length, double EndFactor)
{
    /// <summary>Which cylinder turns; null where the study file does not say. Stress and rate are the same either way; where flow stops being laminar is not.</summary>
    public TurningCylinder? Turning { get; init; }
}
