using System.Text.Json;

namespace HemoRheo;

/// <summary>Reads the fields of an event. Fields it does not know, of a later program with the same format, are left alone.</summary>
internal static class LogJsonReading
{
    private static readonly Dictionary<string, CheckOutcome> Outcomes = Enum.GetValues<CheckOutcome>().ToDictionary(outcome => outcome.Words());
    private static readonly Dictionary<string, SourceKind> Kinds = Enum.GetValues<SourceKind>().ToDictionary(kind => kind.Words());

    internal static LoggedEvent Event(string kind, JsonElement json) => kind switch
    {
        "opening" => new LoggedOpening(json.Text("instrument")),
        "check" => Check(json),
        "adjustment" => new LoggedAdjustment(json.Moment("at"), json.Text("what")),
        "blank run" => new LoggedBlankRun(json.Moment("at"), json.TextOrNull("geometry"), json.GetProperty("readings").EnumerateArray().Select(BlankReading).ToItems()),
        "correction" => new LoggedCorrection(json.GetProperty("of").GetInt64(), json.Text("why"), json.TryGetProperty("instead", out var instead) ? Event(instead.Text("kind"), instead) : null),
        _ => throw new FormatException($"'{kind}' is no kind of entry."),
    };

    private static LoggedCheck Check(JsonElement json) => new(
        json.Text("instrument"),
        json.Text("name"),
        json.GetProperty("filling").GetInt32(),
        json.Moment("at"),
        json.Text("fluid"),
        json.Text("lot"),
        new(json.Number("temperature_degC")),
        new(json.Number("measured_Pa.s")),
        new(json.Number("expected_Pa.s")),
        new(json.Number("error_ln"), json.GetProperty("contributions").EnumerateArray().Select(Contribution).ToItems()),
        json.Number("limit"),
        Outcomes[json.Text("outcome")],
        json.Number("probability_within"),
        json.GetProperty("readings").EnumerateArray().Select(reading => new LoggedReading(reading.Number("rate_1/s"), reading.NumberOrNull("torque_N.m"), reading.Number("error_ln"))).ToItems(),
        json.TextOrNull("export"),
        json.TextOrNull("export_sha256"))
    {
        Bands = json.TryGetProperty("bands", out var bands) ? bands.EnumerateArray().Select(Band).ToItems() : [],
    };

    private static LoggedBand Band(JsonElement json) => new(
        new(json.Number("from_N.m"), json.Number("to_N.m")),
        json.GetProperty("readings").GetInt32(),
        json.Number("error_ln"),
        json.Number("standard_uncertainty"),
        Outcomes[json.Text("outcome")],
        json.Number("probability_within"));

    private static Contribution Contribution(JsonElement json) => new(
        new(Kinds[json.Text("source")], json.Text("of")),
        json.Number("amount"),
        json.TextOrNull("estimate") ?? "",
        json.NumberOrNull("degrees_of_freedom") ?? double.PositiveInfinity);

    private static LoggedBlankReading BlankReading(JsonElement json) =>
        new(json.Number("speed_rad/s"), json.Number("torque_N.m"), json.Number("noise_N.m"), json.GetProperty("readings").GetInt32());

    private static string Text(this JsonElement json, string name) => json.GetProperty(name).GetString() ?? throw new FormatException($"'{name}' is empty.");

    private static string? TextOrNull(this JsonElement json, string name) => json.TryGetProperty(name, out var text) ? text.GetString() : null;

    private static double Number(this JsonElement json, string name) => json.GetProperty(name).GetDouble();

    private static double? NumberOrNull(this JsonElement json, string name) => json.TryGetProperty(name, out var number) ? number.GetDouble() : null;

    private static DateTimeOffset Moment(this JsonElement json, string name) => LogMoment.Read(json.Text(name));
}
