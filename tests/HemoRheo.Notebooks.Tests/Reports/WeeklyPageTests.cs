using System.Xml.Linq;

namespace HemoRheo.Notebooks.Tests.Reports;

public sealed class WeeklyPageTests
{
    private static readonly string Text = WeeklyPage.Write(FakeCourse.Review, Markup.None);

    [Fact]
    public void It_answers_the_three_questions_in_words_before_anything_else()
    {
        var answers = Page().Descendants("div").First(div => div.Attribute("class")?.Value == "answers");
        Assert.Equal(["Is it right now?", "Has it drifted, and since when?", "Which samples are in doubt?"], answers.Descendants("h3").Select(heading => heading.Value));
        Assert.Equal(["Yes.", "Yes.", "90 of 240."], answers.Descendants("b").Select(word => word.Value));
        Assert.Contains("At torques of 0.1 to 1 µN·m: failed.", answers.Value, StringComparison.Ordinal);
        Assert.Matches("It drifts slowly, by \\+0.[0-9]+ % a month.", answers.Value);
        Assert.Matches("Most likely since 2031-0[789]-[0-9]+; with 95 % certainty between 2031-0[5678]-[0-9]+ and 2031-[01][0-9]-[0-9]+", answers.Value);
        Assert.Contains("40 in doubt, 50 measured after a failed check.", answers.Value, StringComparison.Ordinal);
        Assert.Empty(answers.ElementsBeforeSelf());
    }

    [Fact]
    public void Each_task_names_who_must_do_it()
    {
        var tasks = Section("tasks").Descendants("li").ToArray();
        Assert.All(tasks, task => Assert.Contains(task.Element("b")!.Value, new[] { "Whoever measures", "Lab manager", "Whoever judges the samples" }));
        Assert.Contains(tasks, task => task.Value.Contains("Trust no readings at torques of 0.1 to 1 µN·m", StringComparison.Ordinal));
        Assert.Contains(tasks, task => task.Value.Contains("lab book", StringComparison.Ordinal));
    }

    [Fact]
    public void The_table_shows_the_last_checks_by_torque_and_the_samples_stand_by_reason()
    {
        var rows = Section("checks").Descendants("tbody").Single().Elements("tr").ToArray();
        Assert.Equal(6, rows.Length);
        Assert.Equal(["passes", "fails", "cannot tell", "passes"], rows[0].Elements().TakeLast(4).Select(cell => cell.Value));
        Assert.Equal("W-32", rows[0].Element("th")!.Value);
        var samples = Section("samples");
        Assert.Equal(4, samples.Descendants("tbody").Single().Elements("tr").Count());
        Assert.Contains("And 50 more for other reasons.", samples.Value, StringComparison.Ordinal);
    }

    [Fact]
    public void It_bears_the_digest_and_the_caution_and_is_the_same_bytes_each_time()
    {
        Assert.Contains(new string('e', 64), Text, StringComparison.Ordinal);
        Assert.Contains(ResearchUse.Caution, Text, StringComparison.Ordinal);
        Assert.Contains("size:A4 portrait", Text, StringComparison.Ordinal);
        Assert.DoesNotContain("<i>", Text, StringComparison.Ordinal);
        Assert.Equal(Text, WeeklyPage.Write(FakeCourse.Review, Markup.None));
    }

    [Fact]
    public void An_instrument_never_checked_has_a_page_that_says_so()
    {
        var bare = FakeCourse.Course with { Checks = [] };
        var page = WeeklyPage.Write(FakeCourse.Of(bare) with { InDoubt = [], Log = null }, Markup.None);
        Assert.Contains("Nobody knows.", page, StringComparison.Ordinal);
        Assert.Contains("Cannot be told.", page, StringComparison.Ordinal);
        Assert.Contains("Check it before the next sample.", page, StringComparison.Ordinal);
        Assert.DoesNotContain("<figure>", page, StringComparison.Ordinal);
    }

    [Fact]
    public void After_a_failed_check_it_says_between_which_checks_it_went_wrong()
    {
        var failed = FakeCourse.Course with { Checks = [.. FakeCourse.Course.Checks.Take(3), FakeCourse.Course.Checks[3] with { Outcome = CheckOutcome.Fails }] };
        var page = WeeklyPage.Write(FakeCourse.Of(failed), Markup.None);
        Assert.Contains("It went wrong between 2031-03-17, when it last passed, and 2031-03-24, when it failed", page, StringComparison.Ordinal);
        Assert.Contains("Stop: measure no sample.", page, StringComparison.Ordinal);
    }

    private static XElement Page() => XDocument.Parse(Text[Text.IndexOf("<html", StringComparison.Ordinal)..]).Root!.Descendants("main").Single();

    private static XElement Section(string anchor) => Page().Descendants("section").Single(section => section.Attribute("id")!.Value == anchor);
}
