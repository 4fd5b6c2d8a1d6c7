using System.Text;
using System.Text.Encodings.Web;
using System.Text.Json;

namespace HemoRheo;

/// <summary>What entries say, as JSON in one line: fields in a fixed order, numbers in their shortest exact form, an infinite number of degrees of freedom left out.</summary>
internal static class LogJson
{
    private static readonly JsonWriterOptions Options = new() { Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };

    internal static string Write(LoggedEvent what)
    {
        using var bytes = new MemoryStream();
        using (var json = new Utf8JsonWriter(bytes, Options))
        {
            json.WriteStartObject();
            LogJsonWriting.Fields(json, what);
            json.WriteEndObject();
        }

        return Encoding.UTF8.GetString(bytes.GetBuffer(), 0, (int)bytes.Length);
    }

    /// <exception cref="FormatException">It is no such content.</exception>
    internal static LoggedEvent Read(string kind, string content)
    {
        try
        {
            using var document = JsonDocument.Parse(content);
            return LogJsonReading.Event(kind, document.RootElement);
        }
        catch (Exception wrong) when (wrong is JsonException or KeyNotFoundException or InvalidOperationException or ArgumentException)
        {
            throw new FormatException($"The content of a {kind} cannot be read: {wrong.Message}", wrong);
        }
    }

    /// <summary>What rows say, one by one on all processors; null where a row cannot be read.</summary>
    internal static LoggedEvent?[] TryRead(IReadOnlyList<LogRow> rows)
    {
        var read = new LoggedEvent?[rows.Count];
        Parallel.For(0, rows.Count, i => read[i] = TryRead(rows[i]));
        return read;
    }

    /// <summary>What a row says; null where that cannot be read.</summary>
    internal static LoggedEvent? TryRead(LogRow row)
    {
        try
        {
            LogMoment.Read(row.RecordedAt);
            return Read(row.Kind, row.Content);
        }
        catch (FormatException)
        {
            return null;
        }
    }
}
