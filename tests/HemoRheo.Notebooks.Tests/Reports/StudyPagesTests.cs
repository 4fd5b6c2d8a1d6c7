using System.Text.RegularExpressions;
using System.Xml;
using System.Xml.Linq;

namespace HemoRheo.Notebooks.Tests.Reports;

public sealed partial class StudyPagesTests : IDisposable
{
    private readonly string _folder = Directory.CreateTempSubdirectory("hemorheo-pages").FullName;

    public StudyPagesTests() => StudyPages.Write(FakeStudy.Result, FakeCohort.Summary, FakeStudy.Record, FakeStudy.Changed, _folder);

    private string[] Pages => Directory.GetFiles(_folder, "*.html", SearchOption.AllDirectories);

    public void Dispose() => Directory.Delete(_folder, recursive: true);

    [Fact]
    public void There_is_an_overview_a_page_a_sample_a_page_an_instrument_and_a_weekly_page_of_what_was_checked()
    {
        Assert.True(File.Exists(Path.Combine(_folder, "index.html")));
        Assert.Equal(FakeStudy.Names.Length, Directory.GetFiles(Path.Combine(_folder, "samples")).Length);
        Assert.Equal(["R1.html", "R1_week.html", "R2__i.html"], Directory.GetFiles(Path.Combine(_folder, "instruments")).Select(Path.GetFileName).Order(StringComparer.Ordinal));
        Assert.True(File.Exists(Path.Combine(_folder, "run.json")));
        Assert.Equal(["run.json"], Directory.GetFiles(_folder).Select(Path.GetFileName).Where(name => name != "index.html"));
    }

    [Fact]
    public void Every_page_is_well_formed_with_a_language_a_title_and_one_first_heading() => Assert.All(Pages, path =>
    {
        var page = Read(path);
        Assert.Equal("en", page.Root!.Attribute("lang")!.Value);
        Assert.NotEqual("", page.Descendants("title").Single().Value);
        Assert.Single(page.Descendants("h1"));
        Assert.Contains(page.Descendants("meta"), meta => meta.Attribute("name")?.Value == "viewport");
        Assert.All(page.Descendants("table"), table => Assert.Single(table.Elements("caption")));
        Assert.All(page.Descendants("figure"), figure => Assert.Single(figure.Elements("figcaption")));
        Assert.DoesNotContain(page.Descendants().Attributes("id").GroupBy(id => id.Value), same => same.Count() > 1);
    });

    [Fact]
    public void Every_page_stays_under_a_megabyte() => Assert.All(Pages, path => Assert.InRange(new FileInfo(path).Length, 1000, 1_000_000));

    [Fact]
    public void No_page_reaches_the_network_or_runs_anything() => Assert.All(Pages, path =>
    {
        var page = Read(path);
        Assert.DoesNotContain(page.Descendants(), element => element.Name.LocalName is "script" or "link" or "iframe" or "object" or "form" or "base" or "svg");
        Assert.DoesNotContain(page.Descendants().Attributes(), attribute => attribute.Name.LocalName.StartsWith("on", StringComparison.Ordinal) || attribute.Name.LocalName == "style");
        Assert.All(page.Descendants("a").Attributes("href"), href => Assert.Matches(LocalAddress(), href.Value));
        Assert.All(page.Descendants("img").Attributes("src"), src => Assert.StartsWith("data:image/svg+xml;base64,", src.Value, StringComparison.Ordinal));
        Assert.DoesNotContain("url(", File.ReadAllText(path), StringComparison.OrdinalIgnoreCase);
        Assert.DoesNotContain("@import", File.ReadAllText(path), StringComparison.OrdinalIgnoreCase);
    });

    [Fact]
    public void Every_link_leads_to_a_file_that_is_there_and_every_anchor_to_a_section() => Assert.All(Pages, path =>
    {
        var page = Read(path);
        var anchors = page.Descendants().Attributes("id").Select(id => id.Value).ToHashSet();
        Assert.All(page.Descendants("a").Attributes("href").Select(href => href.Value), href =>
        {
            if (href.StartsWith('#')) Assert.Contains(href[1..], anchors);
            else Assert.True(File.Exists(Path.Combine(Path.GetDirectoryName(path)!, href)), href);
        });
    });

