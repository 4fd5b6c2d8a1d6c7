using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp;
using Microsoft.CodeAnalysis.CSharp.Syntax;

namespace HemoRheo.Tests.Architecture;

/// <summary>The sources of the library as the compiler sees them, compiled once for all architecture tests.</summary>
internal static class Sources
{
    private const string GlobalUsings = "global using System; global using System.Collections.Generic; global using System.IO; global using System.Linq; global using System.Net.Http; global using System.Threading; global using System.Threading.Tasks;";

    private static readonly CSharpParseOptions Options = new(LanguageVersion.Preview, DocumentationMode.None);

    public static string Folder { get; } = Path.Combine(Repository.Root, "src", "HemoRheo");

    public static CSharpCompilation Compilation { get; } = Compile();

    /// <summary>The library's own files.</summary>
    public static IReadOnlyList<SyntaxTree> Files { get; } = [.. Compilation.SyntaxTrees.Where(tree => tree.FilePath.Length > 0)];

    /// <summary>Every type the library declares.</summary>
    public static IReadOnlyList<INamedTypeSymbol> Types { get; } =
    [
        .. Files.SelectMany(tree => tree.GetRoot().DescendantNodes().OfType<BaseTypeDeclarationSyntax>()
            .Select(type => (INamedTypeSymbol)Compilation.GetSemanticModel(tree).GetDeclaredSymbol(type)!))
            .Distinct<INamedTypeSymbol>(SymbolEqualityComparer.Default),
    ];

    /// <summary>A path below the repository, with forward slashes.</summary>
    public static string Short(string path) => Path.GetRelativePath(Repository.Root, path).Replace('\\', '/');

    /// <summary>File and line of a node, for messages.</summary>
    public static string Place(SyntaxNode node) => $"{Short(node.SyntaxTree.FilePath)}:{node.GetLocation().GetLineSpan().StartLinePosition.Line + 1}";

    /// <summary>The room a file lies in; null where the file is not the library's.</summary>
    public static string? RoomOf(SyntaxTree tree) => tree.FilePath.Length == 0 ? null : Path.GetRelativePath(Folder, tree.FilePath).Replace('\\', '/').Split('/')[0];

    /// <summary>Source files below a folder, build output left out.</summary>
    public static IEnumerable<string> FilesBelow(string folder) => Directory.EnumerateFiles(folder, "*.cs", SearchOption.AllDirectories)
        .Where(path => !Short(path).Split('/').Any(part => part is "bin" or "obj"))
        .Order(StringComparer.Ordinal);

    /// <summary>The library's sources together with this text, so that a test can show that a check catches what it is for.</summary>
    public static CSharpCompilation With(string text, string path) => Compilation.AddSyntaxTrees(CSharpSyntaxTree.ParseText(text, Options, Path.Combine(Folder, path)));

    private static CSharpCompilation Compile()
    {
        var trees = FilesBelow(Folder).Select(path => CSharpSyntaxTree.ParseText(File.ReadAllText(path), Options, path));
        var platform = ((string)AppContext.GetData("TRUSTED_PLATFORM_ASSEMBLIES")!).Split(Path.PathSeparator)
            .Where(path => !Path.GetFileName(path).StartsWith("HemoRheo.", StringComparison.OrdinalIgnoreCase))
            .Select(path => MetadataReference.CreateFromFile(path));
        return CSharpCompilation.Create(
            "HemoRheo",
            [CSharpSyntaxTree.ParseText(GlobalUsings, Options), .. trees],
            platform,
            new(OutputKind.DynamicallyLinkedLibrary, allowUnsafe: true, nullableContextOptions: NullableContextOptions.Enable));
    }
}
