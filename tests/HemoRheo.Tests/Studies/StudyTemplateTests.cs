namespace HemoRheo.Tests.Studies;

public sealed class StudyTemplateTests
{
    [Fact]
    public void Opens_once_the_files_it_names_are_there()
    {
        using var folder = StudyFolder.Empty();
        folder.Write("study.toml", Study.Template());
        folder.Write("samples.csv", "sample,person\n");
        folder.Write("people.csv", "person,group\n");
        Directory.CreateDirectory(folder.PathOf("exports"));
        Directory.CreateDirectory(folder.PathOf("checks"));

        var study = Study.Open(folder.PathOf("study.toml"));

        Assert.Equal("My study", study.Name);
        Assert.Equal(2, study.Layouts.Count);
        Assert.Equal(0.0125, study.Geometries[0].InnerRadius, 1e-15);
        Assert.Equal(TimeSpan.FromDays(8), study.Instruments[0].CheckEvery);
    }

    [Fact]
    public void Tells_which_files_are_missing_before_they_are_there()
    {
        using var folder = StudyFolder.Empty();
        folder.Write("study.toml", Study.Template());

        var refusal = Assert.Throws<StudyFileException>(() => Study.Open(folder.PathOf("study.toml")));

        Assert.All(refusal.Faults, fault => Assert.Equal("study.toml", fault.File));
        Assert.Contains(refusal.Faults, fault => fault.Found.Contains("exports", StringComparison.Ordinal));
    }

    [Fact]
    public void Shows_every_key_a_study_file_may_have()
    {
        foreach (var key in StudyFileKeys.All.Where(key => key.Kind != StudyFileKeyKind.Field))
            Assert.Matches($@"(?m)^(# )?{key.Name} = ", Study.Template());
    }
}