    [Fact]
    public void Every_picture_says_what_it_shows_and_is_well_formed() => Assert.All(Pages.SelectMany(path => Read(path).Descendants("img")), image =>
    {
        Assert.True(image.Attribute("alt")!.Value.Length > 20);
        var svg = System.Text.Encoding.UTF8.GetString(Convert.FromBase64String(image.Attribute("src")!.Value["data:image/svg+xml;base64,".Length..]));
        Assert.Equal("svg", XDocument.Parse(svg).Root!.Name.LocalName);
        Assert.DoesNotContain("NaN", svg, StringComparison.Ordinal);
    });

    [Fact]
    public void The_caution_stands_on_every_page() => Assert.All(Pages, path => Assert.Contains("For research use only", Read(path).Descendants("header").Single().Value, StringComparison.Ordinal));

    [Fact]
    public void Names_from_data_are_text_never_markup()
    {
        var overview = Read(Path.Combine(_folder, "index.html"));
        var text = overview.Root!.Value;
        Assert.All(FakeStudy.Names, name => Assert.Contains(name, text, StringComparison.Ordinal));
        Assert.Contains("Invented & <b>bold</b>", text, StringComparison.Ordinal);
        Assert.DoesNotContain("<script", File.ReadAllText(Path.Combine(_folder, "index.html")), StringComparison.Ordinal);
    }

    [Fact]
    public void File_names_are_plain_and_unique_whatever_the_pseudonyms_hold()
    {
        var files = Directory.GetFiles(Path.Combine(_folder, "samples")).Select(Path.GetFileName).ToArray();
        Assert.All(files, file => Assert.Matches("^[A-Za-z0-9_-]+\\.html$", file!));
        Assert.Equal(files.Length, files.Distinct(StringComparer.OrdinalIgnoreCase).Count());
    }

    [Fact]
    public void The_overview_names_what_needs_attention_before_anything_else()
    {
        var overview = Read(Path.Combine(_folder, "index.html"));
        var attention = overview.Descendants("section").First();
        Assert.Equal("attention", attention.Attribute("id")!.Value);
        Assert.Contains("failed 1 check", attention.Value, StringComparison.Ordinal);
        Assert.Contains("exports/cut <file>.csv", attention.Value, StringComparison.Ordinal);
        Assert.Contains("1 sample set aside", attention.Value, StringComparison.Ordinal);
        Assert.Contains("R2 <i> has no check", attention.Value, StringComparison.Ordinal);
    }

    [Fact]
    public void The_overview_counts_people_and_samples_apart_and_says_that_a_further_visit_is_averaged()
    {
        var groups = Overview("groups");
        Assert.Contains("4 of 5", groups, StringComparison.Ordinal);
        Assert.Contains("5 of 6", groups, StringComparison.Ordinal);
        Assert.Contains("5: 1 further visit averaged into the person", groups, StringComparison.Ordinal);
    }

    [Fact]
    public void A_deciding_law_that_does_not_fit_is_one_point_of_attention()
    {
        const string Why = "The law contradicts the curves of this study.";
        var finding = PoolingFindings.LawDoesNotFit.At(Where.Nowhere, Why);
        var samples = FakeStudy.Result.Samples.Select(sample => sample with { Values = sample.Values.Select(value => value with { Range = null, Verdict = null, WhyNotJudged = Why, Value = value.Value with { Decidable = false, Findings = [finding] } }).ToItems() });
        var pool = FakeStudy.Result.Analyzed.Pool with { Laws = [new("Casson", 15, 9000, 135, 0, 0, false, Why)], Findings = [finding] };
        StudyPages.Write(FakeStudy.Result with { Analyzed = FakeStudy.Result.Analyzed with { Pool = pool }, Ranges = [], Samples = samples.ToItems() }, null, FakeStudy.Record, null, _folder);
        Assert.Equal(2, Overview("attention").Split(Why).Length);
        Assert.DoesNotContain("set aside", Overview("attention"), StringComparison.Ordinal);
        Assert.DoesNotContain("there is no reference range", Overview("attention"), StringComparison.Ordinal);
    }

    [Fact]
    public void No_page_prints_a_raw_word_of_the_program() =>
        Assert.All(Pages, path => Assert.DoesNotMatch(@"\b(InOrder|InDoubt|Native|StandardBy\w+|PlasmaPower|StudySlope|CannotTell|SmallStep)\b", Read(path).Root!.Value));

    [Fact]
    public void The_overview_says_whether_a_rerun_is_identical()
    {
        var changed = Read(Path.Combine(_folder, "index.html")).Root!.Value;
        Assert.Contains("2 changes", changed, StringComparison.Ordinal);
        StudyPages.Write(FakeStudy.Result, FakeCohort.Summary, FakeStudy.Record, new([]), _folder);
        Assert.Contains("identical", Read(Path.Combine(_folder, "index.html")).Root!.Value, StringComparison.Ordinal);
    }

