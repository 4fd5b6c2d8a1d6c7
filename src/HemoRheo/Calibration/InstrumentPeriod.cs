namespace HemoRheo;

/// <summary>A period of an instrument between calibrations: from its first check that did not fail to the failure or adjustment that ends it.</summary>
/// <param name="Instrument">Name of the instrument.</param>
/// <param name="Number">Number of the period, from 1.</param>
/// <param name="From">Its first check.</param>
/// <param name="Until">The failed check or adjustment that ended it; null while it lasts.</param>
/// <param name="Checks">Its checks; a failed one is never among them.</param>
/// <param name="Correction">Mean of ln(measured/certified), with contributions of calibration, certificate, fluid coefficient, thermometer and torque zero, signed for the mean itself (a corrected value subtracts it).</param>
/// <param name="Scatter">Standard deviation of one check about its period's mean, pooled over the instrument's periods.</param>
/// <param name="ScatterDegreesOfFreedom">Its degrees of freedom; infinite where the study file declares it.</param>
/// <param name="ScatterEstimate">Name of that variance estimate, as contributions carry it.</param>
public sealed record InstrumentPeriod(
    string Instrument,
    int Number,
    DateTimeOffset From,
    DateTimeOffset? Until,
    Items<InstrumentCheck> Checks,
    Value Correction,
    double Scatter,
    double ScatterDegreesOfFreedom,
    string ScatterEstimate)
{
    /// <summary>As sources name it.</summary>
    public string Key => $"{Instrument}/{Number}";

    /// <inheritdoc/>
    public override string ToString() => FormattableString.Invariant($"period {Key}, from {From:yyyy-MM-dd}{(Until is { } end ? FormattableString.Invariant($" to {end:yyyy-MM-dd}") : "")}: {Checks.Count} checks, reads {100 * (Math.Exp(Correction.X) - 1):+0.00;-0.00} %");
}
