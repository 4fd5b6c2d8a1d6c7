namespace HemoRheo.Notebooks.Tests.Reports;

/// <summary>An invented study, made by hand and rich enough to show everything a page can say: two groups, hostile names, points set aside, a failed check, values that are undecided, marked or not judged.</summary>
internal static class FakeStudy
{
    public const string Markup = "<script>alert(1)</script>";
    public const string Formula = "=1+1,\"x\"";
    public const string Address = "javascript:alert(1)";
    public const string Climber = "../../up";

    public static readonly string[] Names = ["S-0001", "S-0002", "S-0003", Markup, Formula, Address, Climber, "s-0001", "S-0009", "S-0010"];

    public static readonly FindingKind Late = new("too-long-since-draw", Severity.Fault, "The sample was measured too long after the draw.", "A full day.", "Measure within the limit, or say in the study why not.");
    public static readonly FindingKind LowTorque = new("torque-below-floor", Severity.Fault, "The torque lies below the instrument's floor.", "A thin sample at a low rate.", "Leave the point aside.");
    public static readonly FindingKind Cut = new("file-cut", Severity.Fault, "The file ends in the middle of a line.", "An interrupted transfer.", "Copy the file again.");
    public static readonly FindingKind Warm = new("temperature-off", Severity.Warning, "The temperature departs from the one asked for.", "A thermostat that had not settled.", "Wait for the thermostat.");
    public static readonly FindingKind Hint = new("ramp-unstated", Severity.Note, "The export does not say which way the ramp went.", "An older export.", "Nothing.");

    public static readonly DateTimeOffset Start = new(2031, 3, 3, 9, 0, 0, TimeSpan.FromHours(1));

    public static Study Study { get; } = new(
        "Invented & <b>bold</b>", 42, "/nowhere", "study.toml", new string('a', 64),
        new(["exports"], ["checks"], "samples.csv", "people.csv", null),
        [],
        [new("R1", 2e-7, 2e-8, 0.05, TimeSpan.FromDays(8), 0.03, null, []), new("R2 <i>", null, 0, 0.05, TimeSpan.FromDays(8), 0.03, 0.01, [])],
        [new("cup", 0.0124, 0.0132, 0.04, 1.1)],
        [Fluid],
        [new("counter A", 0.007, 0.002)],
        new(0.02, 0.003, 0.018, 0.01),
        new(0.02, 0.0005, true, 0.02),
        new(Temperature.Body, 0.3, 0.02, TimeSpan.FromHours(4), 0.001, 0.2, 0.6),
        new(["Casson"], "Casson", [new(1), new(10), new(100)], Ramp.Down, true, 0.95),
        new(new(0.45), StandardisingRule.PlasmaPower),
        new(true, []),
        [new("c", "controls", true), new("p", "residents", false)]);

    public static StudyResult Result { get; } = Make();

    public static RunRecord Record { get; } = new(
        "Invented & <b>bold</b>", 42, new string('a', 64), [new("HemoRheo", "0.1.0"), new("runtime", "10.0.0")], [new("exports/r1.csv", new string('b', 64))], [new("S-0001 viscosity at 1 1/s", "0.0123")], new string('c', 64), []);

    public static RunComparison Changed { get; } = new([new("result", "S-0001 viscosity at 1 1/s", "0.0123", "0.0124", "input exports/r1.csv"), new("input", "exports/r1.csv", null, new string('b', 64), null)]);

    private static CalibrationFluid Fluid => FakeChecks.Fluid;

    private static StudyResult Make()
    {
        var histories = FakeChecks.Histories(Study);
        var ranges = FakeValues.Ranges();
        var samples = Names.Select((name, i) => FakeSamples.Sample(name, i, histories[0])).ToItems();
        var judged = samples.Select((sample, i) => new JudgedSample(sample, sample.Values.Select(value => FakeValues.Judge(value, ranges, i)).ToItems())).ToItems();
        ExportFile[] files =
        [
            new("exports/r1.csv", new string('b', 64), "rows", 12, 200, []),
            new("exports/cut <file>.csv", new string('d', 64), null, 0, 0, [Cut.At(new(File: "exports/cut <file>.csv", Line: 17, Column: 4), "The line ends in the middle of a number.")]),
        ];
        var readings = new StudyReadings(Study, files.ToItems(), samples.SelectMany(sample => sample.Loadings.Select(loading => loading.Recording)).ToItems(), [], samples.Select(sample => sample.Record).OfType<SampleRecord>().ToItems(), People().ToItems(), files[1].Findings);
        var findings = files[1].Findings.Concat(histories.SelectMany(history => history.Findings)).Concat(samples.SelectMany(sample => sample.Findings)).ToItems();
        return new(new(Study, readings, histories, FakeValues.Pool(), samples), ranges, judged, findings);
    }

    private static IEnumerable<Person> People() => Names.Select((_, i) => new Person($"P-{i + 1:000}", i % 2 == 0 ? "c" : "p", Where.Nowhere));
}
