namespace HemoRheo.Notebooks.Tests;

/// <summary>The notebook of the whole chain.</summary>
public sealed class VerdictNotebook() : HeadlessNotebook(jupyter => jupyter.Execute(Source))
{
    internal static string Source { get; } = Path.Combine(Repository.Root, "notebooks", "01-from-export-to-verdict.ipynb");
}
