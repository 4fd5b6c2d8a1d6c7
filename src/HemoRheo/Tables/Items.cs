using System.Collections;
using System.Runtime.CompilerServices;

namespace HemoRheo;

/// <summary>An unchangeable list that compares by content, so that records holding one compare by content too.</summary>
/// <typeparam name="T">What it lists.</typeparam>
[CollectionBuilder(typeof(Items), nameof(Items.Create))]
public sealed class Items<T> : IReadOnlyList<T>, IEquatable<Items<T>>
{
    private readonly T[] _items;

    internal Items(T[] items) => _items = items;

    /// <summary>A list of nothing.</summary>
    public static Items<T> None { get; } = new([]);

    /// <inheritdoc/>
    public int Count => _items.Length;

    /// <inheritdoc/>
    public T this[int index] => _items[index];

    internal ReadOnlySpan<T> Span => _items;

    /// <summary>This list with more at its end.</summary>
    public Items<T> With(IEnumerable<T> more) => new([.. _items, .. more]);

    /// <inheritdoc/>
    public bool Equals(Items<T>? other) => other is not null && _items.AsSpan().SequenceEqual(other._items);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => Equals(obj as Items<T>);

    /// <inheritdoc/>
    public override int GetHashCode()
    {
        var hash = new HashCode();
        foreach (var item in _items) hash.Add(item);
        return hash.ToHashCode();
    }

    /// <inheritdoc/>
    public IEnumerator<T> GetEnumerator() => ((IEnumerable<T>)_items).GetEnumerator();

    IEnumerator IEnumerable.GetEnumerator() => _items.GetEnumerator();

    /// <inheritdoc/>
    public override string ToString() => $"{Count} items";
}
