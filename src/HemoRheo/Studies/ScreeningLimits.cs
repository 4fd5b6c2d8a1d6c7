namespace HemoRheo;

/// <summary>Limits of the screening rules. Defaults are common practice and may be changed in the study file.</summary>
/// <param name="Temperature">Temperature at which blood is to be measured.</param>
/// <param name="TemperatureTolerance">Largest departure from it, K.</param>
/// <param name="SpeedTolerance">Largest relative difference of speed or shear rate reached from that asked for.</param>
/// <param name="LongestSinceDraw">Longest time from draw to measurement.</param>
/// <param name="DuplicateTolerance">Two readings of one ramp whose rates differ by less than this relative amount are duplicates.</param>
/// <param name="LowestHematocrit">Hematocrit below which a value is questioned, L/L.</param>
/// <param name="HighestHematocrit">Hematocrit above which a value is questioned, L/L.</param>
public sealed record ScreeningLimits(
    Temperature Temperature,
    double TemperatureTolerance,
    double SpeedTolerance,
    TimeSpan LongestSinceDraw,
    double DuplicateTolerance,
    double LowestHematocrit,
    double HighestHematocrit);
