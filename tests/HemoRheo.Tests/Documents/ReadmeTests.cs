using System.Reflection;
using System.Text.RegularExpressions;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp;

namespace HemoRheo.Tests.Documents;

/// <summary>The commands of README stand where a newcomer looks, and its code gives what README prints below it.</summary>
public sealed partial class ReadmeTests
{
    // A name of the program's own goes before one that a using brings in, so the sample's Console is this one.
    private const string ConsoleOfTheSample = """
        internal static class Console
        {
            public static readonly System.IO.StringWriter Written = new() { NewLine = "\n" };
            public static void Write(object? what) => Written.Write(what);
            public static void WriteLine(object? what) => Written.WriteLine(what);
        }
        """;

    private static readonly Page Readme = new("README.md");

    [Fact]
    public void The_job_comes_first_then_the_two_commands()
    {
        Assert.Equal("dotnet run --project src/HemoRheo.App -c Release\n", Readme.Blocks[0]);
        Assert.Equal("dotnet test -c Release\n", Readme.Blocks[1]);
        Assert.Matches(JobFirst(), Readme.Text);
    }

    [Theory]
    [InlineData(2)]
    [InlineData(4)]
    public void The_code_has_at_most_twelve_lines_and_prints_what_stands_below_it(int block)
    {
        Assert.InRange(Readme.Blocks[block].Split('\n', StringSplitOptions.RemoveEmptyEntries).Length, 5, 12);
        var printed = Run(Readme.Blocks[block]);
        if (printed != Readme.Blocks[block + 1]) Assert.Fail($"README's code prints:\n{printed}");
    }

    private static string Run(string code)
    {
        var inPlace = code.Replace("\"synthetic-cohort/", $"\"{Repository.Root.Replace('\\', '/')}/synthetic-cohort/", StringComparison.Ordinal);
        const string usings = "global using System; global using System.Collections.Generic; global using System.Linq;";
        var references = ((string)AppContext.GetData("TRUSTED_PLATFORM_ASSEMBLIES")!).Split(Path.PathSeparator).Append(typeof(Value).Assembly.Location).Distinct().Select(path => MetadataReference.CreateFromFile(path));
        var compilation = CSharpCompilation.Create("ReadmeSample", [Parse(usings), Parse(ConsoleOfTheSample), Parse(inPlace)], references, new(OutputKind.ConsoleApplication, nullableContextOptions: NullableContextOptions.Enable));
        using var program = new MemoryStream();
        var built = compilation.Emit(program, cancellationToken: TestContext.Current.CancellationToken);
        Assert.True(built.Success, string.Join('\n', built.Diagnostics));
        var assembly = Assembly.Load(program.ToArray());
        assembly.EntryPoint!.Invoke(null, [Array.Empty<string>()]);
        return assembly.GetType("Console")!.GetField("Written")!.GetValue(null)!.ToString()!;
    }

    private static SyntaxTree Parse(string text) => CSharpSyntaxTree.ParseText(text, new(LanguageVersion.Preview), cancellationToken: TestContext.Current.CancellationToken);

    [GeneratedRegex(@"\A# HemoRheo\n\n[A-Z][^\n]{200,}\n")]
    private static partial Regex JobFirst();
}
