namespace HemoRheo.Notebooks;

/// <summary>What was understood of each file, and what was not.</summary>
internal static class ReadingsView
{
    public static Table Table(StudyReadings readings) => HemoRheo.Table.Of("file", "layout", "recordings", "readings", "findings").WithRows(
        readings.Files,
        file => [file.Path, file.Layout ?? "not understood", file.Recordings, file.Readings, Codes(file.Findings)]);

    public static Markup Of(StudyReadings readings) => Markup.Of($"""
        {TableMarkup.Of(Table(readings), readings.ToString())}{FindingsView.Of(readings.Findings)}
        """);

    private static string Codes(Items<Finding> findings) => string.Join(", ", findings.GroupBy(finding => finding.Code).Select(one => one.Count() == 1 ? one.Key : $"{one.Key} ({one.Count()})"));
}
