namespace HemoRheo;

/// <summary>A quantity that a study reports: a viscosity at a rate, a yield stress, an index.</summary>
/// <param name="Name">Its name, e.g. <c>viscosity at 10 1/s</c>.</param>
/// <param name="Symbol">Its symbol.</param>
/// <param name="Shown">The unit it is shown in.</param>
/// <param name="Logarithmic">Whether its working scale is the natural logarithm of its SI number, or the SI number itself.</param>
public abstract record Measurand(string Name, string Symbol, Unit Shown, bool Logarithmic)
{
    /// <summary>From the working scale to the SI number.</summary>
    public double ToSi(double working) => Logarithmic ? Math.Exp(working) : working;

    /// <summary>From the SI number to the working scale.</summary>
    public double ToWorking(double si) => Logarithmic ? Math.Log(si) : si;

    /// <summary>From the working scale to the number in the shown unit.</summary>
    public double ToShown(double working) => Shown.FromSi(ToSi(working));

    /// <inheritdoc/>
    public override string ToString() => Name;
}
