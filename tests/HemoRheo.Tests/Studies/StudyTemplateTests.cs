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
    public void A_correlation_of_readings_is_estimated_unless_the_file_declares_it()
    {
        using var folder = StudyFolder.Valid();
        Assert.Null(Study.Open(folder.StudyFile).Errors.PointCorrelation);
        folder.Write("study.toml", Study.Template().Replace("# point_correlation = ", "point_correlation = ", StringComparison.Ordinal));
        Assert.Equal(0.3, Study.Open(folder.StudyFile).Errors.PointCorrelation);
    }

    [Fact]
    public void Lists_every_column_of_every_table_with_its_unit()
    {
        using var folder = StudyFolder.Valid();
        var columns = SamplesTable.Columns(Study.Open(folder.StudyFile)).Concat(PeopleTable.Columns).Concat(CheckTable.Columns);
        foreach (var column in columns)
        {
            var unit = column.Quantity is { } quantity ? $@" \[({string.Join('|', UnitTable.SpellingsOf(quantity).Select(System.Text.RegularExpressions.Regex.Escape))})\]" : "";
            Assert.Matches($@"(?m)^#   ([a-z_]+, )*{column.Name}{unit}[ ,]", Study.Template());
        }
    }

    [Fact]
    public void Tables_and_exports_made_as_its_comments_say_are_read_without_a_finding()
    {
        using var folder = StudyFolder.Empty();
        var lines = Study.Template().Split('\n').Select(line => line.StartsWith("#   ", StringComparison.Ordinal) ? line[4..] : line).ToArray();
        string Example(string header) => string.Concat(lines.SkipWhile(line => !line.StartsWith(header, StringComparison.Ordinal)).Take(2).Select(line => line + "\n"));
        const string check = "Sample: C-1\nInstrument: R1\nGeometry: CYL-1\nFluid: oil-5\nStart: 2026-03-02T07:00:00+01:00\nReadings: 1\n" + StudyFolder.BlockHeader + "down,37.0,100,100,485\n";
        folder.Write("study.toml", Study.Template()).Write("samples.csv", Example("sample,person,")).Write("people.csv", Example("person,group"))
            .Write("exports/a.csv", StudyFolder.RowsHeader + StudyFolder.Row("S-001", "120", "7,5")).Write("checks/c.txt", check);

        var readings = Study.Open(folder.StudyFile).ReadExports();

        Assert.Empty(readings.Findings);
        Assert.Equal(("P-001", 1, 1, 1), (Assert.Single(readings.Samples).Person, readings.People.Count, readings.Blood.Count, readings.Checks.Count));
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
