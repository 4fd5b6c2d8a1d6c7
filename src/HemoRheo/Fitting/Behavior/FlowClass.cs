namespace HemoRheo;

/// <summary>How viscosity goes with shear rate over the rates of a curve.</summary>
public enum FlowClass
{
    /// <summary>These readings do not tell.</summary>
    Undecided,

    /// <summary>Constant, within a stated margin.</summary>
    Newtonian,

    /// <summary>Viscosity falls as shear rate rises.</summary>
    ShearThinning,

    /// <summary>Viscosity rises with shear rate.</summary>
    ShearThickening,
}
