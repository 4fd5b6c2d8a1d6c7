namespace HemoRheo.Tests.Fitting;

/// <summary>Invented curves that are hard to fit: few or many points, few decades, equal rates, noise to 20 %, outliers, points at the floor, true parameters at their bounds, stresses from 1e-12 to 1e12 of the usual ones.</summary>
internal static class HardCurves
{
    private const double Floor = 0.0003;

    /// <summary>The curve of a number; always the same one.</summary>
    public static FlowCurve Of(int number)
    {
        var stream = RandomStream.Of(20261201, "hard", number);
        var law = FlowLaw.All[(int)(stream.Uniform() * FlowLaw.All.Count)];
        double[] truth = [.. law.Parameters.Select(parameter => True(parameter, stream))];
        var points = 4 + (int)(37 * stream.Uniform());
        var (highest, decades) = (1000 * Math.Pow(10, -2 * stream.Uniform()), 0.2 + 3 * stream.Uniform());
        var (noise, repeats, scaled) = (0.2 * stream.Uniform() * stream.Uniform(), stream.Uniform() < 0.2, stream.Uniform() < 0.1);
        var (rates, stresses) = (new double[points], new double[points]);
        for (var i = 0; i < points; i++)
        {
            rates[i] = repeats && i % 3 == 1 ? rates[i - 1] : highest * Math.Pow(10, -decades * i / (points - 1));
            stresses[i] = Math.Abs(law.Stress(ShearRate.FromReciprocalSeconds(rates[i]), truth).Pascals * (1 + noise * stream.Normal()) + Floor * stream.Normal());
        }

        if (stream.Uniform() < 0.2) stresses[(int)(points * stream.Uniform())] *= Math.Exp(2 * stream.Normal());
        if (stream.Uniform() < 0.1) for (var i = points / 2; i < points; i++) stresses[i] = Floor * (0.5 + stream.Uniform());
        if (stream.Uniform() < 0.01) stresses[0] = 0;
        var scale = scaled ? Math.Pow(10, 24 * stream.Uniform() - 12) : 1;
        return FlowCurve.Of(rates, [.. stresses.Select(stress => scale * stress)], $"hard {number}");
    }

    /// <summary>What is wrong with a fit, whatever the curve; null where nothing is.</summary>
    public static string? Fault(FittedLaw fit)
    {
        if (string.IsNullOrWhiteSpace(fit.Convergence.Message)) return "no reason";
        if (!fit.Usable) return fit.Findings.Any(finding => finding.Severity == Severity.Fault) ? null : "not usable without a finding";
        if (!fit.Parameters.All(parameter => double.IsFinite(parameter.Estimate))) return "an estimate is not finite";
        if (fit.Parameters.Any(parameter => parameter.StandardError is { } error ? !double.IsFinite(error) : parameter.WhyNoError is null)) return "a standard error is not finite";
        return fit.Residuals.All(double.IsFinite) && fit.Covariance.All(double.IsFinite) && double.IsFinite(fit.Fit.ChiSquare) ? null : "a residual or a covariance is not finite";
    }

    /// <summary>Wide around what blood has; now and then at a bound.</summary>
    private static double True(LawParameter parameter, RandomStream stream)
    {
        var atBound = stream.Uniform() < 0.1;
        var z = stream.Normal();
        return parameter.Name switch
        {
            "ratio" => atBound ? 0 : 1 / (1 + Math.Exp(1.4 + z)),
            "yield stress" => atBound ? 0 : 0.005 * Math.Exp(1.5 * z),
            "flow index" => 0.7 + 0.3 * z,
            "exponent" or "transition" => Math.Exp(0.5 * z),
            "time constant" => Math.Exp(2 * z),
            "critical rate" => 3 * Math.Exp(1.5 * z),
            "low-shear viscosity" => 0.05 * Math.Exp(z),
            "high-shear viscosity" => atBound ? 0 : 0.0035 * Math.Exp(0.5 * z),
            _ => 0.004 * Math.Exp(z),
        };
    }
}
