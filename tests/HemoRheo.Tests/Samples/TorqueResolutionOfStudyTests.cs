namespace HemoRheo.Tests.Samples;

/// <summary>A torque resolution declared in the study file reaches blood and checks through the geometry of each recording.</summary>
public class TorqueResolutionOfStudyTests
{
    private static readonly Study Study = TestStudy.With(TestStudy.Rheometer with { TorqueFloor = 1e-10, TorqueResolution = 1e-7, CheckEvery = TimeSpan.FromDays(30), CheckLimit = 0.2 });

    private static readonly double[] Rates = [200, 100, 50, 20, 10, 5, 2, 1];

    [Fact]
    public void Each_curve_has_the_floor_of_its_own_geometry()
    {
        var wide = TestStudy.Cylinders with { Name = "half as long", Length = TestStudy.Cylinders.Length / 2 };
        var readings = Readings(Study with { Geometries = [TestStudy.Cylinders, wide] }, "half as long");
        var results = readings.Study.Evaluate(readings, cancel: TestContext.Current.CancellationToken).Samples.SelectMany(sample => sample.Loadings).ToDictionary(loading => loading.Recording.Geometry!);
        foreach (var geometry in readings.Study.Geometries)
        {
            var step = 1e-7 * geometry.StressPerTorque();
            Assert.All(results[geometry.Name].Fits, fit => Assert.Equal(Math.Sqrt(0.0003 * 0.0003 + step * step / 12), fit.Errors.Floor.Pascals, 1e-15));
        }
    }

    [Fact]
    public void Checks_have_it_too()
    {
        var check = TestStudy.Check("k", TestStudy.Start, TestStudy.Rates.Select((rate, i) => TestStudy.Turned(i + 1, rate, 0.005 * rate)));
        var history = Assert.Single(Study.CheckInstruments(TestStudy.Readings(Study, [check])));
        var step = 1e-7 * TestStudy.Cylinders.StressPerTorque();
        Assert.Equal(Math.Sqrt(0.0003 * 0.0003 + step * step / 12), history.Checks.Single().Fit.Errors.Floor.Pascals, 1e-15);
    }

    [Fact]
    public void Without_it_nothing_changes()
    {
        var plain = Study with { Instruments = [Study.Instruments[0] with { TorqueResolution = null }] };
        var readings = Readings(plain, "cylinders");
        Assert.All(plain.Evaluate(readings, cancel: TestContext.Current.CancellationToken).Samples.SelectMany(sample => sample.Loadings).SelectMany(loading => loading.Fits), fit => Assert.Equal(0.0003, fit.Errors.Floor.Pascals));
    }

    [Fact]
    public void A_recording_without_a_geometry_says_that_it_could_not_be_used()
    {
        var blood = TestStudy.Blood("a", Rates.Select((rate, i) => TestStudy.Reading(i + 1, rate, 0.004 * rate))) with { Geometry = null };
        var loading = Study.Evaluate(TestStudy.Readings(Study, null, [blood]), cancel: TestContext.Current.CancellationToken).Samples.Single().Loadings.Single();
        Assert.Contains(loading.Findings, finding => finding.Code == "torque-resolution-unknown");
        Assert.All(loading.Fits, fit => Assert.Equal(0.0003, fit.Errors.Floor.Pascals));
    }

    private static StudyReadings Readings(Study study, string second)
    {
        var readings = Rates.Select((rate, i) => TestStudy.Turned(i + 1, rate, Math.Pow(Math.Sqrt(0.005) + Math.Sqrt(0.0035 * rate), 2))).ToArray();
        return TestStudy.Readings(study, null, [TestStudy.Blood("a", readings), TestStudy.Blood("b", readings) with { Geometry = second }]);
    }
}
