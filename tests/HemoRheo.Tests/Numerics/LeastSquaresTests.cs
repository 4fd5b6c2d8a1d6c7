namespace HemoRheo.Tests.Numerics;

/// <summary>The general path where it must say no, and with several predictors.</summary>
public class LeastSquaresTests
{
    /// <summary>y = 1 + 2 u - 3 v exactly, at points that do not lie on a line.</summary>
    [Fact]
    public void Two_predictors_and_exact_data_give_the_exact_plane()
    {
        double[] u = [0, 1, 0, 1, 2];
        double[] v = [0, 0, 1, 1, 5];
        double[] y = [1, 3, -2, 0, -10];
        var solution = LeastSquares.Solve(new FormulaModel<Plane>(default, u, v).Evaluate, y, [0, 0, 0]);
        Assert.True(solution.End.Converged, solution.End.Message);
        Assert.Equal(1, solution.Parameters[0], 1e-13);
        Assert.Equal(2, solution.Parameters[1], 1e-13);
        Assert.Equal(-3, solution.Parameters[2], 1e-13);
    }

    /// <summary>With v = u the plane cannot tell two of its parameters apart.</summary>
    [Fact]
    public void Parameters_that_cannot_be_told_apart_are_said_to_be()
    {
        double[] u = [0, 1, 2, 3];
        var solution = LeastSquares.Solve(new FormulaModel<Plane>(default, u, u).Evaluate, [1, 2, 3, 5], [0, 0, 0]);
        Assert.Equal(StopReason.Singular, solution.End.Reason);
        Assert.Contains("no unique solution", solution.End.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_start_where_the_model_is_not_finite_is_bad_data()
    {
        var solution = LeastSquares.Solve(new FormulaModel<Plane>(default, [1.0, double.NaN], [0.0, 1.0]).Evaluate, [1, 2], [0, 0, 0]);
        Assert.Equal(StopReason.BadData, solution.End.Reason);
    }

    /// <summary>Mean of y with equal variances: response to 1 added everywhere is 1; inverse of the normal equations is floor^2 / n.</summary>
    [Fact]
    public void The_response_and_the_inverse_are_those_of_a_mean()
    {
        var solution = LeastSquares.Solve(new FormulaModel<Level>(default, [0.0, 0, 0, 0]).Evaluate, [1, 2, 3, 6], [0], relative: 0, floor: 0.5);
        Assert.Equal(3, solution.Parameters[0], 1e-13);
        Assert.Equal(0.0625, solution.Inverse[0], 1e-14);
        Assert.Equal(1, solution.Response[0], 1e-13);
        Assert.Equal(56, solution.ChiSquare, 1e-10);
    }

    [Fact]
    public void Lists_that_do_not_match_are_refused_with_both_lengths()
    {
        var refused = Assert.Throws<ArgumentException>(() => LeastSquares.Fit(default(Level), [1.0, 2, 3], [0.0], [0.0, 0.0]));
        Assert.Contains("2 points and the data 3", refused.Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentException>(() => LeastSquares.Fit(default(Plane), [1.0, 2], [0.0, 0, 0], [0.0, 0], [0.0, 0]));
        Assert.Throws<ArgumentException>(() => LeastSquares.Fit(default(Level), [1.0, 2], [0.0]));
    }

    /// <summary>Mean of 1, 2, 3, 6 is 3; its standard error is sqrt(14 / 3 / 4).</summary>
    [Fact]
    public void The_public_entry_estimates_the_scale_from_the_residuals()
    {
        var solution = LeastSquares.Fit(default(Level), [1.0, 2, 3, 6], [0.0], [0.0, 0, 0, 0]);
        Assert.Equal(3, solution.Estimates[0], 1e-13);
        Assert.Equal(1.0801234497346435, solution.StandardErrors[0], 1e-13);
        Assert.True(double.IsNaN(LeastSquares.Fit(default(Level), [1.0], [0.0], [0.0]).StandardErrors[0]));
    }

    private readonly struct Plane : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => p[0] + p[1] * x[0] + p[2] * x[1];
    }

    private readonly struct Level : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => p[0] + 0 * x[0];
    }
}
