namespace HemoRheo.App.Synthetic;

/// <summary>One simulated reading.</summary>
/// <param name="Up">Whether it belongs to the upward ramp.</param>
/// <param name="Elapsed">Time since the recording's start, s.</param>
/// <param name="Temperature">Temperature as read, degC.</param>
/// <param name="SetRate">Shear rate asked for, 1/s.</param>
/// <param name="Rate">Shear rate reached, 1/s.</param>
/// <param name="Stress">Shear stress read, Pa.</param>
internal sealed record SimulatedReading(bool Up, int Elapsed, double Temperature, double SetRate, double Rate, double Stress)
{
    /// <summary>Rotational speed asked for, 1/min.</summary>
    public double SetTurnsPerMinute => TurnsPerMinute(SetRate);

    /// <summary>Rotational speed reached, 1/min.</summary>
    public double ReachedTurnsPerMinute => TurnsPerMinute(Rate);

    /// <summary>Torque, N.m.</summary>
    public double Torque => Stress / TrueSizes.StressPerTorque;

    private static double TurnsPerMinute(double rate) => rate / TrueSizes.RatePerSpeed * 60 / (2 * Math.PI);
}
