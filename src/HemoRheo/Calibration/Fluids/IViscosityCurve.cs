namespace HemoRheo;

/// <summary>The logarithm of a viscosity against temperature through certified rows.</summary>
internal interface IViscosityCurve
{
    /// <summary>How many numbers it takes from the rows.</summary>
    int Parameters { get; }

    /// <summary>ln of the viscosity in Pa.s at a temperature in K.</summary>
    double LnViscosity(double kelvins);

    /// <summary>Its change per change of the logarithm of each row's viscosity.</summary>
    double[] Influence(double kelvins);
}
