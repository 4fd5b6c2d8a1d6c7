namespace HemoRheo;

/// <summary>How a fit ended.</summary>
/// <param name="Reason">Why it stopped.</param>
/// <param name="Iterations">Iterations used.</param>
/// <param name="Message">The reason with its numbers, e.g. <c>relative step 3.1e-13, at most 1e-12</c>.</param>
public sealed record Convergence(StopReason Reason, int Iterations, string Message)
{
    /// <summary>Whether the fit reached a minimum.</summary>
    public bool Converged => Reason is StopReason.SmallStep or StopReason.SmallDecrease or StopReason.SmallGradient;
}
