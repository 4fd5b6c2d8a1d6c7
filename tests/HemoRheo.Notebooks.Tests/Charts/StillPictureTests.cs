using System.Globalization;
using System.Xml.Linq;
using HemoRheo.Notebooks.Tests.Reports;

namespace HemoRheo.Notebooks.Tests.Charts;

public sealed class StillPictureTests
{
    private static readonly JudgedSample Sample = FakeStudy.Result["S-0001"];
    private static readonly SampleValue[] Native = [.. Sample.Values.Take(3).Select(value => value.Value)];

    private static readonly FlowCurve Curve = FlowCurve.Of([1, 3, 10, 30, 100], [0.016, 0.032, 0.07, 0.16, 0.44]);
    private static readonly ErrorModel Errors = ErrorModel.Known(0.02, ShearStress.FromMillipascals(0.5));

    public static TheoryData<string> Pictures => new(Drawings.Keys);

    private static Dictionary<string, (Func<string> Draw, string[] Texts)> Drawings { get; } = new()
    {
        ["flow curve"] = (() => FlowCurveChart.Svg(Sample.Result.Loadings, "Casson", Native, 0.0048), ["shear rate, 1/s", "apparent viscosity, mPa·s", "loading 1, kept", "loading 1, set aside", "torque floor", "100"]),
        ["flow curve of one loading"] = (() => FlowCurveChart.Svg(Sample.Result.Loadings[0], "Casson"), ["shear rate, 1/s", "apparent viscosity, mPa·s"]),
        ["residuals"] = (() => ResidualChart.Svg(Sample.Result.Loadings, "Casson"), ["shear rate, 1/s", "standardized residual, 1", "two standard deviations"]),
        ["profile"] = (() => Still.Svg(ProfileChart.Model(Curve.Fit(FlowLaw.Casson, Errors).Profile("yield stress")), ProfileChart.Height), ["yield stress, mPa", "rise of the misfit, standard deviations", "limit for 95 %", "end of the interval", "estimate"]),
        ["comparison"] = (() => Still.Svg(ComparisonChart.Model(Curve.Compare(Errors, FlowLaw.Casson, FlowLaw.PowerLaw)), ComparisonChart.Height), ["shear rate, 1/s", "readings"]),
        ["budget"] = (() => BudgetChart.Svg(Native), ["size of the contribution, % of the value (one standard uncertainty)", "calibration (shared)", "together"]),
        ["checks"] = (() => CheckChart.Svg(FakeStudy.Result.Analyzed.Histories[0], StatusSpans.Of(FakeStudy.Result.Analyzed.Histories[0])), ["measured less certified, %", "date (as recorded)", "limit of a check", "fails", "cannot tell", "in doubt"]),
        ["control chart"] = (() => ControlChartPicture.Svg(FakeCourse.Review.Chart, 0.03), ["error of the check, %", "date of the check", "allowed", "center", "limits of chance", "weighted average", "it changed in here"]),
        ["strip"] = (() => RangeStripChart.Svg([new("<b>row</b> & more", Sample.Values[0].Range, [.. FakeStudy.Result.Samples.Select(sample => sample.Values[0])], [])], "viscosity at 1 1/s, mPa·s", whiskers: true), ["viscosity at 1 1/s, mPa·s", "<b>row</b> & more", "within", "instrument not in order"]),
        ["ratios"] = (() => RatioChart.Svg(FakeCohort.Summary), ["ratio of means, residents over controls (bars: 95 % interval)", "viscosity at 10 1/s, native", "as it is", "adjusted for hematocrit", "no difference"]),
    };

    [Theory]
    [MemberData(nameof(Pictures))]
    public void A_picture_names_its_axes_with_units_and_its_marks_as_text(string name)
    {
        var texts = Texts(Drawings[name].Draw());
        Assert.All(Drawings[name].Texts, text => Assert.Contains(text, texts));
    }

    [Theory]
    [MemberData(nameof(Pictures))]
    public void A_picture_is_the_same_text_each_time_whatever_the_culture(string name)
    {
        var once = Drawings[name].Draw();
        var culture = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo("de-DE");
            Assert.Equal(once, Drawings[name].Draw());
        }
        finally
        {
            CultureInfo.CurrentCulture = culture;
        }
    }

    [Theory]
    [MemberData(nameof(Pictures))]
    public void A_picture_is_small_well_formed_and_free_of_addresses(string name)
    {
        var svg = Drawings[name].Draw();
        Assert.InRange(svg.Length, 1000, 120_000);
        Assert.All(XDocument.Parse(svg).Descendants().Attributes().Where(attribute => !attribute.IsNamespaceDeclaration), attribute => Assert.DoesNotContain("http", attribute.Value, StringComparison.OrdinalIgnoreCase));
        Assert.DoesNotContain("NaN", svg, StringComparison.Ordinal);
    }

    [Fact]
    public void A_logarithmic_axis_gives_each_decade_the_same_width()
    {
        var texts = XDocument.Parse(FlowCurveChart.Svg(Sample.Result.Loadings, "Casson", [], null)).Descendants().Where(element => element.Name.LocalName == "text").ToArray();
        var places = new[] { "1", "10", "100" }.Select(label => texts.Where(text => text.Value == label).Select(Place).MaxBy(place => place.Y).X).ToArray();
        Assert.Equal(places[1] - places[0], places[2] - places[1], 0.1);
    }

    private static string[] Texts(string svg) => [.. XDocument.Parse(svg).Descendants().Where(element => element.Name.LocalName == "text").Select(text => text.Value)];

    private static (double X, double Y) Place(XElement text)
    {
        var transform = text.Attribute("transform")!.Value;
        var numbers = transform[(transform.IndexOf('(', StringComparison.Ordinal) + 1)..transform.IndexOf(')', StringComparison.Ordinal)].Split(',').Select(part => double.Parse(part, CultureInfo.InvariantCulture)).ToArray();
        return (numbers[0], numbers[1]);
    }
}
