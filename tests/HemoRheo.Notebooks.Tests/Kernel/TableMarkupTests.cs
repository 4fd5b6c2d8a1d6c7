namespace HemoRheo.Notebooks.Tests;

public sealed class TableMarkupTests
{
    [Fact]
    public void Text_from_files_stays_text() =>
        Assert.Contains("&lt;img src=x onerror=alert(1)&gt;", TableMarkup.Of(Table.Of("sample").With("<img src=x onerror=alert(1)>")).Text, StringComparison.Ordinal);

    [Fact]
    public void Units_stand_in_the_heading() =>
        Assert.Contains(">shear rate [1/s]</th>", TableMarkup.Of(Table.Of("shear rate").With(10.0)).Text, StringComparison.Ordinal);

    [Theory]
    [InlineData(26, 0)]
    [InlineData(27, 2)]
    [InlineData(100, 75)]
    public void A_long_table_leaves_out_its_middle_and_says_how_much(int rows, int leftOut)
    {
        var html = TableMarkup.Of(Table.Of("point").WithRows(Enumerable.Range(1, rows), row => [row])).Text;

        Assert.Contains(">1</td>", html, StringComparison.Ordinal);
        Assert.Contains($">{rows}</td>", html, StringComparison.Ordinal);
        Assert.Equal(leftOut > 0, html.Contains($"{leftOut} of {rows} rows not shown", StringComparison.Ordinal));
        Assert.Equal(leftOut > 0, html.Contains("not shown", StringComparison.Ordinal));
    }

    [Fact]
    public void Findings_come_with_the_gravest_first_and_are_counted()
    {
        FindingKind note = new("a-note", Severity.Note, "Meaning.", "Cause.", "Do nothing.");
        FindingKind fault = new("a-fault", Severity.Fault, "Meaning.", "Cause.", "Measure again.");
        Items<Finding> findings = [note.At(Where.Nowhere, "First."), fault.At(new("a.csv", Line: 7), "Second."), note.At(Where.Nowhere, "Third.")];

        var html = FindingsView.Of(findings).Text;

        Assert.Contains("3 findings: 1 fault, 2 notes", html, StringComparison.Ordinal);
        Assert.True(html.IndexOf("Second.", StringComparison.Ordinal) < html.IndexOf("First.", StringComparison.Ordinal));
        Assert.Contains("a.csv:7", html, StringComparison.Ordinal);
        Assert.Contains("Measure again.", html, StringComparison.Ordinal);
    }
}
