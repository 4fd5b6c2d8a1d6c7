namespace HemoRheo.Tests.Architecture;

/// <summary>The rooms of src/HemoRheo in the order of the pipeline, and which others each may use. DEVELOPERS.md prints this table; a test holds both equal.</summary>
internal static class Rooms
{
    /// <summary>The rooms every other room stands on.</summary>
    public static IReadOnlyList<string> Floor { get; } = ["Units", "Findings", "Tables", "Numerics", "Uncertainty", "Decisions"];

    public static IReadOnlyList<Room> All { get; } =
    [
        new("Numerics", [], "a trade word, a unit"),
        new("Units", ["Tables"], "computing results"),
        new("Findings", ["Units", "Tables"], "throwing for data quality"),
        new("Tables", ["Units"], "knowing what a row is about"),
        new("Uncertainty", ["Numerics", "Units", "Tables"], "knowing what was measured"),
        new("Decisions", ["Numerics", "Units", "Tables", "Uncertainty"], "knowing what was measured"),
        new("Studies", [.. Floor], "guessing a value that is not written"),
        new("Exports", [.. Floor, "Studies"], "judging quality; dropping a row"),
        new("Rheometry", [.. Floor, "Studies", "Exports"], "fitting"),
        new("FlowLaws", [.. Floor], "data, solver"),
        new("Fitting", [.. Floor, "Rheometry", "FlowLaws"], "reading files"),
        new("Calibration", [.. Floor, "Studies", "Exports", "Rheometry", "FlowLaws", "Fitting"], "samples of people"),
        new("Screening", [.. Floor, "Studies", "Exports", "Rheometry"], "deleting, smoothing, interpolating"),
        new("Derived", [.. Floor, "Rheometry", "FlowLaws", "Fitting"], "fitting again"),
        new("Pooling", [.. Floor, "Rheometry", "FlowLaws", "Fitting", "Derived"], "deciding on a sample"),
        new("Hematocrit", [.. Floor, "Studies", "Derived", "Pooling"], "clamping silently"),
        new("Samples", [.. Floor, "Studies", "Exports", "Rheometry", "FlowLaws", "Fitting", "Calibration", "Screening", "Derived", "Pooling", "Hematocrit"], "statistics across samples"),
        new("ReferenceRanges", [.. Floor, "Studies", "Exports", "Calibration", "Derived", "Pooling", "Samples"], "drawing"),
        new("Cohorts", [.. Floor, "Studies", "Exports", "Derived", "Pooling", "Samples", "ReferenceRanges"], "drawing"),
        new("Ledger", [.. Floor, "Studies", "Exports", "FlowLaws", "Fitting", "Calibration", "Derived", "Pooling", "Samples", "ReferenceRanges", "Cohorts"], "changing a result"),
    ];

    /// <summary>The table as DEVELOPERS.md prints it.</summary>
    public static string ToMarkdown() => string.Concat(All.Select(room => $"| {room.Name} | {Words(room)} | {room.Never} |\n").Prepend("| room | may use | never |\n|---|---|---|\n"));

    private static string Words(Room room)
    {
        var wholeFloor = Floor.All(room.MayUse.Contains);
        var others = room.MayUse.Where(name => !(wholeFloor && Floor.Contains(name))).ToArray();
        string[] words = wholeFloor ? ["the floor", .. others] : others;
        return words.Length == 0 ? "nothing" : string.Join(", ", words);
    }
}
