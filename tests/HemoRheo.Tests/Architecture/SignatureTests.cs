using System.Reflection;

namespace HemoRheo.Tests.Architecture;

/// <summary>What other programs see of the library speaks of the library and the platform alone.</summary>
public sealed class SignatureTests
{
    private const BindingFlags Everything = BindingFlags.Public | BindingFlags.NonPublic | BindingFlags.Instance | BindingFlags.Static | BindingFlags.DeclaredOnly;

    [Fact]
    public void No_type_of_another_package_stands_in_a_public_signature()
    {
        var library = typeof(Value).Assembly;
        var wrong = library.GetExportedTypes().SelectMany(type => Mentioned(type).SelectMany(Parts).Where(Foreign).Select(foreign => $"{type.Name} shows {foreign.FullName}"));
        Faults.None(wrong);

        bool Foreign(Type type) => type.Assembly != library && !type.Assembly.GetName().Name!.StartsWith("System", StringComparison.Ordinal);
    }

    [Fact]
    public void No_public_member_answers_with_a_tuple() => Faults.None(
        typeof(Value).Assembly.GetExportedTypes()
            .SelectMany(type => type.GetMembers(Everything).Where(Visible).SelectMany(member => Answer(member).SelectMany(Parts).Where(part => part.FullName?.StartsWith("System.ValueTuple", StringComparison.Ordinal) == true).Select(_ => $"{type.Name}.{member.Name}"))));

    private static IEnumerable<Type> Mentioned(Type type) =>
    [
        .. type.BaseType is { } parent ? [parent] : Type.EmptyTypes,
        .. type.GetInterfaces(),
        .. type.GetMembers(Everything).Where(Visible).SelectMany(member => Answer(member).Concat(Asked(member))),
    ];

    private static IEnumerable<Type> Answer(MemberInfo member) => member switch
    {
        MethodInfo method => [method.ReturnType],
        PropertyInfo property => [property.PropertyType],
        FieldInfo field => [field.FieldType],
        _ => [],
    };

    private static IEnumerable<Type> Asked(MemberInfo member) => member is MethodBase method ? method.GetParameters().Select(parameter => parameter.ParameterType) : [];

    private static IEnumerable<Type> Parts(Type type) => type switch
    {
        { HasElementType: true } => Parts(type.GetElementType()!),
        { IsGenericParameter: true } => [],
        { IsGenericType: true } => [type.GetGenericTypeDefinition(), .. type.GetGenericArguments().SelectMany(Parts)],
        _ => [type],
    };

    private static bool Visible(MemberInfo member) => member switch
    {
        MethodBase method => method.IsPublic || method.IsFamily,
        FieldInfo field => field.IsPublic || field.IsFamily,
        PropertyInfo property => property.GetAccessors(nonPublic: true).Any(Visible),
        _ => false,
    };
}