    [Fact]
    public void A_sample_page_shows_each_line_of_the_budget_with_its_sign_and_says_what_is_shared()
    {
        var budget = Section("S-0001.html", "budget");
        Assert.Contains("−0.20", budget.Value, StringComparison.Ordinal);
        Assert.Contains("+0.35", budget.Value, StringComparison.Ordinal);
        var rows = budget.Descendants("tbody").Single().Elements("tr").ToDictionary(row => row.Elements("th").First().Value, row => row.Elements("td").First().Value);
        Assert.Equal("shared", rows["calibration of the period"]);
        Assert.Equal("shared", rows["bias of the hematocrit counter"]);
        Assert.Equal("", rows["fit of the readings"]);
        Assert.Equal("", rows["hematocrit of the sample"]);
    }

    [Fact]
    public void A_sample_page_leads_back_to_lines_of_a_file_and_the_checks()
    {
        var lineage = Section("S-0001.html", "lineage").Value;
        Assert.Contains("exports/r1.csv, lines 21 to 33", lineage, StringComparison.Ordinal);
        Assert.Contains("11 points kept, 2 set aside", lineage, StringComparison.Ordinal);
        Assert.Contains("check W1 of 2031-03-03", lineage, StringComparison.Ordinal);
        Assert.Contains(new string('a', 64), lineage, StringComparison.Ordinal);
    }

    [Fact]
    public void A_value_that_may_not_be_decided_on_is_shown_in_brackets_with_the_reason()
    {
        var values = Section("S-0003.html", "values").Value;
        Assert.Contains("(", values, StringComparison.Ordinal);
        Assert.Contains("too-long-since-draw", values, StringComparison.Ordinal);
        Assert.Contains("not judged: The value may not be decided on.", Section("S-0003.html", "verdicts").Value, StringComparison.Ordinal);
    }

    [Fact]
    public void An_instrument_page_answers_in_words_first()
    {
        var page = Read(Path.Combine(_folder, "instruments", "R1.html"));
        var answers = page.Descendants("div").First(div => div.Attribute("class")?.Value == "answers").Value;
        Assert.Contains("Cannot tell.", answers, StringComparison.Ordinal);
        Assert.Contains("in doubt from 2031-03-17 to 2031-03-24", answers, StringComparison.Ordinal);
        Assert.Contains("2 of 10", answers, StringComparison.Ordinal);
    }

    [Fact]
    public void A_study_without_groups_ranges_or_comparison_has_its_pages_too()
    {
        var bare = FakeStudy.Result with { Ranges = [], Samples = FakeStudy.Result.Samples.Select(sample => sample with { Values = sample.Values.Select(value => value with { Range = null, Verdict = null, WhyNotJudged = "There is no reference range." }).ToItems() }).ToItems() };
        StudyPages.Write(bare, null, FakeStudy.Record, null, _folder);
        Assert.Contains("There is no earlier run", Read(Path.Combine(_folder, "index.html")).Root!.Value, StringComparison.Ordinal);
    }

    [Fact]
    public void The_same_study_gives_the_same_bytes()
    {
        var before = Pages.ToDictionary(path => path, File.ReadAllText);
        StudyPages.Write(FakeStudy.Result, FakeCohort.Summary, FakeStudy.Record, FakeStudy.Changed, _folder);
        Assert.All(Pages, path => Assert.Equal(before[path], File.ReadAllText(path)));
    }

    private string Overview(string anchor) => Read(Path.Combine(_folder, "index.html")).Descendants("section").Single(section => section.Attribute("id")!.Value == anchor).Value;

    private XElement Section(string page, string anchor) => Read(Path.Combine(_folder, "samples", page)).Descendants("section").Single(section => section.Attribute("id")!.Value == anchor);

    private static XDocument Read(string path)
    {
        using var reader = XmlReader.Create(path, new() { DtdProcessing = DtdProcessing.Parse, XmlResolver = null });
        return XDocument.Load(reader);
    }

    [GeneratedRegex("^(#[a-z]+|(\\.\\./)?(index\\.html|run\\.json|(samples|instruments|tables)/[A-Za-z0-9_.-]+)|[A-Za-z0-9_-]+\\.html)$")]
    private static partial Regex LocalAddress();
}
