namespace HemoRheo;

/// <summary>Makes <see cref="Items{T}"/> from other sequences.</summary>
public static class Items
{
    /// <summary>A list of these.</summary>
    public static Items<T> Create<T>(ReadOnlySpan<T> items) => items.IsEmpty ? Items<T>.None : new(items.ToArray());

    /// <summary>A list of these, in their order.</summary>
    public static Items<T> ToItems<T>(this IEnumerable<T> items) => items as Items<T> ?? new([.. items]);
}
