namespace HemoRheo.Tests.Fitting;

/// <summary>What a comparison of laws on one curve says, and what it does not claim.</summary>
public class LawComparisonTests
{
    private static readonly double[] CassonTruth = [0.005, 0.0033];

    [Fact]
    public void A_Quemada_curve_that_Casson_cannot_describe_prefers_Quemada_and_contradicts_Casson()
    {
        var comparison = Simulated.Exact(FlowLaw.Quemada, 0.003, 2, 0.4).Compare(WeightedFits.Errors, FlowLaw.Casson, FlowLaw.Quemada);
        Assert.Equal(FlowLaw.Quemada, comparison.Preferred);
        Assert.Equal("Casson", Assert.Single(comparison.Contradicted).Law.Name);
        Assert.Contains("Quemada is preferred. Contradicted: Casson (lack of fit", comparison.Verdict, StringComparison.Ordinal);
        Assert.True(Assert.Single(comparison.Nested).Probability < 1e-6);
    }

    [Fact]
    public void A_Casson_curve_cannot_part_Casson_from_Quemada_and_says_that_Quemada_ended_at_Casson()
    {
        var comparison = Simulated.Exact(FlowLaw.Casson, CassonTruth).Compare(WeightedFits.Errors, FlowLaw.Quemada, FlowLaw.Casson);
        Assert.Null(comparison.Preferred);
        Assert.Equal(["Casson", "Quemada"], comparison.Possible.Select(law => law.Law.Name));
        Assert.Equal("These data cannot tell Casson and Quemada apart; Casson has the fewest parameters. Quemada ended at its boundary, Casson.", comparison.Verdict);
        Assert.Equal(1, Assert.Single(comparison.Nested).Probability);
    }

    [Fact]
    public void A_law_that_cannot_be_fitted_stands_there_with_the_reason_and_out_of_the_weights()
    {
        var whole = Simulated.Exact(FlowLaw.Casson, CassonTruth);
        var comparison = (whole with { Points = whole.Points.Take(4).ToItems() }).Compare(WeightedFits.Errors, FlowLaw.Newtonian, FlowLaw.Casson, FlowLaw.Quemada, FlowLaw.CarreauYasuda);
        Assert.Contains("not usable (too-few-points)", comparison.Laws[3].WhyNotCompared, StringComparison.Ordinal);
        Assert.Contains("4 points are too few for AICc with 3 parameters", comparison.Laws[2].WhyNotCompared, StringComparison.Ordinal);
        Assert.All(comparison.Laws.Skip(2), law => Assert.True(law.Weight is null && law.Difference is null));
        Assert.Equal(1, comparison.Laws.Sum(law => law.Weight ?? 0), 1e-12);
        Assert.Contains("Carreau-Yasuda took no part", comparison.Verdict, StringComparison.Ordinal);
    }

    [Fact]
    public void Where_nothing_fits_it_says_so()
    {
        var curve = FlowCurve.Of(Simulated.Rates, [.. Simulated.Rates.Select((rate, i) => 0.004 * rate * (i % 2 == 0 ? 1.2 : 0.8))]);
        var comparison = curve.Compare(WeightedFits.Errors, FlowLaw.Newtonian, FlowLaw.Casson);
        Assert.Equal(2, comparison.Contradicted.Count);
        Assert.StartsWith("None of these laws describes the curve.", comparison.Verdict, StringComparison.Ordinal);
        Assert.Null(comparison.Preferred);
    }

    [Fact]
    public void With_the_scale_estimated_no_law_lacks_fit_and_the_scale_counts_as_a_parameter()
    {
        var comparison = Simulated.Exact(FlowLaw.Quemada, 0.003, 2, 0.2).Compare(FlowLaw.Casson, FlowLaw.HerschelBulkley);
        Assert.Equal([3, 4], comparison.Laws.Select(law => law.Parameters));
        Assert.All(comparison.Laws, law => Assert.Null(law.Fit.Fit.Probability));
    }

