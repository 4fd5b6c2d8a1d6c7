namespace HemoRheo.Tests.Fitting;

/// <summary>A profile is what its name says: at every point the other parameters are at their best.</summary>
public class ProfileTests
{
    /// <summary>All but Carreau-Yasuda, whose five numbers a curve of twelve points hardly tells apart.</summary>
    public static TheoryData<string> Laws => [.. FlowLaw.All.Where(law => law != FlowLaw.CarreauYasuda).Select(law => law.Name)];

    /// <summary>Every law on a curve of its own: the sum of squares, calculated here from the law itself, has the rise that is told, and no small change of the other parameters lowers it.</summary>
    [Theory]
    [MemberData(nameof(Laws))]
    public void Every_point_is_a_least_sum_of_squares_with_the_rise_that_is_told(string name)
    {
        var law = FlowLaw.Named(name);
        var guess = new double[law.Parameters.Count];
        var blood = Simulated.Exact(FlowLaw.Carreau, 0.05, 0.0035, 3, 0.4);
        law.FirstGuess([.. blood.Points.Select(point => point.Rate.ReciprocalSeconds)], [.. blood.Points.Select(point => point.Stress.Pascals)], guess);
        var fit = Simulated.Noisy(RandomStream.Of(20261201, "profiles", 1), law, 0.01, 0.0003, guess).Fit(law, WeightedFits.Errors);
        for (var k = 0; k < law.Parameters.Count; k++)
        {
            var profile = fit.Profile(law.Parameters[k].Name);
            Assert.DoesNotContain(profile.Interval.Findings, finding => finding.Code == "profile-below-fit");
            Assert.Equal(profile.Points.OrderBy(point => point.Value), profile.Points);
            foreach (var point in profile.Points)
            {
                var sum = Sum(fit, point.Parameters);
                Assert.Equal(Math.Sqrt(Math.Max(0, sum - fit.Fit.ChiSquare)), Math.Abs(point.Rise), 1e-4);
                foreach (var other in Neighbors(point.Parameters, k)) Assert.True(Sum(fit, other) > sum - 1e-7, $"{name}, {law.Parameters[k].Name} at {point.Value}");
            }
        }
    }

    /// <summary>Rates from 0.7 1/s show the high-shear viscosity and the steepness of this curve; of the plateau at low shear they show that it lies above the highest viscosity, and of its onset nothing, since a broad enough transition puts it anywhere.</summary>
    [Fact]
    public void Of_five_numbers_those_that_the_rates_show_close()
    {
        var fit = Simulated.Noisy(RandomStream.Of(20261201, "five numbers", 1), FlowLaw.CarreauYasuda, 0.01, 0.0003, 0.6, 0.0035, 280, 6, 0.4).Fit((FlowLaw)FlowLaw.CarreauYasuda, WeightedFits.Errors);
        Assert.Equal(IntervalKind.Closed, fit.Interval("high-shear viscosity").Kind);
        Assert.Equal(IntervalKind.Closed, fit.Interval("flow index").Kind);
        Assert.Equal(IntervalKind.AtLeast, fit.Interval("low-shear viscosity").Kind);
        Assert.Equal(IntervalKind.NotIdentifiable, fit.Interval("time constant").Kind);
        Assert.True(fit.Interval("high-shear viscosity").Allows(0.0035) && fit.Interval("flow index").Allows(0.4) && fit.Interval("low-shear viscosity").Allows(0.6) && fit.Interval("time constant").Allows(280));
    }

    [Fact]
    public void Limits_stand_at_the_ends_with_the_limit_of_the_rise()
    {
        var profile = WeightedFits.Curves["A-001/1"].Fit((FlowLaw)FlowLaw.Quemada, WeightedFits.Errors).Profile(Measurand.Viscosity(1.PerSecond()));
        Assert.InRange(profile.Points.Count, 9, 25);
        Assert.Equal(-profile.Limit, profile.Points[0].Rise, 1e-9);
        Assert.Equal(profile.Limit, profile.Points[^1].Rise, 1e-9);
        Assert.Equal(profile.Interval.Lower!.Value, profile.Points[0].Value, 1e-12);
        Assert.Equal(profile.Interval.Upper!.Value, profile.Points[^1].Value, 1e-12);
        Assert.Contains(profile.Points, point => point.Rise == 0 && point.Value == profile.Interval.Estimate);
    }

    [Fact]
    public void A_fit_that_is_not_at_the_minimum_is_found_out()
    {
        var fit = WeightedFits.Curves["A-001/1"].Fit((FlowLaw)FlowLaw.Casson, WeightedFits.Errors);
        Items<double> beside = [fit.Scaled[0] + 0.05, fit.Scaled[1]];
        var natural = fit.Law.ToNatural([.. beside]);
        var wrong = fit with { Scaled = beside, Fit = fit.Fit with { ChiSquare = Sum(fit, [.. natural]) } };
        Assert.Contains(wrong.Interval("Casson viscosity").Findings, finding => finding.Code == "profile-below-fit");
    }

    /// <summary>Viscosity a + 0.001 (w^2 - 1)^2 + 0.0001 w: from the valley at w = 1, which gives a its largest value there, a hill of 0.001 leads to the valley at w = -1, where a is larger by 0.0002; and a large w allows any small a.</summary>
    [Fact]
    public void Another_valley_is_not_left_out_of_the_interval()
    {
        var law = FlowLaw.Custom("two valleys", (rate, p) => rate * (p[0] + 0.001 * LaneDual.Square(LaneDual.Square(p[1]) - 1) + 0.0001 * p[1]), new LawParameter("a", "a", "Pa.s", Start: 0.003), new LawParameter("w", "w", "1", double.NegativeInfinity, Start: 0.9));
        var interval = Simulated.Noisy(RandomStream.Of(20261201, "valleys", 1), FlowLaw.Newtonian, 0.01, 0.0003, 0.003).Fit((FlowLaw)law, WeightedFits.Errors).Interval("a");
        Assert.Equal(IntervalKind.AtMost, interval.Kind);
        Assert.InRange(interval.Upper!.Value, 0.00308, 0.00318);
    }

    private static double Sum(FittedLaw fit, IReadOnlyList<double> natural)
    {
        double sum = 0;
        foreach (var point in fit.Curve.Points)
        {
            var fitted = fit.Law.Stress(point.Rate, [.. fit.Parameters.Select(parameter => parameter.Estimate)]).Pascals;
            var miss = point.Stress.Pascals - fit.Law.Stress(point.Rate, [.. natural]).Pascals;
            sum += miss * miss / (Math.Pow(fit.Errors.Relative * fitted, 2) + Math.Pow(fit.Errors.Floor.Pascals, 2));
        }

        return sum;
    }

    private static IEnumerable<double[]> Neighbors(IReadOnlyList<double> natural, int held)
    {
        for (var k = 0; k < natural.Count; k++)
        {
            foreach (var factor in (double[])[0.999, 1.001])
            {
                double[] moved = [.. natural];
                moved[k] *= factor;
                if (k != held) yield return moved;
            }
        }
    }
}
