using HemoRheo.Benchmarks;

namespace HemoRheo.Tests.Pooling;

/// <summary>Studies of 24 curves with a known correlation of neighboring readings: what is found, and what is made of it.</summary>
public sealed class CorrelationPoolTests
{
    private const int Curves = 24;

    [Theory]
    [InlineData(0.0)]
    [InlineData(0.3)]
    [InlineData(0.6)]
    public void The_correlation_is_found_without_bias_and_its_standard_error_is_its_scatter(double truth)
    {
        var found = Enumerable.Range(0, 150).Select(study => CorrelationPool.Estimate(Drawn(study, truth))!.Value).ToArray();
        var mean = found.Average(one => one.Correlation);
        var scatter = Math.Sqrt(found.Sum(one => (one.Correlation - mean) * (one.Correlation - mean)) / (found.Length - 1));
        Assert.InRange(mean, truth - 3 * scatter / Math.Sqrt(found.Length), truth + 3 * scatter / Math.Sqrt(found.Length));
        Assert.InRange(found.Average(one => one.Error) / scatter, 0.8, 1.2);
    }

    [Fact]
    public void The_plain_correlation_of_neighboring_residuals_would_be_a_third_of_the_true_one()
    {
        var fits = Enumerable.Range(0, 40).SelectMany(study => Drawn(study, 0.6)).ToArray();
        var plain = fits.Sum(fit => fit.Residuals.Zip(fit.Residuals.Skip(1), (a, b) => a * b).Sum()) / fits.Sum(fit => fit.Residuals.Sum(e => e * e));
        Assert.InRange(plain, 0.17, 0.26);
        Assert.InRange(CorrelationPool.Estimate(fits)!.Value.Correlation, 0.55, 0.65);
    }

    /// <summary>Of 200 studies two are expected to be taken for correlated; seven is beyond three standard errors.</summary>
    [Fact]
    public void A_study_of_independent_readings_stays_as_it_is()
    {
        var found = Enumerable.Range(0, 200).Select(study => CorrelationPool.Of(Drawn(study, 0), null)).ToArray();
        Assert.InRange(found.Count(one => one.Value > 0), 0, 6);
        var independent = found.First(one => one.Value == 0);
        Assert.Contains("taken as independent", independent.Words, StringComparison.Ordinal);
        Assert.Empty(CorrelationPool.Findings(independent));
    }

    [Fact]
    public void A_correlation_beyond_chance_is_used_and_said()
    {
        var correlation = CorrelationPool.Of(Drawn(1, 0.6), null);
        Assert.Equal(correlation.Estimate, correlation.Value);
        Assert.Equal(Curves, correlation.Curves);
        Assert.Equal("readings-correlated", Assert.Single(CorrelationPool.Findings(correlation)).Code);
    }

    [Fact]
    public void A_declared_correlation_is_used_as_it_is_and_held_against_the_residuals()
    {
        var right = CorrelationPool.Of(Drawn(1, 0.6), 0.6);
        Assert.Equal((0.6, 0.0), (right.Value, right.StandardError));
        Assert.Empty(CorrelationPool.Findings(right));
        var wrong = CorrelationPool.Of(Drawn(1, 0.6), 0);
        Assert.Equal(0, wrong.Value);
        Assert.Equal("correlation-not-as-declared", Assert.Single(CorrelationPool.Findings(wrong)).Code);
    }

    [Fact]
    public void Few_curves_or_curves_without_noise_give_no_estimate()
    {
        Assert.Null(CorrelationPool.Of(Drawn(1, 0.6)[..7], null).Estimate);
        Assert.Equal(0.4, CorrelationPool.Of(Drawn(1, 0.6)[..7], 0.4).Value);
        var exact = FlowCurve.Of(SimulatedCurves.Rates, [.. SimulatedCurves.Rates.Select(rate => 0.004 * rate)]);
        Assert.Null(CorrelationPool.Of(Fits.OfAll([.. Enumerable.Repeat(exact, 10)], FlowLaw.Newtonian, ErrorModel.Default), null).Estimate);
    }

    /// <summary>Taken as exact, the estimated correlation would call a right law wrong on one curve in fifty at a level of one in a thousand.</summary>
    [Fact]
    public void Lack_of_fit_knows_that_the_correlation_is_an_estimate()
    {
        var (knowing, exact) = (0, 0);
        for (var study = 0; study < 100; study++)
        {
            var fits = Drawn(study, 0.6);
            var correlation = CorrelationPool.Of(fits, null);
            knowing += fits.Count(fit => fit.WithCorrelation(correlation.Value, correlation.StandardError).Fit.Contradicts);
            exact += fits.Count(fit => fit.WithCorrelation(correlation.Value).Fit.Contradicts);
        }

        Assert.InRange(knowing, 0, 10);
        Assert.InRange(exact, 20, 100);
    }

    [Fact]
    public void Misfit_that_all_curves_share_is_not_taken_for_correlation()
    {
        var simulated = new SimulatedCurves(3, 0.01, 0);
        var fits = Fits.OfAll([.. simulated.Quemada(40).Select(item => item.Curve)], FlowLaw.Casson, simulated.Errors());
        Assert.InRange(fits.Average(fit => fit.Fit.ChiSquare), 20, 100);
        Assert.InRange(CorrelationPool.Estimate(fits)!.Value.Correlation, -0.3, 0.3);
    }

    [Fact]
    public void Expected_squares_are_the_trace_that_the_fit_uses()
    {
        var fit = Drawn(1, 0.6)[0];
        fit = (fit.Curve with { Points = fit.Curve.Points.Where(point => point.Number is not (4 or 5 or 9)).ToItems() }).Fit(FlowLaw.Casson, fit.Errors);
        Assert.Equal(fit.WithCorrelation(0.4).Fit.Expected, LagProducts.Of(fit, fit.Residuals).ExpectedSquares(0.4), 1e-9);
    }

    /// <summary>A right law at correlation 0.6: the pooled chi-square is too large once in twenty, the pattern beyond chance once in a hundred. Limits: three standard errors of 150 studies.</summary>
    [Fact]
    public void The_judgment_of_a_right_law_knows_the_correlation()
    {
        var judged = Enumerable.Range(0, 150).Select(study => LawJudgment.Judge(FlowLaw.Casson, [.. Drawn(study, 0.6).Select(fit => fit.WithCorrelation(0.6))])).ToArray();
        Assert.InRange(judged.Count(law => law.Probability < 0.05), 1, 15);
        Assert.InRange(judged.Count(law => law.PatternProbability < 0.01), 0, 5);
        Assert.All(judged, law => Assert.True(law.Fits));
        Assert.Contains("to be expected of correlated readings", judged[0].Words, StringComparison.Ordinal);
    }

    private static FittedLaw[] Drawn(int study, double correlation)
    {
        var simulated = new SimulatedCurves(study, 0.01, correlation);
        return Fits.OfAll([.. simulated.Casson(Curves).Select(item => item.Curve)], FlowLaw.Casson, simulated.Errors());
    }
}
