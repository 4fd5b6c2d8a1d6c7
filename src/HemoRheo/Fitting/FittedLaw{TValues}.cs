namespace HemoRheo;

/// <summary>A flow law fitted to one curve, with its numbers as quantities.</summary>
/// <typeparam name="TValues">The law's numbers, with units.</typeparam>
public sealed record FittedLaw<TValues> : FittedLaw
{
    internal FittedLaw(FittedLaw fit, FlowLaw<TValues> law) : base(fit) => TypedLaw = law;

    /// <summary>The law's numbers, with units.</summary>
    /// <exception cref="InvalidOperationException">The data could not be fitted at all, so there are no estimates; <see cref="FittedLaw.Findings"/> say why.</exception>
    public TValues Values => Parameters.Count > 0
        ? TypedLaw.Values([.. Parameters.Select(parameter => parameter.Estimate)])
        : throw new InvalidOperationException($"There are no estimates of {Law.Name}: {string.Join(" ", Findings.Select(finding => finding.Message))}");

    private FlowLaw<TValues> TypedLaw { get; }

    /// <inheritdoc/>
    public override string ToString() => base.ToString();
}
