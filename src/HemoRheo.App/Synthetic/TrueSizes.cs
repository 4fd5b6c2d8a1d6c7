namespace HemoRheo.App.Synthetic;

/// <summary>The sizes of everything that goes wrong in a measurement of the cohort. The study file declares these same sizes.</summary>
internal static class TrueSizes
{
    public const double StandardHematocrit = 0.45;
    public const double Relative = 0.01;
    public const double FloorPascals = 0.0002;
    public const double Loading = 0.02;
    public const double LargestBias = 0.008;
    public const double Change = 0.07;
    public const double Day = 0.003;
    public const double CheckFilling = 0.002;
    public const double TorqueZero = 3e-9;
    public const double TorqueFloor = 1e-7;
    public const double Thermometer = 0.10;
    public const double BloodPerKelvin = 0.025;
    public const double BloodPerKelvinUncertainty = 0.003;
    public const double PlasmaPerKelvin = 0.020;
    public const double Plasma = 0.010;
    public const double Hematocrit = 0.006;
    public const double HematocritShared = 0.002;
    public const double CertifiedPascalSeconds = 0.00485;
    public const double CertifiedAt = 37;
    public const double CertificateUncertainty = 0.004;
    public const double CertificateCoverage = 2;
    public const double FluidPerKelvin = 0.0220;
    public const double FluidPerKelvinUncertainty = 0.0003;

    /// <summary>Radius of the inner cylinder, m.</summary>
    public const double InnerRadius = 0.01200;

    /// <summary>Radius of the outer cylinder, m: 1.0847 times the inner one, the standard ratio of ISO 3219.</summary>
    public const double OuterRadius = 0.01302;

    /// <summary>Length of the inner cylinder, m: three times its radius.</summary>
    public const double Length = 0.03600;

    /// <summary>Factor of the ends of ISO 3219's standard shape.</summary>
    public const double EndFactor = 1.10;

    private const double Ratio = OuterRadius / InnerRadius;

    /// <summary>Representative shear stress per torque, Pa/(N.m) (ISO 3219:1993, annex B).</summary>
    public const double StressPerTorque = (1 + Ratio * Ratio) / (2 * Ratio * Ratio) / (2 * Math.PI * Length * InnerRadius * InnerRadius * EndFactor);

    /// <summary>Representative shear rate per rotational speed, (1/s)/(rad/s) (ISO 3219:1993, annex B).</summary>
    public const double RatePerSpeed = (1 + Ratio * Ratio) / (Ratio * Ratio - 1);
}
