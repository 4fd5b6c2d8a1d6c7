using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Nodes;
using System.Text.RegularExpressions;

namespace HemoRheo.Notebooks.Tests;

/// <summary>
/// An executed notebook as it is kept in the repository: what the cells show, without times of execution, folders and addresses of the machine,
/// the kernel's own scripts, and the chart library (still pictures stand where charts are until the notebook is run).
/// </summary>
internal static partial class SavedNotebook
{
    private static readonly JsonSerializerOptions AsJupyterWrites = new() { WriteIndented = true, IndentSize = 1, NewLine = "\n", Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };

    /// <summary>The text of the notebook to keep.</summary>
    public static string Of(ExecutedNotebook executed, string source)
    {
        var notebook = JsonNode.Parse(File.ReadAllText(source))!;
        var cells = notebook["cells"]!.AsArray().Where(cell => (string?)cell!["cell_type"] == "code").ToArray();
        for (var i = 0; i < cells.Length; i++)
        {
            cells[i]!["execution_count"] = i + 1;
            cells[i]!["metadata"] = new JsonObject();
            cells[i]!["outputs"] = new JsonArray([.. executed.Cells[i]["outputs"]!.AsArray().Select(output => Kept(output!, i + 1)).OfType<JsonNode>()]);
        }

        var number = 0;
        var ids = new Dictionary<string, string>();
        return ChartId().Replace(notebook.ToJsonString(AsJupyterWrites), id => ids.TryGetValue(id.Value, out var known) ? known : ids[id.Value] = $"hr{++number:000000000000}") + "\n";
    }

    private static JsonObject? Kept(JsonNode output, int count)
    {
        var type = (string?)output["output_type"];
        if (type == "stream") return new() { ["name"] = (string?)output["name"], ["output_type"] = type, ["text"] = Lines(ExecutedNotebook.Text(output["text"])) };
        var html = ExecutedNotebook.Text(output["data"]?["text/html"]);
        var plain = ExecutedNotebook.Text(output["data"]?["text/plain"]);
        var script = html.Contains("<script", StringComparison.Ordinal) && !html.Contains("Plotly.newPlot(", StringComparison.Ordinal);
        var data = new JsonObject();
        if (html.Length > 0 && !script && !html.Contains("Installing Packages", StringComparison.Ordinal) && !html.Contains("Installed Packages", StringComparison.Ordinal)) data["text/html"] = Lines(html);
        if (plain.Length > 0 && !plain.StartsWith("Loading extension", StringComparison.Ordinal)) data["text/plain"] = Lines(plain);
        if (data.Count == 0) return null;
        var kept = new JsonObject { ["data"] = data, ["metadata"] = new JsonObject(), ["output_type"] = type };
        if (type == "execute_result") kept["execution_count"] = count;
        return kept;
    }

    private static JsonArray Lines(string text) => [.. Line().Matches(text).Select(line => (JsonNode)line.Value)];

    [GeneratedRegex("hr[0-9a-f]{12}")]
    private static partial Regex ChartId();

    [GeneratedRegex(".*\n|.+$")]
    private static partial Regex Line();
}
