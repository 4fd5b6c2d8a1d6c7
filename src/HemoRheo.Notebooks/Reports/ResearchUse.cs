namespace HemoRheo.Notebooks;

/// <summary>The caution that stands on every page and beside every table.</summary>
internal static class ResearchUse
{
    /// <summary>The caution in one line.</summary>
    public const string Caution = "For research use only. These are research values with their uncertainty, not a diagnosis and not for the care of a person.";
}
