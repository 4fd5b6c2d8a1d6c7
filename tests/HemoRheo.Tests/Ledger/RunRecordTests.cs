using System.Globalization;
using System.Security.Cryptography;
using System.Text;
using System.Text.Json.Nodes;

namespace HemoRheo.Tests.Ledger;

public sealed class RunRecordTests
{
    private static readonly RunRecord Record = LedgerStudy.Record(LedgerStudy.Analyzed);

    [Fact]
    public void Results_are_named_and_told_in_plain_words() =>
        Assert.All(Record.Results, result => Assert.DoesNotMatch(@"\b(InOrder|InDoubt|Native|StandardBy\w+|CannotTell)\b", $"{result.Name} {result.Text}"));

    [Fact]
    public void Every_value_verdict_range_and_group_number_has_a_name()
    {
        string[] names =
        [
            "S-c1/Casson/viscosity at 10 1/s/native hematocrit/value", "S-c1/Casson/viscosity at 10 1/s/native hematocrit/u", "S-c1/Casson/viscosity at 10 1/s/native hematocrit/calibration",
            "S-p1/Casson/viscosity at 10 1/s/native hematocrit/verdict", "S-p1/Casson/viscosity at 10 1/s/native hematocrit/above",
            "range/Casson/viscosity at 10 1/s/native hematocrit/lower", "range/Casson/viscosity at 10 1/s/native hematocrit/upper limit to",
            "cohort/Casson/viscosity at 10 1/s/native hematocrit/patients beside controls/total/value", "cohort/Casson/viscosity at 10 1/s/native hematocrit/patients beside controls/total/p",
            "cohort/Casson/viscosity at 10 1/s/native hematocrit/patients beside controls/controls/mean/value", "outcomes/patients/viscosity at 10 1/s/native hematocrit/above",
        ];
        Assert.All(names, name => Assert.Single(Record.Results, result => result.Name == name));
        Assert.Equal(Record.Results.Count, Record.Results.Select(result => result.Name).Distinct().Count());
    }

    [Fact]
    public void Numbers_are_written_so_that_the_same_bits_come_back()
    {
        var texts = Record.Results.ToDictionary(result => result.Name, result => result.Text);
        Assert.All(LedgerStudy.Analyzed.Samples, sample =>
            Assert.Equal(sample.Values[0].Value.X, double.Parse(texts[$"{sample.Sample}/Casson/viscosity at 10 1/s/native hematocrit/value"], CultureInfo.InvariantCulture)));
    }

    [Fact]
    public void The_digest_is_SHA_256_over_one_line_a_result()
    {
        var lines = string.Concat(Record.Results.Select(result => $"{result.Name}\t{result.Text}\n"));
        Assert.Equal(Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(lines))), Record.ResultDigest);
    }

    [Fact]
    public void Inputs_settings_seed_versions_and_feeds_are_recorded()
    {
        Assert.Equal(25, Record.Inputs.Count);
        Assert.Equal(LedgerStudy.Analyzed.Study.Digest, Record.Settings);
        Assert.Equal(20261201, Record.Seed);
        Assert.Equal(["HemoRheo", "MathNet.Numerics", "runtime", "architecture"], Record.Versions.Select(version => version.Name));
        Assert.StartsWith("5.0.0", Record.Versions[1].Text, StringComparison.Ordinal);
        Assert.Equal(["exports/S-c1.csv", "samples.csv", "people.csv"], Record.Feeds.Where(feed => feed.Name == "S-c1").Select(feed => feed.Text));
    }

    [Fact]
    public void Two_results_of_one_name_are_told_apart()
    {
        var twice = LedgerStudy.Analyzed with { Samples = LedgerStudy.Analyzed.Samples.With([LedgerStudy.Analyzed.Samples[0]]) };
        Assert.Contains(LedgerStudy.Record(twice).Results, result => result.Name == "S-c1/Casson/viscosity at 10 1/s/native hematocrit/value (2)");
    }

    [Fact]
    public void A_record_without_a_summary_has_no_cohort_numbers() =>
        Assert.DoesNotContain(RunRecord.Of(LedgerStudy.Analyzed.Judged(), null).Results, result => result.Name.StartsWith("cohort/", StringComparison.Ordinal));

    [Fact]
    public void Reading_back_gives_an_equal_record_and_the_same_text()
    {
        var strange = Record with { Study = "Ünusual \"name\"\n<script>" };
        var json = strange.ToJson();
        Assert.Equal(strange, RunRecord.FromJson(json));
        Assert.Equal(json, RunRecord.FromJson(json).ToJson());
        Assert.DoesNotContain("<script>", json, StringComparison.Ordinal);
        Assert.DoesNotContain("\r", json, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("de-DE")]
    [InlineData("ar-SA")]
    public void A_record_is_the_same_under_any_culture(string culture)
    {
        var before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = new(culture);
            Assert.Equal(Record.ToJson(), LedgerStudy.Record(LedgerStudy.Analyzed).ToJson());
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void What_is_not_a_record_is_refused_in_words()
    {
        Refused("", "cannot be read");
        Refused("{ \"format\": 1, ", "cannot be read");
        Refused("[]", "not a record of a run");
        Refused("{}", "no whole number \"format\"");
        Refused(Changed(json => json["format"] = 2), "format 2; this program reads format 1, so a newer version wrote it");
        Refused(Changed(json => json["format"] = 1.5), "no whole number");
        Refused(Changed(json => json["extra"] = 1), "extra");
        Refused(Changed(json => json["inputs"]![0]!["extra"] = "x"), "extra");
        Refused(Changed(json => json.AsObject().Remove("seed")), "seed");
        Refused(Changed(json => json["study"] = null), "study");
        Refused(Changed(json => json["seed"] = "7"), "seed");
        Refused(Changed(json => json["results"]![0]!["text"] = "7"), "changed after it was written");
        Refused(Record.ToJson().Replace("\"seed\"", "\"study\": \"twice\", \"seed\"", StringComparison.Ordinal), "study");

        static void Refused(string json, string words) => Assert.Contains(words, Assert.Throws<FormatException>(() => RunRecord.FromJson(json)).Message, StringComparison.Ordinal);

        static string Changed(Action<JsonNode> change)
        {
            var json = JsonNode.Parse(Record.ToJson())!;
            change(json);
            return json.ToJsonString();
        }
    }
}
