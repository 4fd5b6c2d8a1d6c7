using System.Globalization;

namespace HemoRheo.Tests.Fitting;

/// <summary>Michaelis-Menten as a user's own law on published enzyme data, against 40-digit arithmetic; R agrees as far as its own search goes.</summary>
public class MichaelisMentenTests
{
    private static readonly Dictionary<string, double> Exact = Read("puromycin.mpmath.csv");

    private static readonly (double[] Concentration, double[] Velocity) Data = (Column("conc"), Column("rate"));

    private static readonly FlowLaw<NamedValues> Law = FlowLaw.Custom(
        "Michaelis-Menten",
        (c, p) => p[0] * c / (p[1] + c),
        new LawParameter("Vm", "Vm", "counts/min2", Start: 200),
        new LawParameter("K", "K", "ppm", Start: 0.1));

    private static FittedLaw Fit => FlowCurve.Of(Data.Concentration, Data.Velocity, "puromycin").Fit((FlowLaw)Law, ErrorModel.UpToScale(0, ShearStress.FromPascals(1)));

    [Theory]
    [InlineData("Vm", 0)]
    [InlineData("K", 1)]
    public void Estimates_and_standard_errors_agree_to_12_digits(string name, int index)
    {
        var parameter = Fit.Parameters[index];
        Agrees(Exact[name], parameter.Estimate, 1e-11);
        Agrees(Exact[$"se {name}"], parameter.StandardError!.Value, 1e-9);
    }

    [Fact]
    public void Sum_of_squares_degrees_of_freedom_and_correlation_agree()
    {
        var fit = Fit;
        Agrees(Exact["residual sum of squares"], fit.Fit.ChiSquare, 1e-12);
        Assert.Equal(Exact["df"], fit.Fit.DegreesOfFreedom);
        Agrees(Exact["correlation"], fit.Covariance[1] / Math.Sqrt(fit.Covariance[0] * fit.Covariance[3]), 1e-10);
    }

    [Theory]
    [InlineData("Vm")]
    [InlineData("K")]
    public void Profile_limits_agree_to_11_digits(string name)
    {
        var interval = Fit.Interval(name);
        Assert.Equal(IntervalKind.Closed, interval.Kind);
        Agrees(Exact[$"{name} profile 95 % low"], interval.Lower!.Value, 1e-11);
        Agrees(Exact[$"{name} profile 95 % high"], interval.Upper!.Value, 1e-11);
    }

    /// <summary>The table's Wald limits are symmetric on the natural scale, which is the fitting scale of a parameter without bounds.</summary>
    [Theory]
    [InlineData("Vm")]
    [InlineData("K")]
    public void Wald_and_profile_limits_of_parameters_without_bounds_agree(string name)
    {
        var free = FlowLaw.Custom("unbounded", (c, p) => p[0] * c / (p[1] + c), [.. Law.Parameters.Select(parameter => parameter with { Lower = double.NegativeInfinity })]);
        var fit = FlowCurve.Of(Data.Concentration, Data.Velocity).Fit((FlowLaw)free, ErrorModel.UpToScale(0, ShearStress.FromPascals(1)));
        var (wald, profile) = (fit.Interval(name, 0.95, IntervalMethod.Wald), fit.Interval(name));
        Agrees(Exact[$"{name} Wald 95 % low"], wald.Lower!.Value, 1e-10);
        Agrees(Exact[$"{name} Wald 95 % high"], wald.Upper!.Value, 1e-10);
        Agrees(Exact[$"{name} profile 95 % low"], profile.Lower!.Value, 1e-9);
        Agrees(Exact[$"{name} profile 95 % high"], profile.Upper!.Value, 1e-9);
    }

    /// <summary>The value at 0.1 over 0.1 is its apparent viscosity, whose working scale is the logarithm.</summary>
    [Fact]
    public void A_derived_value_and_its_standard_error_by_the_delta_method_agree()
    {
        var value = Measurand.Viscosity(ShearRate.FromReciprocalSeconds(0.1)).From(Fit)!.ToValue(Fit);
        Agrees(Exact["rate at concentration 0.1"], 0.1 * Math.Exp(value.X), 1e-11);
        Agrees(Exact["delta-method se of rate at concentration 0.1"], 0.1 * Math.Exp(value.X) * value.StandardUncertainty, 1e-10);
    }

    /// <summary>Weights that belong to the readings are no error model of a flow curve; the general entry takes them as a second predictor.</summary>
    [Fact]
    public void Weighted_fits_agree_with_the_scale_known_and_estimated()
    {
        double[] roots = [.. Data.Velocity.Select(velocity => 1 / Math.Sqrt(velocity))];
        var fit = LeastSquares.Fit(default(Weighted), [.. Data.Velocity.Select((velocity, i) => velocity * roots[i])], [200, 0.1], Data.Concentration, roots);
        Agrees(Exact["weights 1/rate: Vm"], fit.Parameters[0], 1e-10);
        Agrees(Exact["weights 1/rate: K"], fit.Parameters[1], 1e-10);
        Agrees(Exact["weights 1/rate: WSS"], fit.ChiSquare, 1e-12);
        var scale = fit.ChiSquare / Exact["df"];
        foreach (var (name, at) in new[] { ("Vm", 0), ("K", 3) })
        {
            Agrees(Exact[$"weights 1/rate: se {name} scale known"], Math.Sqrt(fit.Inverse[at]), 1e-10);
            Agrees(Exact[$"weights 1/rate: se {name} scale estimated"], Math.Sqrt(scale * fit.Inverse[at]), 1e-10);
        }
    }

    [Fact]
    public void R_agrees_with_the_exact_numbers() => Assert.All(Read("puromycin.r.csv"), row => Agrees(Exact[row.Key], row.Value, 2e-8));

    private static void Agrees(double expected, double actual, double relative) =>
        Assert.True(Math.Abs(actual / expected - 1) <= relative, string.Create(CultureInfo.InvariantCulture, $"{actual:G15} instead of {expected:G15}"));

    private static Dictionary<string, double> Read(string file) => ReferenceTable.Read("intervals", file).ToDictionary(row => row["quantity"], row => row.Number("value"));

    private static double[] Column(string name) => [.. ReferenceTable.Read("law-comparison", "puromycin.csv").Select(row => row.Number(name))];

    private readonly struct Weighted : IModelFormula
    {
        public T Value<T>(ReadOnlySpan<T> x, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => x[1] * p[0] * x[0] / (p[1] + x[0]);
    }
}
