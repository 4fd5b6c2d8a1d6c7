using System.Text.RegularExpressions;

namespace HemoRheo.Tests.Documents;

/// <summary>A page of text of the repository.</summary>
internal sealed partial class Page(string path)
{
    public string Path { get; } = path;

    public string Text { get; } = File.ReadAllText(System.IO.Path.Combine(Repository.Root, path));

    /// <summary>Its fenced blocks, without the fences.</summary>
    public IReadOnlyList<string> Blocks => [.. Fences().Matches(Text).Select(block => block.Groups["text"].Value)];

    /// <summary>What stands in single backticks outside fenced blocks.</summary>
    public IReadOnlyList<string> Codes => [.. Backticks().Matches(Fences().Replace(Text, "")).Select(code => code.Groups["text"].Value).Distinct()];

    /// <summary>Targets of its links that lie in the repository.</summary>
    public IEnumerable<string> Links => Targets().Matches(Fences().Replace(Text, "")).Select(link => link.Groups["target"].Value).Where(target => !target.Contains("://", StringComparison.Ordinal) && !target.StartsWith('#'));

    public bool Has(string heading) => Text.Split('\n').Any(line => line.StartsWith('#') && line.TrimStart('#').Trim() == heading);

    [GeneratedRegex("^```[a-z]*\n(?<text>.*?)^```\n", RegexOptions.Multiline | RegexOptions.Singleline)]
    private static partial Regex Fences();

    [GeneratedRegex("`(?<text>[^`\n]+)`")]
    private static partial Regex Backticks();

    [GeneratedRegex(@"\]\((?<target>[^)\s]+)\)")]
    private static partial Regex Targets();
}
