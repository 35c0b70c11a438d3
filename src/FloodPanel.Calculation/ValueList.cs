using System.Collections;
using System.Runtime.CompilerServices;

namespace FloodPanel.Calculation;

/// <summary>An immutable list that is equal to another when its items are equal, so that records holding it compare by value.</summary>
/// <typeparam name="T">The item type.</typeparam>
[CollectionBuilder(typeof(ValueList), nameof(ValueList.Create))]
public sealed class ValueList<T> : IReadOnlyList<T>, IEquatable<ValueList<T>>
{
    private readonly T[] items;

    internal ValueList(T[] items) => this.items = items;

    /// <summary>Number of items [-].</summary>
    public int Count => items.Length;

    /// <summary>The item at a position, counted from 0.</summary>
    /// <param name="index">Position, 0 to Count - 1.</param>
    public T this[int index] => items[index];

    /// <summary>The items as a span, for loops that must not allocate.</summary>
    public ReadOnlySpan<T> AsSpan() => items;

    /// <summary>A copy with one item replaced.</summary>
    /// <param name="index">Position, 0 to Count - 1.</param>
    /// <param name="item">The new item.</param>
    public ValueList<T> SetItem(int index, T item)
    {
        var copy = items.ToArray();
        copy[index] = item;
        return new ValueList<T>(copy);
    }

    /// <summary>A copy with one item appended.</summary>
    /// <param name="item">The item to append.</param>
    public ValueList<T> Add(T item) => new([.. items, item]);

    /// <summary>A copy without the item at a position.</summary>
    /// <param name="index">Position, 0 to Count - 1.</param>
    public ValueList<T> RemoveAt(int index) => new([.. items[..index], .. items[(index + 1)..]]);

    /// <summary>A copy with one item inserted before a position.</summary>
    /// <param name="index">Position, 0 to Count.</param>
    /// <param name="item">The item to insert.</param>
    public ValueList<T> Insert(int index, T item) => new([.. items[..index], item, .. items[index..]]);

    /// <inheritdoc/>
    public bool Equals(ValueList<T>? other) => other is not null && items.AsSpan().SequenceEqual(other.items);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => Equals(obj as ValueList<T>);

    /// <inheritdoc/>
    public override int GetHashCode()
    {
        var hash = new HashCode();
        foreach (var item in items)
        {
            hash.Add(item);
        }

        return hash.ToHashCode();
    }

    /// <inheritdoc/>
    public IEnumerator<T> GetEnumerator() => ((IEnumerable<T>)items).GetEnumerator();

    IEnumerator IEnumerable.GetEnumerator() => items.GetEnumerator();
}

/// <summary>Makes <see cref="ValueList{T}"/> from collection expressions and sequences.</summary>
public static class ValueList
{
    /// <summary>A list of the given items.</summary>
    /// <typeparam name="T">The item type.</typeparam>
    /// <param name="items">The items, copied.</param>
    public static ValueList<T> Create<T>(ReadOnlySpan<T> items) => new(items.ToArray());

    /// <summary>A list of the items of a sequence.</summary>
    /// <typeparam name="T">The item type.</typeparam>
    /// <param name="items">The items, copied.</param>
    public static ValueList<T> ToValueList<T>(this IEnumerable<T> items) => new([.. items]);
}
