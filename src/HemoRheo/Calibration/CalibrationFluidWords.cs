using static System.FormattableString;

namespace HemoRheo;

/// <summary>What a calibration fluid is at a temperature.</summary>
public static class CalibrationFluidWords
{
    /// <summary>
    /// Viscosity at a temperature T. Water: IAPWS SR6-08. Glycerol and water: Cheng 2008. Sucrose: Bingham and Jackson 1918. A certificate file: its interpolation.
    /// One declared temperature: certified * exp(-coefficient * (T - certificate's temperature)).
    /// </summary>
    /// <param name="fluid">The fluid.</param>
    /// <param name="temperature">The temperature, within <see cref="ValidTemperatures"/>.</param>
    /// <exception cref="ArgumentOutOfRangeException">The temperature is outside the fluid's range.</exception>
    /// <exception cref="ArgumentException">The rows of the certificate follow no curve of the kind it names.</exception>
    public static Viscosity ViscosityAt(this CalibrationFluid fluid, Temperature temperature)
    {
        if (fluid.IsWater) return Water.ViscosityAt(temperature);
        if (fluid.Glycerol is { } mixture) return GlycerolWater.ViscosityAt(mixture.MassFraction, temperature);
        if (fluid.IsSucrose) return Sucrose.ViscosityAt(temperature);
        if (fluid.Certificate is { } certificate) return new(Math.Exp(CurveOf(fluid, certificate, temperature).LnViscosity(temperature.DegreesCelsius)));
        return new(fluid.Certified.PascalSeconds * Math.Exp(-fluid.PerKelvin * (temperature.DegreesCelsius - fluid.At.DegreesCelsius)));
    }

    /// <summary>Temperature coefficient -d ln(viscosity)/dT at a temperature, 1/K: the declared one, or the local slope of the fluid's formula or interpolation.</summary>
    /// <param name="fluid">The fluid.</param>
    /// <param name="temperature">The temperature, within <see cref="ValidTemperatures"/>.</param>
    /// <exception cref="ArgumentOutOfRangeException">The temperature is outside the fluid's range.</exception>
    /// <exception cref="ArgumentException">The rows of the certificate follow no curve of the kind it names.</exception>
    public static double PerKelvinAt(this CalibrationFluid fluid, Temperature temperature)
    {
        if (fluid.IsWater) return Water.PerKelvinAt(temperature);
        if (fluid.Glycerol is { } mixture) return GlycerolWater.PerKelvinAt(mixture.MassFraction, temperature);
        if (fluid.IsSucrose) return Sucrose.PerKelvinAt(temperature);
        return fluid.Certificate is { } certificate ? CurveOf(fluid, certificate, temperature).PerKelvin(temperature.DegreesCelsius) : fluid.PerKelvin;
    }

    /// <summary>
    /// ln(viscosity in Pa.s) at a temperature, with what the certificate or formula, the move in temperature and, for a mixture, its mass fraction add to its uncertainty; without the thermometer's part.
    /// Each contribution is the change when its input is raised by one standard uncertainty.
    /// </summary>
    /// <param name="fluid">The fluid.</param>
    /// <param name="temperature">The temperature, within <see cref="ValidTemperatures"/>.</param>
    /// <exception cref="ArgumentOutOfRangeException">The temperature is outside the fluid's range.</exception>
    /// <exception cref="ArgumentException">The rows of the certificate follow no curve of the kind it names.</exception>
    public static Value LnViscosityAt(this CalibrationFluid fluid, Temperature temperature) =>
        new(Math.Log(fluid.ViscosityAt(temperature).PascalSeconds), fluid.Parts(temperature).ToItems());

    /// <summary>The temperature coefficient with its uncertainty, 1/K. A certificate's: of its rows, taken as wrong independently, and of the interpolation.</summary>
    /// <param name="fluid">The fluid.</param>
    /// <param name="temperature">The temperature, within <see cref="ValidTemperatures"/>.</param>
    /// <exception cref="ArgumentOutOfRangeException">The temperature is outside the fluid's range.</exception>
    /// <exception cref="ArgumentException">The rows of the certificate follow no curve of the kind it names.</exception>
    public static Value TemperatureCoefficientAt(this CalibrationFluid fluid, Temperature temperature)
    {
        var slope = fluid.PerKelvinAt(temperature);
        if (fluid.Certificate is not { } certificate) return fluid.ByFormula() ? Value.Exact(slope) : new(slope, [new(new(SourceKind.FluidBeta, fluid.Name), fluid.PerKelvinUncertainty)]);
        var (curve, t) = (CurveOf(fluid, certificate, temperature), temperature.DegreesCelsius);
        return new(slope, [new(fluid.OfCertificate(), curve.PerKelvinOfRows(t)), new(new(SourceKind.FluidBeta, fluid.Name), curve.PerKelvinOfInterpolation(t))]);
    }

