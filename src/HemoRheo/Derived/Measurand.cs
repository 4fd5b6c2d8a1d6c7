namespace HemoRheo;

/// <summary>A quantity that a study reports: a viscosity at a rate, a yield stress, an index.</summary>
/// <param name="Name">Its name, e.g. <c>viscosity at 10 1/s</c>.</param>
/// <param name="Symbol">Its symbol.</param>
/// <param name="Shown">The unit it is shown in.</param>
/// <param name="Logarithmic">Whether its working scale is the natural logarithm of its SI number, or the SI number itself.</param>
public abstract record Measurand(string Name, string Symbol, Unit Shown, bool Logarithmic)
{
    /// <summary>The Casson yield stress: an extrapolation to zero rate.</summary>
    public static Measurand CassonYieldStress { get; } = new LawNumber("Casson yield stress", "τ_y", ShownUnits.Millipascal, "Casson", 0);

    /// <summary>The Casson viscosity: the limit at high rates.</summary>
    public static Measurand CassonViscosity { get; } = new LawNumber("Casson viscosity", "η_c", ShownUnits.MillipascalSecond, "Casson", 1);

    /// <summary>Apparent viscosity at a shear rate.</summary>
    /// <param name="at">Shear rate, finite and above zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">The rate is not finite and above zero.</exception>
    public static Measurand Viscosity(ShearRate at) => at.ReciprocalSeconds > 0 && double.IsFinite(at.ReciprocalSeconds)
        ? new ViscosityAtRate(at)
        : throw new ArgumentOutOfRangeException(nameof(at), $"A viscosity is asked for at a finite shear rate above zero; this one is {at}.");

    /// <summary>Viscosity at a shear rate relative to the plasma of the same sample.</summary>
    public static Measurand RelativeViscosity(ShearRate at) => new RelativeViscosityAtRate(at);

    /// <summary>Shear-thinning index: viscosity at a low rate over viscosity at a high rate; 1 for a Newtonian liquid.</summary>
    /// <param name="low">The low rate, above zero.</param>
    /// <param name="high">The high rate, above the low one.</param>
    /// <exception cref="ArgumentException">The rates are not above zero, or not in this order.</exception>
    public static Measurand ShearThinningIndex(ShearRate low, ShearRate high) => low.ReciprocalSeconds > 0 && high.ReciprocalSeconds > low.ReciprocalSeconds && double.IsFinite(high.ReciprocalSeconds)
        ? new ShearThinningIndex(low, high)
        : throw new ArgumentException($"A shear-thinning index needs a low rate above zero and a high rate above that; these are {low} and {high}.");

    /// <summary>From the working scale to the SI number.</summary>
    public double ToSi(double working) => Logarithmic ? Math.Exp(working) : working;

    /// <summary>From the SI number to the working scale.</summary>
    public double ToWorking(double si) => Logarithmic ? Math.Log(si) : si;

    /// <summary>From the working scale to the number in the shown unit.</summary>
    public double ToShown(double working) => Shown.FromSi(ToSi(working));

    /// <summary>The measurand of one fit, with its gradient; null where it does not come from a fit of this law alone.</summary>
    internal abstract FitValue? From(FittedLaw fit);

    /// <summary>Whether the measurand speaks of rates that the curve does not reach.</summary>
    internal virtual bool ReachesBeyond(FlowCurve curve) => false;

    /// <inheritdoc/>
    public override string ToString() => Name;
}
