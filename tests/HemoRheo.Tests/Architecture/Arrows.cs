using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp;
using Microsoft.CodeAnalysis.CSharp.Syntax;

namespace HemoRheo.Tests.Architecture;

/// <summary>Which rooms a file mentions: every name in it is bound, and led back to the file that declares it.</summary>
internal static class Arrows
{
    /// <summary>Every mention of another room's type or member in this file, and every name that means nothing.</summary>
    public static IEnumerable<Mention> In(SyntaxTree tree, CSharpCompilation compilation)
    {
        var model = compilation.GetSemanticModel(tree);
        var room = Sources.RoomOf(tree)!;
        foreach (var node in tree.GetRoot().DescendantNodes().Where(Speaks))
        {
            var info = model.GetSymbolInfo(node);
            var symbol = info.Symbol ?? info.CandidateSymbols.FirstOrDefault();
            if (symbol is null)
            {
                if (!Keyword(node)) yield return new(node, room, null);
            }
            else if (Declaring(symbol) is { } other && other != room)
            {
                yield return new(node, room, other);
            }
        }
    }

    private static bool Speaks(SyntaxNode node) => node is SimpleNameSyntax or ImplicitObjectCreationExpressionSyntax or ElementAccessExpressionSyntax;

    /// <summary>Words that look like names and are not: they bind to nothing by their nature.</summary>
    private static bool Keyword(SyntaxNode node) => node switch
    {
        IdentifierNameSyntax { IsVar: true } or IdentifierNameSyntax { IsNotNull: true } or IdentifierNameSyntax { IsUnmanaged: true } => true,
        IdentifierNameSyntax { Identifier.Text: "nameof" or "_" } => true,
        ElementAccessExpressionSyntax => true, // An array's element: its type was named where the array came from.
        _ => false,
    };

    private static string? Declaring(ISymbol symbol)
    {
        if (symbol is INamespaceSymbol or ILocalSymbol or IParameterSymbol or ILabelSymbol or IRangeVariableSymbol or ITypeParameterSymbol or IDiscardSymbol) return null;
        if (symbol is IMethodSymbol { ReducedFrom: { } extension }) symbol = extension;
        symbol = symbol.OriginalDefinition;
        var declared = symbol.DeclaringSyntaxReferences.FirstOrDefault() ?? symbol.ContainingType?.DeclaringSyntaxReferences.FirstOrDefault();
        return declared is null ? null : Sources.RoomOf(declared.SyntaxTree);
    }
}
