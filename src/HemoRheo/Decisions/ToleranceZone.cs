namespace HemoRheo;

/// <summary>
/// The zone about a certified viscosity in which 85 of 100 results of a site that measures without a bias lie:
/// 1.44 sqrt(s^2 + (U/k)^2) to either side, s the site's standard deviation, U/k the certificate's standard uncertainty.
/// </summary>
/// <remarks>Source: ASTM D6617, as the annex of a kinematic-viscosity method works it out.</remarks>
public static class ToleranceZone
{
    /// <summary>Half width of the zone, in the unit of what is given.</summary>
    /// <param name="siteDeviation">Standard deviation of the site's results.</param>
    /// <param name="expanded">Expanded uncertainty of the certified value.</param>
    /// <param name="coverageFactor">Its coverage factor.</param>
    public static double Half(double siteDeviation, double expanded, double coverageFactor)
    {
        var certificate = expanded / coverageFactor;
        return 1.44 * Math.Sqrt(siteDeviation * siteDeviation + certificate * certificate);
    }
}
