using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp;
using Microsoft.CodeAnalysis.CSharp.Syntax;

namespace HemoRheo.Tests.Architecture;

/// <summary>The compiler's rules see calls without a culture, but not texts with numbers in braces or joined with a plus: those are found here.</summary>
public sealed class CultureTests
{
    [Fact]
    public void No_number_or_moment_is_written_by_the_culture_of_the_machine() => Faults.None(Sources.Files.SelectMany(tree => Wrong(tree, Sources.Compilation)));

    [Theory]
    [InlineData("$\"{1.5}\"", true)]
    [InlineData("\"x\" + x", true)]
    [InlineData("$\"{System.DateTimeOffset.UnixEpoch}\"", true)]
    [InlineData("string.Create(System.Globalization.CultureInfo.InvariantCulture, $\"{x}\")", false)]
    [InlineData("FormattableString.Invariant($\"{x}\")", false)]
    [InlineData("$\"{count} {x.ToString(System.Globalization.CultureInfo.InvariantCulture)}\"", false)]
    public void The_check_tells_them_apart(string expression, bool refused)
    {
        var compilation = Sources.With($"namespace HemoRheo;\ninternal static class Probe {{ static string Text(double x, int count) => {expression}; }}", "Units/Probe.cs");
        Assert.Equal(refused, Wrong(compilation.SyntaxTrees.Last(), compilation).Any());
    }

    private static IEnumerable<string> Wrong(SyntaxTree tree, CSharpCompilation compilation)
    {
        var model = compilation.GetSemanticModel(tree);
        var nodes = tree.GetRoot().DescendantNodes().ToArray();
        var inBraces = nodes.OfType<InterpolatedStringExpressionSyntax>()
            .Where(text => model.GetTypeInfo(text).ConvertedType?.SpecialType == SpecialType.System_String && !HandedToInvariant(text, model))
            .SelectMany(text => text.Contents.OfType<InterpolationSyntax>())
            .Select(hole => hole.Expression);
        var joined = nodes.OfType<BinaryExpressionSyntax>()
            .Where(sum => sum.IsKind(SyntaxKind.AddExpression) && model.GetTypeInfo(sum).Type?.SpecialType == SpecialType.System_String)
            .SelectMany(sum => new[] { sum.Left, sum.Right });
        return inBraces.Concat(joined).Where(expression => ByCulture(model.GetTypeInfo(expression).Type)).Select(expression => $"{Sources.Place(expression)}: {expression}");
    }

    private static bool HandedToInvariant(InterpolatedStringExpressionSyntax text, SemanticModel model) =>
        text.Parent is ArgumentSyntax { Parent.Parent: InvocationExpressionSyntax call } && model.GetSymbolInfo(call).Symbol is IMethodSymbol { Name: "Invariant" or "Create" };

    private static bool ByCulture(ITypeSymbol? type)
    {
        if (type is INamedTypeSymbol { OriginalDefinition.SpecialType: SpecialType.System_Nullable_T } nullable) type = nullable.TypeArguments[0];
        if (type is null or { TypeKind: TypeKind.Enum }) return false;
        var whole = type.SpecialType is SpecialType.System_Char or (>= SpecialType.System_SByte and <= SpecialType.System_UInt64);
        return !whole && type.AllInterfaces.Any(face => face.Name == "IFormattable" && face.ContainingNamespace.Name == "System");
    }
}
