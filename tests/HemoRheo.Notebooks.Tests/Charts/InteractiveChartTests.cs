using System.Text.Json.Nodes;
using HemoRheo.Notebooks.Tests.Reports;
using Plotly.NET;

namespace HemoRheo.Notebooks.Tests.Charts;

public sealed class InteractiveChartTests
{
    private static readonly double[] Rates = [1, 10, 100];
    private static readonly double[] Stresses = [0.02, 0.08, 0.5];

    public static TheoryData<string> Pictures => [.. Drawn.Keys];

    private static Dictionary<string, Func<InteractiveChart>> Drawn { get; } = new()
    {
        ["curve"] = () => FlowCurve.Of(Rates, Stresses).Chart(),
        ["viscosity"] = () => FlowCurve.Of(Rates, Stresses).ViscosityChart(),
        ["fit"] = () => FlowCurve.Of(Rates, Stresses).Fit(FlowLaw.Casson).Chart(),
        ["residuals"] = () => FlowCurve.Of(Rates, Stresses).Fit(FlowLaw.Casson).ResidualChart(),
        ["profile"] = () => FlowCurve.Of(Rates, Stresses).Fit(FlowLaw.Casson).Profile("yield stress").Chart(),
        ["comparison"] = () => FlowCurve.Of(Rates, Stresses).Compare(ErrorModel.Known(0.02, ShearStress.FromMillipascals(1)), FlowLaw.Newtonian, FlowLaw.Casson).Chart(),
        ["sample"] = () => FakeStudy.Result.Samples[0].Chart(),
        ["budget"] = () => FakeStudy.Result.Samples[0].BudgetChart(),
        ["ranges"] = () => FakeStudy.Result.Samples[0].RangeChart(),
        ["checks"] = () => FakeStudy.Result.Analyzed.Histories[0].Chart(),
        ["control chart"] = () => FakeCourse.Review.Chart.Chart(),
        ["ratios"] = () => FakeCohort.Summary.Chart(),
    };

    [Theory]
    [MemberData(nameof(Pictures))]
    public void A_chart_is_a_figure_and_a_still_picture_of_the_same_width(string picture)
    {
        var chart = Drawn[picture]();
        var figure = Json(chart);

        Assert.NotEmpty(figure["data"]!.AsArray());
        Assert.Equal(700, (int)figure["layout"]!["width"]!);
        Assert.Contains("<svg width=\"700\"", chart.StillPicture, StringComparison.Ordinal);
    }

    [Fact]
    public void On_a_logarithmic_axis_numbers_stay_as_they_are_and_the_range_is_of_exponents()
    {
        var figure = Json(FlowCurve.Of(Rates, Stresses).Chart());
        var axis = figure["layout"]!["xaxis"]!;

        Assert.Equal("log", (string?)axis["type"]);
        Assert.Equal([1, 10, 100], figure["data"]![0]!["x"]!.AsArray().Select(x => (double)x!));
        Assert.Equal([20, 80, 500], figure["data"]![0]!["y"]!.AsArray().Select(y => Math.Round((double)y!, 9)));
        Assert.Equal(Math.Log10(1 / 1.4), (double)axis["range"]![0]!, 1e-12);
        Assert.Equal(Math.Log10(140), (double)axis["range"]![1]!, 1e-12);
    }

    [Fact]
    public void A_text_that_is_markup_stays_text_in_labels_and_in_the_page()
    {
        var kind = new FindingKind("made-up", Severity.Fault, "Meaning.", "Cause.", "Do.");
        var curve = FlowCurve.Of(Rates, Stresses);
        var aside = curve with { Points = curve.Points.Take(2).ToItems(), SetAside = [new(curve.Points[2], [kind.At(Where.Nowhere, "</script><b>bold</b> & more")])] };

        var hover = Json(aside.Chart())["data"]!.AsArray().Select(trace => trace!["text"]).OfType<JsonArray>().SelectMany(texts => texts).Select(text => (string?)text).ToArray();

        Assert.Contains(hover, text => text!.Contains("&lt;/script>&lt;b>bold&lt;/b> &amp; more", StringComparison.Ordinal));
        Assert.DoesNotContain("</script><b>", ChartMarkup.Of(aside.Chart()).Text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_curve_without_a_point_above_zero_says_why_it_cannot_be_drawn() =>
        Assert.Contains("logarithmic axes", Assert.Throws<InvalidOperationException>(() => FlowCurve.Of([1], [-0.1]).Chart()).Message, StringComparison.Ordinal);

    private static JsonNode Json(InteractiveChart chart) => JsonNode.Parse(GenericChart.toFigureJson(chart.Figure))!;
}
