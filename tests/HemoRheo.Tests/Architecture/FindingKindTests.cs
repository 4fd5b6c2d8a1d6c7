using System.Reflection;
using System.Text.RegularExpressions;
using Microsoft.CodeAnalysis.CSharp;
using Microsoft.CodeAnalysis.CSharp.Syntax;

namespace HemoRheo.Tests.Architecture;

/// <summary>Every kind of finding says what it means, what causes it and what to do, under a code of its own.</summary>
public sealed partial class FindingKindTests
{
    private static readonly IReadOnlyList<PropertyInfo> Properties =
    [
        .. typeof(FindingKind).Assembly.GetTypes().SelectMany(type => type.GetProperties(BindingFlags.Static | BindingFlags.Public | BindingFlags.NonPublic))
            .Where(property => property.PropertyType == typeof(FindingKind)),
    ];

    [Fact]
    public void Codes_are_stable_words_and_unique()
    {
        var codes = Properties.Select(property => Kind(property).Code).ToArray();
        Assert.All(codes, code => Assert.Matches(Words(), code));
        Faults.None(codes.GroupBy(code => code).Where(same => same.Count() > 1).Select(same => same.Key));
    }

    [Fact]
    public void Every_kind_says_meaning_cause_cure_and_source_in_sentences() => Assert.All(Properties, property =>
    {
        var kind = Kind(property);
        foreach (var sentence in new[] { kind.Meaning, kind.UsualCause, kind.WhatToDo })
        {
            Assert.True(sentence.Length > 7 && (char.IsUpper(sentence[0]) || char.IsDigit(sentence[0])) && sentence[^1] is '.', $"{kind.Code}: \"{sentence}\" is no sentence.");
        }

        Assert.False(string.IsNullOrWhiteSpace(kind.Source), kind.Code);
    });

    [Fact]
    public void Kinds_are_public_properties_of_a_class_named_after_its_room() => Assert.All(Properties, property =>
    {
        Assert.True(property.GetMethod!.IsPublic && property.SetMethod is null, property.Name);
        Assert.EndsWith("Findings", property.DeclaringType!.Name, StringComparison.Ordinal);
    });

    [Fact]
    public void Every_kind_is_raised_somewhere()
    {
        var named = Sources.Files.SelectMany(tree => tree.GetRoot().DescendantNodes().OfType<MemberAccessExpressionSyntax>()).Select(access => access.ToString()).ToHashSet();
        Faults.None(Properties.Select(property => $"{property.DeclaringType!.Name}.{property.Name}").Where(name => !named.Contains(name)));
    }

    [Fact]
    public void No_kind_is_made_on_the_way() => Faults.None(
        from tree in Sources.Files
        from made in tree.GetRoot().DescendantNodes().OfType<BaseObjectCreationExpressionSyntax>()
        let type = Sources.Compilation.GetSemanticModel(tree).GetTypeInfo((ExpressionSyntax)made).Type
        where type?.Name == nameof(FindingKind) && !made.Ancestors().OfType<ClassDeclarationSyntax>().Any(home => home.Identifier.Text.EndsWith("Findings", StringComparison.Ordinal))
        select Sources.Place(made));

    private static FindingKind Kind(PropertyInfo property) => (FindingKind)property.GetValue(null)!;

    [GeneratedRegex("^[a-z0-9]+(-[a-z0-9]+)*$")]
    private static partial Regex Words();
}