    /// <summary>A law without an error left is not the best of all: its likelihood has no end.</summary>
    [Fact]
    public void An_exact_curve_with_the_scale_estimated_leaves_the_exact_law_without_a_size_of_errors_or_with_a_finite_criterion()
    {
        var comparison = FlowCurve.Of([1, 2, 4, 8, 16, 32], [1, 2, 4, 8, 16, 32]).Compare(ErrorModel.UpToScale(0.01, new(0)), FlowLaw.Newtonian, FlowLaw.PowerLaw);
        Assert.All(comparison.Laws, law => Assert.True(law.Criterion is null ? law.WhyNotCompared is not null : double.IsFinite(law.Criterion.Value)));
        Assert.DoesNotContain("NaN", comparison.ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void Misuse_is_told_in_words()
    {
        var curve = Simulated.Exact(FlowLaw.Casson, CassonTruth);
        Assert.Contains("two laws or more", Assert.Throws<ArgumentException>(() => curve.Compare(FlowLaw.Casson)).Message, StringComparison.Ordinal);
        Assert.Contains("Casson stands twice", Assert.Throws<ArgumentException>(() => curve.Compare(FlowLaw.Casson, FlowLaw.Casson)).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void The_tables_fit_a_page_of_text()
    {
        var comparison = Simulated.Exact(FlowLaw.Quemada, 0.003, 2, 0.2).Compare(WeightedFits.Errors, [.. FlowLaw.All]);
        Assert.Equal(FlowLaw.All.Count, comparison.ToTable().Rows.Count);
        Assert.All((comparison.ToTable().ToText() + comparison.NestedToTable().ToText() + comparison.ResidualsToTable().ToText()).Split('\n'), line => Assert.True(line.Length <= 100, line));
    }

    /// <summary>A likelihood ratio has no known distribution where other parameters of the general law mean nothing.</summary>
    [Fact]
    public void A_Newtonian_liquid_within_Quemada_gets_no_probability()
    {
        var comparison = Simulated.Exact(FlowLaw.Quemada, 0.003, 2, 0.4).Compare(WeightedFits.Errors, FlowLaw.Newtonian, FlowLaw.Quemada);
        Assert.Null(Assert.Single(comparison.Nested).Probability);
        Assert.Equal("chi-square, no known distribution", comparison.NestedToTable().Rows[0][^1].Shown);
    }

    /// <summary>Every nesting is one: the simple law's best curve is within reach of the general law, so its sum of squares is not below that of the general one.</summary>
    [Fact]
    public void A_general_law_never_fits_worse_than_its_special_case()
    {
        foreach (var nesting in Nesting.All)
        {
            foreach (var curve in WeightedFits.Curves.Values)
            {
                var (simple, general) = (Fits.OfAll([curve], nesting.Simple, WeightedFits.Errors)[0], Fits.OfAll([curve], nesting.General, WeightedFits.Errors)[0]);
                if (simple.Usable && general.Usable) Assert.True(general.Fit.ChiSquare <= simple.Fit.ChiSquare * 1.001, $"{nesting.Simple} in {nesting.General}: {simple.Fit.ChiSquare} and {general.Fit.ChiSquare}");
            }
        }
    }

    /// <summary>At 5 % a true simple law is rejected in 5 % of 2,000 curves: within three standard errors 3.5 to 6.5 %.</summary>
    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Casson_within_Quemada_is_rejected_as_often_as_it_says(bool known)
    {
        var errors = WeightedFits.Errors with { ScaleKnown = known };
        var curves = Enumerable.Range(1, 2000).Select(i => Simulated.Noisy(RandomStream.Of(20261201, "nested", i), FlowLaw.Casson, 0.01, 0.0003, CassonTruth)).ToArray();
        var (casson, quemada) = (Fits.OfAll(curves, FlowLaw.Casson, errors), Fits.OfAll(curves, FlowLaw.Quemada, errors));
        var rejected = curves.Index().Average(item => NestedTest.Of(casson[item.Index], quemada[item.Index], NestingKind.AtBound, "ratio 0")!.Probability <= 0.05 ? 1.0 : 0);
        Assert.InRange(rejected, 0.035, 0.065);
    }

    /// <summary>The probability of the residuals' correlation is uniform when the law is right.</summary>
    [Fact]
    public void Residuals_of_the_right_law_are_called_correlated_as_often_as_it_says()
    {
        var curves = Enumerable.Range(1, 2000).Select(i => Simulated.Noisy(RandomStream.Of(20261201, "pattern", i), FlowLaw.Casson, 0.01, 0.0003, CassonTruth)).ToArray();
        var probabilities = Fits.OfAll(curves, FlowLaw.Casson, WeightedFits.Errors).Select(fit => ResidualPattern.Of(fit).Probability!.Value).ToArray();
        Assert.InRange(probabilities.Average(p => p <= 0.05 ? 1.0 : 0), 0.035, 0.065);
        Assert.InRange(probabilities.Average(p => p <= 0.5 ? 1.0 : 0), 0.466, 0.534);
    }

    [Fact]
    public void A_law_that_was_only_too_short_to_compare_is_not_said_not_to_describe_the_curve()
    {
        var three = FlowCurve.Of([100, 10, 1], [0.43, 0.062, 0.0148]).Compare(ErrorModel.Known(0.02, ShearStress.FromMillipascals(0.5)), FlowLaw.Newtonian, FlowLaw.Casson);
        Assert.StartsWith("None of the laws that could be compared describes the curve.", three.Verdict, StringComparison.Ordinal);
    }

    [Fact]
    public void Residuals_that_are_rounding_decide_nothing()
    {
        double[] rates = [100, 50, 20, 10, 5, 2, 1];
        var exact = FlowCurve.Of(rates, [.. rates.Select(rate => 0.005 + 0.0034 * rate)]).Compare(FlowLaw.Bingham, FlowLaw.HerschelBulkley);
        Assert.Null(exact.Preferred);
        Assert.Empty(exact.Contradicted);
    }
}
