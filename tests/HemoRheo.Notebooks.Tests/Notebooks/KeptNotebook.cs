namespace HemoRheo.Notebooks.Tests;

/// <summary>A notebook of the repository, kept with what its cells show.</summary>
/// <param name="file">Its file name.</param>
/// <param name="charts">How many charts it shows.</param>
public abstract class KeptNotebook(string file, int charts) : HeadlessNotebook(jupyter => jupyter.Execute(SourceOf(file)))
{
    internal string Source { get; } = SourceOf(file);

    internal int Charts { get; } = charts;

    private static string SourceOf(string file) => Path.Combine(Repository.Root, "notebooks", file);
}
