namespace HemoRheo.Tests.Tables;

public sealed class GlossaryTests
{
    [Fact]
    public void An_unknown_column_is_refused_with_the_nearest_one()
    {
        var refused = Assert.Throws<ArgumentException>(() => Glossary.Column("viscosty"));
        Assert.Contains("\"viscosity\"", refused.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Every_name_is_there_once() => Assert.Empty(Glossary.All.GroupBy(column => column.Name).Where(same => same.Count() > 1).Select(same => same.Key));

    [Fact]
    public void Every_column_says_what_it_means_in_a_sentence() => Assert.All(Glossary.All, column =>
    {
        Assert.True(column.Meaning.Length > 6 && char.IsUpper(column.Meaning[0]) && column.Meaning[^1] == '.', column.Name);
        Assert.Equal(column.Name.Trim(), column.Name);
    });
}
