using System.Xml.Linq;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp.Syntax;

namespace HemoRheo.Tests.Architecture;

/// <summary>The list of banned symbols is in force, every entry of it names something, and no source uses one.</summary>
public sealed class BannedTests
{
    private static readonly string[] Ids = [.. File.ReadLines(Path.Combine(Repository.Root, "src", "BannedSymbols.txt")).Select(line => line.Split(';')[0])];

    [Fact]
    public void The_library_is_built_with_the_list_as_errors()
    {
        var project = XDocument.Load(Path.Combine(Sources.Folder, "HemoRheo.csproj"));
        Assert.Contains(project.Descendants("PackageReference"), item => (string?)item.Attribute("Include") == "Microsoft.CodeAnalysis.BannedApiAnalyzers");
        Assert.Contains(project.Descendants("AdditionalFiles"), item => (string?)item.Attribute("Include") == "../BannedSymbols.txt");
        Assert.DoesNotContain("RS0030", File.ReadAllText(Path.Combine(Repository.Root, ".editorconfig")), StringComparison.Ordinal);
        Assert.DoesNotContain(Sources.FilesBelow(Path.Combine(Repository.Root, "src")), path => File.ReadAllText(path).Contains("RS0030", StringComparison.Ordinal));
    }

    [Fact]
    public void Every_entry_names_a_symbol_that_exists() => Faults.None(Ids.Where(id => DocumentationCommentId.GetFirstSymbolForDeclarationId(id, Sources.Compilation) is null));

    [Theory]
    [InlineData("P:System.DateTime.Now")]
    [InlineData("P:System.DateTimeOffset.UtcNow")]
    [InlineData("P:System.Globalization.CultureInfo.CurrentCulture")]
    [InlineData("T:System.Random")]
    [InlineData("T:System.Console")]
    public void Clock_culture_randomness_and_console_are_on_it(string id) => Assert.Contains(id, Ids);

    [Fact]
    public void No_source_uses_one()
    {
        var used = from tree in Sources.Files
                   let model = Sources.Compilation.GetSemanticModel(tree)
                   from name in tree.GetRoot().DescendantNodes().OfType<SimpleNameSyntax>()
                   let symbol = model.GetSymbolInfo(name).Symbol?.OriginalDefinition
                   where symbol is not null and not INamespaceSymbol && (Ids.Contains(symbol.GetDocumentationCommentId()) || Ids.Contains(symbol.ContainingType?.GetDocumentationCommentId()))
                   select $"{Sources.Place(name)}: {name}";
        Faults.None(used);
    }
}
