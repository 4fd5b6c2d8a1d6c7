namespace HemoRheo;

/// <summary>A flow law whose parameters have a type of their own.</summary>
/// <typeparam name="TValues">The law's numbers, with units.</typeparam>
/// <param name="Name">Name from the literature.</param>
/// <param name="Source">Where it was published.</param>
/// <param name="Parameters">Its parameters, in the order its formula takes them.</param>
/// <param name="ValidRates">Shear rates for which the literature uses it with blood, 1/s.</param>
public abstract record FlowLaw<TValues>(string Name, Citation Source, Items<LawParameter> Parameters, Interval ValidRates)
    : FlowLaw(Name, Source, Parameters, ValidRates)
{
    /// <summary>The law's numbers, with units.</summary>
    /// <param name="estimates">Parameters on their natural scale, SI, in the order of <see cref="FlowLaw.Parameters"/>.</param>
    internal abstract TValues Values(IReadOnlyList<double> estimates);
}
