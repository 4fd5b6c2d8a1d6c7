namespace HemoRheo;

/// <summary>Slopes of smooth formulas by a central difference.</summary>
internal static class LocalSlope
{
    // The logarithms of viscosity bend over tens of kelvins, so the error of the step is below 1e-9 of the slope and that of rounding below 1e-11.
    private const double Step = 1e-3;

    public static double Of(Func<double, double> formula, double at) => (formula(at + Step) - formula(at - Step)) / (2 * Step);
}
