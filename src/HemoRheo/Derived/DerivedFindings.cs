namespace HemoRheo;

/// <summary>Kinds of findings about values derived from a fit.</summary>
public static class DerivedFindings
{
    /// <summary>Quemada's law ended at r = 0: its structure parameter at rest is 2/H by definition.</summary>
    public static FindingKind StructureAtBoundary { get; } = new(
        "structure-at-boundary",
        Severity.Warning,
        "The fit ended at ratio zero, which is Casson's law: the structure parameter at rest is 2/H by definition and says nothing of this blood.",
        "The low shear rates do not reach the plateau of viscosity, or Casson's law holds.",
        "Do not interpret the parameter at rest; measure at lower rates, or report Casson's numbers.",
        "Quemada 1978, Rheologica Acta 17:632-642");

    /// <summary>A structure parameter lies where the law has no meaning.</summary>
    public static FindingKind StructureOutOfRange { get; } = new(
        "structure-out-of-range",
        Severity.Warning,
        "A structure parameter is below zero: the blood would be thinner than its plasma.",
        "Plasma viscosity or unit is mistaken, or was measured at another temperature than the blood.",
        "Look at the plasma viscosity and its temperature.",
        "Quemada 1978, Rheologica Acta 17:632-642");
}
