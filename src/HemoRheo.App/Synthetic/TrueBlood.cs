namespace HemoRheo.App.Synthetic;

/// <summary>The blood of one invented sample as it truly is, at 37 degC.</summary>
/// <param name="Hematocrit">True hematocrit, L/L.</param>
/// <param name="Plasma">True plasma viscosity, Pa.s.</param>
/// <param name="Fibrinogen">True fibrinogen, g/L.</param>
/// <param name="InfiniteShear">Quemada viscosity at infinite shear rate, Pa.s.</param>
/// <param name="CriticalRate">Quemada critical shear rate, 1/s.</param>
/// <param name="Ratio">Quemada ratio r, (1 - H k0/2)/(1 - H kinf/2).</param>
internal sealed record TrueBlood(double Hematocrit, double Plasma, double Fibrinogen, double InfiniteShear, double CriticalRate, double Ratio)
{
    /// <summary>Shear stress at a shear rate in 1/s, Pa.</summary>
    public double StressAt(double rate) => FlowLaw.Quemada.Stress(ShearRate.FromReciprocalSeconds(rate), InfiniteShear, CriticalRate, Ratio).Pascals;

    /// <summary>Apparent viscosity at a shear rate in 1/s, Pa.s.</summary>
    public double ViscosityAt(double rate) => StressAt(rate) / rate;

    /// <summary>Viscosity at a shear rate, moved to a standard hematocrit by the plasma power rule on true numbers, Pa.s.</summary>
    public double StandardViscosityAt(double rate, double standardHematocrit)
    {
        var k = standardHematocrit / Hematocrit;
        return Math.Exp(k * Math.Log(ViscosityAt(rate)) + (1 - k) * Math.Log(Plasma));
    }
}
