namespace HemoRheo;

/// <summary>
/// A certificate's viscosity between its temperatures. Its uncertainty has two parts: that of the rows, the larger of what rows that are wrong together and rows that are wrong independently give;
/// and that of the interpolation, its difference from another formula through the same rows as the half width of a rectangular distribution, with the scatter of the rows about it where there are more rows than it needs.
/// The other formula is ASTM D341 for Vogel-Fulcher-Tammann and the reverse.
/// </summary>
internal sealed class CertificateCurve
{
    private readonly double[] _uncertainties;
    private readonly IViscosityCurve _curve;
    private readonly IViscosityCurve _other;
    private readonly double _scatter;

    private CertificateCurve(Certificate certificate, double[] kelvins, double[] logarithms, IViscosityCurve curve, IViscosityCurve other)
    {
        (_curve, _other) = (curve, other);
        _uncertainties = [.. certificate.Rows.Select(row => row.RelativeExpandedUncertainty / certificate.CoverageFactor)];
        Residuals = kelvins.Zip(logarithms, (t, ln) => ln - curve.LnViscosity(t)).ToItems();
        var free = kelvins.Length - curve.Parameters;
        _scatter = free > 0 ? Math.Sqrt(Residuals.Sum(residual => residual * residual) / free) : 0;
    }

    /// <summary>Relative departure of each row from the curve.</summary>
    public Items<double> Residuals { get; }

    /// <summary>The curve of a certificate; null where its rows follow no curve of the kind it names.</summary>
    public static CertificateCurve? Of(Certificate certificate)
    {
        double[] kelvins = [.. certificate.Rows.Select(row => row.At.Kelvins)];
        double[] logarithms = [.. certificate.Rows.Select(row => Math.Log(row.Viscosity.PascalSeconds))];
        double[] weights = [.. certificate.Rows.Select(row => Math.Pow(certificate.CoverageFactor / row.RelativeExpandedUncertainty, 2))];
        var vogel = VogelCurve.Free(kelvins, logarithms, weights);
        // Without densities the form of D341 serves the dynamic viscosity, as that of a liquid of 1 g/mL.
        var walther = new WaltherCurve(kelvins, logarithms, weights, DensityLine.Of(certificate) ?? new(1000, 0));
        return certificate.Interpolation switch
        {
            CertificateInterpolation.Vft => vogel is null ? null : new(certificate, kelvins, logarithms, vogel, walther),
            _ => new(certificate, kelvins, logarithms, walther, vogel ?? VogelCurve.OfTwo(kelvins, logarithms, weights)),
        };
    }

    /// <summary>ln(viscosity in Pa.s) at a temperature in degC.</summary>
    public double LnViscosity(double degreesCelsius) => _curve.LnViscosity(degreesCelsius + 273.15);

    /// <summary>-d ln(viscosity)/dT, 1/K.</summary>
    public double PerKelvin(double degreesCelsius) => -LocalSlope.Of(LnViscosity, degreesCelsius);

    /// <summary>Standard uncertainty of ln(viscosity) from the rows.</summary>
    public double OfRows(double degreesCelsius)
    {
        var parts = _curve.Influence(degreesCelsius + 273.15).Zip(_uncertainties, (influence, u) => influence * u).ToArray();
        return Math.Max(Math.Abs(parts.Sum()), Math.Sqrt(parts.Sum(part => part * part)));
    }

    /// <summary>Standard uncertainty of ln(viscosity) from the interpolation.</summary>
    public double OfInterpolation(double degreesCelsius)
    {
        var difference = LnViscosity(degreesCelsius) - _other.LnViscosity(degreesCelsius + 273.15);
        return Math.Sqrt(difference * difference / 3 + _scatter * _scatter);
    }

    /// <summary>Standard uncertainty of the temperature coefficient from the rows, wrong independently: together they would not move it.</summary>
    public double PerKelvinOfRows(double degreesCelsius) => Math.Sqrt(_uncertainties.Select((u, i) => Math.Pow(u * LocalSlope.Of(t => _curve.Influence(t + 273.15)[i], degreesCelsius), 2)).Sum());

    /// <summary>Standard uncertainty of the temperature coefficient from the interpolation.</summary>
    public double PerKelvinOfInterpolation(double degreesCelsius) =>
        Math.Abs(LocalSlope.Of(t => LnViscosity(t) - _other.LnViscosity(t + 273.15), degreesCelsius)) / Math.Sqrt(3);
}
