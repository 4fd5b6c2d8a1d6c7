using System.Text.Json.Nodes;

namespace HemoRheo.Notebooks.Tests;

/// <summary>A notebook with the outputs of its cells.</summary>
internal sealed class ExecutedNotebook(string path)
{
    private readonly JsonNode _notebook = JsonNode.Parse(File.ReadAllText(path))!;

    public string Path => path;

    /// <summary>Code cells, from 0.</summary>
    public IReadOnlyList<JsonNode> Cells => [.. _notebook["cells"]!.AsArray().Where(cell => (string?)cell!["cell_type"] == "code").Select(cell => cell!)];

    /// <summary>All that the cells gave.</summary>
    public IEnumerable<JsonNode> Outputs => Cells.SelectMany(OutputsOf);

    /// <summary>Messages of the cells that failed.</summary>
    public IReadOnlyList<string> Errors => [.. Outputs.Where(output => (string?)output["output_type"] == "error").Select(output => $"{output["ename"]}: {output["evalue"]}")];

    /// <summary>What one cell shows in one form.</summary>
    public string Shown(int cell, string form) => string.Concat(OutputsOf(Cells[cell]).Select(output => Text(output["data"]?[form])));

    /// <summary>What one cell printed.</summary>
    public string Printed(int cell) => string.Concat(OutputsOf(Cells[cell]).Where(output => (string?)output["output_type"] == "stream").Select(output => Text(output["text"])));

    /// <summary>All that all cells show as HTML.</summary>
    public string AllHtml => string.Concat(Enumerable.Range(0, Cells.Count).Select(cell => Shown(cell, "text/html")));

    /// <summary>Multi-line text of a notebook: one string or a list of lines.</summary>
    public static string Text(JsonNode? node) => node switch
    {
        null => "",
        JsonArray lines => string.Concat(lines.Select(line => (string?)line)),
        _ => (string?)node ?? "",
    };

    private static IEnumerable<JsonNode> OutputsOf(JsonNode cell) => cell["outputs"]!.AsArray().Select(output => output!);
}
