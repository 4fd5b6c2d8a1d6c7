namespace HemoRheo.Tests.Fitting;

/// <summary>A curve's fit does not feel its neighbors: the same bits alone, in any batch, in any lane.</summary>
public class SameBitsTests
{
    public static TheoryData<string> Laws => [.. FlowLaw.All.Select(law => law.Name)];

    [Theory]
    [MemberData(nameof(Laws))]
    public void A_curve_alone_and_in_a_batch_of_unequal_lengths_has_the_same_bits(string name)
    {
        var law = FlowLaw.Named(name);
        var curves = Mixed(120);
        var together = Fits.OfAll(curves, law, WeightedFits.Errors);
        var backwards = Fits.OfAll([.. curves.Reverse()], law, WeightedFits.Errors);
        for (var i = 0; i < curves.Length; i++)
        {
            Assert.Equal(curves[i].Fit(law, WeightedFits.Errors), together[i]);
            Assert.Equal(together[i], backwards[^(i + 1)]);
        }
    }

    [Theory]
    [MemberData(nameof(Laws))]
    public void Neighbors_that_are_not_numbers_or_overflow_change_no_bit(string name)
    {
        var law = FlowLaw.Named(name);
        var curve = Mixed(1)[0];
        var alone = curve.Fit(law, WeightedFits.Errors);
        foreach (var poison in (double[])[double.NaN, double.PositiveInfinity, -1, 0, 1e-300, 1e300, 1e160])
        {
            var neighbor = FlowCurve.Of(Simulated.Rates, [.. Simulated.Rates.Select((rate, i) => i == 3 ? poison : 0.004 * rate)]);
            var whole = FlowCurve.Of(Simulated.Rates, [.. Simulated.Rates.Select(_ => poison)]);
            Assert.Equal(alone, Fits.OfAll([neighbor, curve, whole, neighbor], law, WeightedFits.Errors)[1]);
            Assert.Equal(alone, Fits.OfAll([whole, neighbor, neighbor, curve], law, WeightedFits.Errors)[3]);
        }
    }

    [Theory]
    [InlineData(1)]
    [InlineData(2)]
    [InlineData(7)]
    public void Any_number_of_threads_gives_the_same_bits(int threads)
    {
        FlowCurve[] curves = [.. Mixed(60), FlowCurve.Of(Simulated.Rates, [.. Simulated.Rates.Select(_ => 1e300)]), .. Mixed(31), FlowCurve.Of([1, 2], [double.NaN, 1])];
        foreach (var law in FlowLaw.All)
        {
            var fits = Fits.InParallel(curves, law, [.. curves.Select(_ => WeightedFits.Errors)], threads, TestContext.Current.CancellationToken);
            Assert.Equal([.. curves.Select(curve => curve.Fit(law, WeightedFits.Errors))], fits);
        }
    }

    [Fact]
    public void A_study_of_fits_can_be_cancelled()
    {
        var curves = Mixed(40);
        Assert.Throws<OperationCanceledException>(() => Fits.InParallel(curves, FlowLaw.Casson, [.. curves.Select(_ => WeightedFits.Errors)], 2, new CancellationToken(canceled: true)));
    }

    /// <summary>Fits without records are the same fits, allocate nothing once warm, and hold a parameter at its bound.</summary>
    [Theory]
    [InlineData("Casson")]
    [InlineData("Quemada")]
    public void Fits_without_records_have_the_same_estimates_and_allocate_nothing(string name)
    {
        var law = FlowLaw.Named(name);
        var curves = Mixed(140).Where((curve, i) => i % 3 < 2 && curve.Points.Count > 9).ToArray();
        CurveData[] data = [.. curves.Select(curve => CurveData.Of(curve, law, WeightedFits.Errors))];
        double[] starts = [.. data.SelectMany(curve => Fits.StartOf(law, curve))];
        var (estimates, sums, converged) = (new double[starts.Length], new double[data.Length], new bool[data.Length]);
        BareFits.Of(law, data, starts, estimates, sums, converged);
        var before = GC.GetAllocatedBytesForCurrentThread();
        BareFits.Of(law, data, starts, estimates, sums, converged);
        Assert.Equal(0, GC.GetAllocatedBytesForCurrentThread() - before);
        FittedLaw[] fits = [.. curves.Select(curve => curve.Fit(law, WeightedFits.Errors))];
        Assert.Equal(fits.SelectMany(fit => fit.Scaled), estimates);
        Assert.Equal(fits.Select(fit => fit.Fit.ChiSquare), sums);
        Assert.All(converged, Assert.True);
    }

    /// <summary>The lanes themselves, without the checks of data that keep such curves out.</summary>
    [Fact]
    public void A_lane_solves_the_same_beside_poisoned_lanes()
    {
        var clean = Solved(1);
        foreach (var poison in (double[])[double.NaN, double.PositiveInfinity, -1e300, 1e300])
        {
            var beside = Solved(poison);
            Assert.Equal([clean.Estimates[0][1], clean.Estimates[1][1], clean.ChiSquare[1], clean.LeastPivot[1]], [beside.Estimates[0][1], beside.Estimates[1][1], beside.ChiSquare[1], beside.LeastPivot[1]]);
            Assert.Equal(clean.Ends[1], beside.Ends[1]);
            Assert.Equal(StopReason.BadData, beside.Ends[0].Reason);
        }
    }

    private static LaneSolver Solved(double first)
    {
        double[] rates = [80, 20, 8, 2], stresses = [0.3, 0.1, 0.05, 0.02];
        var (problem, solver) = (new LaneProblem(), new LaneSolver());
        problem.Begin(4, 2);
        problem.Put(0, rates, [.. stresses.Select(stress => first * stress)], [first == 1 ? Math.Log(0.004) : first, Math.Log(0.003)], 0.01, 0.0003);
        problem.Put(1, rates, stresses, [Math.Log(0.004), Math.Log(0.003)], 0.01, 0.0003);
        problem.Put(2, rates, stresses, [-5, Math.Log(0.003)], 0.01, 0.0003);
        problem.Put(3, rates, stresses, [-5, Math.Log(0.003)], 0.01, 0.0003);
        solver.Solve(FlowLaw.Casson, problem);
        return solver;
    }

    private static FlowCurve[] Mixed(int count)
    {
        var stream = RandomStream.Of(20261201, "same bits", count);
        var curves = new FlowCurve[count];
        for (var i = 0; i < count; i++)
        {
            var whole = (i % 3) switch
            {
                0 => Simulated.Noisy(stream, FlowLaw.Casson, 0.01, 0.0003, 0.005 * Math.Exp(0.3 * stream.Normal()), 0.0033),
                1 => Simulated.Noisy(stream, FlowLaw.Quemada, 0.01, 0.0003, 0.003, 2 * Math.Exp(0.3 * stream.Normal()), 0.2),
                _ => Simulated.Noisy(stream, FlowLaw.Newtonian, 0.01, 0.0003, 0.0013),
            };
            curves[i] = whole with { Points = whole.Points.Take(12 - i % 7).ToItems() };
        }

        return curves;
    }
}
