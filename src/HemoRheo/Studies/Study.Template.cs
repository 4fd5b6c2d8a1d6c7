namespace HemoRheo;

public sealed partial record Study
{
    /// <summary>The text of a commented study file to start from. It opens once the files it names are there; every value in it is to be replaced by the study's own.</summary>
    public static string Template() => StudyTemplate.Text;
}
