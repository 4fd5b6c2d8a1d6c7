namespace HemoRheo.Tests.Uncertainty;

public sealed class ValueTests
{
    private static readonly Contribution Calibration = new(new(SourceKind.Calibration, "R1/1"), -0.01, "checks", 7);

    [Fact]
    public void A_common_part_cancels_in_a_difference_and_stays_in_a_mean()
    {
        var a = new Value(1.0, [Calibration, new(new(SourceKind.Fit, "a"), 0.03)]);
        var b = new Value(0.4, [Calibration, new(new(SourceKind.Fit, "b"), 0.04)]);
        var difference = a - b;
        Assert.Equal(0.6, difference.X, 1e-15);
        Assert.Equal(0, difference.Part(SourceKind.Calibration));
        Assert.Equal(0.05, difference.StandardUncertainty, 1e-15);
        var mean = Value.Mean([a, b]);
        Assert.Equal(-0.01, mean.Part(SourceKind.Calibration));
        Assert.Equal(Math.Sqrt(0.0001 + 0.000625), mean.StandardUncertainty, 1e-15);
    }

    [Fact]
    public void Opposite_signs_of_one_source_take_from_each_other_before_squaring()
    {
        var raised = new Value(0, [new(new(SourceKind.Thermometer, "R1"), 0.02)]);
        var lowered = new Value(0, [new(new(SourceKind.Thermometer, "R1"), -0.015)]);
        Assert.Equal(0.005, (raised + lowered).StandardUncertainty, 1e-15);
        Assert.Equal(0.035, (raised - lowered).StandardUncertainty, 1e-15);
    }

    [Fact]
    public void A_mean_of_many_never_averages_a_shared_part_away()
    {
        var many = Enumerable.Range(0, 400).Select(i => new Value(0, [Calibration, new(new(SourceKind.Fit, $"{i}"), 0.02)])).ToItems();
        Assert.Equal(Math.Sqrt(0.0001 + 0.0004 / 400), Value.Mean(many).StandardUncertainty, 1e-15);
    }

    [Fact]
    public void Contributions_of_one_estimate_are_right_or_wrong_together()
    {
        var one = new Value(0, [new(new(SourceKind.Loading, "a"), 0.02, "loading", 5), new(new(SourceKind.Loading, "b"), 0.02, "loading", 5)]);
        var two = new Value(0, [new(new(SourceKind.Loading, "a"), 0.02, "first", 5), new(new(SourceKind.Loading, "b"), 0.02, "second", 5)]);
        Assert.Equal(5, one.DegreesOfFreedom, 1e-12);
        Assert.Equal(10, two.DegreesOfFreedom, 1e-12);
        Assert.Equal(one.StandardUncertainty, two.StandardUncertainty);
    }

    [Fact]
    public void Known_variances_have_infinite_degrees_of_freedom_and_normal_intervals()
    {
        var value = new Value(1, [new(new(SourceKind.Fit, "a"), 0.5)]);
        Assert.Equal(double.PositiveInfinity, value.DegreesOfFreedom);
        // 0.975 quantile of the normal distribution: 1.959963984540054 (NIST/SEMATECH e-Handbook, table 1.3.6.7.1, more digits by R qnorm).
        Assert.Equal(1 + 0.5 * 1.959963984540054, value.Interval().Upper, 1e-12);
    }

    public static TheoryData<string, string> Combinations =>
        [.. ReferenceTable.Read("decisions", "expected-combinations.csv").Where(row => !row["combination"].StartsWith("ratio", StringComparison.Ordinal)).Select(row => (row["law"], row["combination"]))];

