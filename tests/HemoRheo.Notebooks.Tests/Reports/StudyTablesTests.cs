using System.Globalization;
using System.Text;

namespace HemoRheo.Notebooks.Tests.Reports;

public sealed class StudyTablesTests
{
    private static readonly Dictionary<string, string> Files =
        StudyTables.Files(new(FakeStudy.Result, FakeCohort.Summary, FakeStudy.Record, null)).ToDictionary(file => file.Name, file => file.Text);

    public static TheoryData<string> Tables => new(Files.Keys.Where(name => name.EndsWith(".csv", StringComparison.Ordinal)));

    [Theory]
    [MemberData(nameof(Tables))]
    public void Every_table_has_rows_all_as_long_as_its_heading(string name)
    {
        var rows = Parse(Files[name]);
        Assert.True(rows.Count > 1, name);
        Assert.All(rows, row => Assert.Equal(rows[0].Length, row.Length));
        Assert.DoesNotContain('\r', Files[name]);
        Assert.EndsWith("\n", Files[name], StringComparison.Ordinal);
        Assert.DoesNotContain("NaN", Files[name], StringComparison.Ordinal);
    }

    [Fact]
    public void The_dictionary_covers_every_column_of_every_table()
    {
        var described = Parse(Files[StudyTables.Dictionary]).Skip(1).Select(row => (row[0], row[1])).ToHashSet();
        foreach (var (name, text) in Files.Where(file => file.Key.EndsWith(".csv", StringComparison.Ordinal) && file.Key != StudyTables.Dictionary))
        {
            Assert.All(Parse(text)[0], column => Assert.Contains((name, column), described));
        }
    }

    [Fact]
    public void A_column_with_a_unit_has_its_UCUM_code()
    {
        var rows = Parse(Files[StudyTables.Dictionary]);
        Assert.All(rows.Skip(1).Where(row => row[3].Length > 0), row => Assert.NotEqual("", row[4]));
        Assert.Contains(rows, row => row[0] == "checks.csv" && row[1] == "temperature [°C]" && row[4] == "Cel");
        Assert.Contains(rows, row => row[0] == "checks.csv" && row[1] == "measured [mPa·s]" && row[4] == "mPa.s");
    }

    [Fact]
    public void The_caution_stands_in_the_dictionary_and_beside_the_tables()
    {
        Assert.Contains("For research use only", Parse(Files[StudyTables.Dictionary])[1][2], StringComparison.Ordinal);
        Assert.Contains("For research use only", Files["README.txt"], StringComparison.Ordinal);
    }

    [Theory]
    [MemberData(nameof(Tables))]
    public void Every_row_of_every_table_carries_the_caution_in_its_last_column(string name)
    {
        var rows = Parse(Files[name]);
        Assert.Equal("caution", rows[0][^1]);
        Assert.All(rows.Skip(1), row => Assert.Equal("research use only", row[^1]));
    }

    [Fact]
    public void Counts_of_people_and_of_samples_add_up_in_every_row_of_the_cohort()
    {
        var rows = Parse(Files["cohort.csv"]);
        Assert.All(rows.Skip(1), row =>
        {
            Assert.Equal(Number(rows, row, "samples"), Number(rows, row, "samples used") + Number(rows, row, "marked") + Number(rows, row, "set aside"));
            Assert.Equal(Number(rows, row, "people"), Number(rows, row, "n") + Of(rows, row, "people left out").Split("; ").Where(reason => reason.Length > 0).Sum(reason => int.Parse(reason.Split(' ')[1], CultureInfo.InvariantCulture)));
        });
        Assert.Contains(rows, row => Of(rows, row, "n") == "4" && Of(rows, row, "samples used") == "5" && Of(rows, row, "samples") == "6");
    }

    [Fact]
    public void A_fit_that_ended_well_is_not_said_to_fit_where_its_curve_or_the_study_contradicts_the_law()
    {
        Assert.Equal(["yes"], Judgments(0.4, true));
        Assert.Equal(["no: the curve contradicts the law"], Judgments(0.0005, true));
        Assert.Equal(["no: the study contradicts the law"], Judgments(0.4, false));
        Assert.Equal(["no: the curve and the study contradict the law"], Judgments(0.0005, false));
    }

    [Fact]
    public void No_table_holds_a_raw_word_of_the_program() => Assert.All(Files, file => Assert.DoesNotMatch(@"\b(InOrder|InDoubt|Native|StandardBy\w+|PlasmaPower|StudySlope|CannotTell|SmallStep)\b", file.Value));

    private static IEnumerable<string> Judgments(double probability, bool lawFits)
    {
        var result = FakeStudy.Result;
        var sample = result.Samples[0];
        var loadings = sample.Result.Loadings.Select(loading => loading with { Fits = loading.Fits.Select(fit => fit with { Fit = fit.Fit with { Probability = probability } }).ToItems() }).ToItems();
        var pool = result.Analyzed.Pool with { Laws = result.Analyzed.Pool.Laws.Select(law => law with { Fits = lawFits }).ToItems() };
        var edition = new Edition(result with { Analyzed = result.Analyzed with { Pool = pool }, Samples = [sample with { Result = sample.Result with { Loadings = loadings } }] }, null, FakeStudy.Record, null);
        var rows = Parse(CurveTables.Fits(edition).Table.ToCsv());
        Assert.All(rows.Skip(1), row => Assert.Equal("yes", Of(rows, row, "usable")));
        return rows.Skip(1).Select(row => Of(rows, row, "fits")).Distinct();
    }

