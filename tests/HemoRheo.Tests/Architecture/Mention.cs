using Microsoft.CodeAnalysis;

namespace HemoRheo.Tests.Architecture;

/// <summary>A name in a source file that leads to another room.</summary>
/// <param name="Node">The name.</param>
/// <param name="Room">The room it stands in.</param>
/// <param name="Other">The room that declares what it names; null where it does not bind.</param>
internal sealed record Mention(SyntaxNode Node, string Room, string? Other)
{
    public override string ToString() => Other is null
        ? $"{Sources.Place(Node)}: {Node} means nothing"
        : $"{Sources.Place(Node)}: {Room} uses {Other} ({Node})";
}
