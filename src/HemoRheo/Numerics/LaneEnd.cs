using System.Globalization;

namespace HemoRheo;

/// <summary>How a lane ended, as numbers; the words are made when somebody asks.</summary>
/// <param name="Reason">Why it stopped.</param>
/// <param name="Iterations">Iterations used.</param>
/// <param name="Size">The number that decided: the relative step, or the one to come where steps shrink steadily; or a distance to the minimum in lengths of the residuals.</param>
/// <param name="AtWall">Whether a parameter ran below its wall.</param>
internal readonly record struct LaneEnd(StopReason Reason, int Iterations, double Size, bool AtWall = false)
{
    /// <summary>Whether the lane reached a minimum.</summary>
    public bool Converged => Reason is StopReason.SmallStep or StopReason.SmallDecrease or StopReason.SmallGradient;

    /// <summary>The end with its words.</summary>
    public Convergence Said() => new(Reason, Iterations, Reason switch
    {
        StopReason.BadData => "the model is not finite at the start",
        StopReason.SmallStep => Words($"relative step {Size:G2}, at most {LaneSolver.StepLimit:G2}"),
        StopReason.SmallGradient => Words($"distance to the minimum {Size:G2} of the length of the residuals, at most {LaneSolver.GradientLimit:G2}"),
        StopReason.SmallDecrease => Words($"steps no longer fall: relative step {Size:G2}"),
        _ when AtWall => "a parameter runs to its bound",
        _ => Words($"{Iterations} iterations, relative step {Size:G2}, more than {LaneSolver.StepLimit:G2}"),
    });

    private static string Words(FormattableString words) => words.ToString(CultureInfo.InvariantCulture);
}
