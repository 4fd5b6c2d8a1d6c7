namespace HemoRheo;

/// <summary>A steady-shear flow law: what a user holds. Lists of unlike laws are lists of this.</summary>
/// <param name="Name">Name from the literature.</param>
/// <param name="Source">Where it was published.</param>
/// <param name="Parameters">Its parameters, in the order its formula takes them; at most five.</param>
/// <param name="ValidRates">Shear rates for which the literature uses it with blood, 1/s.</param>
public abstract record FlowLaw(string Name, Citation Source, Items<LawParameter> Parameters, Interval ValidRates) : ILaneModel
{
    /// <summary>Constant viscosity.</summary>
    public static FlowLaw<Newtonian> Newtonian => HemoRheo.Newtonian.Law;

    /// <summary>The Ostwald-de Waele power law: a consistency and a flow index.</summary>
    public static FlowLaw<PowerLaw> PowerLaw => HemoRheo.PowerLaw.Law;

    /// <summary>Bingham's law: a yield stress and a plastic viscosity.</summary>
    public static FlowLaw<Bingham> Bingham => HemoRheo.Bingham.Law;

    /// <summary>Casson's law: a yield stress and a Casson viscosity.</summary>
    public static FlowLaw<Casson> Casson => HemoRheo.Casson.Law;

    /// <summary>The law of Herschel and Bulkley: a yield stress, a consistency and a flow index.</summary>
    public static FlowLaw<HerschelBulkley> HerschelBulkley => HemoRheo.HerschelBulkley.Law;

    /// <summary>Quemada's law in its three identifiable numbers.</summary>
    public static FlowLaw<Quemada> Quemada => HemoRheo.Quemada.Law;

    /// <summary>Carreau's law: two viscosities, a time constant and a flow index.</summary>
    public static FlowLaw<Carreau> Carreau => HemoRheo.Carreau.Law;

    /// <summary>Cross's law: two viscosities, a time constant and an exponent.</summary>
    public static FlowLaw<Cross> Cross => HemoRheo.Cross.Law;

    /// <summary>The law of Carreau and Yasuda: Carreau's with the sharpness of its transition.</summary>
    public static FlowLaw<CarreauYasuda> CarreauYasuda => HemoRheo.CarreauYasuda.Law;

    /// <summary>Every built-in law, from few parameters to many.</summary>
    public static Items<FlowLaw> All => [Newtonian, PowerLaw, Bingham, Casson, HerschelBulkley, Quemada, Carreau, Cross, CarreauYasuda];

    /// <summary>A limiting case of this law that a fit may end in; null where there is none.</summary>
    internal abstract LawBoundary? Boundary { get; }

    /// <summary>Whether its shape is not known beforehand, so that a fit looks for other minima even where it converged.</summary>
    internal virtual bool MayHaveManyMinima => false;

    /// <summary>A built-in law by its name.</summary>
    /// <param name="name">Its name; upper and lower case are the same.</param>
    /// <exception cref="ArgumentException">No built-in law has this name.</exception>
    public static FlowLaw Named(string name)
    {
        ArgumentNullException.ThrowIfNull(name);
        return All.FirstOrDefault(law => law.Name.Equals(name, StringComparison.OrdinalIgnoreCase))
            ?? throw new ArgumentException($"There is no flow law named '{name}'; the laws are {string.Join(", ", All.Select(law => law.Name))}.", nameof(name));
    }

    /// <summary>A user's own law, its formula on a struct. Everything works on it as on a built-in law, exact slopes included.</summary>
    /// <typeparam name="TFormula">A readonly struct with the formula; what it needs beside rate and parameters goes into its constructor.</typeparam>
    /// <param name="name">Its name.</param>
    /// <param name="formula">The formula.</param>
    /// <param name="parameters">One to five parameters, each with a <see cref="LawParameter.Start"/>, in the order of <c>p[0]</c>, <c>p[1]</c>...</param>
    /// <remarks>
    /// In compiled code, <c>[MethodImpl(MethodImplOptions.AggressiveInlining)]</c> on the formula makes it as fast as a built-in one without slopes by hand.
    /// In a notebook cell, which is compiled without optimization, a law of one's own is 5 to 8 times slower than a built-in one. What the compiler says, and what helps:
    /// <list type="table">
    /// <item><term>CS0120</term><description>the struct uses a variable of the cell: hand it to the struct's constructor, or write a lambda.</description></item>
    /// <item><term>CS0453</term><description>a class instead of a struct.</description></item>
    /// <item><term>CS0425</term><description>the constraint <c>where T : struct, ILawNumber&lt;T&gt;</c> is missing.</description></item>
    /// <item><term>CS1503</term><description><c>Math.Sqrt(rate)</c>: write <c>T.Sqrt(rate)</c>.</description></item>
    /// <item><term>CS0019</term><description>a comparison: a formula has no branches.</description></item>
    /// <item><term>CS0029</term><description><c>return 0</c>: write <c>0 * rate</c>.</description></item>
    /// </list>
    /// </remarks>
    /// <exception cref="ArgumentException">The formula, tried once at the starts, reads too many parameters, ignores one, throws, or gives no finite stress; or a parameter has no start.</exception>
    public static FlowLaw<NamedValues> Custom<TFormula>(string name, TFormula formula, params LawParameter[] parameters) where TFormula : struct, IFormula =>
        LawProbe.Checked(name, items => new StructLaw<TFormula>(name, formula, items), parameters);

