using System;

namespace RadicalSites.Molecules;

/// <summary>One bond of a molecule, in its localised (Kekule) form.</summary>
/// <remarks>Equality compares all fields, ends in order. Immutable and safe for use by many threads.</remarks>
public readonly struct Bond : IEquatable<Bond>
{
    private readonly byte flags;

    internal Bond(int begin, int end, BondOrder order, bool isAromatic, bool isInRing)
    {
        Begin = begin;
        End = end;
        Order = order;
        flags = (byte)((isAromatic ? 1 : 0) | (isInRing ? 2 : 0));
    }

    /// <summary>0-based index of the first atom, in input order.</summary>
    public int Begin { get; }

    /// <summary>0-based index of the second atom, in input order.</summary>
    public int End { get; }

    /// <summary>Bond order of the Kekule form.</summary>
    public BondOrder Order { get; }

    /// <summary>Whether the bond belongs to an aromatic ring by the model of the Perception namespace.</summary>
    public bool IsAromatic => (flags & 1) != 0;

    /// <summary>Whether the bond lies on a ring.</summary>
    public bool IsInRing => (flags & 2) != 0;

    /// <summary>The other end of the bond.</summary>
    /// <param name="atom">0-based index of one end.</param>
    /// <returns>0-based index of the end that is not <paramref name="atom"/>.</returns>
    public int Other(int atom) => Begin ^ End ^ atom;

    /// <inheritdoc/>
    public bool Equals(Bond other) =>
        Begin == other.Begin && End == other.End && Order == other.Order && flags == other.flags;

    /// <inheritdoc/>
    public override bool Equals(object? obj) => obj is Bond other && Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(Begin, End, Order, flags);

    /// <summary>Whether two bonds have the same fields.</summary>
    /// <param name="left">First bond.</param>
    /// <param name="right">Second bond.</param>
    /// <returns>Whether all fields are equal.</returns>
    public static bool operator ==(Bond left, Bond right) => left.Equals(right);

    /// <summary>Whether two bonds differ in a field.</summary>
    /// <param name="left">First bond.</param>
    /// <param name="right">Second bond.</param>
    /// <returns>Whether a field differs.</returns>
    public static bool operator !=(Bond left, Bond right) => !left.Equals(right);
}
