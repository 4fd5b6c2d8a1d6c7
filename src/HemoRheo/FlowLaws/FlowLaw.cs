namespace HemoRheo;

/// <summary>A steady-shear flow law: what a user holds. Lists of unlike laws are lists of this.</summary>
/// <param name="Name">Name from the literature.</param>
/// <param name="Source">Where it was published.</param>
/// <param name="Parameters">Its parameters, in the order its formula takes them.</param>
/// <param name="ValidRates">Shear rates for which the literature uses it with blood, 1/s.</param>
public abstract record FlowLaw(string Name, Citation Source, Items<LawParameter> Parameters, Interval ValidRates)
{
    /// <inheritdoc/>
    public override string ToString() => Name;
}
