using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Serialization;

namespace HemoRheo;

/// <summary>Records of runs as JSON text.</summary>
internal static class RunRecordJson
{
    private const int Format = 1;
    private const string WhatToDo = "Take the record that this program wrote, or leave the earlier record out and start a new one.";

    private static readonly JsonSerializerOptions Options = new(JsonSerializerDefaults.Web)
    {
        WriteIndented = true,
        NewLine = "\n",
        Encoder = JavaScriptEncoder.Default,
        UnmappedMemberHandling = JsonUnmappedMemberHandling.Disallow,
        RespectNullableAnnotations = true,
        RespectRequiredConstructorParameters = true,
        PropertyNameCaseInsensitive = false,
        NumberHandling = JsonNumberHandling.Strict,
        AllowDuplicateProperties = false,
    };

    internal static string Write(RunRecord record)
    {
        var file = new RunRecordFile(Format, record.Study, record.Seed, record.Settings, [.. record.Versions], [.. record.Inputs], [.. record.Feeds], [.. record.Results], record.ResultDigest);
        return JsonSerializer.Serialize(file, Options) + "\n";
    }

    internal static RunRecord Read(string json)
    {
        RefuseNewer(json);
        var file = Parse(json);
        if (ResultDigests.Of(file.Results) != file.ResultDigest) throw new FormatException($"The results in this record of a run do not agree with its digest, so it was changed after it was written. {WhatToDo}");
        return new(file.Study, file.Seed, file.Settings, file.Versions.ToItems(), file.Inputs.ToItems(), file.Results.ToItems(), file.ResultDigest, file.Feeds.ToItems());
    }

    private static void RefuseNewer(string json)
    {
        try
        {
            using var document = JsonDocument.Parse(json);
            if (document.RootElement.ValueKind != JsonValueKind.Object || !document.RootElement.TryGetProperty("format", out var format) || !format.TryGetInt32(out var number))
            {
                throw new FormatException($"This is not a record of a run: it has no whole number \"format\". {WhatToDo}");
            }

            if (number != Format) throw new FormatException($"This record of a run has format {number}; this program reads format {Format}{(number > Format ? ", so a newer version wrote it. Use that version" : "")}. {WhatToDo}");
        }
        catch (Exception wrong) when (wrong is JsonException or InvalidOperationException)
        {
            throw Unreadable(wrong);
        }
    }

    private static RunRecordFile Parse(string json)
    {
        try
        {
            return JsonSerializer.Deserialize<RunRecordFile>(json, Options)!;
        }
        catch (JsonException wrong)
        {
            throw Unreadable(wrong);
        }
    }

    private static FormatException Unreadable(Exception wrong) => new($"This record of a run cannot be read: {wrong.Message} {WhatToDo}", wrong);
}
