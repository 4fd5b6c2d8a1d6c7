using Microsoft.CodeAnalysis.CSharp;
using Microsoft.CodeAnalysis.CSharp.Syntax;

namespace HemoRheo.Tests.Architecture;

/// <summary>Files of all projects, as text and syntax.</summary>
public sealed class FileTests
{
    private const int Longest = 300;

    /// <summary>Files that are longer, each with its reason.</summary>
    private static readonly Dictionary<string, string> LongWithReason = [];

    private static readonly string[] RefusedWords = ["Manager", "Helper", "Helpers", "Util", "Utils", "Utilities", "Common", "Misc", "Stuff"];

    private static readonly IReadOnlyList<string> Files =
    [
        .. Sources.FilesBelow(Path.Combine(Repository.Root, "src")),
        .. Sources.FilesBelow(Path.Combine(Repository.Root, "tests")),
    ];

    [Fact]
    public void No_file_is_long_without_a_reason()
    {
        var tooLong = Files.Where(path => File.ReadLines(path).Count() >= Longest).Select(Sources.Short);
        Faults.None(tooLong.Except(LongWithReason.Keys));
    }

    [Fact]
    public void A_file_declares_one_type_and_is_named_after_it()
    {
        var wrong = new List<string>();
        foreach (var path in Files.Where(path => Path.GetFileName(path) is not ("Program.cs" or "AssemblyAttributes.cs" or "GlobalUsings.cs")))
        {
            var types = Declared(path).Select(Name).ToArray();
            var file = Path.GetFileNameWithoutExtension(path).Split('.', '{')[0];
            // Items and Items<T> have one name and two files: the words that make an Items<T> lie in ItemsWords.cs, FlowLaw<T> lies in FlowLawOf.cs.
            var fits = types.Length == 1 && (types[0] == file || types[0] + "Words" == file || types[0] + "Of" == file);
            if (!fits) wrong.Add($"{Sources.Short(path)} declares {(types.Length == 0 ? "no type" : string.Join(", ", types))}");
        }

        Faults.None(wrong);
    }

    [Fact]
    public void The_namespace_says_the_project_and_folders_do_not_add_to_it_in_the_library()
    {
        var wrong = Files.Where(path => !Expected(Sources.Short(path), Namespace(path))).Select(path => $"{Sources.Short(path)}: namespace {Namespace(path)}");
        Faults.None(wrong);

        static bool Expected(string path, string? space)
        {
            var parts = path.Split('/');
            if (parts[^1] is "Program.cs" or "AssemblyAttributes.cs" or "GlobalUsings.cs") return true;
            return parts[1] switch
            {
                "HemoRheo" => space == "HemoRheo",
                "HemoRheo.Notebooks" when space == "HemoRheo" => true, // Verbs that a notebook finds after the library's one using.
                _ => space is not null && (space == parts[1] || space.StartsWith(parts[1] + ".", StringComparison.Ordinal)),
            };
        }
    }

    [Fact]
    public void No_type_or_folder_hides_what_it_does_behind_a_name_that_says_nothing()
    {
        var names = Files.SelectMany(path => Declared(path).Select(Name).Concat(Sources.Short(path).Split('/').Select(part => part.Replace(".cs", "", StringComparison.Ordinal)))).Distinct();
        Faults.None(names.Where(name => RefusedWords.Any(word => name.EndsWith(word, StringComparison.Ordinal))));
    }

    private static IEnumerable<MemberDeclarationSyntax> Declared(string path) => Root(path).DescendantNodes(node => node is CompilationUnitSyntax or BaseNamespaceDeclarationSyntax)
        .OfType<MemberDeclarationSyntax>().Where(member => member is BaseTypeDeclarationSyntax or DelegateDeclarationSyntax);

    private static string Name(MemberDeclarationSyntax member) => member is BaseTypeDeclarationSyntax type ? type.Identifier.Text : ((DelegateDeclarationSyntax)member).Identifier.Text;

    private static string? Namespace(string path) => Root(path).DescendantNodes().OfType<BaseNamespaceDeclarationSyntax>().FirstOrDefault()?.Name.ToString();

    private static Microsoft.CodeAnalysis.SyntaxNode Root(string path) => CSharpSyntaxTree.ParseText(File.ReadAllText(path), new(LanguageVersion.Preview), path).GetRoot(TestContext.Current.CancellationToken);
}
