using System.Text.Json;

namespace HemoRheo;

/// <summary>Writes the fields of an event.</summary>
internal static class LogJsonWriting
{
    internal static void Fields(Utf8JsonWriter json, LoggedEvent what)
    {
        switch (what)
        {
            case LoggedOpening opening:
                json.WriteString("instrument", opening.Instrument);
                break;
            case LoggedCheck check:
                Check(json, check);
                break;
            case LoggedAdjustment adjustment:
                json.WriteString("at", LogMoment.Text(adjustment.At));
                json.WriteString("what", adjustment.What);
                break;
            case LoggedBlankRun run:
                json.WriteString("at", LogMoment.Text(run.At));
                if (run.Geometry is not null) json.WriteString("geometry", run.Geometry);
                json.WriteStartArray("readings");
                foreach (var reading in run.Readings) BlankReading(json, reading);
                json.WriteEndArray();
                break;
            case LoggedCorrection correction:
                json.WriteNumber("of", correction.Of);
                json.WriteString("why", correction.Why);
                if (correction.Instead is not { } instead) break;
                json.WriteStartObject("instead");
                json.WriteString("kind", instead.Kind);
                Fields(json, instead);
                json.WriteEndObject();
                break;
            default:
                throw new ArgumentException($"A {what.GetType().Name} is no event of a log.", nameof(what));
        }
    }

    private static void Check(Utf8JsonWriter json, LoggedCheck check)
    {
        json.WriteString("instrument", check.Instrument);
        json.WriteString("name", check.Name);
        json.WriteNumber("filling", check.Filling);
        json.WriteString("at", LogMoment.Text(check.At));
        json.WriteString("fluid", check.Fluid);
        json.WriteString("lot", check.Lot);
        json.WriteNumber("temperature_degC", check.Temperature.DegreesCelsius);
        json.WriteNumber("measured_Pa.s", check.Measured.PascalSeconds);
        json.WriteNumber("expected_Pa.s", check.Expected.PascalSeconds);
        json.WriteNumber("error_ln", check.Error.X);
        json.WriteStartArray("contributions");
        foreach (var part in check.Error.Parts) Contribution(json, part);
        json.WriteEndArray();
        json.WriteNumber("limit", check.Limit);
        json.WriteString("outcome", check.Outcome.Words());
        json.WriteNumber("probability_within", check.ProbabilityWithin);
        json.WriteStartArray("readings");
        foreach (var reading in check.Readings) Reading(json, reading);
        json.WriteEndArray();
        if (check.Bands.Count > 0)
        {
            json.WriteStartArray("bands");
            foreach (var band in check.Bands) Band(json, band);
            json.WriteEndArray();
        }

        if (check.Export is not null) json.WriteString("export", check.Export);
        if (check.ExportDigest is not null) json.WriteString("export_sha256", check.ExportDigest);
    }

    private static void Contribution(Utf8JsonWriter json, Contribution part)
    {
        json.WriteStartObject();
        json.WriteString("source", part.Source.Kind.Words());
        json.WriteString("of", part.Source.Of);
        json.WriteNumber("amount", part.Amount);
        if (part.Estimate.Length > 0) json.WriteString("estimate", part.Estimate);
        if (double.IsFinite(part.DegreesOfFreedom)) json.WriteNumber("degrees_of_freedom", part.DegreesOfFreedom);
        json.WriteEndObject();
    }

    private static void Reading(Utf8JsonWriter json, LoggedReading reading)
    {
        json.WriteStartObject();
        json.WriteNumber("rate_1/s", reading.Rate);
        if (reading.Torque is { } torque) json.WriteNumber("torque_N.m", torque);
        json.WriteNumber("error_ln", reading.Error);
        json.WriteEndObject();
    }

    private static void Band(Utf8JsonWriter json, LoggedBand band)
    {
        json.WriteStartObject();
        json.WriteNumber("from_N.m", band.Torque.Lower);
        json.WriteNumber("to_N.m", band.Torque.Upper);
        json.WriteNumber("readings", band.Readings);
        json.WriteNumber("error_ln", band.Error);
        json.WriteNumber("standard_uncertainty", band.Uncertainty);
        json.WriteString("outcome", band.Outcome.Words());
        json.WriteNumber("probability_within", band.ProbabilityWithin);
        json.WriteEndObject();
    }

    private static void BlankReading(Utf8JsonWriter json, LoggedBlankReading reading)
    {
        json.WriteStartObject();
        json.WriteNumber("speed_rad/s", reading.Speed);
        json.WriteNumber("torque_N.m", reading.Torque);
        json.WriteNumber("noise_N.m", reading.Noise);
        json.WriteNumber("readings", reading.Readings);
        json.WriteEndObject();
    }
}
