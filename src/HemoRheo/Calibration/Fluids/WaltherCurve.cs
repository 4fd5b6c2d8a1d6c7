namespace HemoRheo;

/// <summary>
/// ASTM D341: with nu in mm2/s, Z = nu + 0.7 + exp(-1.47 - 1.84 nu - 0.51 nu^2) and log log Z = A - B log T. Exactly through two rows, by least squares in log log Z through more.
/// Dynamic viscosity is that times density, which is a straight line in temperature.
/// </summary>
/// <remarks>Source: ASTM D341, annex (form for 0.21 mm2/s and more); Walther 1931.</remarks>
internal sealed class WaltherCurve : IViscosityCurve
{
    private readonly WeightedFit _fit;
    private readonly DensityLine _density;
    private readonly double[] _ordinatePerLn;

    /// <summary>The curve through rows.</summary>
    /// <param name="kelvins">Temperatures, ascending.</param>
    /// <param name="logarithms">ln of the dynamic viscosity in Pa.s.</param>
    /// <param name="weights">One over the variance of each logarithm.</param>
    /// <param name="density">Density, kg/m3.</param>
    public WaltherCurve(double[] kelvins, double[] logarithms, double[] weights, DensityLine density)
    {
        _density = density;
        double[] kinematic = [.. logarithms.Zip(kelvins, (ln, t) => 1e6 * Math.Exp(ln) / density.At(t))];
        _ordinatePerLn = [.. kinematic.Select(OrdinatePerLn)];
        double[] own = [.. weights.Zip(_ordinatePerLn, (weight, slope) => weight / (slope * slope))];
        _fit = new([.. kelvins.Select(t => new[] { 1, Math.Log(t) })], [.. kinematic.Select(nu => Math.Log(Math.Log(Raised(nu))))], own);
    }

    /// <inheritdoc/>
    public int Parameters => 2;

    /// <inheritdoc/>
    public double LnViscosity(double kelvins) => Math.Log(1e-6 * Kinematic(RaisedAt(kelvins)) * _density.At(kelvins));

    /// <inheritdoc/>
    public double[] Influence(double kelvins)
    {
        var raised = RaisedAt(kelvins);
        var lnPerOrdinate = KinematicSlope(raised) * raised * Math.Log(raised) / Kinematic(raised);
        return [.. _fit.InfluenceAt([1, Math.Log(kelvins)]).Zip(_ordinatePerLn, (influence, slope) => lnPerOrdinate * influence * slope)];
    }

    private double RaisedAt(double kelvins) => Math.Exp(Math.Exp(_fit.Coefficients[0] + _fit.Coefficients[1] * Math.Log(kelvins)));

    private static double Raised(double nu) => nu + 0.7 + Math.Exp(-1.47 - 1.84 * nu - 0.51 * nu * nu);

    private static double Kinematic(double raised) => raised - 0.7 - Small(raised - 0.7);

    private static double KinematicSlope(double raised)
    {
        var q = raised - 0.7;
        return 1 - Small(q) * (-3.295 + 2 * 0.6119 * q - 3 * 0.3193 * q * q);
    }

    private static double Small(double q) => Math.Exp(-0.7487 - 3.295 * q + 0.6119 * q * q - 0.3193 * q * q * q);

    private static double OrdinatePerLn(double nu)
    {
        var raised = Raised(nu);
        return nu * (1 - (1.84 + 1.02 * nu) * Math.Exp(-1.47 - 1.84 * nu - 0.51 * nu * nu)) / (raised * Math.Log(raised));
    }
}
