namespace HemoRheo.Tests.Tables;

public sealed class TableTests
{
    private static readonly Table Example = Table.Of("sample", "viscosity", "n")
        .With("S-0001", Cell.Rounded(4.87123456789, 0.1093), 12)
        .With("S-0002", 12.5, Cell.Empty);

    [Fact]
    public void Tables_of_equal_content_are_equal()
    {
        var again = Table.Of("sample", "viscosity", "n").WithRows<(string Name, Cell Number, int? Count)>(
            [("S-0001", Cell.Rounded(4.87123456789, 0.1093), 12), ("S-0002", 12.5, null)],
            row => [row.Name, row.Number, row.Count]);
        Assert.Equal(Example, again);
        Assert.Equal(Example.GetHashCode(), again.GetHashCode());
    }

    [Fact]
    public void Text_shows_numbers_rounded_and_to_the_right() => Assert.Equal(
        """
        sample  viscosity [mPa·s]   n
        ------  -----------------  --
        S-0001               4.87  12
        S-0002               12.5

        """,
        Example.ToText());

    [Fact]
    public void Headings_of_numbers_wrap_where_the_line_is_narrow() => Assert.Equal(
        """
                viscosity
        sample    [mPa·s]   n
        ------  ---------  --
        S-0001       4.87  12
        S-0002       12.5

        """,
        Example.ToText(width: 20));

    [Fact]
    public void Csv_writes_numbers_in_full_and_headings_with_units() =>
        Assert.Equal("sample,viscosity [mPa·s],n\nS-0001,4.87123456789,12\nS-0002,12.5,\n", Example.ToCsv());

    [Fact]
    public void Csv_quotes_separators_quotes_and_line_breaks() => // RFC 4180, rules 5 to 7.
        Assert.Equal("name,meaning,before\n\"a,b\",\"say \"\"x\"\"\",\"two\nlines\"\n", Table.Of("name", "meaning", "before").With("a,b", "say \"x\"", "two\nlines").ToCsv());

    [Theory]
    [InlineData("=1+1", "'=1+1")]
    [InlineData("+1", "'+1")]
    [InlineData("-1", "'-1")]
    [InlineData("@x", "'@x")]
    [InlineData("\tx", "'\tx")]
    [InlineData("\rx", "\"'\rx\"")]
    [InlineData("a=1", "a=1")]
    public void A_text_that_a_spreadsheet_would_run_is_guarded(string text, string field) =>
        Assert.Equal($"name\n{field}\n", Table.Of("name").With(text).ToCsv());

    [Theory]
    [InlineData(-1.5, "-1.5")]
    [InlineData(1e-300, "1E-300")]
    [InlineData(0.1, "0.1")]
    [InlineData(double.PositiveInfinity, "Inf")]
    [InlineData(double.NegativeInfinity, "-Inf")]
    public void A_number_is_never_guarded(double number, string field) => Assert.Equal($"value\n{field}\n", Table.Of("value").With(number).ToCsv());

    [Fact]
    public void A_NaN_is_refused() => Assert.Throws<ArgumentException>(() => Table.Of("value").With(double.NaN));

    [Fact]
    public void A_row_of_another_length_is_refused_with_both_counts()
    {
        var refused = Assert.Throws<ArgumentException>(() => Table.Of("sample", "value").With("S-1"));
        Assert.Contains("2 columns", refused.Message, StringComparison.Ordinal);
        Assert.Contains("1 cells", refused.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Long_texts_wrap_to_the_width_and_no_letter_is_lost()
    {
        var text = string.Join(' ', Enumerable.Range(1, 40).Select(i => $"word{i}"));
        var lines = Table.Of("sample", "finding").With("S-0001", text).ToText(60).Split('\n');
        Assert.All(lines, line => Assert.True(line.Length <= 60, line));
        Assert.Equal(text, string.Join(' ', lines[2..].Select(line => line.Length > 8 ? line[8..].Trim() : "").Where(line => line.Length > 0)));
    }

    [Fact]
    public void Control_characters_of_a_text_never_reach_the_console() =>
        Assert.DoesNotContain('\u001b', Table.Of("sample").With("\u001b[2Jx").ToText());

    [Fact]
    public void The_dictionary_of_a_table_describes_its_columns()
    {
        Assert.Equal(["sample", "viscosity [mPa·s]", "n"], Example.Dictionary().Rows.Select(row => row[0].Shown));
        Assert.Equal("mPa.s", Example.Dictionary().Rows[1][3].Shown); // UCUM: case-sensitive code of the millipascal second.
    }
}
