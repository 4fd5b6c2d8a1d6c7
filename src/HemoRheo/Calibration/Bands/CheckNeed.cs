using static System.FormattableString;

namespace HemoRheo;

/// <summary>What would decide a check, at its present error, that cannot tell at its present uncertainty. Each part is for that change alone.</summary>
/// <param name="MoreReadings">Further readings of the same filling; null where no number would do, or more than a thousand.</param>
/// <param name="MoreFillings">Further independent fillings on the same day with the same fluid; null where no number would do, or more than a hundred.</param>
/// <param name="CertificateUncertainty">Relative expanded uncertainty (k = 2) of the fluid that would do; null where no certificate would.</param>
/// <param name="Obstacle">Which part alone is already too large; null where none is, so that several together are.</param>
public sealed record CheckNeed(int? MoreReadings, int? MoreFillings, double? CertificateUncertainty, SourceKind? Obstacle)
{
    /// <inheritdoc/>
    public override string ToString()
    {
        string?[] ways =
        [
            MoreReadings is { } readings ? Invariant($"{readings} more reading{(readings == 1 ? "" : "s")}") : null,
            MoreFillings is { } fillings ? Invariant($"{fillings} more filling{(fillings == 1 ? "" : "s")}") : null,
            CertificateUncertainty is { } certificate ? Invariant($"a fluid certified to {100 * certificate:G2} % (k = 2)") : null,
        ];
        var would = string.Join(" or ", ways.OfType<string>());
        var blocks = Obstacle is { } kind ? $"the part of the {kind.Words()} alone is too large" : "the error lies too near the limit for what they leave";
        if (would.Length == 0) return $"Neither readings nor fillings nor a better fluid would tell: {blocks}";
        return MoreReadings is null ? $"To tell: {would}; no number of readings would: {blocks}" : $"To tell: {would}";
    }
}
