namespace HemoRheo.Tests.Fitting;

/// <summary>The joint fits of tests/ReferenceData/joint-fits: curves, error models, and SciPy's numbers for them.</summary>
internal static class JointCases
{
    private static readonly ILookup<string, IReadOnlyDictionary<string, string>> Readings = ReferenceTable.Read("joint-fits", "readings.csv").ToLookup(row => row["case"]);

    private static readonly ILookup<(string, string), double> Numbers = ReferenceTable.Read("joint-fits", "joint-fits.scipy.csv").ToLookup(row => (row["case"], row["quantity"]), row => row.Number("value"));

    public static FlowCurve[] Curves(string name) =>
    [
        .. Readings[name].GroupBy(row => row["curve"]).Select(rows => Of(rows.Key, [.. rows.Select(row => row.Number("shear_rate_per_s"))], [.. rows.Select(row => row.Number("shear_stress_Pa"))])),
    ];

    public static ErrorModel[] Errors(string name, bool known = true) =>
    [
        .. Readings[name].GroupBy(row => row["curve"]).Select(rows => rows.First())
            .Select(row => new ErrorModel(row.Number("relative"), ShearStress.FromPascals(row.Number("floor_Pa")), known)),
    ];

    public static Hematocrit[] Hematocrits(string name) => [.. Readings[name].GroupBy(row => row["curve"]).Select(rows => Hematocrit.FromLiterPerLiter(rows.First().Number("hematocrit")))];

    public static double[] Expected(string name, string quantity) => [.. Numbers[(name, quantity)]];

    /// <summary>A curve of a loading of one sample.</summary>
    private static FlowCurve Of(string loading, double[] rates, double[] stresses)
    {
        var curve = FlowCurve.Of(rates, stresses, "S-1");
        return curve with { Label = curve.Label with { Loading = int.Parse(loading, System.Globalization.CultureInfo.InvariantCulture) } };
    }
}
