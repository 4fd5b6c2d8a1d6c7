namespace HemoRheo.Tests.Fitting;

/// <summary>The standing example: what rates above 10 1/s can tell of a yield stress.</summary>
public class YieldStressFromHighRatesTests
{
    private const int Curves = 200;

    /// <summary>Wells and Merrill 1962, four rates from 12 to 124 1/s, read off their figure; scatter estimated.</summary>
    private static readonly Dictionary<string, FlowCurve> Published = ReferenceTable.Read("hematocrit", "wells-merrill-1962-digitised.csv")
        .GroupBy(row => row["hematocrit_percent"])
        .ToDictionary(rows => rows.Key, rows => FlowCurve.Of([.. rows.Select(row => row.Number("shear_rate_1_s"))], [.. rows.Select(row => row.Number("shear_rate_1_s") * row.Number("viscosity_mPa_s") / 1000)]));

    public static TheoryData<string> Hematocrits => ["16", "33", "43", "57", "70"];

    /// <summary>Casson's two numbers and Bingham's two close, each on a yield stress of its own: it is the form of the law that closes them. Where the form is free, zero is not excluded at any hematocrit.</summary>
    [Theory]
    [MemberData(nameof(Hematocrits))]
    public void Published_curves_leave_the_yield_stress_open_unless_the_form_of_the_law_is_taken_for_granted(string hematocrit)
    {
        var free = Published[hematocrit].Fit((FlowLaw)FlowLaw.HerschelBulkley).Interval("yield stress");
        Assert.Equal(IntervalKind.AtMost, free.Kind);
        Assert.Contains("these shear rates do not exclude zero", free.ToString(), StringComparison.Ordinal);
        foreach (var law in (FlowLaw[])[FlowLaw.Casson, FlowLaw.Bingham])
        {
            var estimate = Published[hematocrit].Fit(law).Interval("yield stress").Estimate!.Value;
            Assert.True(free.Allows(estimate), $"{law}: {estimate}");
        }
    }

    [Fact]
    public void Limits_far_below_every_stress_that_was_read_are_said_to_come_from_the_form_of_the_law()
    {
        var published = Published["43"].Fit((FlowLaw)FlowLaw.Casson).Interval("yield stress");
        Assert.Contains(published.Findings, finding => finding.Kind == FittingFindings.YieldStressByForm);
        Assert.Contains("Right only if the form of Casson is", published.ToString(), StringComparison.Ordinal);

        double[] rates = [0.05, 0.1, 0.3, 1, 3, 10, 30];
        var low = FlowCurve.Of(rates, [.. rates.Select(rate => FlowLaw.Casson.Stress(new(rate), 0.01, 0.0033).Pascals)]);
        Assert.Empty(low.Fit((FlowLaw)FlowLaw.Casson, ErrorModel.Known(0.01, ShearStress.FromMillipascals(0.1))).Interval("yield stress").Findings);
    }

    /// <summary>Quemada's ratio, zero for a yield stress and one for none, at the lowest hematocrit.</summary>
    [Fact]
    public void At_the_lowest_hematocrit_the_published_curve_cannot_tell_a_yield_stress_from_a_plateau()
    {
        var ratio = Published["16"].Fit((FlowLaw)FlowLaw.Quemada).Interval("ratio");
        Assert.Equal(IntervalKind.NotIdentifiable, ratio.Kind);
        Assert.Equal("ratio: not identifiable with these shear rates (95 %, profile likelihood)", ratio.ToString());
    }

    /// <summary>Yield stress, lowest rate, relative noise: intervals hold the truth in 95 % (of 200: 90.4 to 99.6 %), whatever their kind; and how many have no lower limit, from nearly none to most.</summary>
    [Theory]
    [InlineData(0.005, 10, 0.01, 0, 0)]
    [InlineData(0.005, 100, 0.01, 0, 0.02)]
    [InlineData(0.002, 100, 0.03, 0.25, 0.55)]
    [InlineData(0.0005, 10, 0.03, 0, 0.1)]
    [InlineData(0.0005, 100, 0.03, 0.6, 0.95)]
    [InlineData(0.0001, 100, 0.03, 0.85, 1)]
    public void A_known_yield_stress_is_not_excluded_and_the_lower_limit_goes_where_the_rates_are_silent(double yieldStress, double lowest, double relative, double fewestOpen, double mostOpen)
    {
        const double Floor = 0.0003;
        double[] rates = [.. Enumerable.Range(0, 12).Select(i => lowest * Math.Pow(300 / lowest, i / 11.0))];
        var intervals = Enumerable.Range(0, Curves).Select(Interval).ToArray();
        Assert.All(intervals, interval => Assert.True(interval.Kind is IntervalKind.Closed or IntervalKind.AtMost, interval.ToString()));
        Assert.InRange(intervals.Average(interval => interval.Allows(yieldStress) ? 1.0 : 0), 0.904, 0.996);
        Assert.InRange(intervals.Average(interval => interval.Kind == IntervalKind.AtMost ? 1.0 : 0), fewestOpen, mostOpen);

        FitInterval Interval(int i)
        {
            var stream = RandomStream.Of(20261201, "yield stress from high rates", i);
            double[] stresses = [.. rates.Select(rate => FlowLaw.Casson.Stress(new(rate), yieldStress, 0.0033).Pascals * (1 + relative * stream.Normal()) + Floor * stream.Normal())];
            return FlowCurve.Of(rates, stresses).Fit((FlowLaw)FlowLaw.Casson, ErrorModel.Known(relative, ShearStress.FromPascals(Floor))).Interval("yield stress");
        }
    }
}
