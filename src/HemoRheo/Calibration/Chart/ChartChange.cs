using static System.FormattableString;

namespace HemoRheo;

/// <summary>A change of the instrument as the checks since its last adjustment describe it.</summary>
/// <param name="Shape">Step or drift.</param>
/// <param name="MostLikely">Most likely moment: of a step, the middle between the two checks that part it.</param>
/// <param name="Earliest">Begin of the 95 % interval.</param>
/// <param name="Latest">End of the 95 % interval.</param>
/// <param name="Size">Of a step, the change of the ln error; of a drift, its change in a month of 30.4375 days.</param>
/// <param name="SizeUncertainty">Its standard uncertainty, the moment taken as known.</param>
/// <param name="LogLikelihood">Largest log likelihood, up to a constant that step and drift share.</param>
public sealed record ChartChange(ChangeShape Shape, DateTimeOffset MostLikely, DateTimeOffset Earliest, DateTimeOffset Latest, double Size, double SizeUncertainty, double LogLikelihood)
{
    /// <inheritdoc/>
    public override string ToString()
    {
        var what = Invariant($"{(Shape == ChangeShape.Step ? "a step" : "a drift")} of {100 * (Math.Exp(Size) - 1):+0.00;-0.00} %{(Shape == ChangeShape.Step ? "" : " a month")}");
        return Invariant($"{what}, most likely from {MostLikely:yyyy-MM-dd} (95 % interval {Earliest:yyyy-MM-dd} to {Latest:yyyy-MM-dd})");
    }
}
