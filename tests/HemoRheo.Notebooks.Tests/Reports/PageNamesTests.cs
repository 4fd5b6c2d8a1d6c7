namespace HemoRheo.Notebooks.Tests.Reports;

public sealed class PageNamesTests
{
    [Fact]
    public void Names_that_differ_only_in_case_or_signs_get_files_of_their_own()
    {
        var names = new PageNames(["S-1", "s-1", "S/1", "S\\1"]);
        Assert.Equal(["S-1.html", "s-1-2.html", "S_1.html", "S_1-2.html"], new[] { "S-1", "s-1", "S/1", "S\\1" }.Select(name => names[name]));
    }

    [Theory]
    [InlineData("../../etc/passwd", "etc_passwd.html")]
    [InlineData("..", "page.html")]
    [InlineData("", "page.html")]
    [InlineData("con", "page-con.html")]
    [InlineData("com1", "page-com1.html")]
    [InlineData("Straße 1", "Stra_e_1.html")]
    public void A_name_never_becomes_a_path(string name, string file) => Assert.Equal(file, new PageNames([name])[name]);

    [Fact]
    public void A_long_name_is_cut() => Assert.InRange(new PageNames([new string('x', 5000)])[new string('x', 5000)].Length, 1, 80);
}
