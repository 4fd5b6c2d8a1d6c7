namespace HemoRheo.Tests.Uncertainty;

/// <summary>The end gauge of JCGM 100:2008 (GUM), H.1, as a budget of signed contributions (tests/ReferenceData/decisions/metrology.r.csv).</summary>
public sealed class EndGaugeTests
{
    private static readonly Dictionary<string, IReadOnlyDictionary<string, string>> Rows = ReferenceTable.Read("decisions", "metrology.r.csv")
        .Where(row => row["example"] == "GUM H.1 end gauge").ToDictionary(row => row["quantity"]);

    [Fact]
    public void Its_length_uncertainty_and_degrees_of_freedom_are_reproduced()
    {
        var gauge = Gauge();
        Assert.Equal(Of("length l"), gauge.X, 1e-3);
        // R differentiates the full relation, this budget the guide's approximation of it: one part in a million apart.
        Assert.Equal(Of("combined standard uncertainty"), gauge.StandardUncertainty, 1e-4);
        Assert.Equal(Of("effective degrees of freedom"), gauge.DegreesOfFreedom, 1e-4);
        // Published: 32 nm, 16.
        Assert.Equal((32, 16), (Math.Round(gauge.StandardUncertainty), Math.Floor(gauge.DegreesOfFreedom)));
    }

    [Fact]
    public void Its_expanded_uncertainty_is_93_nm_with_the_degrees_of_freedom_cut_to_16()
    {
        // The guide cuts 16.6 to 16 before it takes t; not cut, t is a little smaller.
        var gauge = Gauge();
        Assert.Equal(93, Math.Round(Of("t 99 % (16 df)") * gauge.StandardUncertainty));
        Assert.InRange(gauge.ExpandedUncertainty(0.99), 0.99 * Of("expanded uncertainty 99 %"), Of("expanded uncertainty 99 %"));
        Assert.Equal(gauge.X + gauge.ExpandedUncertainty(0.99), gauge.Interval(0.99).Upper, 1e-6);
    }

    private static Value Gauge()
    {
        // l = l_s + d - l_s (d_alpha theta + alpha_s d_theta), every input with its degrees of freedom of table H.1.
        var (length, alpha, theta) = (Of("input lambda.s"), Of("input alpha.s"), Of("input thetabar") + Of("input Delta"));
        var (differs, warmer) = (Of("input delta.alpha"), Of("input delta.theta"));
        Contribution Part(string name, double sensitivity, double degreesOfFreedom) => new(new(SourceKind.Fit, name), sensitivity * Of($"u( {name} )"), name, degreesOfFreedom);
        return new(
            length + Of("input dbar.lambda") - length * (differs * theta + alpha * warmer),
            [
                Part("lambda.s", 1 - (differs * theta + alpha * warmer), 18),
                Part("dbar.lambda", 1, 24),
                Part("delta.Cr", 1, 5),
                Part("delta.Cnr", 1, 8),
                Part("alpha.s", -length * warmer, double.PositiveInfinity),
                Part("delta.alpha", -length * theta, 50),
                Part("thetabar", -length * differs, double.PositiveInfinity),
                Part("Delta", -length * differs, double.PositiveInfinity),
                Part("delta.theta", -length * alpha, 2),
            ]);
    }

    private static double Of(string quantity) => Rows[quantity].Number("value");
}
