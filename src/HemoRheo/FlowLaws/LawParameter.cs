namespace HemoRheo;

/// <summary>A parameter of a flow law.</summary>
/// <param name="Name">Its name, e.g. <c>yield stress</c>.</param>
/// <param name="Symbol">Its symbol.</param>
/// <param name="Unit">Its unit inside, e.g. <c>Pa</c>.</param>
/// <param name="Lower">Lower bound; finite, with no upper bound, means fitted on the log scale of the distance from it.</param>
/// <param name="Upper">Upper bound; positive infinity where there is none. Both bounds finite means fitted on the logit scale.</param>
/// <param name="Start">Where a fit of a user's own law starts; null for a built-in law, which guesses from the curve.</param>
public sealed record LawParameter(string Name, string Symbol, string Unit, double Lower = 0, double Upper = double.PositiveInfinity, double? Start = null)
{
    /// <summary>The unit in which tables and charts show it.</summary>
    public Unit Shown => Unit switch
    {
        "Pa" => ShownUnits.Millipascal,
        "Pa.s" => ShownUnits.MillipascalSecond,
        "1/s" => ShownUnits.PerSecond,
        "1" => ShownUnits.One,
        _ => new(Quantity.Number, Unit, Unit, 1),
    };

    /// <summary>From the fitting scale to the natural one.</summary>
    internal double ToNatural(double scaled) => ToNatural(new Lane(scaled))[0];

    /// <summary>From the natural scale to the fitting one; minus infinity at the lower bound.</summary>
    internal double ToScaled(double natural) => ToScaled(new Lane(natural))[0];

    /// <summary>From the natural scale to the fitting one, four at a time.</summary>
    internal Lane ToScaled(Lane natural) =>
        double.IsInfinity(Lower) ? natural
        : double.IsInfinity(Upper) ? Lane.Log(natural - Lower)
        : Lane.Log((natural - Lower) / (Upper - natural));

    /// <summary>From the fitting scale to the natural one, four at a time.</summary>
    internal Lane ToNatural(Lane scaled) =>
        double.IsInfinity(Lower) ? scaled
        : double.IsInfinity(Upper) ? Lane.Exp(scaled) + Lower
        : 1 / (1 + Lane.Exp(-scaled)) * (Upper - Lower) + Lower;

    /// <summary>Change of the natural value a change of the scaled one.</summary>
    internal Lane SlopeOf(Lane natural) =>
        double.IsInfinity(Lower) ? new(1.0)
        : double.IsInfinity(Upper) ? natural - Lower
        : (natural - Lower) * (Upper - natural) / (Upper - Lower);
}