    [Fact]
    public void No_cell_of_any_table_starts_like_a_formula_unless_it_is_a_number() => Assert.All(Files.Where(file => file.Key.EndsWith(".csv", StringComparison.Ordinal)), file => Assert.All(Parse(file.Value).SelectMany(row => row), cell =>
    {
        var number = double.TryParse(cell, NumberStyles.Float, CultureInfo.InvariantCulture, out _) || cell == "-Inf";
        Assert.False(!number && cell is ['=' or '+' or '-' or '@' or '\t' or '\r', ..], cell);
    }));

    [Fact]
    public void Values_carry_estimate_interval_budget_and_verdict()
    {
        var rows = Parse(Files["values.csv"]);
        var row = rows.First(row => row[0] == "S-0001" && Of(rows, row, "measurand") == "viscosity at 10 1/s" && Of(rows, row, "basis") == "standard hematocrit, plasma rule");
        Assert.Equal("P-001", Of(rows, row, "person"));
        Assert.Equal("controls", Of(rows, row, "group"));
        Assert.Equal("mPa.s", Of(rows, row, "UCUM code"));
        var working = Number(rows, row, "working value");
        Assert.Equal(Math.Log(0.0065) - 0.2, working, 1e-12);
        Assert.Equal(6.5 * Math.Exp(-0.2), Number(rows, row, "value"), 1e-9);
        Assert.Equal(-0.002, Number(rows, row, "c calibration"), 1e-12);
        Assert.Equal(-0.0225, Number(rows, row, "c hematocrit"), 1e-12);
        Assert.Equal("", Of(rows, row, "c slope"));
        Assert.Equal("below", Of(rows, row, "outcome"));
        Assert.Equal(1, Number(rows, row, "p below") + Number(rows, row, "p within") + Number(rows, row, "p above"), 1e-9);
    }

    [Fact]
    public void The_squares_of_a_values_budget_add_up_to_its_uncertainty()
    {
        var values = Parse(Files["values.csv"]);
        var row = values.First(row => row[0] == "S-0001" && Of(values, row, "measurand") == "viscosity at 1 1/s" && Of(values, row, "basis") == "native hematocrit");
        var parts = Parse(Files["budget.csv"]);
        var sum = parts.Skip(1).Where(part => part[0] == "S-0001" && Of(parts, part, "measurand") == "viscosity at 1 1/s" && Of(parts, part, "basis") == "native hematocrit")
            .Sum(part => Math.Pow(Number(parts, part, "working contribution"), 2));
        Assert.Equal(Number(values, row, "working uncertainty"), Math.Sqrt(sum), 1e-12);
    }

    [Fact]
    public void Points_set_aside_stay_in_the_data_with_their_reason_and_line()
    {
        var rows = Parse(Files["points.csv"]);
        var aside = rows.Where(row => row[0] == "S-0001" && Of(rows, row, "kept") == "no").ToArray();
        Assert.Equal(4, aside.Length);
        Assert.All(aside, row => Assert.Equal("torque-below-floor", Of(rows, row, "set aside because")));
        Assert.Equal(["32", "33"], aside.Take(2).Select(row => Of(rows, row, "line")));
    }

    [Fact]
    public void A_comparison_that_could_not_be_had_says_why_and_holds_no_number()
    {
        var rows = Parse(Files["comparisons.csv"]);
        var row = rows.Single(row => row[0] == "viscosity at 100 1/s" && Of(rows, row, "basis") == "native hematocrit" && Of(rows, row, "question") == "total");
        Assert.Equal("", Of(rows, row, "ratio"));
        Assert.Equal("One person is too few for a comparison.", Of(rows, row, "reason"));
    }

    private static string Of(List<string[]> rows, string[] row, string column) => row[Array.IndexOf(rows[0], column)];

    private static double Number(List<string[]> rows, string[] row, string column) => double.Parse(Of(rows, row, column), CultureInfo.InvariantCulture);

    /// <summary>Reads comma-separated values by the grammar of RFC 4180, section 2, with line feeds.</summary>
    private static List<string[]> Parse(string text)
    {
        var rows = new List<string[]>();
        var row = new List<string>();
        var field = new StringBuilder();
        var quoted = false;
        for (var i = 0; i < text.Length; i++)
        {
            var letter = text[i];
            if (quoted && letter == '"' && i + 1 < text.Length && text[i + 1] == '"') field.Append(text[++i]);
            else if (letter == '"') quoted = !quoted;
            else if (quoted) field.Append(letter);
            else if (letter is ',' or '\n') Close(letter == '\n');
            else field.Append(letter);
        }

        return rows;

        void Close(bool line)
        {
            row.Add(field.ToString());
            field.Clear();
            if (!line) return;
            rows.Add([.. row]);
            row.Clear();
        }
    }
}