    /// <summary>Temperatures at which its viscosity is known, in degC: the certificate's or the formula's. Of a fluid declared at one temperature: without limits.</summary>
    /// <param name="fluid">The fluid.</param>
    public static Interval ValidTemperatures(this CalibrationFluid fluid)
    {
        if (fluid.IsWater) return new(Water.ValidKelvins.Lower - 273.15, Water.ValidKelvins.Upper - 273.15);
        if (fluid.Glycerol is not null) return GlycerolWater.ValidTemperatures;
        if (fluid.IsSucrose) return Sucrose.ValidTemperatures;
        return fluid.Certificate?.Range ?? new(double.NegativeInfinity, double.PositiveInfinity);
    }

    /// <summary>Density at a temperature, kg/m3: the declared one, the certificate's, or the formula's of water and of glycerol and water; null where it is not known.</summary>
    /// <param name="fluid">The fluid.</param>
    /// <param name="temperature">The temperature, within <see cref="ValidTemperatures"/>.</param>
    public static double? DensityAt(this CalibrationFluid fluid, Temperature temperature)
    {
        if (fluid.Density is { } declared) return declared;
        if (fluid.IsWater) return Water.DensityAt(temperature);
        if (fluid.Glycerol is { } mixture) return GlycerolWater.DensityAt(mixture.MassFraction, temperature);
        return fluid.Certificate is { } certificate ? DensityLine.Of(certificate)?.At(temperature.Kelvins) : null;
    }

    private static IEnumerable<Contribution> Parts(this CalibrationFluid fluid, Temperature temperature)
    {
        if (fluid.Certificate is { } certificate)
        {
            var curve = CurveOf(fluid, certificate, temperature);
            yield return new(fluid.OfCertificate(), curve.OfRows(temperature.DegreesCelsius));
            yield return new(new(SourceKind.FluidBeta, fluid.Name), curve.OfInterpolation(temperature.DegreesCelsius));
            yield break;
        }

        yield return new(fluid.OfCertificate(), fluid.RelativeExpandedUncertainty / fluid.CoverageFactor);
        if (fluid.Glycerol is { } mixture)
        {
            yield return new(new(SourceKind.Certificate, $"mass fraction of {fluid.Name}, {fluid.Lot}"), GlycerolWater.PerMassFractionAt(mixture.MassFraction, temperature) * mixture.MassFractionUncertainty);
        }

        if (!fluid.ByFormula()) yield return new(new(SourceKind.FluidBeta, fluid.Name), -(temperature.DegreesCelsius - fluid.At.DegreesCelsius) * fluid.PerKelvinUncertainty);
    }

    private static bool ByFormula(this CalibrationFluid fluid) => fluid.IsWater || fluid.IsSucrose || fluid.Glycerol is not null;

    private static Source OfCertificate(this CalibrationFluid fluid) => new(SourceKind.Certificate, $"{fluid.Name}, {fluid.Lot}");

    private static CertificateCurve CurveOf(CalibrationFluid fluid, Certificate certificate, Temperature temperature)
    {
        if (!certificate.Range.Contains(temperature.DegreesCelsius))
        {
            throw new ArgumentOutOfRangeException(nameof(temperature), Invariant($"The certificate of '{fluid.Name}' reaches from {certificate.Range.Lower:G4} to {certificate.Range.Upper:G4} degC; nothing is taken from outside, as at {temperature}."));
        }

        return CertificateCurve.Of(certificate) ?? throw new ArgumentException($"The rows of the certificate of '{fluid.Name}' follow no Vogel-Fulcher-Tammann curve: their logarithms must flatten as temperature rises. Correct them or interpolate by ASTM D341.", nameof(fluid));
    }
}
