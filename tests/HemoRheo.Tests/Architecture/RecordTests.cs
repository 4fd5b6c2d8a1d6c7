using Microsoft.CodeAnalysis;

namespace HemoRheo.Tests.Architecture;

/// <summary>Results are unchangeable and equal by content.</summary>
public sealed class RecordTests
{
    /// <summary>Fields that compare by reference on purpose, each with its reason.</summary>
    private static readonly Dictionary<string, string> ByReferenceWithReason = [];

    public static TheoryData<Type> Buildable => [.. typeof(Value).Assembly.GetExportedTypes().Where(type => IsRecord(type) && !type.IsAbstract && !type.ContainsGenericParameters && type.GetConstructors().Length > 0)];

    [Fact]
    public void Every_field_of_a_record_compares_by_content()
    {
        var wrong = Sources.Types.Where(type => type.IsRecord && IsPublic(type))
            .SelectMany(type => type.GetMembers().OfType<IFieldSymbol>().Where(field => !field.IsStatic && !ByContent(field.Type)))
            .Select(field => $"{field.ContainingType.Name}.{(field.AssociatedSymbol ?? field).Name}: {field.Type.ToDisplayString(SymbolDisplayFormat.MinimallyQualifiedFormat)}");
        Faults.None(wrong.Where(field => !ByReferenceWithReason.ContainsKey(field)));
    }

    [Fact]
    public void The_check_of_fields_refuses_arrays_lists_and_functions()
    {
        var compilation = Sources.With("namespace HemoRheo;\npublic sealed record Probe(int[] A, List<int> B, IReadOnlyList<int> C, Func<int> D, Items<int[]> E, (int, int[]) F, Items<double> G, Unit? H, DateTimeOffset? I);", "Units/Probe.cs");
        var fields = compilation.GetTypeByMetadataName("HemoRheo.Probe")!.GetMembers().OfType<IFieldSymbol>();
        Assert.Equal(["A", "B", "C", "D", "E", "F"], fields.Where(field => !ByContent(field.Type)).Select(field => field.AssociatedSymbol!.Name));
    }

    [Theory]
    [MemberData(nameof(Buildable), DisableDiscoveryEnumeration = true)]
    public void Two_records_of_equal_content_are_equal(Type type)
    {
        var one = Invented.Of(type);
        var other = Invented.Of(type);
        Assert.NotSame(one, other);
        Assert.Equal(one, other);
        Assert.Equal(one.GetHashCode(), other.GetHashCode());
    }

    [Fact]
    public void Records_are_sealed_or_abstract_unless_the_library_derives_from_them()
    {
        var bases = Sources.Types.Select(type => type.BaseType?.OriginalDefinition).OfType<INamedTypeSymbol>().ToHashSet<INamedTypeSymbol>(SymbolEqualityComparer.Default);
        var open = Sources.Types.Where(type => type is { TypeKind: TypeKind.Class, IsSealed: false, IsAbstract: false, IsStatic: false } && !bases.Contains(type) && !IsException(type));
        Faults.None(open.Select(type => type.Name));
    }

    [Fact]
    public void Nothing_public_can_be_set_after_it_is_made()
    {
        var members = Sources.Types.Where(IsPublic).SelectMany(type => type.GetMembers());
        var settable = members.Where(member => member.DeclaredAccessibility is Accessibility.Public or Accessibility.Protected && member switch
        {
            IPropertySymbol property => property.SetMethod is { IsInitOnly: false, DeclaredAccessibility: Accessibility.Public or Accessibility.Protected },
            IFieldSymbol field => field is { IsReadOnly: false, IsConst: false } && field.ContainingType.TypeKind != TypeKind.Enum,
            _ => false,
        });
        Faults.None(settable.Select(member => $"{member.ContainingType.Name}.{member.Name}"));
    }

    [Fact]
    public void No_field_that_all_share_can_change() => Faults.None(
        Sources.Types.SelectMany(type => type.GetMembers().OfType<IFieldSymbol>())
            .Where(field => field is { IsStatic: true, IsReadOnly: false, IsConst: false })
            .Select(field => $"{field.ContainingType.Name}.{field.Name}"));

    private static bool ByContent(ITypeSymbol type) => type switch
    {
        ITypeParameterSymbol => true,
        { TypeKind: TypeKind.Enum } => true,
        { TypeKind: TypeKind.Array or TypeKind.Delegate or TypeKind.Interface or TypeKind.Dynamic } => false,
        INamedTypeSymbol named when named.TypeArguments.Any(argument => !ByContent(argument)) => false,
        INamedTypeSymbol { OriginalDefinition.SpecialType: SpecialType.System_Nullable_T } => true,
        INamedTypeSymbol { IsRecord: true } => true,
        INamedTypeSymbol named => named.AllInterfaces.Any(face => face.Name == "IEquatable" && SymbolEqualityComparer.Default.Equals(face.TypeArguments[0], named)),
        _ => false,
    };

    private static bool IsPublic(INamedTypeSymbol type) => type.DeclaredAccessibility == Accessibility.Public && (type.ContainingType is null || IsPublic(type.ContainingType));

    private static bool IsException(INamedTypeSymbol type) => type.Name.EndsWith("Exception", StringComparison.Ordinal);

    private static bool IsRecord(Type type) => type.GetMethod("<Clone>$") is not null || (type.IsValueType && !type.IsEnum && type.GetMethod("PrintMembers", System.Reflection.BindingFlags.NonPublic | System.Reflection.BindingFlags.Instance) is not null);
}
