namespace HemoRheo.Notebooks.Tests.Reports;

public sealed class MarkupTests
{
    [Theory]
    [InlineData("<img src=x onerror=alert(1)>", "&lt;img src=x onerror=alert(1)&gt;")]
    [InlineData("a & \"b\" 'c'", "a &amp; &quot;b&quot; &#39;c&#39;")]
    [InlineData("\u0000\u001b\uffff", "\ufffd\ufffd\ufffd")]
    [InlineData("abc\u202egnp.exe", "abc\ufffdgnp.exe")]
    [InlineData("τ_y η 100 µ", "τ_y η 100 µ")]
    public void Text_from_data_is_encoded(string data, string html) => Assert.Equal($"<p>{html}</p>", Markup.Of($"<p>{data}</p>").Text);

    [Fact]
    public void A_lone_half_of_a_pair_becomes_the_replacement_character() => Assert.Equal("\ufffd", Markup.Of($"{new string((char)0xD800, 1)}").Text);

    [Fact]
    public void Markup_inside_markup_is_kept() => Assert.Equal("<p><b>&lt;</b></p>", Markup.Of($"<p>{Markup.Of($"<b>{"<"}</b>")}</p>").Text);
}
