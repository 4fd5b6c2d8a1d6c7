using System.Reflection;

namespace HemoRheo.Tests.Architecture;

/// <summary>Makes a value of any type of the library through its public constructors, always of the same content and always anew.</summary>
internal static class Invented
{
    public static object Of(Type type)
    {
        if (Nullable.GetUnderlyingType(type) is { } inner) return Of(inner);
        if (type == typeof(string)) return new string('a', 3);
        if (type.IsEnum) return Enum.GetValues(type).GetValue(0)!;
        if (type == typeof(DateTimeOffset)) return new DateTimeOffset(2026, 3, 4, 5, 6, 7, TimeSpan.FromHours(1));
        if (type.IsPrimitive || type == typeof(TimeSpan) || type == typeof(DateOnly)) return type == typeof(double) ? 1.5 : Activator.CreateInstance(type)!;
        if (type.IsGenericType && type.GetGenericTypeDefinition() == typeof(Items<>)) return List(type.GetGenericArguments()[0]);
        if (type == typeof(FlowLaw)) return FlowLaw();
        if (type == typeof(Cell)) return (Cell)1.5;
        if (type.IsAbstract) return Of(Concrete(type));
        var constructor = type.GetConstructors().OrderByDescending(one => one.GetParameters().Length).First(one => one.GetParameters() is not [{ } only] || only.ParameterType != type);
        return constructor.Invoke([.. constructor.GetParameters().Select(parameter => Of(parameter.ParameterType))]);
    }

    private static object List(Type item)
    {
        var array = Array.CreateInstance(item, 2);
        for (var i = 0; i < 2; i++) array.SetValue(Of(item), i);
        return typeof(Items).GetMethod(nameof(Items.ToItems))!.MakeGenericMethod(item).Invoke(null, [array])!;
    }

    /// <summary>Laws are made by the library alone: the first one it offers.</summary>
    private static object FlowLaw() => typeof(FlowLaw).GetProperties(BindingFlags.Public | BindingFlags.Static).First(property => property.PropertyType.IsAssignableTo(typeof(FlowLaw))).GetValue(null)!;

    private static Type Concrete(Type type) => type.Assembly.GetExportedTypes().First(other => !other.IsAbstract && other.IsAssignableTo(type) && other.GetConstructors().Length > 0);
}