    /// <summary>
    /// The worked example's differences and means from its single values. Fit and loading are given there as one number a sample,
    /// so ratios of two rates of one sample cannot be had this way. The loading's degrees of freedom follow from the whole.
    /// </summary>
    [Theory]
    [MemberData(nameof(Combinations))]
    public void Combinations_of_the_worked_example_are_reproduced_from_its_values(string law, string combination)
    {
        var expected = ReferenceTable.Read("decisions", "expected-combinations.csv").Single(row => row["law"] == law && row["combination"] == combination);
        var (basis, rate) = (combination.Contains("native", StringComparison.Ordinal) ? "native" : "standard", combination.Split('@')[1]);
        var values = ReferenceTable.Read("decisions", "expected.csv")
            .Where(row => row["law"] == law && row["value"] == basis && row["shear_rate_per_s"] == rate)
            .Select(Given)
            .ToArray();
        var value = combination.StartsWith("two", StringComparison.Ordinal) ? values[0] - values[^1] : Value.Mean(values);
        Assert.Equal(6, values.Length);
        Near(expected.Number("ln_value"), value.X, 1e-7);
        Near(expected.Number("u_ln"), value.StandardUncertainty, 1e-5);
        Near(expected.Number("degrees_of_freedom"), value.DegreesOfFreedom, 1e-4);
        Near(expected.Number("lower_95"), value.Interval().Lower, 1e-5);
        Near(expected.Number("upper_95"), value.Interval().Upper, 1e-5);
        foreach (var (column, kind) in Columns.Where(column => expected[column.Name].Length > 0)) Assert.Equal(expected.Number(column), value.Part(kind)!.Value, 1e-5 * value.StandardUncertainty);
    }

    private static readonly (string Name, SourceKind Kind)[] Columns =
    [
        ("c_fit", SourceKind.Fit), ("c_loading", SourceKind.Loading), ("c_calibration", SourceKind.Calibration), ("c_day", SourceKind.Day),
        ("c_certificate", SourceKind.Certificate), ("c_fluid_beta", SourceKind.FluidBeta), ("c_thermometer", SourceKind.Thermometer),
        ("c_blood_beta", SourceKind.BloodBeta), ("c_hematocrit", SourceKind.Hematocrit), ("c_counter", SourceKind.Counter), ("c_plasma", SourceKind.Plasma),
    ];

    /// <summary>A row of the worked example: six samples of one period, each of a day of its own; eight checks.</summary>
    private static Value Given(IReadOnlyDictionary<string, string> row)
    {
        const double checks = 7;
        var own = row["sample"];
        double Amount(string column) => row[column].Length == 0 ? 0 : row.Number(column);
        var u2 = Math.Pow(row.Number("u_ln"), 2);
        var fromChecks = (Math.Pow(Amount("c_calibration"), 2) + Math.Pow(Amount("c_day"), 2)) / Math.Sqrt(checks);
        var fromLoading = Math.Sqrt(u2 * u2 / row.Number("degrees_of_freedom") - fromChecks * fromChecks);
        var loading = Amount("c_loading");
        var df = Math.Pow(loading * loading / fromLoading, 2);
        return new(row.Number("ln_value"),
        [
            new(new(SourceKind.Fit, own), Amount("c_fit")),
            new(new(SourceKind.Loading, own), loading, "loading", df),
            new(new(SourceKind.Calibration, "A"), Amount("c_calibration"), "checks A", checks),
            new(new(SourceKind.Day, own), Amount("c_day"), "checks A", checks),
            new(new(SourceKind.Certificate, ""), Amount("c_certificate")),
            new(new(SourceKind.FluidBeta, ""), Amount("c_fluid_beta")),
            new(new(SourceKind.Thermometer, ""), Amount("c_thermometer")),
            new(new(SourceKind.BloodBeta, ""), Amount("c_blood_beta")),
            new(new(SourceKind.Hematocrit, own), Amount("c_hematocrit")),
            new(new(SourceKind.Counter, ""), Amount("c_counter")),
            new(new(SourceKind.Plasma, own), Amount("c_plasma")),
        ]);
    }

    private static void Near(double expected, double actual, double relative) => Assert.InRange(actual, expected - relative * Math.Abs(expected), expected + relative * Math.Abs(expected));
}
