using System;
using System.Collections.Generic;

namespace RadicalSites.Products;

/// <summary>Equality of permutations by their images.</summary>
internal sealed class PermutationComparer : IEqualityComparer<ushort[]>
{
    internal static readonly PermutationComparer Instance = new();

    /// <inheritdoc/>
    public bool Equals(ushort[]? x, ushort[]? y) => x.AsSpan().SequenceEqual(y);

    /// <inheritdoc/>
    public int GetHashCode(ushort[] obj)
    {
        var hash = default(HashCode);
        foreach (ushort image in obj)
        {
            hash.Add(image);
        }

        return hash.ToHashCode();
    }
}
