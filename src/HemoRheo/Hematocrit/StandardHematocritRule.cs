namespace HemoRheo;

/// <summary>Moves log viscosities to a standard hematocrit, with the contributions of hematocrit and its counter.</summary>
internal static class StandardHematocritRule
{
    /// <summary>Hematocrits for which the plasma power rule is used, L/L.</summary>
    /// <remarks>Source: Matrai, Whittington and Ernst 1987, Clin Hemorheol 7:261-265; the range is common practice.</remarks>
    public static Interval PowerRuleRange { get; } = new(0.30, 0.60);

    /// <summary>The plasma power rule: ln x at the standard = k ln x + (1 - k) ln p, k = standard / measured hematocrit.</summary>
    /// <param name="native">Native log viscosity.</param>
    /// <param name="plasma">Log plasma viscosity of the same sample.</param>
    /// <param name="sample">Pseudonym of the sample.</param>
    /// <param name="measured">Its hematocrit.</param>
    /// <param name="standard">The standard.</param>
    /// <param name="counter">What measured the hematocrit.</param>
    public static Value ByPlasma(Value native, Value plasma, string sample, Hematocrit measured, Hematocrit standard, Counter counter)
    {
        var k = standard.LiterPerLiter / measured.LiterPerLiter;
        var perHematocrit = -k / measured.LiterPerLiter * (native.X - plasma.X);
        return WithHematocrit(Value.Combine([(k, native), (1 - k, plasma)]), perHematocrit, sample, counter);
    }

    /// <summary>The study's slope: ln x at the standard = ln x + b (standard - measured hematocrit).</summary>
    /// <param name="native">Native log viscosity.</param>
    /// <param name="slope">The study's slope.</param>
    /// <param name="sample">Pseudonym of the sample.</param>
    /// <param name="measured">Its hematocrit.</param>
    /// <param name="standard">The standard.</param>
    /// <param name="counter">What measured the hematocrit.</param>
    public static Value BySlope(Value native, HematocritSlope slope, string sample, Hematocrit measured, Hematocrit standard, Counter counter)
    {
        var distance = standard.LiterPerLiter - measured.LiterPerLiter;
        var moved = native with { X = native.X + slope.Slope * distance };
        var name = $"{slope.Law}, {slope.Measurand.Name}";
        return WithHematocrit(moved, -slope.Slope, sample, counter)
            .With(new(new(SourceKind.Slope, name), distance * slope.StandardUncertainty, $"slope of {name}", slope.DegreesOfFreedom));
    }

    private static Value WithHematocrit(Value value, double perHematocrit, string sample, Counter counter) => value
        .With(new(new(SourceKind.Hematocrit, sample), perHematocrit * counter.Uncertainty))
        .With(new(new(SourceKind.Counter, counter.Name), perHematocrit * counter.SharedUncertainty));
}
