using System.Reflection;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp;

namespace HemoRheo.Tests.FlowLaws;

/// <summary>A user's law as a notebook cell compiles it: script source, no optimization.</summary>
public class CustomLawInScriptTests
{
    private const string Parameters = """
        new LawParameter("yield stress", "τ_y", "Pa", Start: 0.01), new LawParameter("viscosity", "η", "Pa.s", Start: 0.004)
        """;

    /// <summary>Exact data of Casson, 5 mPa and 3.4 mPa.s.</summary>
    private const string Curve = """
        var rates = new[] { 300, 130, 50, 20, 5, 1.2 };
        var curve = FlowCurve.Of(rates, rates.Select(rate => FlowLaw.Casson.Stress(rate.PerSecond(), 0.005, 0.0034).Pascals).ToArray());
        """;

    [Fact]
    public async Task A_struct_in_a_cell_fits()
    {
        var answer = await Run($$"""
            readonly struct Mine : IFormula
            {
                public T Stress<T>(T rate, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => T.Square(T.Sqrt(p[0]) + T.Sqrt(p[1] * rate));
            }
            {{Curve}}
            curve.Fit(FlowLaw.Custom("mine", new Mine(), {{Parameters}})).Values["yield stress"]
            """);
        Assert.Equal(0.005, (double)answer, 1e-11);
    }

    [Fact]
    public async Task A_lambda_in_a_cell_may_use_a_variable_of_the_cell()
    {
        var answer = await Run($$"""
            var factor = 2.0;
            {{Curve}}
            curve.Fit(FlowLaw.Custom("mine", (rate, p) => LaneDual.Square(LaneDual.Sqrt(factor * p[0]) + LaneDual.Sqrt(p[1] * rate)), {{Parameters}})).Values["yield stress"]
            """);
        Assert.Equal(0.0025, (double)answer, 1e-11);
    }

    /// <summary>The table in the documentation of FlowLaw.Custom.</summary>
    [Theory]
    [InlineData("CS0120", "var c = 2.0; readonly struct Mine : IFormula { public T Stress<T>(T rate, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => p[0] * rate * c; }")]
    [InlineData("CS0453", "class Mine : IFormula { public T Stress<T>(T rate, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => p[0] * rate; }\nFlowLaw.Custom(\"mine\", new Mine(), new LawParameter(\"a\", \"a\", \"1\", Start: 1))")]
    [InlineData("CS0425", "readonly struct Mine : IFormula { public T Stress<T>(T rate, ReadOnlySpan<T> p) => rate; }")]
    [InlineData("CS1503", "readonly struct Mine : IFormula { public T Stress<T>(T rate, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => p[0] * Math.Sqrt(rate); }")]
    [InlineData("CS0019", "readonly struct Mine : IFormula { public T Stress<T>(T rate, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => rate > p[0] ? rate : p[0]; }")]
    [InlineData("CS0029", "readonly struct Mine : IFormula { public T Stress<T>(T rate, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> { return 0; } }")]
    public void A_mistake_has_the_message_that_the_documentation_lists(string code, string cell) =>
        Assert.Contains(code, Compiled(cell).GetDiagnostics(TestContext.Current.CancellationToken).Where(diagnostic => diagnostic.Severity == DiagnosticSeverity.Error).Select(diagnostic => diagnostic.Id));

    private static async Task<object> Run(string cell)
    {
        using var image = new MemoryStream();
        var emitted = Compiled(cell).Emit(image, cancellationToken: TestContext.Current.CancellationToken);
        Assert.True(emitted.Success, string.Join(Environment.NewLine, emitted.Diagnostics));
        var entry = Assembly.Load(image.ToArray()).GetType("Submission")!.GetMethod("<Factory>", BindingFlags.Static | BindingFlags.Public)!;
        return await (Task<object>)entry.Invoke(null, [new object?[2]])!;
    }

    private static CSharpCompilation Compiled(string cell)
    {
        var tree = CSharpSyntaxTree.ParseText(cell, new CSharpParseOptions(LanguageVersion.Latest, kind: SourceCodeKind.Script), cancellationToken: TestContext.Current.CancellationToken);
        var references = ((string)AppContext.GetData("TRUSTED_PLATFORM_ASSEMBLIES")!).Split(Path.PathSeparator).Select(path => MetadataReference.CreateFromFile(path));
        var options = new CSharpCompilationOptions(OutputKind.DynamicallyLinkedLibrary, optimizationLevel: OptimizationLevel.Debug, usings: ["System", "System.Linq", "HemoRheo"], scriptClassName: "Submission");
        return CSharpCompilation.CreateScriptCompilation("cell", tree, references, options, returnType: typeof(object));
    }
}