    /// <summary>A user's own law as a lambda: <c>FlowLaw.Custom("mine", (rate, p) => p[0] * LaneDual.Pow(rate, p[1]), ...)</c>. It may use variables of the cell.</summary>
    /// <param name="name">Its name.</param>
    /// <param name="function">The formula; functions are those of <see cref="LaneDual"/>.</param>
    /// <param name="parameters">One to five parameters, each with a <see cref="LawParameter.Start"/>.</param>
    /// <exception cref="ArgumentException">As for the form with a struct.</exception>
    public static FlowLaw<NamedValues> Custom(string name, LawFunction function, params LawParameter[] parameters)
    {
        ArgumentNullException.ThrowIfNull(function);
        return LawProbe.Checked(name, items => new LambdaLaw(name, function, items), parameters);
    }

    /// <summary>Shear stress at a shear rate.</summary>
    /// <param name="rate">Shear rate, not below zero.</param>
    /// <param name="parameters">Parameters on their natural scale, SI, in the order of <see cref="Parameters"/>.</param>
    /// <exception cref="ArgumentException">There are too few or too many parameters.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The rate is below zero or not a number.</exception>
    public ShearStress Stress(ShearRate rate, params ReadOnlySpan<double> parameters)
    {
        CheckCount(parameters.Length);
        if (!(rate.ReciprocalSeconds >= 0))
        {
            throw new ArgumentOutOfRangeException(nameof(rate), $"A shear rate is zero or above; this one is {rate}.");
        }

        Span<Lane> natural = stackalloc Lane[LaneDual.Slopes];
        for (var k = 0; k < parameters.Length; k++) natural[k] = new(parameters[k]);
        return new(StressOf(new(rate.ReciprocalSeconds), natural[..parameters.Length])[0]);
    }

    /// <inheritdoc/>
    public sealed override string ToString() => Name;

    /// <summary>Stress, Pa, and its slopes with respect to the parameters on the fitting scale.</summary>
    internal double StressAt(double rate, ReadOnlySpan<double> scaled, Span<double> slopes)
    {
        CheckCount(scaled.Length);
        Span<Lane> at = stackalloc Lane[LaneDual.Slopes];
        Span<Lane> stress = stackalloc Lane[1];
        Span<Lane> lanes = stackalloc Lane[LaneDual.Slopes];
        for (var k = 0; k < scaled.Length; k++) at[k] = new(scaled[k]);
        StressesAndSlopes([new(rate)], at[..scaled.Length], stress, lanes[..scaled.Length]);
        for (var k = 0; k < scaled.Length; k++) slopes[k] = lanes[k][0];
        return stress[0][0];
    }

    /// <summary>From the fitting scale to the natural one.</summary>
    internal double[] ToNatural(ReadOnlySpan<double> scaled)
    {
        var natural = new double[scaled.Length];
        for (var k = 0; k < natural.Length; k++) natural[k] = Parameters[k].ToNatural(scaled[k]);
        return natural;
    }

    /// <summary>From the natural scale to the fitting one.</summary>
    internal double[] ToScaled(ReadOnlySpan<double> natural)
    {
        var scaled = new double[natural.Length];
        for (var k = 0; k < scaled.Length; k++) scaled[k] = Parameters[k].ToScaled(natural[k]);
        return scaled;
    }

    /// <summary>Where a fit starts: a deterministic guess from a linearised form, inside the bounds, natural scale.</summary>
    /// <param name="perSecond">Shear rates, above zero, 1/s.</param>
    /// <param name="pascals">Shear stresses, above zero, Pa.</param>
    /// <param name="guess">Receives the guess.</param>
    internal abstract void FirstGuess(ReadOnlySpan<double> perSecond, ReadOnlySpan<double> pascals, Span<double> guess);

    /// <summary>Stress from natural parameters in four lanes.</summary>
    internal abstract Lane StressOf(Lane rate, ReadOnlySpan<Lane> natural);

    /// <summary>Stresses and slopes with respect to the scaled parameters, one curve a lane: slope k of point i at k * rates.Length + i.</summary>
    internal abstract void StressesAndSlopes(ReadOnlySpan<Lane> rates, ReadOnlySpan<Lane> scaled, Span<Lane> stresses, Span<Lane> slopes);

    /// <summary>The same with exact slopes from the formula, also where a law has slopes by hand.</summary>
    internal virtual void ByFormula(ReadOnlySpan<Lane> rates, ReadOnlySpan<Lane> scaled, Span<Lane> stresses, Span<Lane> slopes) => StressesAndSlopes(rates, scaled, stresses, slopes);

    void ILaneModel.Evaluate(ReadOnlySpan<Lane> x, ReadOnlySpan<Lane> parameters, Span<Lane> values, Span<Lane> slopes) => StressesAndSlopes(x, parameters, values, slopes);

    private void CheckCount(int count)
    {
        if (count != Parameters.Count)
        {
            throw new ArgumentException($"{Name} takes {Parameters.Count} parameters ({string.Join(", ", Parameters.Select(p => $"{p.Name} in {p.Unit}"))}); {count} were given.");
        }
    }
}
